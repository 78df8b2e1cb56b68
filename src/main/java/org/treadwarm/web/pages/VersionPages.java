package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.nio.charset.StandardCharsets;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.intake.Document;
import org.treadwarm.intake.NotJsonException;
import org.treadwarm.jobs.Difference;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.jobs.JobDesk.Saving;
import org.treadwarm.store.Change;
import org.treadwarm.store.RevisionHeader;
import org.treadwarm.survey.Assembly;
import org.treadwarm.survey.Room;
import org.treadwarm.survey.Space;
import org.treadwarm.web.security.Visitors;

/**
 * Two people changed one room, space or assembly: both versions side by side, and a choice wherever they differ. What was
 * typed travels in the form, so it is not lost however often others save meanwhile.
 */
final class VersionPages {
    private static final int MOST_TRIES = 20;
    private static final Map<String, Class<? extends Record>> TYPES =
            Map.of("rooms", Room.class, "spaces", Space.class, "assemblies", Assembly.class);

    private final JobDesk desk;
    private final Visitors visitors;
    private final View view;

    VersionPages(JobDesk desk, Visitors visitors, View view) {
        this.desk = desk;
        this.visitors = visitors;
        this.view = view;
    }

    /** What a form holds beside the choices: the revision it began from, the one compared with, and the new name. */
    private record Draft(long base, long seen, JsonNode mine, String name) {}

    /** The part at an address of this page; a missing node if the document has it not. */
    private static JsonNode part(Context ctx, JsonNode document) {
        return Part.find(document, ctx.pathParam("part"), ctx.pathParam("name"))
                .map(part -> document.at(part.pointer()))
                .orElse(MissingNode.getInstance());
    }

    private TwoVersions versions(Context ctx, Job job, Draft draft) {
        JsonNode base = desk.document(job.id(), draft.base())
                .map(document -> part(ctx, document))
                .orElse(MissingNode.getInstance());
        return new TwoVersions(TYPES.get(ctx.pathParam("part")), base, part(ctx, job.document()), draft.mine());
    }

    /**
     * Shows what was typed beside what others saved.
     *
     * @param base the revision that the form showed
     * @param mine what was typed; a missing node if the part was to be taken out
     * @param name the name that the part was to have
     */
    void begin(Context ctx, Job job, long base, JsonNode mine, String name) {
        Draft draft = new Draft(base, job.revision(), mine, name);
        show(ctx, 409, job, draft, Map.of(), false, "");
    }

    private void show(
            Context ctx, int status, Job job, Draft draft, Map<String, String> chosen, boolean sent, String notice) {
        TwoVersions versions = versions(ctx, job, draft);
        List<Choice> choices = versions.choices(chosen, sent);
        RevisionHeader theirs = desk.lastChange(job.id(), draft.base(), document -> part(ctx, document))
                .orElseGet(() -> desk.revisions(job.id()).get(0));
        JsonNode named = draft.mine().isMissingNode() ? versions.theirs() : draft.mine();
        Map<String, Object> model = new HashMap<>();
        model.put(
                "partTitle",
                ctx.pathParam("part").equals("rooms") ? named.path("name").asText("a room") : ctx.pathParam("name"));
        model.put("jobName", job.name());
        model.put("back", "/jobs/" + job.id());
        model.put("who", theirs.savedBy());
        model.put("when", Moments.minute(theirs.savedAt()));
        model.put("action", address(ctx) + "/versions");
        model.put("base", draft.base());
        model.put("seen", job.revision());
        model.put("mine", draft.mine().isMissingNode() ? "" : draft.mine().toString());
        model.put("partName", draft.name());
        model.put("choices", choices);
        model.put("notice", notice);
        model.put(
                "errors",
                choices.stream()
                        .filter(Choice::wrong)
                        .map(choice -> new ErrorView(choice.id(), "", choice.where() + ": say which shall stand.", ""))
                        .toList());
        view.show(ctx, status, "versions", model);
    }

    private static String address(Context ctx) {
        return Links.part(ctx.pathParam("job"), ctx.pathParam("part"), ctx.pathParam("name"));
    }

    /** Saves what was chosen, or shows the two versions again when a choice is missing or somebody saved once more. */
    void settle(Context ctx) {
        Optional<Draft> draft = draft(ctx);
        for (int i = 0; i < MOST_TRIES; i++) {
            Optional<Job> job = desk.current(ctx.pathParam("job"));
            if (job.isEmpty() || draft.isEmpty() || !TYPES.containsKey(ctx.pathParam("part"))) {
                JobPages.missing(ctx, view);
                return;
            }
            if (settled(ctx, job.get(), draft.get())) {
                return;
            }
        }
        show(
                ctx,
                409,
                desk.current(ctx.pathParam("job")).orElseThrow(),
                draft.orElseThrow(),
                Map.of(),
                false,
                "Others are saving this job at the same time. Nothing of yours is lost: try again.");
    }

