package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.treadwarm.intake.Document;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.jobs.JobDesk.Saving;
import org.treadwarm.jobs.Judgement;
import org.treadwarm.jobs.Partial;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.RoomSizing;
import org.treadwarm.sizing.Sizing.SpaceSizing;
import org.treadwarm.sizing.Verdict;
import org.treadwarm.store.Change;
import org.treadwarm.store.RevisionHeader;
import org.treadwarm.survey.Site;
import org.treadwarm.units.Numbers;
import org.treadwarm.web.security.Visitors;

/** The list of jobs, and a job: its site, spaces, assemblies, rooms with their verdicts, and totals. */
final class JobPages {
    private static final int LONGEST_NAME = 200;

    private final JobDesk desk;
    private final Visitors visitors;
    private final View view;

    JobPages(JobDesk desk, Visitors visitors, View view) {
        this.desk = desk;
        this.visitors = visitors;
        this.view = view;
    }

    /** A row of the list of jobs. */
    public record JobRow(String id, String name, long revision, boolean draft, String savedAt, String savedBy) {
        static JobRow of(RevisionHeader header) {
            String saved = header.savedAt().toString().substring(0, 16).replace('T', ' ') + " UTC";
            return new JobRow(
                    header.jobId(), header.name(), header.revision(), header.draft(), saved, header.savedBy());
        }
    }

    /** A row of a job's rooms. */
    public record RoomRow(
            String id,
            String name,
            boolean unfinished,
            String verdict,
            String mark,
            String loss,
            String required,
            String carrying,
            String margin,
            String holds) {}

    /** A row of a job's spaces or assemblies. */
    public record PartRow(String name, String link, String words) {}

    void list(Context ctx) {
        list(ctx, 200, "");
    }

    private void list(Context ctx, int status, String error) {
        view.show(
                ctx,
                status,
                "jobs",
                Map.of("jobs", desk.list().stream().map(JobRow::of).toList(), "error", error));
    }

    void create(Context ctx) {
        String name = EntryPages.text(ctx, "name").strip();
        if (name.isEmpty() || name.length() > LONGEST_NAME) {
            list(ctx, 422, "A job's name has 1 to " + LONGEST_NAME + " characters.");
            return;
        }
        ObjectNode survey = Document.mapper().createObjectNode();
        survey.putObject("site");
        survey.putObject("assemblies");
        survey.putObject("spaces");
        survey.putArray("rooms");
        Job job = desk.create(name, survey, Change.by(who(ctx)));
        ctx.redirect("/jobs/" + job.id(), HttpStatus.SEE_OTHER);
    }

    private String who(Context ctx) {
        return visitors.session(ctx).orElseThrow().person().name();
    }

    void show(Context ctx) {
        Optional<Job> job = desk.current(ctx.pathParam("job"));
        if (job.isEmpty()) {
            missing(ctx, view);
        } else {
            show(ctx, 200, job.get(), List.of(), "");
        }
    }

    static void missing(Context ctx, View view) {
        view.show(ctx, 404, "fault", Map.of("title", "There is nothing here", "status", 404));
    }

    private void show(Context ctx, int status, Job job, List<ErrorView> more, String notice) {
        show(ctx, status, job, job.document(), more, notice);
    }

    private void show(Context ctx, int status, Job job, JsonNode document, List<ErrorView> more, String notice) {
        Forms forms = new Forms(document, Judgement.of(document).problems());
        ObjectView site = forms.form("/site", "Site", Site.class);
        Partial partial = Partial.of(document);
        Optional<Sizing> sizing = partial.judgement().sizing();
        List<ErrorView> errors = new ArrayList<>(more);
        errors.addAll(forms.errors());
        Map<String, Object> model = new HashMap<>();
        model.put("job", job);
        model.put("site", site);
        model.put("errors", errors);
        model.put("notice", notice);
        model.put("rooms", rooms(document, sizing));
        model.put("spaces", spaces(job.id(), document, sizing));
        model.put("assemblies", assemblies(job.id(), document, sizing));
        model.put("total", sizing.map(Sizing::total).orElse(null));
        model.put("totals", sizing.map(JobPages::totals).orElse(List.of()));
        model.put("warnings", sizing.map(all -> looks(job, all)).orElse(List.of()));
        model.put("unfinished", partial.unfinished());
        model.put(
                "problems",
                job.problems().stream()
                        .map(problem -> new Look(
                                Place.of(job.id(), document, problem.pointer()),
                                problem.message(),
                                "",
                                problem.allowed()))
                        .toList());
        view.show(ctx, status, "job", model);
    }

