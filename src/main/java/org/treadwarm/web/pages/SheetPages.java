package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.HashMap;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.sheets.FrozenText;
import org.treadwarm.sheets.SheetDesk;
import org.treadwarm.sheets.Verification;
import org.treadwarm.store.Sheet;
import org.treadwarm.store.Sheets;
import org.treadwarm.web.security.Visitors;

/** The list of issued sheets; one sheet, to be read and printed; its verification and its withdrawal. */
final class SheetPages {
    private static final int MOST_DIFFERENCES = 200;

    private final SheetDesk desk;
    private final Visitors visitors;
    private final View view;

    SheetPages(SheetDesk desk, Visitors visitors, View view) {
        this.desk = desk;
        this.visitors = visitors;
        this.view = view;
    }

    void list(Context ctx) {
        view.show(
                ctx,
                200,
                "sheets",
                Map.of("sheets", desk.list().stream().map(SheetView.Head::of).toList()));
    }

    void show(Context ctx) {
        Optional<Sheet> sheet = sheet(ctx);
        if (sheet.isEmpty()) {
            JobPages.missing(ctx, view);
            return;
        }
        Map<String, Object> model = SheetView.model(sheet.get());
        model.put("shared", false);
        view.show(ctx, 200, "sheet", model);
    }

    void verify(Context ctx) {
        Optional<Verification> found = number(ctx).flatMap(desk::verify);
        if (found.isEmpty()) {
            JobPages.missing(ctx, view);
            return;
        }
        Verification verification = found.get();
        Map<String, Object> model = new HashMap<>();
        model.put("verification", verification);
        model.put(
                "differences",
                verification.differences().stream().limit(MOST_DIFFERENCES).toList());
        model.put("more", Math.max(0, verification.differences().size() - MOST_DIFFERENCES));
        view.show(ctx, 200, "sheet-verification", model);
    }

    void askWithdrawal(Context ctx) {
        Optional<Sheet> sheet = sheet(ctx);
        if (sheet.isEmpty()) {
            JobPages.missing(ctx, view);
        } else if (sheet.get().header().withdrawal().isPresent()) {
            ctx.redirect("/sheets/" + ctx.pathParam("number"), HttpStatus.SEE_OTHER);
        } else {
            showWithdrawal(ctx, 200, sheet.get(), new FormErrors());
        }
    }

    private void showWithdrawal(Context ctx, int status, Sheet sheet, FormErrors errors) {
        Map<String, Object> model = errors.model();
        model.put("sheet", SheetView.Head.of(sheet.header()));
        model.put("reason", EntryPages.text(ctx, "reason"));
        view.show(ctx, status, "sheet-withdrawal", model);
    }

    void withdraw(Context ctx) {
        Optional<Sheet> sheet = sheet(ctx);
        String reason = EntryPages.text(ctx, "reason").strip();
        if (sheet.isEmpty()) {
            JobPages.missing(ctx, view);
        } else if (reason.isEmpty() || reason.length() > Sheets.LONGEST_REASON || reason.indexOf('\0') >= 0) {
            FormErrors errors =
                    new FormErrors().add("reason", "The reason has 1 to " + Sheets.LONGEST_REASON + " characters.");
            showWithdrawal(ctx, 422, sheet.get(), errors);
        } else {
            String number = sheet.get().header().number();
            String who = visitors.session(ctx).orElseThrow().person().name();
            // Withdrawn before, it shows by whom and why, which stands as it was.
            desk.withdraw(number, reason, who);

            ctx.redirect("/sheets/" + number, HttpStatus.SEE_OTHER);
        }
    }

    /** The survey that the sheet of an address was issued from. */
    Optional<JsonNode> survey(Context ctx) {
        return sheet(ctx).map(sheet -> FrozenText.tree(sheet.content().survey()));
    }

    private Optional<Sheet> sheet(Context ctx) {
        return number(ctx).flatMap(desk::find);
    }

    /** The number in the address; empty when it has not the form of one. */
    static Optional<String> number(Context ctx) {
        return Optional.of(ctx.pathParam("number")).filter(number -> number.matches("[0-9]{4}-[0-9]{4,9}"));
    }
}