    private boolean settled(Context ctx, Job job, Draft draft) {
        TwoVersions now = versions(ctx, job, draft);
        boolean moved = isMoved(ctx, job, draft, now);
        Map<String, String> chosen = moved ? stillTrue(ctx, job, draft, now) : chosen(ctx, now);
        boolean complete = now.differences().stream().allMatch(each -> chosen.containsKey(each.address()));
        if (moved || !complete) {
            String notice =
                    moved ? "It was saved once more while you chose. What has changed is to be chosen anew." : "";
            show(ctx, moved ? 409 : 422, job, draft, chosen, !moved, notice);
            return true;
        }
        return keep(ctx, job, draft, now.settled(chosen));
    }

    private boolean isMoved(Context ctx, Job job, Draft draft, TwoVersions now) {
        Optional<JsonNode> compared = desk.document(job.id(), draft.seen()).map(document -> part(ctx, document));
        return compared.isEmpty() || !compared.get().equals(now.theirs());
    }

    private static Map<String, String> chosen(Context ctx, TwoVersions versions) {
        String action = EntryPages.text(ctx, "do");
        Map<String, String> chosen = new HashMap<>();
        for (Difference difference : versions.differences()) {
            if (action.equals("all-theirs") || action.equals("all-mine")) {
                chosen.put(difference.address(), action.substring("all-".length()));
            } else {
                TwoVersions.chosen(ctx.formParamMap(), difference)
                        .ifPresent(side -> chosen.put(difference.address(), side));
            }
        }
        return chosen;
    }

    /** The choices between values that still are what they were when they were chosen. */
    private Map<String, String> stillTrue(Context ctx, Job job, Draft draft, TwoVersions now) {
        JsonNode compared = desk.document(job.id(), draft.seen())
                .map(document -> part(ctx, document))
                .orElse(MissingNode.getInstance());
        List<Difference> before = new TwoVersions(now.type(), now.base(), compared, now.mine()).differences();
        Map<String, String> chosen = new HashMap<>();
        now.differences().stream()
                .filter(before::contains)
                .forEach(difference -> TwoVersions.chosen(ctx.formParamMap(), difference)
                        .ifPresent(side -> chosen.put(difference.address(), side)));
        return chosen;
    }

    private boolean keep(Context ctx, Job job, Draft draft, JsonNode result) {
        ObjectNode document = (ObjectNode) job.document().deepCopy();
        String key = put(ctx, document, result, draft.name());
        Job saved = job;
        if (!document.equals(job.document())) {
            String who = visitors.session(ctx).orElseThrow().person().name();
            Saving saving = desk.save(
                    job.id(), job.revision(), job.name(), document, new Change(who, "two versions brought together"));
            if (!(saving instanceof Saving.Saved done)) {
                return false;
            }
            saved = done.job();
        }
        boolean there = Part.find(saved.document(), ctx.pathParam("part"), key).isPresent();
        ctx.redirect(
                there ? Links.part(job.id(), ctx.pathParam("part"), key) : "/jobs/" + job.id(), HttpStatus.SEE_OTHER);
        return true;
    }

    /** Puts the result where the part stands or stood, and gives its key then. */
    private static String put(Context ctx, ObjectNode document, JsonNode result, String name) {
        String kind = ctx.pathParam("part");
        String key = ctx.pathParam("name");
        Optional<Part> there = Part.find(document, kind, key);
        if (result.isMissingNode()) {
            there.ifPresent(part -> part.remove(document));
            return key;
        }
        if (kind.equals("rooms")) {
            ArrayNode rooms = document.path("rooms") instanceof ArrayNode known ? known : document.putArray("rooms");
            if (there.isPresent()) {
                rooms.set(Integer.parseInt(there.get().pointer().substring("/rooms/".length())), result);
            } else {
                rooms.add(result);
            }
            return key;
        }
        (document.path(kind) instanceof ObjectNode all ? all : document.putObject(kind)).set(key, result);
        Part part = Part.find(document, kind, key).orElseThrow();
        return part.refusal(document, name).isEmpty() ? part.act(document, "", name) : key;
    }

    private static Optional<Draft> draft(Context ctx) {
        String base = EntryPages.text(ctx, "base");
        String seen = EntryPages.text(ctx, "seen");
        if (!base.matches("[0-9]{1,15}") || !seen.matches("[0-9]{1,15}")) {
            return Optional.empty();
        }
        String typed = EntryPages.text(ctx, "mine");
        try {
            JsonNode mine =
                    typed.isEmpty() ? MissingNode.getInstance() : Document.read(typed.getBytes(StandardCharsets.UTF_8));
            String name = EntryPages.text(ctx, "part-name").strip();
            return mine.isMissingNode() || isPart(ctx, mine)
                    ? Optional.of(new Draft(Long.parseLong(base), Long.parseLong(seen), mine, name))
                    : Optional.empty();
        } catch (NotJsonException e) {
            return Optional.empty();
        }
    }

    private static boolean isPart(Context ctx, JsonNode mine) {
        boolean room = ctx.pathParam("part").equals("rooms");
        return mine.isObject() && (!room || mine.path("id").asText().equals(ctx.pathParam("name")));
    }
}
