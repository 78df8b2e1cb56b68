package org.treadwarm.web.pages;

import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.store.NewSheetLink;
import org.treadwarm.store.Sheet;
import org.treadwarm.store.SheetHeader;
import org.treadwarm.store.SheetLink;
import org.treadwarm.store.Store;
import org.treadwarm.web.security.Visitors;

/** Links that show one sheet, and nothing else of the job, to whoever has them. */
final class SheetLinkPages {
    private static final int LONGEST_TOKEN = 100;

    private final Store store;
    private final Visitors visitors;
    private final View view;

    SheetLinkPages(Store store, Visitors visitors, View view) {
        this.store = store;
        this.visitors = visitors;
        this.view = view;
    }

    /** A link as a row. */
    public record Row(String id, String made, String madeBy) {
        static Row of(SheetLink link) {
            return new Row(link.id(), Moments.minute(link.madeAt()), link.madeBy());
        }
    }

    void list(Context ctx) {
        show(ctx, Optional.empty());
    }

    private void show(Context ctx, Optional<NewSheetLink> fresh) {
        Optional<SheetHeader> sheet = SheetPages.number(ctx).flatMap(store.sheets()::header);
        if (sheet.isEmpty()) {
            JobPages.missing(ctx, view);
            return;
        }
        Map<String, Object> model = new FormErrors().model();
        model.put("sheet", SheetView.Head.of(sheet.get()));
        model.put(
                "links",
                store.sheetLinks().list(sheet.get().number()).stream()
                        .map(Row::of)
                        .toList());
        model.put(
                "address",
                fresh.map(made -> visitors.origin(ctx) + "/shared/" + made.token())
                        .orElse(""));
        model.put("done", "revoke".equals(ctx.queryParam("done")) ? "The link was revoked." : "");
        view.show(ctx, 200, "sheet-links", model);
    }

    void create(Context ctx) {
        Optional<NewSheetLink> made =
                SheetPages.number(ctx).flatMap(number -> store.sheetLinks().create(number, who(ctx)));
        if (made.isEmpty()) {
            JobPages.missing(ctx, view);
        } else {
            show(ctx, made);
        }
    }

    void revoke(Context ctx) {
        Optional<String> number =
                SheetPages.number(ctx).filter(each -> store.sheetLinks().revoke(each, ctx.pathParam("link"), who(ctx)));
        if (number.isPresent()) {
            ctx.redirect("/sheets/" + number.get() + "/links?done=revoke", HttpStatus.SEE_OTHER);
        } else {
            JobPages.missing(ctx, view);
        }
    }

    /** The sheet that a link shows. */
    void shared(Context ctx) {
        ctx.header("X-Robots-Tag", "noindex, nofollow, noarchive");
        ctx.header("Referrer-Policy", "no-referrer");
        String token = ctx.pathParam("token");
        Optional<Sheet> sheet = token.length() > LONGEST_TOKEN
                ? Optional.empty()
                : store.sheetLinks().find(token);
        if (sheet.isEmpty()) {
            JobPages.missing(ctx, view);
            return;
        }
        Map<String, Object> model = SheetView.model(sheet.get());
        model.put("shared", true);
        view.show(ctx, 200, "sheet", model);
    }

    private String who(Context ctx) {
        return visitors.session(ctx).orElseThrow().person().name();
    }
}
