package org.treadwarm.web;

import io.javalin.http.Context;
import java.util.List;
import java.util.Optional;
import org.treadwarm.survey.Problem;
import org.treadwarm.wire.Json;
import org.treadwarm.wire.ProblemDocument;

/** Writes problems to API clients, always as application/problem+json. */
public final class Problems {
    private Problems() {}

    /** Writes a problem document with its status. */
    public static void write(Context ctx, ProblemDocument problem) {
        write(ctx, problem.status(), problem.metBy(RequestIds.id(ctx)));
    }

    /** Writes a problem document that says more than others, with its status. */
    public static void write(Context ctx, int status, Record problem) {
        ctx.status(status);
        ctx.contentType(ProblemDocument.MEDIA_TYPE);
        ctx.result(Json.bytes(problem));
    }

    /** The id of the request that a problem document repeats; empty if it never began. */
    public static Optional<String> requestId(Context ctx) {
        return RequestIds.id(ctx);
    }

    /** Writes that a document has problems. */
    public static void invalid(Context ctx, List<Problem> problems) {
        write(ctx, ProblemDocument.invalid(problems));
    }

    /** Writes a problem without an address. */
    public static void plain(Context ctx, int status, String kind, String title, String detail) {
        write(ctx, ProblemDocument.plain(status, kind, title, detail));
    }
}
