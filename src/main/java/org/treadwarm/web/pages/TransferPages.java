package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.jobs.Differences;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.jobs.JobDesk.Saving;
import org.treadwarm.jobs.Labels;
import org.treadwarm.store.Change;
import org.treadwarm.survey.Survey;
import org.treadwarm.web.csv.CellProblem;
import org.treadwarm.web.csv.TableExport;
import org.treadwarm.web.csv.TableFile;
import org.treadwarm.web.csv.TableImport;
import org.treadwarm.web.csv.TableImport.Result;
import org.treadwarm.web.csv.TableKind;
import org.treadwarm.web.security.Visitors;

/** Files out of a job and into it: a table is shown with what it would change before anything is kept. */
final class TransferPages {
    private static final String ENDING = ".csv";
    private static final String RESULTS = "results" + ENDING;
    private static final String CSV = "text/csv; charset=utf-8";

    private final JobDesk desk;
    private final Visitors visitors;
    private final View view;

    TransferPages(JobDesk desk, Visitors visitors, View view) {
        this.desk = desk;
        this.visitors = visitors;
        this.view = view;
    }

    void show(Context ctx) {
        Optional<Job> job = desk.current(ctx.pathParam("job"));
        if (job.isEmpty()) {
            JobPages.missing(ctx, view);
        } else {
            show(ctx, 200, job.get(), Map.of());
        }
    }

    private void show(Context ctx, int status, Job job, Map<String, Object> more) {
        Map<String, Object> model = new HashMap<>();
        model.put("job", job);
        model.put(
                "tables",
                Arrays.stream(TableKind.values()).map(IncomingTable::of).toList());
        model.put("largest", TableFile.LARGEST_IN_WORDS);
        model.put("text", "");
        model.put("kind", "");
        model.put("errors", List.of());
        model.put("wrong", Map.of());
        model.put("problems", List.of());
        model.put("changes", List.of());
        model.put("ready", false);
        model.put("notice", "");
        model.putAll(more);
        view.show(ctx, status, "files", model);
    }

    /** What must be sized for a file out of the job; nothing where the file is the job as typed. */
    Optional<JsonNode> sized(Context ctx) {
        return ctx.pathParam("file").equals(RESULTS) ? desk.document(ctx.pathParam("job")) : Optional.empty();
    }

    /** A file out of the job. */
    void download(Context ctx) {
        Optional<Job> job = desk.current(ctx.pathParam("job"));
        String file = ctx.pathParam("file");
        if (job.isEmpty()) {
            JobPages.missing(ctx, view);
        } else if (file.equals("survey.json")) {
            send(
                    ctx,
                    file,
                    "application/json; charset=utf-8",
                    job.get().document().toPrettyString());
        } else if (file.equals(RESULTS) && !job.get().draft()) {
            job.get()
                    .sizing()
                    .ifPresentOrElse(
                            sizing -> send(ctx, file, CSV, TableExport.results(sizing)),
                            () -> JobPages.missing(ctx, view));
        } else if (kind(file).isPresent()) {
            send(ctx, file, CSV, TableExport.survey(kind(file).get(), job.get().document()));
        } else {
            JobPages.missing(ctx, view);
        }
    }

    private static Optional<TableKind> kind(String file) {
        return file.endsWith(ENDING)
                ? TableKind.called(file.substring(0, file.length() - ENDING.length()))
                : Optional.empty();
    }

    private static void send(Context ctx, String file, String type, String text) {
        ctx.contentType(type);
        ctx.header("Content-Disposition", "attachment; filename=\"" + ctx.pathParam("job") + "-" + file + "\"");
        ctx.result(text);
    }

    /** Shows what a table would change, or keeps it when that was seen and still is so. */
    void read(Context ctx) {
        Optional<Job> current = desk.current(ctx.pathParam("job"));
        Optional<TableKind> kind = kind(ctx.pathParam("file"));
        if (current.isEmpty() || kind.isEmpty()) {
            JobPages.missing(ctx, view);
            return;
        }
        Job job = current.get();
        SentTable table = SentTable.of(ctx);
        if (!table.error().isEmpty()) {
            refuse(ctx, job, kind.get(), table);
            return;
        }
        String text = table.text();
        Result result = TableImport.read(kind.get(), text, job.document());
        boolean seen = EntryPages.text(ctx, "revision").equals(Long.toString(job.revision()));
        boolean keep = EntryPages.text(ctx, "do").equals("keep");
        boolean kept = keep && seen && result.problems().isEmpty() && keep(ctx, job, kind.get(), result);
        if (!kept) {
            String notice = keep && result.problems().isEmpty()
                    ? "Somebody saved this job meanwhile. Look once more at what the table would change."
                    : "";
            preview(ctx, desk.current(job.id()).orElse(job), kind.get(), text, notice);
        }
    }

    /** Says that a form was too large to be read at all. */
    void refuseLarge(Context ctx) {
        Optional<Job> job = desk.current(ctx.pathParam("job"));
        Optional<TableKind> kind = kind(ctx.pathParam("file"));
        if (job.isEmpty() || kind.isEmpty()) {
            JobPages.missing(ctx, view);
        } else {
            refuse(ctx, job.get(), kind.get(), SentTable.unread());
        }
    }

    private void refuse(Context ctx, Job job, TableKind kind, SentTable table) {
        String id = table.field() + "-" + kind.word();
        Map<String, Object> more = new HashMap<>();
        more.put("text", table.text());
        more.put("kind", kind.word());
        more.put("errors", List.of(new ErrorView(id, "", table.error(), "")));
        more.put("wrong", Map.of(id, table.error()));
        show(ctx, 422, job, more);
    }

    private void preview(Context ctx, Job job, TableKind kind, String text, String notice) {
        Result result = TableImport.read(kind, text, job.document());
        List<CellProblem> problems = result.problems();
        JsonNode after = JobDesk.withIds(result.document(), job.document());
        Labels labels = new Labels(Survey.class, after, job.document());
        List<HistoryPages.Line> changes = !problems.isEmpty()
                ? List.of()
                : Differences.between(job.document(), after).stream()
                        .map(each -> HistoryPages.Line.of(each, labels))
                        .toList();
        Map<String, Object> more = new HashMap<>();
        more.put("text", text);
        more.put("kind", kind.word());
        more.put("problems", problems);
        more.put("changes", changes);
        more.put("ready", problems.isEmpty() && !changes.isEmpty());
        more.put(
                "notice",
                !notice.isEmpty()
                        ? notice
                        : problems.isEmpty() && changes.isEmpty()
                                ? "The table says what stands in the job already."
                                : "");
        show(ctx, problems.isEmpty() ? notice.isEmpty() ? 200 : 409 : 422, job, more);
    }

    private boolean keep(Context ctx, Job job, TableKind kind, Result result) {
        if (!result.document().equals(job.document())) {
            String who = visitors.session(ctx).orElseThrow().person().name();
            Change change = new Change(who, kind.word() + " from a table");
            Saving saving = desk.save(job.id(), job.revision(), job.name(), result.document(), change);
            if (!(saving instanceof Saving.Saved)) {
                return false;
            }
        }
        ctx.redirect("/jobs/" + job.id(), HttpStatus.SEE_OTHER);
        return true;
    }
}
