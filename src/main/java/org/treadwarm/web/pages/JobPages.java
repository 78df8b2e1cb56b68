package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.intake.Document;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.jobs.JobDesk.Saving;
import org.treadwarm.sheets.SheetDesk;
import org.treadwarm.store.Change;
import org.treadwarm.store.JobListings;
import org.treadwarm.store.JobPlace;
import org.treadwarm.store.JobSearch;
import org.treadwarm.web.security.Visitors;

/** The list of jobs, and a job: its site, spaces, assemblies, rooms with their verdicts, and totals. */
final class JobPages {
    static final int LONGEST_NAME = 200;
    private static final int A_PAGE = 50;
    private static final int MOST_TRIES = 20;

    private final JobDesk desk;
    private final SheetDesk sheets;
    private final Visitors visitors;
    private final View view;
    private final VersionPages versions;

    JobPages(JobDesk desk, SheetDesk sheets, Visitors visitors, View view, VersionPages versions) {
        this.desk = desk;
        this.sheets = sheets;
        this.visitors = visitors;
        this.view = view;
        this.versions = versions;
    }

    void list(Context ctx) {
        list(ctx, 200, "");
    }

    private void list(Context ctx, int status, String error) {
        String find = query(ctx, "find").strip();
        String show = query(ctx, "show");
        String after = query(ctx, "after");
        boolean known = List.of("", "archived", "all").contains(show);
        Optional<JobPlace> place = JobPlace.of(after);
        if (!known || find.length() > LONGEST_NAME) {
            missing(ctx, view);
            return;
        }
        if (!after.isEmpty() && place.isEmpty()) {
            String title = "This is no place in the list of jobs, or one of an earlier program; begin the list again";
            view.show(ctx, 400, "fault", Map.of("title", title, "status", 400));
            return;
        }
        JobListings found = desk.find(new JobSearch(
                find, show.equals("all") ? Optional.empty() : Optional.of(show.equals("archived")), place, A_PAGE));
        Map<String, Object> model = new HashMap<>();
        model.put("jobs", found.jobs().stream().map(JobView.JobRow::of).toList());
        model.put(
                "next", found.next().map(last -> more(find, show, last.text())).orElse(""));
        model.put("find", find);
        model.put("show", show);
        model.put("filtered", !find.isEmpty() || !show.isEmpty() || !after.isEmpty());
        model.put("error", error);
        view.show(ctx, status, "jobs", model);
    }

    /** The address of the next part of a list. */
    private static String more(String find, String show, String place) {
        return "/jobs?find=" + encoded(find) + "&show=" + encoded(show) + "&after=" + encoded(place);
    }

    private static String encoded(String text) {
        return URLEncoder.encode(text, StandardCharsets.UTF_8);
    }

    private static String query(Context ctx, String name) {
        return Optional.ofNullable(ctx.queryParam(name)).orElse("");
    }

    /** Starts a job with the newest revision of this one. */
    void copy(Context ctx) {
        Optional<Job> copy = desk.copies().copy(ctx.pathParam("job"), who(ctx));
        if (copy.isPresent()) {
            ctx.redirect("/jobs/" + copy.get().id(), HttpStatus.SEE_OTHER);
        } else {
            missing(ctx, view);
        }
    }

    void archive(Context ctx) {
        archive(ctx, true);
    }

    void bringBack(Context ctx) {
        archive(ctx, false);
    }

    private void archive(Context ctx, boolean archived) {
        if (desk.archive(ctx.pathParam("job"), archived, who(ctx))) {
            ctx.redirect("/jobs/" + ctx.pathParam("job"), HttpStatus.SEE_OTHER);
        } else {
            missing(ctx, view);
        }
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
        Map<String, Object> model = new HashMap<>(new JobView(job, document).model(typedName(ctx, job), more, notice));
        model.put(
                "sheets",
                sheets.ofJob(job.id()).stream().map(SheetView.Head::of).toList());
        model.put("archived", desk.isArchived(job.id()).orElse(false));
        view.show(ctx, status, "job", model);
    }