    /** Something to look at, with where it is. */
    public record Look(Place place, String message, String why, String remedy) {}

    private static List<Look> looks(Job job, Sizing sizing) {
        return sizing.warnings().stream()
                .map(warning -> new Look(
                        Place.of(job.id(), job.document(), warning.pointer()),
                        warning.message().replace("m2", "m²"),
                        warning.why().replace("m2", "m²"),
                        warning.settle()))
                .toList();
    }

    /** A line of the totals. */
    public record TotalRow(String name, String value) {}

    private static List<TotalRow> totals(Sizing sizing) {
        List<TotalRow> rows = new ArrayList<>();
        rows.add(new TotalRow(
                "Heat loss of the rooms", Numbers.grouped(sizing.total().heatLoss()) + " W"));
        rows.add(new TotalRow("Heated area", Numbers.fixed(sizing.total().heatedArea(), 1) + " m²"));
        rows.add(new TotalRow(
                "Heater power at the required flux",
                Numbers.grouped(sizing.total().heaterPower()) + " W"));
        sizing.total()
                .installedPower()
                .ifPresent(power -> rows.add(new TotalRow("Installed electric power", Numbers.grouped(power) + " W")));
        double supplement = sizing.rooms().stream()
                .mapToDouble(room -> room.floor().supplement().orElse(0))
                .sum();
        if (supplement > 0) {
            rows.add(new TotalRow("Something else must add", Numbers.grouped(supplement) + " W"));
        }
        return rows;
    }

    private static List<RoomRow> rooms(JsonNode document, Optional<Sizing> sizing) {
        List<RoomRow> rows = new ArrayList<>();
        for (JsonNode room : document.path("rooms")) {
            String name = room.path("name").asText();
            Optional<RoomSizing> answer = sizing.flatMap(all -> all.rooms().stream()
                    .filter(each -> each.name().equals(name.strip()))
                    .findFirst());
            String title = name.isBlank() ? "(no name yet)" : name;
            rows.add(answer.map(sized -> row(room, title, sized))
                    .orElseGet(() -> new RoomRow(
                            room.path("id").asText(), title, true, "unfinished", "draft", "", "", "", "", "")));
        }
        return rows;
    }

    private static RoomRow row(JsonNode room, String title, RoomSizing answer) {
        FloorSizing floor = answer.floor();
        boolean carries = floor.verdict() == Verdict.CARRIES;
        String mark = floor.verdict() == Verdict.NO_HEATED_FLOOR ? "none" : carries ? "carries" : "short";
        return new RoomRow(
                room.path("id").asText(),
                title,
                false,
                floor.verdict().toString(),
                mark,
                Numbers.grouped(answer.heatLoss().total()) + " W",
                flux(floor.requiredFlux()),
                flux(floor.carryingFlux()),
                flux(floor.margin()),
                floor.holdsDownTo().isPresent()
                        ? Numbers.fixed(floor.holdsDownTo().getAsDouble(), 1) + " °C"
                        : floor.holdsDownToReason()
                                .map(reason -> reason.equals("never") ? "never" : "below -60 °C")
                                .orElse(""));
    }

    private static String flux(OptionalDouble flux) {
        return flux.isPresent() ? Numbers.fixed(flux.getAsDouble(), 1) : "";
    }

    private static List<PartRow> spaces(String job, JsonNode document, Optional<Sizing> sizing) {
        List<PartRow> rows = new ArrayList<>();
        document.path("spaces").properties().forEach(entry -> {
            JsonNode space = entry.getValue();
            String words;
            if (space.path("kind").asText().equals("held")) {
                words = "held at " + Forms.shown(space.path("temperature"));
            } else if (space.has("temperatureFactor")) {
                words = "temperature factor " + Forms.shown(space.path("temperatureFactor"));
            } else {
                words = "unheated"
                        + sizing.flatMap(all -> settled(all, entry.getKey())).orElse("");
            }
            rows.add(new PartRow(entry.getKey(), Links.part(job, "spaces", entry.getKey()), words));
        });
        return rows;
    }

