package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.OptionalLong;
import java.util.function.Supplier;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.jobs.JobDesk.Saving;
import org.treadwarm.jobs.Judgement;
import org.treadwarm.store.Change;
import org.treadwarm.store.KeptAnswer;
import org.treadwarm.survey.Problem;
import org.treadwarm.web.Problems;
import org.treadwarm.web.api.TableAnswers.TableAnswer;
import org.treadwarm.web.api.TableAnswers.TableProblems;
import org.treadwarm.web.csv.TableExport;
import org.treadwarm.web.csv.TableImport;
import org.treadwarm.web.csv.TableImport.Result;
import org.treadwarm.web.csv.TableKind;
import org.treadwarm.wire.Json;

/** Tables out of a job and into it over the API, as CSV. */
final class TablesApi {
    private static final String RESULTS = "results";

    private final JobDesk desk;
    private final Repeats repeats;

    TablesApi(JobDesk desk, Repeats repeats) {
        this.desk = desk;
        this.repeats = repeats;
    }

    /** {@code GET /api/v1/jobs/{id}/tables/{table}}: rooms or openings as typed, or the results of the rooms. */
    void get(Context ctx) {
        String table = ctx.pathParam("table");
        Optional<TableKind> kind = TableKind.called(table);
        Optional<Job> job = desk.current(ctx.pathParam("id"));
        if (job.isEmpty() || kind.isEmpty() && !table.equals(RESULTS)) {
            missing(ctx);
        } else if (kind.isPresent()) {
            csv(ctx, job.get(), TableExport.survey(kind.get(), job.get().document()));
        } else {
            results(ctx, job.get());
        }
    }

    private static void results(Context ctx, Job job) {
        Optional<Judgement> judged = SizingApi.judged(ctx, job.document());
        judged.flatMap(Judgement::sizing).ifPresent(sizing -> csv(ctx, job, TableExport.results(sizing)));
        judged.filter(each -> each.sizing().isEmpty()).ifPresent(each -> Problems.invalid(ctx, each.problems()));
    }

    private static void csv(Context ctx, Job job, String text) {
        String file = job.id() + "-" + ctx.pathParam("table") + ".csv";
        ctx.header("ETag", Tags.quoted(Long.toString(job.revision())));
        ctx.header("Content-Disposition", "attachment; filename=\"" + file + "\"");
        ctx.contentType("text/csv; charset=utf-8");
        ctx.result(text);
    }

    /** {@code POST /api/v1/jobs/{id}/tables/{table}?preview=} with If-Match: a table into the job, all of it or nothing. */
    void read(Context ctx) {
        Optional<TableKind> kind = TableKind.called(ctx.pathParam("table"));
        Optional<Job> current = desk.current(ctx.pathParam("id"));
        if (kind.isEmpty() || current.isEmpty()) {
            missing(ctx);
            return;
        }
        Optional<Boolean> preview = preview(ctx);
        if (preview.isEmpty() || Tags.expected(ctx, "job").isEmpty()) {
            return;
        }
        Optional<String> text = Bodies.table(ctx);
        if (text.isEmpty()) {
            return;
        }
        Supplier<Optional<KeptAnswer>> reading = reading(ctx, current.get(), kind.get(), text.get(), preview.get());
        if (preview.get()) {
            repeats.answer(ctx, reading);
        } else {
            repeats.create(ctx, reading);
        }
    }

    /** Whether the changes are only looked at; empty when the refusal has been written already. */
    private static Optional<Boolean> preview(Context ctx) {
        // What cannot be decoded has no value; taken for left out, it would keep what was only to be looked at.
        String given = ctx.queryParamMap().containsKey("preview")
                ? Optional.ofNullable(ctx.queryParam("preview")).orElse("what cannot be decoded")
                : "false";
        if (given.equals("true") || given.equals("false")) {
            return Optional.of(given.equals("true"));
        }
        Problem problem = new Problem(
                "/preview",
                JobsApi.shortened(given),
                "this cannot be asked for",
                "true or false, or nothing for false");
        Problems.invalid(ctx, List.of(problem));
        return Optional.empty();
    }

    /** Reads the table and judges the job with it; what is given back keeps that, or answers why not. */
    private Supplier<Optional<KeptAnswer>> reading(Context ctx, Job job, TableKind kind, String text, boolean preview) {
        OptionalLong expected = JobsApi.expected(ctx.header("If-Match"), job.revision());
        if (expected.isEmpty() || expected.getAsLong() != job.revision()) {
            return answered(() -> JobsApi.stale(ctx, job.revision()));
        }
        Result result = TableImport.read(kind, text, job.document());
        if (!result.problems().isEmpty()) {
            TableProblems problems = TableProblems.of(result.problems(), Problems.requestId(ctx));
            return answered(() -> Problems.write(ctx, TableProblems.STATUS, problems));
        }
        JsonNode after = JobDesk.withIds(result.document(), job.document());
        if (preview || after.equals(job.document())) {
            boolean draft = !Judgement.unsized(after).problems().isEmpty();
            return answered(() -> looked(ctx, TableAnswer.looked(job, after, draft)));
        }
        Change change = new Change(JobsApi.change(ctx).who(), kind.word() + " from a table");
        Supplier<Saving> saving = desk.preparedSave(job.id(), job.revision(), job.name(), after, change);
        return () -> kept(ctx, job, saving.get());
    }

    private static Supplier<Optional<KeptAnswer>> answered(Runnable answer) {
        return () -> {
            answer.run();
            return Optional.empty();
        };
    }

    private static void looked(Context ctx, TableAnswer answer) {
        ctx.header("ETag", Tags.quoted(Long.toString(answer.revision())));
        SizingApi.json(ctx, 200, answer);
    }

    private static Optional<KeptAnswer> kept(Context ctx, Job before, Saving saving) {
        if (saving instanceof Saving.Saved saved) {
            String tag = Tags.quoted(Long.toString(saved.job().revision()));
            byte[] body = Json.bytes(TableAnswer.kept(before, saved.job()));
            return Optional.of(
                    new KeptAnswer(200, "/api/v1/jobs/" + before.id(), tag, new String(body, StandardCharsets.UTF_8)));
        }
        JobsApi.answer(ctx, saving);
        return Optional.empty();
    }

    private static void missing(Context ctx) {
        Problems.plain(ctx, 404, "missing", "There is no such job or table", "Nothing is kept at " + ctx.path() + ".");
    }
}
