package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.regex.Pattern;
import org.treadwarm.intake.Intake;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.jobs.JobDesk.Prepared;
import org.treadwarm.jobs.JobDesk.Saving;
import org.treadwarm.store.Change;
import org.treadwarm.store.JobListing;
import org.treadwarm.store.JobListings;
import org.treadwarm.store.JobSearch;
import org.treadwarm.store.KeptAnswer;
import org.treadwarm.store.RevisionHeader;
import org.treadwarm.survey.Pointer;
import org.treadwarm.survey.Problem;
import org.treadwarm.web.Problems;
import org.treadwarm.web.security.KeyGuard;
import org.treadwarm.wire.Json;

/** Jobs over the API: whole documents, every save a revision, no save over somebody else's. */
final class JobsApi {
    private static final int LONGEST_NAME = 200;
    private static final Pattern JOBS = Pattern.compile("jobs ([0-9]{1,18}) ([0-9]{1,18})");

    private final JobDesk desk;
    private final Repeats repeats;

    JobsApi(JobDesk desk, Repeats repeats) {
        this.desk = desk;
        this.repeats = repeats;
    }

    /** A job with its survey as typed. Problems stand there when it is a draft. */
    record JobAnswer(
            String id,
            long revision,
            String name,
            boolean draft,
            Instant savedAt,
            String savedBy,
            List<Problem> problems,
            JsonNode survey) {
        static JobAnswer of(Job job) {
            return new JobAnswer(
                    job.id(),
                    job.revision(),
                    job.name(),
                    job.draft(),
                    job.savedAt(),
                    job.savedBy(),
                    job.problems(),
                    job.document());
        }
    }

    /** A job in a list: its newest revision without the survey. */
    record ListedJob(
            String id,
            long revision,
            String name,
            boolean draft,
            Instant savedAt,
            String savedBy,
            String note,
            boolean archived) {
        static ListedJob of(JobListing job) {
            RevisionHeader header = job.newest();
            return new ListedJob(
                    header.jobId(),
                    header.revision(),
                    header.name(),
                    header.draft(),
                    header.savedAt(),
                    header.savedBy(),
                    header.note(),
                    job.archived());
        }
    }

    /** A page of jobs, and where the next page begins, if there is one. */
    record JobsAnswer(List<ListedJob> jobs, Optional<String> next) {}

    private record JobBody(String name, JsonNode survey) {}

    /** {@code GET /api/v1/jobs?find=&archived=&limit=&cursor=}. */
    void list(Context ctx) {
        Optional<Paging> paging = Paging.of(ctx, JOBS);
        Optional<JobSearch> search = paging.flatMap(part -> JobQuery.read(ctx, part));
        if (search.isPresent()) {
            JobListings found = desk.find(search.get());
            Optional<String> next = found.next().map(place -> paging.get().next(ctx, place.begin(), place.last()));
            SizingApi.json(
                    ctx,
                    200,
                    new JobsAnswer(found.jobs().stream().map(ListedJob::of).toList(), next));
        }
    }

    static void answer(Context ctx, Saving saving) {
        if (saving instanceof Saving.Saved saved) {
            answer(ctx, 200, saved.job());
        } else if (saving instanceof Saving.Stale stale) {
            stale(ctx, stale.revision());
        } else {
            missing(ctx);
        }
    }

    /** {@code POST /api/v1/jobs}. */
    void create(Context ctx) {
        Optional<JobBody> body = body(ctx);
        if (body.isPresent()) {
            Prepared prepared = desk.prepared(body.get().name(), body.get().survey());
            repeats.create(ctx, () -> Optional.of(kept(201, desk.create(prepared, change(ctx)))));
        }
    }

    /** A job that was created or changed, as an answer to keep. */
    static KeptAnswer kept(int status, Job job) {
        String text = new String(Json.bytes(JobAnswer.of(job)), StandardCharsets.UTF_8);
        return new KeptAnswer(status, "/api/v1/jobs/" + job.id(), tag(job.revision()), text);
    }

    /** {@code GET /api/v1/jobs/{id}}. */
    void get(Context ctx) {
        answerOrMissing(ctx, desk.current(ctx.pathParam("id")));
    }

    /** {@code GET /api/v1/jobs/{id}/sizing}: of the newest revision. */
    void sizing(Context ctx) {
        Optional<Job> job = desk.current(ctx.pathParam("id"));
        if (job.isEmpty()) {
            missing(ctx);
        } else {
            SizingApi.judged(ctx, job.get().document()).ifPresent(judged -> {
                if (judged.sizing().isPresent()) {
                    ctx.header("ETag", tag(job.get().revision()));
                }
                SizingApi.answer(ctx, judged);
            });
        }
    }

