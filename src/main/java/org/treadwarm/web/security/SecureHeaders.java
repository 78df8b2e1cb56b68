package org.treadwarm.web.security;

import io.javalin.http.Context;
import java.util.List;
import org.eclipse.jetty.ee10.servlet.ServletContextRequest;
import org.eclipse.jetty.http.HttpField;
import org.eclipse.jetty.http.HttpFields;
import org.eclipse.jetty.http.PreEncodedHttpField;

/** Headers on every answer: no script but our own, no frames, no guessing of types, nothing kept by caches. */
public final class SecureHeaders {
    private static final String POLICY =
            "default-src 'none'; script-src 'self'; style-src 'self'; img-src 'self' data:;"
                    + " font-src 'self'; connect-src 'self'; form-action 'self'; base-uri 'none'; frame-ancestors 'none'";

    /** As bytes already, since they go out with every answer. */
    private static final List<HttpField> ALWAYS = List.of(
            new PreEncodedHttpField("Content-Security-Policy", POLICY),
            new PreEncodedHttpField("X-Content-Type-Options", "nosniff"),
            new PreEncodedHttpField("X-Frame-Options", "DENY"),
            new PreEncodedHttpField("Referrer-Policy", "same-origin"),
            new PreEncodedHttpField("Cross-Origin-Opener-Policy", "same-origin"),
            new PreEncodedHttpField("Cross-Origin-Resource-Policy", "same-origin"),
            new PreEncodedHttpField("Permissions-Policy", "camera=(), geolocation=(), microphone=()"));

    private static final HttpField NOT_STORED = new PreEncodedHttpField("Cache-Control", "no-store");

    private SecureHeaders() {}

    /** Sets the headers. */
    public static void set(Context ctx) {
        // Nothing has been set yet, so adding does what setting does without looking for what is there.
        HttpFields.Mutable to = ServletContextRequest.getServletContextRequest(ctx.req())
                .getServletContextResponse()
                .getHeaders();
        for (HttpField field : ALWAYS) {
            to.add(field);
        }
        if (!ctx.path().startsWith("/static/")) {
            to.add(NOT_STORED);
        }
    }
}