    private static Optional<String> settled(Sizing sizing, String name) {
        return sizing.spaces().stream()
                .filter(space -> space.name().equals(name.strip()))
                .findFirst()
                .map(SpaceSizing::temperature)
                .map(temperature -> ", settles at " + Numbers.fixed(temperature, 1) + " °C on the design day");
    }

    private static List<PartRow> assemblies(String job, JsonNode document, Optional<Sizing> sizing) {
        List<PartRow> rows = new ArrayList<>();
        document.path("assemblies").properties().forEach(entry -> {
            JsonNode assembly = entry.getValue();
            String words = assembly.has("uValue")
                    ? "U " + Forms.shown(assembly.path("uValue"))
                    : assembly.path("layers").size() + " layers"
                            + sizing.flatMap(all -> uValue(all, entry.getKey())).orElse("");
            rows.add(new PartRow(entry.getKey(), Links.part(job, "assemblies", entry.getKey()), words));
        });
        return rows;
    }

    private static Optional<String> uValue(Sizing sizing, String name) {
        return sizing.assemblies().stream()
                .filter(assembly -> assembly.name().equals(name.strip()))
                .flatMap(assembly -> assembly.sides().stream())
                .filter(side -> side.uValue().isPresent())
                .findFirst()
                .map(side ->
                        ", U " + Numbers.fixed(side.uValue().orElseThrow(), 3) + " W/(m²·K) towards " + side.side());
    }

    void change(Context ctx) {
        Optional<Job> current = desk.current(ctx.pathParam("job"));
        if (current.isEmpty()) {
            missing(ctx, view);
            return;
        }
        Job job = current.get();
        ObjectNode document = (ObjectNode) job.document().deepCopy();
        String action = EntryPages.text(ctx, "do");
        FormData data = new FormData();
        ObjectNode site = document.path("site") instanceof ObjectNode known ? known : document.putObject("site");
        Job shown = shown(ctx, job);
        List<ErrorView> errors = new ArrayList<>(writeSite(ctx, data, site, shown));
        String name = name(ctx, job, shown);
        String notice = act(ctx, action, document, data, site);
        if (!notice.isEmpty()) {
            errors.add(new ErrorView("new-name", "", notice, ""));
        }
        if (errors.isEmpty()) {
            save(ctx, job, name, document, action);
        } else {
            show(ctx, notice.isEmpty() ? 409 : 422, job, document, errors, "");
        }
    }

    /** The revision that the form was made from. */
    private Job shown(Context ctx, Job current) {
        String revision = EntryPages.text(ctx, "revision");
        return revision.matches("[0-9]{1,15}")
                ? desk.revision(current.id(), Long.parseLong(revision)).orElse(current)
                : current;
    }

    /**
     * Writes what was typed about the site; fields that nobody touched keep what others have saved since. A field that both
     * changed is told of.
     */
    private static List<ErrorView> writeSite(Context ctx, FormData data, ObjectNode site, Job shown) {
        List<ErrorView> conflicts = new ArrayList<>();
        ctx.formParamMap().forEach((field, values) -> {
            if (!field.startsWith("/site/")) {
                return;
            }
            List<String> steps = FormData.steps(field.substring("/site".length()));
            String typed = values.get(0).strip();
            String before =
                    data.shown(steps, Site.class, shown.document().path("site")).strip();
            String now = data.shown(steps, Site.class, site).strip();
            if (typed.equals(before)) {
                return;
            }
            data.write(steps, Site.class, site, typed);
            if (!now.equals(before) && !now.equals(typed)) {
                conflicts.add(new ErrorView(
                        Forms.id(field),
                        "Site",
                        "Somebody else has made this \"" + now
                                + "\" meanwhile. Yours stands in the field, not kept yet: save"
                                + " again to let it stand.",
                        ""));
            }
        });
        return conflicts;
    }

    private static String name(Context ctx, Job job, Job shown) {
        String typed = EntryPages.text(ctx, "job-name").strip();
        boolean unchanged = typed.isEmpty() || typed.length() > LONGEST_NAME || typed.equals(shown.name());
        return unchanged ? job.name() : typed;
    }

