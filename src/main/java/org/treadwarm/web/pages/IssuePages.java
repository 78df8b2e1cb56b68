package org.treadwarm.web.pages;

import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.sheets.Issuing;
import org.treadwarm.sheets.SheetDesk;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.store.SheetHeader;
import org.treadwarm.web.security.Visitors;

/** Issuing a job's sizing: a page that asks, since what is issued cannot be taken back. */
final class IssuePages {
    private final JobDesk jobs;
    private final SheetDesk sheets;
    private final Visitors visitors;
    private final View view;

    IssuePages(JobDesk jobs, SheetDesk sheets, Visitors visitors, View view) {
        this.jobs = jobs;
        this.sheets = sheets;
        this.visitors = visitors;
        this.view = view;
    }

    /** A room in the words of its verdict. */
    public record RoomRow(String name, String verdict) {}

    void ask(Context ctx) {
        Optional<Job> job = jobs.current(ctx.pathParam("job"));
        if (job.isEmpty()) {
            JobPages.missing(ctx, view);
        } else {
            show(ctx, 200, job.get(), new FormErrors());
        }
    }

    private void show(Context ctx, int status, Job job, FormErrors errors) {
        List<SheetHeader> open = sheets.ofJob(job.id()).stream()
                .filter(sheet -> sheet.replacedBy().isEmpty())
                .toList();
        Map<String, Object> model = errors.model();
        model.put("job", job);
        Optional<Sizing> sized = job.sizing();
        model.put("warnings", sized.map(sizing -> sizing.warnings().size()).orElse(0));
        model.put("rooms", sized.map(IssuePages::rooms).orElse(List.of()));
        model.put("sheets", open.stream().map(SheetView.Head::of).toList());
        model.put("replaces", status == 200 ? "" : EntryPages.text(ctx, "replaces"));
        view.show(ctx, status, "issue", model);
    }

    private static List<RoomRow> rooms(Sizing sizing) {
        return sizing.rooms().stream()
                .map(room -> new RoomRow(room.name(), room.floor().verdict().toString()))
                .toList();
    }

    void issue(Context ctx) {
        Optional<Job> job = jobs.current(ctx.pathParam("job"));
        if (job.isEmpty()) {
            JobPages.missing(ctx, view);
            return;
        }
        if (!EntryPages.text(ctx, "revision").equals(Long.toString(job.get().revision()))) {
            String changed = "The job is at revision " + job.get().revision() + " now. Look at it before issuing it.";
            show(ctx, 409, job.get(), new FormErrors().add("content", changed));
            return;
        }
        Optional<String> replaces =
                Optional.of(EntryPages.text(ctx, "replaces")).filter(number -> !number.isEmpty());
        if (replaces.isPresent()
                && sheets.ofJob(job.get().id()).stream()
                        .noneMatch(sheet -> sheet.number().equals(replaces.get()))) {
            show(ctx, 422, job.get(), new FormErrors().add("replaces", "Choose one of this job's sheets, or none."));
            return;
        }
        String who = visitors.session(ctx).orElseThrow().person().name();
        answer(ctx, job.get(), sheets.issue(job.get().id(), job.get().revision(), replaces, who));
    }

    private void answer(Context ctx, Job job, Issuing result) {
        if (result instanceof Issuing.Issued issued) {
            ctx.redirect("/sheets/" + issued.sheet().number(), HttpStatus.SEE_OTHER);
        } else if (result instanceof Issuing.SameHolds same) {
            String message = "Sheet " + same.number() + " has the same content and holds; there is nothing to issue.";
            show(ctx, 409, job, new FormErrors().add("content", message));
        } else if (result instanceof Issuing.CannotReplace cannot) {
            show(ctx, 409, job, new FormErrors().add("replaces", cannot.why()));
        } else if (result instanceof Issuing.Draft) {
            show(ctx, 422, job, new FormErrors().add("content", "A draft cannot be issued."));
        } else {
            JobPages.missing(ctx, view);
        }
    }
}
