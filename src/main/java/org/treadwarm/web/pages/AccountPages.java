package org.treadwarm.web.pages;

import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.store.OpenSession;
import org.treadwarm.store.PasswordChange;
import org.treadwarm.store.Session;
import org.treadwarm.store.Store;
import org.treadwarm.web.security.Visitors;

/** One's own account: the password, and where one is signed in. */
final class AccountPages {
    private static final Map<String, String> DONE = Map.of(
            "password", "The new password holds. All other sessions have ended.", "session", "The session has ended.");

    private final Store store;
    private final Visitors visitors;
    private final View view;

    AccountPages(Store store, Visitors visitors, View view) {
        this.store = store;
        this.visitors = visitors;
        this.view = view;
    }

    /** A session as a row. */
    public record Row(String id, boolean here, String begun, String lastSeen) {
        static Row of(OpenSession session, Session here) {
            return new Row(
                    session.id(),
                    session.id().equals(here.id()),
                    Moments.minute(session.begun()),
                    Moments.minute(session.lastSeen()));
        }
    }

    void show(Context ctx) {
        show(ctx, 200, new FormErrors());
    }

    private void show(Context ctx, int status, FormErrors errors) {
        Session session = session(ctx);
        Map<String, Object> model = errors.model();
        List<Row> rows = store.sessions().list(session.person()).stream()
                .map(each -> Row.of(each, session))
                .toList();
        model.put("sessions", rows);
        model.put(
                "done",
                DONE.getOrDefault(Optional.ofNullable(ctx.queryParam("done")).orElse(""), ""));
        view.show(ctx, status, "account", model);
    }

    void changePassword(Context ctx) {
        String fresh = EntryPages.text(ctx, "password");
        FormErrors errors = new FormErrors().checkPassword(fresh, EntryPages.text(ctx, "again"));
        if (!errors.isEmpty()) {
            show(ctx, 422, errors);
            return;
        }
        String present = EntryPages.text(ctx, "present");
        PasswordChange change = store.people().changePassword(session(ctx), present, fresh, visitors.address(ctx));
        if (change instanceof PasswordChange.Changed) {
            ctx.redirect("/account?done=password", HttpStatus.SEE_OTHER);
        } else if (change instanceof PasswordChange.Wait wait) {
            show(ctx, 429, errors.add("present", EntryPages.wait(ctx, wait.remaining())));
        } else {
            show(ctx, 422, errors.add("present", "This is not your present password."));
        }
    }

    void endSession(Context ctx) {
        String id = ctx.pathParam("session");
        boolean here = session(ctx).id().equals(id);
        if (!store.sessions().end(session(ctx).person(), id)) {
            JobPages.missing(ctx, view);
        } else if (here) {
            left(ctx);
        } else {
            ctx.redirect("/account?done=session", HttpStatus.SEE_OTHER);
        }
    }

    void endAllSessions(Context ctx) {
        store.sessions().endAll(session(ctx).person());
        left(ctx);
    }

    private void left(Context ctx) {
        visitors.end(ctx);
        ctx.redirect("/sign-in", HttpStatus.SEE_OTHER);
    }

    private Session session(Context ctx) {
        return visitors.session(ctx).orElseThrow();
    }
}
