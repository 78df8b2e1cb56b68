package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Optional;
import java.util.function.Supplier;
import java.util.regex.Pattern;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.sheets.FrozenText;
import org.treadwarm.sheets.Issuing;
import org.treadwarm.sheets.SheetDesk;
import org.treadwarm.sheets.Verification;
import org.treadwarm.store.KeptAnswer;
import org.treadwarm.store.Sheet;
import org.treadwarm.store.SheetHeader;
import org.treadwarm.store.SheetPlace;
import org.treadwarm.store.SheetWithdrawal;
import org.treadwarm.web.Problems;
import org.treadwarm.web.api.SheetAnswers.IssuedSheet;
import org.treadwarm.web.api.SheetAnswers.SheetAnswer;
import org.treadwarm.web.api.SheetAnswers.SheetsAnswer;
import org.treadwarm.web.security.KeyGuard;
import org.treadwarm.wire.Json;

/** Issued sheets over the API. */
final class SheetsApi {
    private static final Pattern SHEETS = Pattern.compile("sheets ([0-9]{4}) ([0-9]{1,9})");

    private final SheetDesk desk;
    private final JobDesk jobs;
    private final Repeats repeats;

    SheetsApi(SheetDesk desk, JobDesk jobs, Repeats repeats) {
        this.desk = desk;
        this.jobs = jobs;
        this.repeats = repeats;
    }

    /** {@code POST /api/v1/jobs/{id}/sheets}. */
    void issue(Context ctx) {
        Optional<SheetBodies.Order> order = SheetBodies.order(ctx);
        if (order.isPresent()) {
            String job = ctx.pathParam("id");
            // Sized once before, within the time that one request may take; issuing has its floors at hand then.
            Optional<JsonNode> document = jobs.document(job, order.get().revision());
            if (document.isPresent() && SizingApi.judged(ctx, document.get()).isEmpty()) {
                return;
            }
            Supplier<Issuing> issuing =
                    desk.preparedIssue(job, order.get().revision(), order.get().replaces(), who(ctx));
            repeats.create(ctx, () -> issued(ctx, issuing.get()));
        }
    }

    private static Optional<KeptAnswer> issued(Context ctx, Issuing result) {
        if (result instanceof Issuing.Issued issued) {
            String text = new String(Json.bytes(IssuedSheet.of(issued.sheet())), StandardCharsets.UTF_8);
            return Optional.of(
                    new KeptAnswer(201, "/api/v1/sheets/" + issued.sheet().number(), "", text));
        }
        refuse(ctx, result);
        return Optional.empty();
    }

    private static void refuse(Context ctx, Issuing result) {
        if (result instanceof Issuing.Draft draft) {
            Problems.invalid(ctx, draft.problems());
        } else if (result instanceof Issuing.SameHolds same) {
            String detail = "Sheet " + same.number() + " of this job has the same content and holds.";
            Problems.plain(ctx, 409, "same-sheet", "This is issued already", detail);
        } else if (result instanceof Issuing.CannotReplace cannot) {
            Problems.plain(ctx, 409, "replaces", "That sheet cannot be replaced", cannot.why());
        } else {
            missing(ctx, "There is no such job or revision");
        }
    }

    /** {@code GET /api/v1/sheets?limit=&cursor=}. */
    void list(Context ctx) {
        Optional<Paging> paging = Paging.of(ctx, SHEETS);
        if (paging.isEmpty()) {
            return;
        }
        int limit = paging.get().limit();
        Optional<SheetPlace> after =
                paging.get().after().map(last -> new SheetPlace((int) last.number(1), (int) last.number(2)));
        List<SheetHeader> found = desk.list(limit + 1, after);
        List<IssuedSheet> part =
                found.stream().limit(limit).map(IssuedSheet::of).toList();
        Optional<String> next = Optional.empty();
        if (found.size() > limit) {
            SheetPlace last = SheetPlace.of(part.get(limit - 1).number());
            next = Optional.of(paging.get().next(ctx, last.year(), last.running()));
        }
        SizingApi.json(ctx, 200, new SheetsAnswer(part, next));
    }

    /** {@code GET /api/v1/sheets/{number}}. */
    void get(Context ctx) {
        Optional<Sheet> sheet = number(ctx).flatMap(desk::find);
        if (sheet.isPresent()) {
            SizingApi.json(ctx, 200, SheetAnswer.of(sheet.get()));
        } else {
            missing(ctx, "There is no such sheet");
        }
    }

    /** {@code GET /api/v1/sheets/{number}/verification}. */
    void verification(Context ctx) {
        Optional<Sheet> sheet = number(ctx).flatMap(desk::find);
        if (sheet.isPresent()
                && SizingApi.judged(ctx, FrozenText.tree(sheet.get().content().survey()))
                        .isEmpty()) {
            return;
        }
        Optional<Verification> verification = number(ctx).flatMap(desk::verify);
        if (verification.isPresent()) {
            SizingApi.json(ctx, 200, verification.get());
        } else {
            missing(ctx, "There is no such sheet");
        }
    }

    /** {@code POST /api/v1/sheets/{number}/withdrawal}. */
    void withdraw(Context ctx) {
        Optional<String> reason = SheetBodies.reason(ctx);
        if (reason.isEmpty()) {
            return;
        }
        SheetWithdrawal result = number(ctx)
                .map(number -> desk.withdraw(number, reason.get(), who(ctx)))
                .orElseGet(SheetWithdrawal.Missing::new);
        if (result instanceof SheetWithdrawal.Done done) {
            SizingApi.json(ctx, 200, IssuedSheet.of(done.header()));
        } else if (result instanceof SheetWithdrawal.DoneBefore before) {
            String detail = "It was withdrawn at "
                    + before.header().withdrawal().orElseThrow().at() + "; that stands as it was.";
            Problems.plain(ctx, 409, "withdrawn", "The sheet is withdrawn already", detail);
        } else {
            missing(ctx, "There is no such sheet");
        }
    }

    private static Optional<String> number(Context ctx) {
        return Optional.of(ctx.pathParam("number")).filter(SheetBodies::isNumber);
    }

    private static String who(Context ctx) {
        return "key " + KeyGuard.key(ctx).name();
    }

    private static void missing(Context ctx, String title) {
        Problems.plain(ctx, 404, "missing", title, "Nothing is kept at " + ctx.path() + ".");
    }
}
