package org.treadwarm.web.security;

import io.javalin.http.Context;

/** Headers on every answer: no script but our own, no frames, no guessing of types, nothing kept by caches. */
public final class SecureHeaders {
    private static final String POLICY =
            "default-src 'none'; script-src 'self'; style-src 'self'; img-src 'self' data:;"
                    + " font-src 'self'; connect-src 'self'; form-action 'self'; base-uri 'none'; frame-ancestors 'none'";

    private SecureHeaders() {}

    /** Sets the headers. */
    public static void set(Context ctx) {
        ctx.header("Content-Security-Policy", POLICY);
        ctx.header("X-Content-Type-Options", "nosniff");
        ctx.header("X-Frame-Options", "DENY");
        ctx.header("Referrer-Policy", "same-origin");
        ctx.header("Cross-Origin-Opener-Policy", "same-origin");
        ctx.header("Cross-Origin-Resource-Policy", "same-origin");
        ctx.header("Permissions-Policy", "camera=(), geolocation=(), microphone=()");
        if (!ctx.path().startsWith("/static/")) {
            ctx.header("Cache-Control", "no-store");
        }
    }
}