    void change(Context ctx) {
        Optional<Job> job = desk.current(ctx.pathParam("job"));
        boolean answered = job.isPresent() && changed(ctx, job.get());
        for (int i = 1; i < MOST_TRIES && job.isPresent() && !answered; i++) {
            job = desk.current(ctx.pathParam("job"));
            answered = job.isPresent() && changed(ctx, job.get());
        }
        if (job.isEmpty()) {
            missing(ctx, view);
        } else if (!answered) {
            String told = "Others are saving this job at the same time, so yours is not kept. Go back and save again.";
            show(ctx, 409, job.get(), List.of(new ErrorView("content", "", told, "")), "");
        }
    }

    /** Does what the form says; says whether it is answered, or somebody saved the job in the same moment. */
    private boolean changed(Context ctx, Job job) {
        ObjectNode document = (ObjectNode) job.document().deepCopy();
        String action = EntryPages.text(ctx, "do");
        Job shown = shown(ctx, job);
        TypedSite site = TypedSite.of(ctx.formParamMap(), shown.document(), job.document());
        String name = name(ctx, job, shown);
        JobActions actions =
                new JobActions(document, EntryPages.text(ctx, "new-name").strip());
        List<ErrorView> errors = errors(ctx, actions.act(action, site));
        if (errors.isEmpty() && !site.conflicts().isEmpty()) {
            return choose(ctx, job, shown, name, document, site);
        }
        document.set("site", site.site());
        if (errors.isEmpty()) {
            return save(ctx, job, name, document, actions, action);
        }
        errors.addAll(0, site.conflicts());
        show(ctx, site.conflicts().isEmpty() ? 422 : 409, job, document, errors, "");
        return true;
    }

    private static List<ErrorView> errors(Context ctx, String notice) {
        List<ErrorView> errors = new ArrayList<>();
        if (!isName(EntryPages.text(ctx, "job-name"))) {
            errors.add(new ErrorView("job-name", "", "A job's name has 1 to " + LONGEST_NAME + " characters.", ""));
        }
        if (!notice.isEmpty()) {
            errors.add(new ErrorView("new-name", "", notice, ""));
        }
        return errors;
    }

    /** Keeps all but the site, and shows both versions of that. */
    private boolean choose(Context ctx, Job job, Job shown, String name, ObjectNode document, TypedSite site) {
        Optional<Job> kept = kept(ctx, job, name, document);
        if (kept.isPresent()) {
            String part = VersionDraft.SITE;
            VersionDraft draft =
                    new VersionDraft(part, part, shown.revision(), kept.get().revision(), site.mine(), "");
            versions.begin(ctx, kept.get(), draft);
        }
        return kept.isPresent();
    }

    /** The job with this name and document, saved unless it is so already; empty when somebody saved meanwhile. */
    private Optional<Job> kept(Context ctx, Job job, String name, ObjectNode document) {
        if (document.equals(job.document()) && name.equals(job.name())) {
            return Optional.of(job);
        }
        Saving saving = desk.save(job.id(), job.revision(), name, document, Change.by(who(ctx)));
        return saving instanceof Saving.Saved done ? Optional.of(done.job()) : Optional.empty();
    }

    /** The revision that the form was made from. */
    private Job shown(Context ctx, Job current) {
        String revision = EntryPages.text(ctx, "revision");
        return revision.matches("[0-9]{1,15}")
                ? desk.revision(current.id(), Long.parseLong(revision)).orElse(current)
                : current;
    }

    private static String name(Context ctx, Job job, Job shown) {
        String typed = EntryPages.text(ctx, "job-name").strip();
        return typed.equals(shown.name()) ? job.name() : typed;
    }

    /** The name that stands in the field: the one that was sent, or the job's. */
    private static String typedName(Context ctx, Job job) {
        return Optional.ofNullable(ctx.formParam("job-name")).orElse(job.name());
    }

    private static boolean isName(String text) {
        return !text.isBlank() && text.strip().length() <= LONGEST_NAME;
    }

    private boolean save(Context ctx, Job job, String name, ObjectNode document, JobActions actions, String action) {
        Optional<Job> kept = kept(ctx, job, name, document);
        if (kept.isEmpty()) {
            return false;
        }
        Job saved = kept.get();
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
            ctx.redirect(actions.pageAfter(saved, action), HttpStatus.SEE_OTHER);
        }
        return true;
    }
}
