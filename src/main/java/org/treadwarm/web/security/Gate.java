package org.treadwarm.web.security;

import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.util.Optional;
import org.treadwarm.store.Role;
import org.treadwarm.store.Session;

/** Stands before every route and lets in whom its {@link Access} names. */
public final class Gate {
    private final Visitors visitors;
    private final KeyGuard keys;
    private final Refusal refusal;

    /** Shows a person a page that says why not. */
    @FunctionalInterface
    public interface Refusal {
        /** Answers with status 403 that at least this role is needed. */
        void show(Context ctx, Role least);
    }

    public Gate(Visitors visitors, KeyGuard keys, Refusal refusal) {
        this.visitors = visitors;
        this.keys = keys;
        this.refusal = refusal;
    }

    /** Lets the request on to its route, or answers it. */
    public void check(Context ctx) {
        for (var role : ctx.routeRoles()) {
            if (role instanceof Access access && admits(ctx, access)) {
                return;
            }
        }
        ctx.skipRemainingHandlers();
    }

    private boolean admits(Context ctx, Access access) {
        if (access instanceof Access.Key key) {
            return keys.admit(ctx, key.least());
        }
        if (access instanceof Access.Watcher watcher) {
            return visitors.isOnThisMachine(ctx) || keys.admit(ctx, watcher.least());
        }
        return !(access instanceof Access.Member member) || admits(ctx, member);
    }

    private boolean admits(Context ctx, Access.Member member) {
        Optional<Session> session = visitors.session(ctx);
        if (session.isEmpty()) {
            String back = ctx.method().toString().equals("GET") ? ctx.path() : "/jobs";
            ctx.redirect("/sign-in?back=" + URLEncoder.encode(back, StandardCharsets.UTF_8), HttpStatus.SEE_OTHER);
            return false;
        }
        boolean may = session.get().person().role().allows(member.least());
        if (!may) {
            refusal.show(ctx, member.least());
        }
        return may;
    }
}
