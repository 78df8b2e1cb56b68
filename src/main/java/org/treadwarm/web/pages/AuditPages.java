package org.treadwarm.web.pages;

import io.javalin.http.Context;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalLong;
import org.treadwarm.store.AuditEntry;
import org.treadwarm.store.AuditPage;
import org.treadwarm.store.Store;

/** The audit list, for owners. */
final class AuditPages {
    private static final int A_PAGE = 50;

    private final Store store;
    private final View view;

    AuditPages(Store store, View view) {
        this.store = store;
        this.view = view;
    }

    /** An entry as a row. */
    public record Row(String at, String who, String what, String subject) {
        static Row of(AuditEntry entry) {
            return new Row(Moments.minute(entry.at()), entry.who(), entry.what(), entry.subject());
        }
    }

    void list(Context ctx) {
        String before = Optional.ofNullable(ctx.queryParam("before")).orElse("");
        if (!before.matches("|[1-9][0-9]{0,17}")) {
            JobPages.missing(ctx, view);
            return;
        }
        OptionalLong from = before.isEmpty() ? OptionalLong.empty() : OptionalLong.of(Long.parseLong(before));
        AuditPage page = store.audit().page(from, A_PAGE);
        view.show(
                ctx,
                200,
                "audit",
                Map.of(
                        "entries",
                        page.entries().stream().map(Row::of).toList(),
                        "older",
                        page.older().isPresent() ? Long.toString(page.older().getAsLong()) : "",
                        "newest",
                        before.isEmpty()));
    }
}
