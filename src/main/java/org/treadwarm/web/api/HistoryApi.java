package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.function.Supplier;
import java.util.regex.Pattern;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.jobs.JobDesk.Saving;
import org.treadwarm.store.KeptAnswer;
import org.treadwarm.store.RevisionHeader;
import org.treadwarm.survey.Survey;

/** A job's history over the API: its revisions, what each changed, old ones brought back, copies and the archive. */
final class HistoryApi {
    private static final Pattern REVISIONS = Pattern.compile("revisions ([0-9]{1,15})");

    private final JobDesk desk;
    private final Repeats repeats;

    HistoryApi(JobDesk desk, Repeats repeats) {
        this.desk = desk;
        this.repeats = repeats;
    }

    /** One revision without its survey. */
    record RevisionAnswer(
            String id, long revision, String name, boolean draft, Instant savedAt, String savedBy, String note) {
        static RevisionAnswer of(RevisionHeader header) {
            return new RevisionAnswer(
                    header.jobId(),
                    header.revision(),
                    header.name(),
                    header.draft(),
                    header.savedAt(),
                    header.savedBy(),
                    header.note());
        }
    }

    /** A part of the list of revisions. */
    record RevisionsAnswer(List<RevisionAnswer> revisions, Optional<String> next) {}

    /** What a revision changed of the one before it. */
    record ChangesAnswer(long revision, List<DifferenceAnswer> changes) {}

    /** Whether a job is archived. */
    record ArchiveAnswer(String id, boolean archived) {}

    /** {@code GET /api/v1/jobs/{id}/revisions}. */
    void revisions(Context ctx) {
        Optional<Paging> paging = Paging.of(ctx, REVISIONS);
        if (paging.isEmpty()) {
            return;
        }
        int limit = paging.get().limit();
        long before = paging.get().after().map(last -> last.number(1)).orElse(Long.MAX_VALUE);
        List<RevisionHeader> found = desk.revisions(ctx.pathParam("id"), limit + 1, before);
        if (found.isEmpty()) {
            JobsApi.missing(ctx);
            return;
        }
        List<RevisionAnswer> page =
                found.stream().limit(limit).map(RevisionAnswer::of).toList();
        Optional<String> next = found.size() > limit
                ? Optional.of(paging.get().next(ctx, page.get(limit - 1).revision()))
                : Optional.empty();
        SizingApi.json(ctx, 200, new RevisionsAnswer(page, next));
    }

    /** {@code GET /api/v1/jobs/{id}/revisions/{n}}. */
    void revision(Context ctx) {
        OptionalLong number = JobsApi.number(ctx.pathParam("n"));
        JobsApi.answerOrMissing(
                ctx, number.isEmpty() ? Optional.empty() : desk.revision(ctx.pathParam("id"), number.getAsLong()));
    }

    /** {@code GET /api/v1/jobs/{id}/revisions/{n}/changes}. */
    void changes(Context ctx) {
        String id = ctx.pathParam("id");
        OptionalLong number = JobsApi.number(ctx.pathParam("n"));
        Optional<JsonNode> after = number.isEmpty() ? Optional.empty() : desk.document(id, number.getAsLong());
        if (after.isEmpty()) {
            JobsApi.missing(ctx);
            return;
        }
        List<DifferenceAnswer> changes = desk.document(id, number.getAsLong() - 1)
                .map(before -> DifferenceAnswer.between(before, after.get(), Survey.class))
                .orElse(List.of());
        SizingApi.json(ctx, 200, new ChangesAnswer(number.getAsLong(), changes));
    }

    /** {@code POST /api/v1/jobs/{id}/revisions/{n}/restore} with If-Match: an old revision as a new one. */
    void restore(Context ctx) {
        String id = ctx.pathParam("id");
        OptionalLong number = JobsApi.number(ctx.pathParam("n"));
        Optional<JsonNode> there = number.isEmpty() ? Optional.empty() : desk.document(id, number.getAsLong());
        if (there.isEmpty()) {
            JobsApi.missing(ctx);
            return;
        }
        if (Tags.expected(ctx, "job").isEmpty()) {
            return;
        }
        long current = desk.revisions(id).get(0).revision();
        OptionalLong expected = JobsApi.expected(ctx.header("If-Match"), current);
        if (expected.isEmpty()) {
            JobsApi.stale(ctx, current);
            return;
        }
        Supplier<Saving> saving = desk.copies()
                .preparedRestore(
                        id,
                        number.getAsLong(),
                        expected.getAsLong(),
                        JobsApi.change(ctx).who());
        repeats.create(ctx, () -> restored(ctx, saving.get()));
    }

    private static Optional<KeptAnswer> restored(Context ctx, Saving saving) {
        if (saving instanceof Saving.Saved saved) {
            return Optional.of(JobsApi.kept(200, saved.job()));
        }
        JobsApi.answer(ctx, saving);
        return Optional.empty();
    }

    /** {@code POST /api/v1/jobs/{id}/copy}. */
    void copy(Context ctx) {
        Optional<Supplier<Job>> copy = desk.copies()
                .preparedCopy(ctx.pathParam("id"), JobsApi.change(ctx).who());
        if (copy.isPresent()) {
            repeats.create(ctx, () -> Optional.of(JobsApi.kept(201, copy.get().get())));
        } else {
            JobsApi.missing(ctx);
        }
    }

    /** {@code POST /api/v1/jobs/{id}/archive}. */
    void archive(Context ctx) {
        archive(ctx, true);
    }

    /** {@code POST /api/v1/jobs/{id}/unarchive}. */
    void bringBack(Context ctx) {
        archive(ctx, false);
    }

    private void archive(Context ctx, boolean archived) {
        String id = ctx.pathParam("id");
        if (desk.archive(id, archived, JobsApi.change(ctx).who())) {
            SizingApi.json(ctx, 200, new ArchiveAnswer(id, archived));
        } else {
            JobsApi.missing(ctx);
        }
    }
}
