package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.ArrayList;
import java.util.HashMap;
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
    private static final String TRIES = "tries";
    private static final int MOST_TRIES = 20;
    private static final String DRAFT_NOTICE =
            "Kept as a draft. What is marked must be put right before it can be sized.";

    /** In the query of a page that is come to after a draft was kept. */
    private static final String KEPT_AS_DRAFT = "kept=draft";

    private final JobDesk desk;
    private final Visitors visitors;
    private final View view;
    private final WrittenAnswers answers;
    private final VersionPages versions;
    private final SolvingAhead ahead;

    PartPages(
            JobDesk desk,
            Visitors visitors,
            View view,
            VersionPages versions,
            SolvingAhead ahead,
            WrittenAnswers answers) {
        this.desk = desk;
        this.versions = versions;
        this.ahead = ahead;
        this.visitors = visitors;
        this.view = view;
        this.answers = answers;
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
                    KEPT_AS_DRAFT.equals(ctx.queryString()) && job.get().draft() ? DRAFT_NOTICE : "",
                    job.get().revision());
        }
    }

    private static Optional<Part> part(Context ctx, JsonNode document) {
        return Part.find(document, ctx.pathParam("part"), ctx.pathParam("name"));
    }

    private void show(Context ctx, int status, Job job, JsonNode document, Part part, String notice, long revision) {
        Forms forms = new Forms(document, Judgement.unsized(document).problems());
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
        model.put("feet", WallFootOffers.of(job, document, part));
        model.put("materials", Materials.all());
        model.put(
                "answer",
                SolvingAhead.isUnsized(ctx)
                        ? answers.unsized(document, part, SolvingAhead.STOPPED)
                        : answers.of(document, part));
        view.show(ctx, status, "part", model);
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
        ahead.preview(ctx, answers, document, part.get());
    }

    void save(Context ctx) {
        Optional<Job> current = desk.current(ctx.pathParam("job"));
        if (current.isEmpty()) {
            JobPages.missing(ctx, view);
            return;
        }
        Job job = current.get();
        Optional<JsonNode> shown = overtaken(ctx, job);
        boolean typed = true;
        if (shown.isPresent()) {
            Part then = part(ctx, shown.get()).orElseThrow();
            JsonNode mine = typed(ctx, shown.get(), then);
            typed = !mine.equals(shown.get().at(then.pointer()))
                    && !mine.equals(part(ctx, job.document())
                            .map(part -> job.document().at(part.pointer()))
                            .orElse(MissingNode.getInstance()));
            if (typed) {
                versions.begin(
                        ctx,
                        job,
                        new VersionDraft(
                                then.kind(),
                                then.key(),
                                shownRevision(ctx),
                                job.revision(),
                                mine,
                                wantedName(ctx, then)));
                return;
            }
        }
        Optional<Part> part = part(ctx, job.document());
        if (part.isEmpty()) {
            JobPages.missing(ctx, view);
        } else {
            save(ctx, job, part.get(), typed);
        }
    }

    /** What was typed into the form of another revision; a missing node if the part was to be taken out. */
    private static JsonNode typed(Context ctx, JsonNode shown, Part part) {
        ObjectNode document = shown.deepCopy();
        part.write(document, ctx.formParamMap());
        String action = EntryPages.text(ctx, "do");
        part.act(document, action, "");
        return action.equals("remove-part") ? MissingNode.getInstance() : document.at(part.pointer());
    }

    private static String wantedName(Context ctx, Part part) {
        return Optional.ofNullable(ctx.formParam("part-name"))
                .orElse(part.key())
                .strip();
    }

    private void save(Context ctx, Job job, Part part, boolean typed) {
        ObjectNode document = (ObjectNode) job.document().deepCopy();
        String action = typed ? EntryPages.text(ctx, "do") : "";
        if (typed) {
            part.write(document, ctx.formParamMap());
        }
        String wanted = wantedName(ctx, part);
        String refusal = part.refusal(document, wanted);
        String renamed = part.act(document, action, refusal.isEmpty() ? wanted : "");
        if (!refusal.isEmpty()) {
            ctx.attribute(WANTED_NAME, wanted);
            ctx.attribute(NAME_ERROR, refusal);
            show(ctx, 422, job, document, part, "Not kept yet: the name must be put right first.", job.revision());
            return;
        }
        if (action.equals("remove-part")) {
            part.remove(document);
        }
        keep(ctx, job, document, part, action, renamed);
    }

    private void keep(Context ctx, Job job, ObjectNode document, Part part, String action, String key) {
        Job saved = job;
        if (!document.equals(job.document())) {
            String who = visitors.session(ctx).orElseThrow().person().name();
            Saving saving = desk.save(job.id(), job.revision(), job.name(), document, Change.by(who));
            if (!(saving instanceof Saving.Saved done)) {
                saveAgain(ctx, job, document, part);
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
            String address = Links.part(job.id(), part.kind(), key);
            if (Answer.needsFloors(now.get())
                    && ahead.waits(
                            ctx,
                            saved.document(),
                            address + "?" + KEPT_AS_DRAFT,
                            address + "?" + SolvingAhead.UNSIZED)) {
                return;
            }
            show(ctx, 422, saved, saved.document(), now.get(), DRAFT_NOTICE, saved.revision());
        } else {
            String anchor = Part.anchor(action).map(id -> "#" + id).orElse("");
            ctx.redirect(Links.part(job.id(), part.kind(), key) + anchor, HttpStatus.SEE_OTHER);
        }
    }

    /** Somebody saved the job in the same moment, most likely another part of it. */
    private void saveAgain(Context ctx, Job job, JsonNode document, Part part) {
        int tries = Optional.<Integer>ofNullable(ctx.attribute(TRIES)).orElse(0);
        ctx.attribute(TRIES, tries + 1);
        if (tries < MOST_TRIES) {
            save(ctx);
        } else {
            show(
                    ctx,
                    409,
                    job,
                    document,
                    part,
                    "Others are saving this job at the same time. Below is yours, not kept yet: save again.",
                    job.revision());
        }
    }

    /** The document that the form was made from, if somebody saved this very part since; empty if nobody did. */
    private Optional<JsonNode> overtaken(Context ctx, Job job) {
        long shown = shownRevision(ctx);
        if (shown >= job.revision()) {
            return Optional.empty();
        }
        Optional<JsonNode> then = desk.document(job.id(), shown);
        Optional<JsonNode> before = then.flatMap(old -> part(ctx, old).map(found -> old.at(found.pointer())));
        Optional<JsonNode> now =
                part(ctx, job.document()).map(found -> job.document().at(found.pointer()));
        return before.isPresent() && !before.equals(now) ? then : Optional.empty();
    }

    /** The revision that the form was made from; the newest thinkable where it does not say. */
    private static long shownRevision(Context ctx) {
        String shown = EntryPages.text(ctx, "revision");
        return shown.matches("[0-9]{1,15}") ? Long.parseLong(shown) : Long.MAX_VALUE;
    }
}
