package org.treadwarm.web.security;

import io.javalin.http.Context;
import jakarta.servlet.http.HttpServletResponse;

/** Headers on every answer: no script but our own, no frames, no guessing of types, nothing kept by caches. */
public final class SecureHeaders {
    private static final String POLICY =
            "default-src 'none'; script-src 'self'; style-src 'self'; img-src 'self' data:;"
                    + " font-src 'self'; connect-src 'self'; form-action 'self'; base-uri 'none'; frame-ancestors 'none'";

    private SecureHeaders() {}

    /** Sets the headers. */
    public static void set(Context ctx) {
        // Nothing has been set yet, so adding does what setting does without looking for what is there.
        HttpServletResponse to = ctx.res();
        to.addHeader("Content-Security-Policy", POLICY);
        to.addHeader("X-Content-Type-Options", "nosniff");
        to.addHeader("X-Frame-Options", "DENY");
        to.addHeader("Referrer-Policy", "same-origin");
        to.addHeader("Cross-Origin-Opener-Policy", "same-origin");
        to.addHeader("Cross-Origin-Resource-Policy", "same-origin");
        to.addHeader("Permissions-Policy", "camera=(), geolocation=(), microphone=()");
        if (!ctx.path().startsWith("/static/")) {
            to.addHeader("Cache-Control", "no-store");
        }
    }
}
