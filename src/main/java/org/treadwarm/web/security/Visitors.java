package org.treadwarm.web.security;

import io.javalin.http.Context;
import io.javalin.http.Cookie;
import io.javalin.http.SameSite;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.SecureRandom;
import java.util.Base64;
import java.util.Optional;
import org.treadwarm.store.Session;
import org.treadwarm.store.Sessions;

/**
 * Who is at the browser, and whether a form is ours. Signed in, a form carries its session's secret; before that, a secret of
 * its own that stands in a cookie too.
 */
public final class Visitors {
    /** The form field that carries the secret. */
    public static final String FORM_FIELD = "csrf";

    private static final String SESSION_COOKIE = "treadwarm-session";
    private static final String FORM_COOKIE = "treadwarm-form";
    private static final String SESSION = "session";
    private static final int FORTNIGHT = 14 * 24 * 3600;
    private static final SecureRandom RANDOM = new SecureRandom();

    private final Sessions sessions;
    private final boolean secure;
    private final boolean behindProxy;

    /**
     * @param secure whether browsers speak TLS to us, by way of a proxy
     * @param behindProxy whether a proxy of ours says where requests come from
     */
    public Visitors(Sessions sessions, boolean secure, boolean behindProxy) {
        this.sessions = sessions;
        this.secure = secure;
        this.behindProxy = behindProxy;
    }

    /** The address a visitor comes from, in a form that visitors cannot choose freely. */
    public String address(Context ctx) {
        return ClientAddress.of(ctx, behindProxy);
    }

    /** Whether the request was sent on this machine, and not by a proxy on it. */
    public boolean isOnThisMachine(Context ctx) {
        boolean passedOn = secure
                || behindProxy
                || ctx.header("X-Forwarded-For") != null
                || ctx.header("Forwarded") != null
                || ctx.header("Via") != null;
        return !passedOn && ClientAddress.isLoopback(ctx.req().getRemoteAddr());
    }

    /** Our own address as the visitor's browser writes it, without a path. */
    public String origin(Context ctx) {
        return (secure ? "https://" : "http://") + ctx.header("Host");
    }

    /** The visitor's session, if signed in. */
    public Optional<Session> session(Context ctx) {
        Session known = ctx.attribute(SESSION);
        if (known != null) {
            return Optional.of(known);
        }
        String token = ctx.cookie(SESSION_COOKIE);
        Optional<Session> found = token == null || token.length() > 200 ? Optional.empty() : sessions.find(token);
        found.ifPresent(session -> ctx.attribute(SESSION, session));
        return found;
    }

    /** Starts keeping a session in the browser. */
    public void begin(Context ctx, Session session) {
        ctx.cookie(cookie(SESSION_COOKIE, session.token(), FORTNIGHT));
    }

    /** Ends the visitor's session, here and in the browser. */
    public void end(Context ctx) {
        session(ctx).ifPresent(session -> sessions.end(session.token()));
        ctx.cookie(cookie(SESSION_COOKIE, "", 0));
    }

    /** The secret for the forms of this answer. */
    public String formSecret(Context ctx) {
        return session(ctx).map(Session::csrfToken).orElseGet(() -> {
            String known = ctx.cookie(FORM_COOKIE);
            if (known != null && known.length() >= 20 && known.length() <= 100) {
                return known;
            }
            byte[] bytes = new byte[24];
            RANDOM.nextBytes(bytes);
            String fresh = Base64.getUrlEncoder().withoutPadding().encodeToString(bytes);
            ctx.cookie(cookie(FORM_COOKIE, fresh, -1));
            return fresh;
        });
    }

    /** Whether the form that was sent is one of ours. */
    public boolean acceptsForm(Context ctx) {
        String sent = ctx.formParam(FORM_FIELD);
        if (sent == null) {
            return false;
        }
        return session(ctx)
                .map(session -> session.acceptsForm(sent))
                .orElseGet(() -> same(sent, ctx.cookie(FORM_COOKIE)));
    }

    private static boolean same(String sent, String kept) {
        return kept != null
                && MessageDigest.isEqual(sent.getBytes(StandardCharsets.UTF_8), kept.getBytes(StandardCharsets.UTF_8));
    }

    private Cookie cookie(String name, String value, int maxAge) {
        return new Cookie(name, value, "/", maxAge, secure, true, null, SameSite.LAX);
    }
}
