package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import java.util.Locale;
import java.util.Optional;
import org.treadwarm.intake.Document;
import org.treadwarm.intake.NotJsonException;
import org.treadwarm.web.Drain;
import org.treadwarm.web.Problems;
import org.treadwarm.wire.ProblemDocument;

/** Reads JSON bodies within their limits. */
final class Bodies {
    /** The largest body of a sizing, bytes. */
    static final int SIZING = 2 * 1024 * 1024;

    /** The largest body of a job, bytes. */
    static final int JOB = 16 * 1024 * 1024;

    private Bodies() {}

    /** The body as a tree; empty when the refusal has been written already. */
    static Optional<JsonNode> read(Context ctx, int most) {
        if (!isJson(ctx.contentType())) {
            Problems.plain(
                    ctx,
                    415,
                    "media-type",
                    "The body is not declared as JSON",
                    "Send it with \"Content-Type: application/json\".");
            return Optional.empty();
        }
        if (ctx.req().getContentLengthLong() > most) {
            Drain.rest(ctx);
            tooLarge(ctx, most);
            return Optional.empty();
        }
        byte[] body = ctx.bodyAsBytes();
        if (body.length > most) {
            tooLarge(ctx, most);
            return Optional.empty();
        }
        try {
            return Optional.of(Document.read(body));
        } catch (NotJsonException e) {
            Problems.write(ctx, ProblemDocument.notJson(e.problem()));
            return Optional.empty();
        }
    }

    static void tooLarge(Context ctx, int most) {
        Problems.plain(ctx, 413, "too-large", "The body is too large", "At most " + size(most) + " are read here.");
    }

    private static String size(int bytes) {
        int mebibyte = 1024 * 1024;
        return bytes % mebibyte == 0 ? bytes / mebibyte + " MiB" : bytes / 1024 + " KiB";
    }

    private static boolean isJson(String contentType) {
        if (contentType == null) {
            return false;
        }
        String type = contentType.split(";", 2)[0].strip().toLowerCase(Locale.ROOT);
        return type.equals("application/json") || type.startsWith("application/") && type.endsWith("+json");
    }
}
