package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.jobs.Difference;
import org.treadwarm.jobs.Differences;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.jobs.JobDesk.Saving;
import org.treadwarm.jobs.Labels;
import org.treadwarm.store.RevisionHeader;
import org.treadwarm.survey.Survey;
import org.treadwarm.web.security.Visitors;

/** A job's history: who changed what, every revision to read, and any of them brought back as a new one. */
final class HistoryPages {
    private static final int A_PAGE = 20;
    private static final int MOST_CHANGES = 40;

    private final JobDesk desk;
    private final Visitors visitors;
    private final View view;

    HistoryPages(JobDesk desk, Visitors visitors, View view) {
        this.desk = desk;
        this.visitors = visitors;
        this.view = view;
    }

    /** One change in words. */
    public record Line(String where, String before, String after) {
        static Line of(Difference difference, Labels labels) {
            return new Line(
                    labels.where(difference),
                    labels.value(difference, difference.before()),
                    labels.value(difference, difference.after()));
        }
    }

    /** A revision with what it changed; {@code more} counts the changes that are not listed. */
    public record Entry(
            long revision,
            String name,
            boolean draft,
            String at,
            String who,
            String note,
            List<Line> changes,
            int more) {}

    void list(Context ctx) {
        list(ctx, 200, "");
    }

    private void list(Context ctx, int status, String notice) {
        String id = ctx.pathParam("job");
        String before = Optional.ofNullable(ctx.queryParam("before")).orElse("");
        List<RevisionHeader> all = desk.revisions(id);
        if (all.isEmpty() || !before.matches("|[1-9][0-9]{0,14}")) {
            JobPages.missing(ctx, view);
            return;
        }
        List<RevisionHeader> older = all.stream()
                .filter(header -> before.isEmpty() || header.revision() < Long.parseLong(before))
                .toList();
        List<RevisionHeader> shown = older.subList(0, Math.min(A_PAGE, older.size()));
        Map<String, Object> model = new HashMap<>();
        model.put("jobId", id);
        model.put("jobName", all.get(0).name());
        model.put("newest", all.get(0).revision());
        model.put("entries", shown.stream().map(this::entry).toList());
        model.put("older", older.size() > A_PAGE ? shown.get(A_PAGE - 1).revision() : 0);
        model.put("isFirstPage", before.isEmpty());
        model.put("notice", notice);
        view.show(ctx, status, "history", model);
    }

    private Entry entry(RevisionHeader header) {
        List<Line> lines = new ArrayList<>();
        if (header.revision() > 1) {
            lines.addAll(changes(header));
        }
        return new Entry(
                header.revision(),
                header.name(),
                header.draft(),
                Moments.minute(header.savedAt()),
                header.savedBy(),
                header.note(),
                lines.subList(0, Math.min(MOST_CHANGES, lines.size())),
                Math.max(0, lines.size() - MOST_CHANGES));
    }

    private List<Line> changes(RevisionHeader header) {
        JsonNode after = desk.document(header.jobId(), header.revision()).orElseThrow();
        JsonNode before = desk.document(header.jobId(), header.revision() - 1).orElseThrow();
        return lines(before, after);
    }

    private static List<Line> lines(JsonNode before, JsonNode after) {
        Labels labels = new Labels(Survey.class, after, before);
        List<Line> lines = new ArrayList<>();
        for (Difference difference : Differences.between(before, after)) {
            lines.add(Line.of(difference, labels));
        }
        return lines;
    }

    /** The document of the revision in the address. */
    Optional<JsonNode> document(Context ctx) {
        return number(ctx).flatMap(number -> desk.document(ctx.pathParam("job"), number));
    }

    /** One revision, to read. */
    void show(Context ctx) {
        Optional<Job> found = number(ctx).flatMap(number -> desk.revision(ctx.pathParam("job"), number));
        if (found.isEmpty()) {
            JobPages.missing(ctx, view);
            return;
        }
        Job job = found.get();
        Map<String, Object> model = new HashMap<>(new JobView(job, job.document()).model(job.name(), List.of(), ""));
        model.put("errors", List.of());
        model.put("at", Moments.minute(job.savedAt()));
        model.put("newest", desk.revisions(job.id()).get(0).revision());
        model.put("parts", RevisionPart.of(job.document()));
        view.show(ctx, 200, "revision", model);
    }

    private static Optional<Long> number(Context ctx) {
        String number = ctx.pathParam("n");
        return number.matches("[1-9][0-9]{0,14}") ? Optional.of(Long.parseLong(number)) : Optional.empty();
    }

    /** Brings a revision back as the newest one; somebody else's save since the page was shown is told of first. */
    void restore(Context ctx) {
        String id = ctx.pathParam("job");
        String seen = EntryPages.text(ctx, "revision");
        Optional<Long> number = number(ctx);
        if (number.isEmpty() || !seen.matches("[1-9][0-9]{0,14}")) {
            JobPages.missing(ctx, view);
            return;
        }
        String who = visitors.session(ctx).orElseThrow().person().name();
        Saving saving = desk.copies().restore(id, number.get(), Long.parseLong(seen), who);
        if (saving instanceof Saving.Saved) {
            ctx.redirect("/jobs/" + id, HttpStatus.SEE_OTHER);
        } else if (saving instanceof Saving.Stale) {
            list(
                    ctx,
                    409,
                    "Somebody saved this job meanwhile, so nothing was brought back yet. Look at the newest change"
                            + " first, then press again.");
        } else {
            JobPages.missing(ctx, view);
        }
    }
}