    /** {@code PUT /api/v1/jobs/{id}} with If-Match. */
    void put(Context ctx) {
        String id = ctx.pathParam("id");
        if (desk.revisions(id).isEmpty()) {
            missing(ctx);
            return;
        }
        String match = ctx.header("If-Match");
        if (match == null || match.isBlank()) {
            Problems.plain(
                    ctx,
                    428,
                    "if-match",
                    "The revision that was changed is not named",
                    "Send the job's ETag in the header If-Match, so that nobody's work is overwritten.");
            return;
        }
        OptionalLong expected = expected(match, desk.revisions(id).get(0).revision());
        Optional<JobBody> body = body(ctx);
        if (body.isEmpty()) {
            return;
        }
        if (expected.isEmpty()) {
            stale(ctx, desk.revisions(id).get(0).revision());
            return;
        }
        Saving saving = desk.save(
                id, expected.getAsLong(), body.get().name(), body.get().survey(), change(ctx));
        answer(ctx, saving);
    }

    static void stale(Context ctx, long current) {
        ctx.header("ETag", tag(current));
        Problems.plain(
                ctx,
                412,
                "stale",
                "The job was saved by somebody else in between",
                "It is at revision " + current + " now. Fetch it, take its changes in, and send yours again.");
    }

    static Change change(Context ctx) {
        return Change.by("key " + KeyGuard.key(ctx).name());
    }

    private static String tag(long revision) {
        return "\"" + revision + "\"";
    }

    /**
     * The revision that a change was made from (RFC 9110, 13.1.1): any for *, the current one where the list names it, else
     * one that was named. Weak tags never match.
     */
    static OptionalLong expected(String match, long current) {
        OptionalLong named = OptionalLong.empty();
        for (String each : match.split(",", -1)) {
            String tag = each.strip();
            boolean quoted = tag.length() > 2 && tag.startsWith("\"") && tag.endsWith("\"");
            OptionalLong revision = number(quoted ? tag.substring(1, tag.length() - 1) : tag);
            if (tag.equals("*") || revision.isPresent() && revision.getAsLong() == current) {
                return OptionalLong.of(current);
            }
            named = revision.isPresent() ? revision : named;
        }
        return named;
    }

    static OptionalLong number(String text) {
        return text.matches("[0-9]{1,15}") ? OptionalLong.of(Long.parseLong(text)) : OptionalLong.empty();
    }

    private static Optional<JobBody> body(Context ctx) {
        Optional<JsonNode> tree = Bodies.read(ctx, Bodies.JOB);
        if (tree.isEmpty()) {
            return Optional.empty();
        }
        List<Problem> problems = problems(tree.get());
        if (!problems.isEmpty()) {
            Problems.invalid(ctx, problems);
            return Optional.empty();
        }
        Intake.tidy(tree.get().get("survey"));
        return Optional.of(new JobBody(
                tree.get().get("name").textValue().strip(), tree.get().get("survey")));
    }

    private static List<Problem> problems(JsonNode tree) {
        List<Problem> problems = new ArrayList<>();
        if (!tree.isObject()) {
            return List.of(new Problem("", "no object", "a job is an object", "{\"name\": ..., \"survey\": ...}"));
        }
        JsonNode name = tree.path("name");
        String allowed = "1 to " + LONGEST_NAME + " characters";
        if (!name.isTextual() || name.textValue().isBlank()) {
            String given = name.isMissingNode() ? "nothing" : shortened(name.toString());
            problems.add(new Problem("/name", given, "the job's name is missing", allowed));
        } else if (name.textValue().strip().length() > LONGEST_NAME
                || name.textValue().chars().anyMatch(Character::isISOControl)) {
            problems.add(new Problem("/name", shortened(name.textValue()), "this name cannot be used", allowed));
        }
        if (!tree.path("survey").isObject()) {
            String given = tree.path("survey").isMissingNode() ? "nothing" : "no object";
            problems.add(new Problem("/survey", given, "the survey is missing", "an object"));
        }
        for (Iterator<String> keys = tree.fieldNames(); keys.hasNext(); ) {
            String key = keys.next();
            if (!key.equals("name") && !key.equals("survey")) {
                problems.add(
                        new Problem(Pointer.to("", key), shortened(key), "this is no key of a job", "name, survey"));
            }
        }
        return problems;
    }

    static String shortened(String text) {
        return text.length() <= 100 ? text : text.substring(0, 99) + "…";
    }

    static void answerOrMissing(Context ctx, Optional<Job> job) {
        if (job.isPresent()) {
            answer(ctx, 200, job.get());
        } else {
            missing(ctx);
        }
    }

    static void answer(Context ctx, int status, Job job) {
        ctx.header("ETag", tag(job.revision()));
        SizingApi.json(ctx, status, JobAnswer.of(job));
    }

    static void missing(Context ctx) {
        Problems.plain(
                ctx, 404, "missing", "There is no such job or revision", "Nothing is kept at " + ctx.path() + ".");
    }
}