    private void save(Context ctx, Job job, String name, ObjectNode document, String action) {
        Job saved = job;
        if (!document.equals(job.document()) || !name.equals(job.name())) {
            Saving saving = desk.save(job.id(), job.revision(), name, document, Change.by(who(ctx)));
            if (!(saving instanceof Saving.Saved done)) {
                show(
                        ctx,
                        409,
                        job,
                        List.of(new ErrorView(
                                "content",
                                "",
                                "Somebody saved this job in the same moment. Nothing is lost: try again.",
                                "")),
                        "");
                return;
            }
            saved = done.job();
        }
        boolean siteProblem =
                saved.problems().stream().anyMatch(problem -> problem.pointer().startsWith("/site"));
        if (action.equals("save") && siteProblem) {
            show(
                    ctx,
                    422,
                    saved,
                    List.of(),
                    "Kept as a draft: what is marked must be put right before it can be sized.");
        } else {
            ctx.redirect(after(saved, action, ctx), HttpStatus.SEE_OTHER);
        }
    }

    private static String after(Job job, String action, Context ctx) {
        String name = EntryPages.text(ctx, "new-name").strip();
        return switch (action.split(":", 2)[0]) {
            case "add-space" -> Links.part(job.id(), "spaces", name);
            case "add-assembly" -> Links.part(job.id(), "assemblies", name);
            case "add-room", "copy-room" -> {
                JsonNode rooms = job.document().path("rooms");
                yield Links.part(
                        job.id(),
                        "rooms",
                        rooms.path(rooms.size() - 1).path("id").asText());
            }
            default -> "/jobs/" + job.id();
        };
    }

    /** Does what a button says; gives a sentence when it cannot. */
    private static String act(Context ctx, String action, ObjectNode document, FormData data, ObjectNode site) {
        String name = EntryPages.text(ctx, "new-name").strip();
        String[] words = action.split(":", 2);
        String target = words.length > 1 ? words[1] : "";
        switch (words[0]) {
            case "add-room" -> {
                if (name.isEmpty()) {
                    return "The new room needs a name.";
                }
                rooms(document).addObject().put("name", name);
            }
            case "copy-room" -> copyRoom(document, target);
            case "remove-room" -> removeRoom(document, target);
            case "add-space", "add-assembly" -> {
                String parts = words[0].equals("add-space") ? "spaces" : "assemblies";
                ObjectNode all = document.path(parts) instanceof ObjectNode known ? known : document.putObject(parts);
                if (name.isEmpty() || name.length() > LONGEST_NAME || all.has(name)) {
                    return name.isEmpty() ? "The new part needs a name." : "That name is too long, or taken already.";
                }
                ObjectNode fresh = all.putObject(name);
                if (parts.equals("spaces")) {
                    fresh.put("kind", "unheated")
                            .putObject("temperatureFactor")
                            .put("reading", "0.8")
                            .put("basis", "assumed");
                }
            }
            case "assume" -> {
                if (target.startsWith("/site/")) {
                    data.assume(FormData.steps(target.substring("/site".length())), Site.class, site);
                }
            }
            default -> {}
        }
        return "";
    }

    private static ArrayNode rooms(ObjectNode document) {
        return document.path("rooms") instanceof ArrayNode known ? known : document.putArray("rooms");
    }

    private static void copyRoom(ObjectNode document, String id) {
        ArrayNode rooms = rooms(document);
        for (JsonNode room : rooms) {
            if (room.path("id").asText().equals(id)) {
                ObjectNode copy = room.deepCopy();
                withoutIds(copy);
                copy.put("name", freeName(document, room.path("name").asText()));
                rooms.add(copy);
                return;
            }
        }
    }

    private static void withoutIds(JsonNode node) {
        if (node instanceof ObjectNode object) {
            object.remove("id");
        }
        node.forEach(JobPages::withoutIds);
    }

    private static String freeName(ObjectNode document, String name) {
        List<String> taken = new ArrayList<>();
        document.path("rooms").forEach(room -> taken.add(room.path("name").asText()));
        document.path("spaces").fieldNames().forEachRemaining(taken::add);
        for (int i = 2; ; i++) {
            String free = name + " (" + i + ")";
            if (!taken.contains(free)) {
                return free;
            }
        }
    }

    private static void removeRoom(ObjectNode document, String id) {
        ArrayNode rooms = rooms(document);
        for (int i = 0; i < rooms.size(); i++) {
            if (rooms.get(i).path("id").asText().equals(id)) {
                rooms.remove(i);
                return;
            }
        }
    }
}
