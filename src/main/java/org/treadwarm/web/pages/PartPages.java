package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.jobs.JobDesk.Saving;
import org.treadwarm.jobs.Judgement;
import org.treadwarm.store.Change;
import org.treadwarm.tables.Materials;
import org.treadwarm.web.security.Visitors;

/**
 * One part of a job as a form with its answer beside it: a room, a space or an assembly. Whatever is typed is kept with every
 * button, as a draft if need be.
 */
final class PartPages {
    private static final String WANTED_NAME = "wanted-name";
    private static final String NAME_ERROR = "name-error";

    private final JobDesk desk;
    private final Visitors visitors;
    private final View view;

    PartPages(JobDesk desk, Visitors visitors, View view) {
        this.desk = desk;
        this.visitors = visitors;
        this.view = view;
    }

    void show(Context ctx) {
        Optional<Job> job = desk.current(ctx.pathParam("job"));
        Optional<Part> part = job.flatMap(found -> part(ctx, found.document()));
        if (part.isEmpty()) {
            JobPages.missing(ctx, view);
        } else {
            show(
                    ctx,
                    200,
                    job.get(),
                    job.get().document(),
                    part.get(),
                    "",
                    job.get().revision());
        }
    }

    private static Optional<Part> part(Context ctx, JsonNode document) {
        return Part.find(document, ctx.pathParam("part"), ctx.pathParam("name"));
    }

    private void show(Context ctx, int status, Job job, JsonNode document, Part part, String notice, long revision) {
        Forms forms = new Forms(document, Judgement.of(document).problems());
        Map<String, Object> model = new HashMap<>();
        String nameError =
                Optional.<String>ofNullable(ctx.attribute(NAME_ERROR)).orElse("");
        model.put(
                "partName",
                Optional.<String>ofNullable(ctx.attribute(WANTED_NAME)).orElse(part.key()));
        model.put("nameError", nameError);
        model.put("jobId", job.id());
        model.put("jobName", job.name());
        model.put("revision", revision);
        model.put("part", part);
        model.put("form", forms.form(part.pointer(), part.formTitle(), part.type()));
        List<ErrorView> errors = new ArrayList<>(forms.errors());
        if (!nameError.isEmpty()) {
            errors.add(0, new ErrorView("part-name", "Name", nameError, ""));
        }
        model.put("errors", errors);
        model.put("notice", notice);
        model.put("action", Links.part(job.id(), part.kind(), part.key()));
        model.put("back", "/jobs/" + job.id());
        model.put("backWords", "Back to the job");
        model.put("quick", false);
        model.put("feet", feet(job.id(), document, part));
        model.put("materials", Materials.all());
        model.putAll(Answer.of(document, part));
        view.show(ctx, status, "part", model);
    }

    /** The ways to what can be solved in section: titles and addresses. */
    private static Map<String, String> feet(String job, JsonNode document, Part part) {
        Map<String, String> feet = new LinkedHashMap<>();
        JsonNode room = document.at(part.pointer());
        for (JsonNode junction : part.isRoom() ? room.path("junctions") : room.path("none")) {
            String id = junction.path("id").asText();
            if (WallFootDraft.isFoot(room, junction) && !id.isEmpty()) {
                feet.put(
                        Links.part(job, part.kind(), part.key()) + "/wall-foot/" + id,
                        junction.path("name").asText("junction"));
            }
        }
        return feet;
    }

    /** The answer alone, for the form as it stands; nothing is kept. */
    void preview(Context ctx) {
        Optional<Job> job = desk.current(ctx.pathParam("job"));
        Optional<Part> part = job.flatMap(found -> part(ctx, found.document()));
        if (part.isEmpty()) {
            JobPages.missing(ctx, view);
            return;
        }
        ObjectNode document = (ObjectNode) job.get().document().deepCopy();
        part.get().write(document, ctx.formParamMap());
        Map<String, Object> model = new HashMap<>(Answer.of(document, part.get()));
        model.put("part", part.get());
        view.show(ctx, 200, "answer", model);
    }

    void save(Context ctx) {
        Optional<Job> current = desk.current(ctx.pathParam("job"));
        Optional<Part> part = current.flatMap(found -> part(ctx, found.document()));
        if (part.isEmpty()) {
            JobPages.missing(ctx, view);
            return;
        }
        Job job = current.get();
        ObjectNode document = (ObjectNode) job.document().deepCopy();
        part.get().write(document, ctx.formParamMap());
        String action = EntryPages.text(ctx, "do");
        String wanted = Optional.ofNullable(ctx.formParam("part-name"))
                .orElse(part.get().key())
                .strip();
        String refusal = part.get().refusal(document, wanted);
        String renamed = part.get().act(document, action, refusal.isEmpty() ? wanted : "");
        if (!refusal.isEmpty()) {
            ctx.attribute(WANTED_NAME, wanted);
            ctx.attribute(NAME_ERROR, refusal);
            show(
                    ctx,
                    422,
                    job,
                    document,
                    part.get(),
                    "Not kept yet: the name must be put right first.",
                    job.revision());
            return;
        }
        if (isOvertaken(ctx, job, part.get())) {
            String who = job.savedBy();
            show(
                    ctx,
                    409,
                    job,
                    document,
                    part.get(),
                    "While you typed, " + who + " saved this too. Below is yours, not kept"
                            + " yet: save again to let it stand, or open the page anew to see theirs.",
                    job.revision());
            return;
        }
        if (action.equals("remove-part")) {
            part.get().remove(document);
        }
        keep(ctx, job, document, part.get(), action, renamed);
    }

    private void keep(Context ctx, Job job, ObjectNode document, Part part, String action, String key) {
        Job saved = job;
        if (!document.equals(job.document())) {
            String who = visitors.session(ctx).orElseThrow().person().name();
            Saving saving = desk.save(job.id(), job.revision(), job.name(), document, Change.by(who));
            if (!(saving instanceof Saving.Saved done)) {
                show(
                        ctx,
                        409,
                        job,
                        document,
                        part,
                        "Somebody saved this job in the same moment. Below is yours, not kept" + " yet: save again.",
                        desk.current(job.id()).orElseThrow().revision());
                return;
            }
            saved = done.job();
        }
        if (action.equals("remove-part")) {
            ctx.redirect("/jobs/" + job.id(), HttpStatus.SEE_OTHER);
            return;
        }
        Optional<Part> now = Part.find(saved.document(), part.kind(), key);
        boolean problems = now.isPresent()
                && saved.problems().stream().anyMatch(problem -> now.get().holds(problem.pointer()));
        if (action.equals("save") && problems) {
            show(
                    ctx,
                    422,
                    saved,
                    saved.document(),
                    now.get(),
                    "Kept as a draft. What is marked must be put right before it can be sized.",
                    saved.revision());
        } else {
            String anchor = Part.anchor(action).map(id -> "#" + id).orElse("");
            ctx.redirect(Links.part(job.id(), part.kind(), key) + anchor, HttpStatus.SEE_OTHER);
        }
    }

    /** Whether this very part was saved by somebody else since the form was shown. */
    private boolean isOvertaken(Context ctx, Job job, Part part) {
        String shown = EntryPages.text(ctx, "revision");
        if (!shown.matches("[0-9]{1,15}") || Long.parseLong(shown) >= job.revision()) {
            return false;
        }
        Optional<Job> then = desk.revision(job.id(), Long.parseLong(shown));
        Optional<JsonNode> before = then.flatMap(old -> Part.find(old.document(), part.kind(), part.key())
                .map(found -> old.document().at(found.pointer())));
        return before.isEmpty() || !before.get().equals(job.document().at(part.pointer()));
    }
}
