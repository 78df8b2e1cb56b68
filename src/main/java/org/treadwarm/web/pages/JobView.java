package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.Judgement;
import org.treadwarm.jobs.Partial;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.ManifoldSizing;
import org.treadwarm.sizing.Sizing.RoomSizing;
import org.treadwarm.sizing.Sizing.SpaceSizing;
import org.treadwarm.sizing.Sizing.WaterTotal;
import org.treadwarm.sizing.Verdict;
import org.treadwarm.store.JobListing;
import org.treadwarm.store.RevisionHeader;
import org.treadwarm.survey.Site;
import org.treadwarm.units.Numbers;

/** What the list of jobs and the page of a job show: rows of rooms, spaces and assemblies, totals, and what to look at. */
final class JobView {
    /** A row of the list of jobs. */
    public record JobRow(
            String id, String name, long revision, boolean draft, String savedAt, String savedBy, boolean archived) {
        static JobRow of(JobListing job) {
            RevisionHeader header = job.newest();
            return new JobRow(
                    header.jobId(),
                    header.name(),
                    header.revision(),
                    header.draft(),
                    Moments.minute(header.savedAt()),
                    header.savedBy(),
                    job.archived());
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

    /** Something to look at, with where it is. */
    public record Look(Place place, String message, String why, String remedy) {}

    /** A line of the totals. */
    public record TotalRow(String name, String value) {}

    private final Job job;
    private final JsonNode document;
    private final Partial partial;
    private final Optional<Sizing> sizing;

    /** A job with the document to show, which is its own or one that could not be kept. */
    JobView(Job job, JsonNode document) {
        this.job = job;
        this.document = document;
        this.partial = Partial.of(document);
        this.sizing = partial.judgement().sizing();
    }

    /** What the page is made from. */
    Map<String, Object> model(String jobName, List<ErrorView> more, String notice) {
        Forms forms = new Forms(document, Judgement.unsized(document).problems());
        ObjectView site = forms.form("/site", "Site", Site.class);
        List<ErrorView> errors = new ArrayList<>(more);
        errors.addAll(forms.errors());
        Map<String, Object> model = new HashMap<>();
        model.put("job", job);
        model.put("jobName", jobName);
        model.put("site", site);
        model.put("errors", errors);
        model.put("notice", notice);
        model.put("rooms", rooms());
        model.put("spaces", spaces());
        model.put("assemblies", assemblies());
        model.put("totals", sizing.map(JobView::totals).orElse(List.of()));
        model.put("warnings", sizing.map(this::warnings).orElse(List.of()));
        model.put("unfinished", partial.unfinished());
        model.put("problems", problems());
        return model;
    }

    private List<Look> problems() {
        return job.problems().stream()
                .map(problem -> new Look(
                        Place.of(job.id(), document, problem.pointer()), problem.message(), "", problem.allowed()))
                .toList();
    }

    private List<Look> warnings(Sizing all) {
        return all.warnings().stream()
                .map(warning -> new Look(
                        Place.of(job.id(), document, warning.pointer()),
                        warning.message().replace("m2", "m²"),
                        warning.why().replace("m2", "m²"),
                        warning.settle()))
                .toList();
    }

    static List<TotalRow> totals(Sizing all) {
        List<TotalRow> rows = new ArrayList<>();
        rows.add(new TotalRow(
                "Heat loss of the rooms", Numbers.grouped(all.total().heatLoss()) + " W"));
        rows.add(new TotalRow("Heated area", Numbers.fixed(all.total().heatedArea(), 1) + " m²"));
        rows.add(new TotalRow(
                "Heater power at the required flux", Numbers.grouped(all.total().heaterPower()) + " W"));
        all.total()
                .installedPower()
                .ifPresent(power -> rows.add(new TotalRow("Installed electric power", Numbers.grouped(power) + " W")));
        double supplement = all.rooms().stream()
                .mapToDouble(room -> room.floor().supplement().orElse(0))
                .sum();
        if (supplement > 0) {
            rows.add(new TotalRow("Something else must add", Numbers.grouped(supplement) + " W"));
        }
        all.total().water().ifPresent(water -> water(rows, water));
        return rows;
    }

    /** The warm water of the job: what the boiler and the pump must give; manifolds and heat source as far as the survey states them. */
    private static void water(List<TotalRow> rows, WaterTotal water) {
        rows.add(new TotalRow(
                "Supply of the warm water",
                Numbers.fixed(water.supplyTemperature(), 1) + " °C, governed by " + water.governingRoom()));
        rows.add(new TotalRow("Loops", Integer.toString(water.valves().size())));
        rows.add(new TotalRow("Flow of the pump", Numbers.fixed(60_000 * water.volumeFlow(), 2) + " l/min"));
        drops(rows, water);
        if (water.manifolds().size() > 1) {
            water.manifolds().forEach(manifold -> rows.add(manifold(manifold)));
        }
        rows.add(new TotalRow("Water in the loops", Numbers.fixed(1000 * water.waterContent(), 1) + " l"));
    }

    /** What the pump has to overcome: loops as straight pipe, and what the survey states of manifolds and heat source. */
    private static void drops(List<TotalRow> rows, WaterTotal water) {
        double worst = water.manifolds().stream()
                .mapToDouble(manifold -> manifold.loopDrop().orElse(manifold.pressure()))
                .max()
                .orElseThrow();
        rows.add(new TotalRow("Drop of the worst loop", kilopascals(worst) + ", straight pipe"));
        if (water.manifolds().size() == 1) {
            water.manifolds()
                    .get(0)
                    .ownDrop()
                    .ifPresent(drop -> rows.add(new TotalRow("Drop of the manifold", kilopascals(drop))));
        }
        water.sourceDrop().ifPresent(drop -> rows.add(new TotalRow("Drop of the heat source", kilopascals(drop))));
        if (water.pressure() != worst) {
            rows.add(new TotalRow("Pressure of the pump", kilopascals(water.pressure())));
        }
    }

    private static String kilopascals(double pascals) {
        return Numbers.fixed(pascals / 1000, 1) + " kPa";
    }

    private static TotalRow manifold(ManifoldSizing manifold) {
        return new TotalRow(
                manifold.name().map(name -> "Manifold " + name).orElse("Manifold without a name"),
                manifold.loops() + (manifold.loops() == 1 ? " loop, " : " loops, ")
                        + Numbers.fixed(60_000 * manifold.volumeFlow(), 2) + " l/min, "
                        + Numbers.fixed(manifold.pressure() / 1000, 1) + " kPa; "
                        + Numbers.fixed(manifold.throttled() / 1000, 1) + " kPa to be throttled before it");
    }

    private List<RoomRow> rooms() {
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

    private List<PartRow> spaces() {
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
            rows.add(new PartRow(entry.getKey(), Links.part(job.id(), "spaces", entry.getKey()), words));
        });
        return rows;
    }

    private static Optional<String> settled(Sizing all, String name) {
        return all.spaces().stream()
                .filter(space -> space.name().equals(name.strip()))
                .findFirst()
                .map(SpaceSizing::temperature)
                .map(temperature -> ", settles at " + Numbers.fixed(temperature, 1) + " °C on the design day");
    }

    private List<PartRow> assemblies() {
        List<PartRow> rows = new ArrayList<>();
        document.path("assemblies").properties().forEach(entry -> {
            JsonNode assembly = entry.getValue();
            String words = assembly.has("uValue")
                    ? "U " + Forms.shown(assembly.path("uValue"))
                    : assembly.path("layers").size() + " layers"
                            + sizing.flatMap(all -> uValue(all, entry.getKey())).orElse("");
            rows.add(new PartRow(entry.getKey(), Links.part(job.id(), "assemblies", entry.getKey()), words));
        });
        return rows;
    }

    private static Optional<String> uValue(Sizing all, String name) {
        return all.assemblies().stream()
                .filter(assembly -> assembly.name().equals(name.strip()))
                .flatMap(assembly -> assembly.sides().stream())
                .filter(side -> side.uValue().isPresent())
                .findFirst()
                .map(side ->
                        ", U " + Numbers.fixed(side.uValue().orElseThrow(), 3) + " W/(m²·K) towards " + side.side());
    }
}
