package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import java.util.Locale;
import java.util.Optional;
import java.util.regex.Pattern;
import org.treadwarm.intake.Document;
import org.treadwarm.intake.NotJsonException;
import org.treadwarm.web.Drain;
import org.treadwarm.web.Problems;
import org.treadwarm.web.csv.TableFile;
import org.treadwarm.wire.ProblemDocument;

/** Reads bodies within their limits. */
final class Bodies {
    /** The largest body of a sizing, bytes. */
    static final int SIZING = 2 * 1024 * 1024;

    /** The largest body of a job, bytes. */
    static final int JOB = 16 * 1024 * 1024;

    private static final Pattern UTF_8_TABLE = Pattern.compile(
            "text/csv(\\s*;\\s*(charset\\s*=\\s*\"?utf-?8\"?|header\\s*=\\s*present))*\\s*;?",
            Pattern.CASE_INSENSITIVE);

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
        Optional<byte[]> body = bytes(ctx, most);
        if (body.isEmpty()) {
            return Optional.empty();
        }
        try {
            return Optional.of(Document.read(body.get()));
        } catch (NotJsonException e) {
            Problems.write(ctx, ProblemDocument.notJson(e.problem()));
            return Optional.empty();
        }
    }

    /** A table as text; empty when the refusal has been written already. */
    static Optional<String> table(Context ctx) {
        if (!isUtf8Table(ctx.contentType())) {
            Problems.plain(
                    ctx,
                    415,
                    "media-type",
                    "The body is not declared as CSV in UTF-8",
                    "Send it with \"Content-Type: text/csv\"; a charset, if named, is utf-8.");
            return Optional.empty();
        }
        Optional<byte[]> body = bytes(ctx, TableFile.LARGEST);
        Optional<String> text = body.flatMap(TableFile::text);
        if (body.isPresent() && text.isEmpty()) {
            Problems.plain(
                    ctx,
                    400,
                    "not-utf-8",
                    "The table is no text in UTF-8",
                    "It holds bytes that UTF-8 does not have. " + TableFile.HOW_TO_SAVE);
        }
        return text;
    }

    private static Optional<byte[]> bytes(Context ctx, int most) {
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
        return Optional.of(body);
    }

    static void tooLarge(Context ctx, int most) {
        Problems.plain(ctx, 413, "too-large", "The body is too large", "At most " + size(most) + " are read here.");
    }

    private static String size(int bytes) {
        int mebibyte = 1024 * 1024;
        return bytes % mebibyte == 0 ? bytes / mebibyte + " MiB" : bytes / 1024 + " KiB";
    }

    private static boolean isUtf8Table(String contentType) {
        return contentType != null && UTF_8_TABLE.matcher(contentType.strip()).matches();
    }

    private static boolean isJson(String contentType) {
        if (contentType == null) {
            return false;
        }
        String type = contentType.split(";", 2)[0].strip().toLowerCase(Locale.ROOT);
        return type.equals("application/json") || type.startsWith("application/") && type.endsWith("+json");
    }
}
