package org.treadwarm.web;

import io.javalin.http.Context;
import jakarta.servlet.MultipartConfigElement;
import jakarta.servlet.ServletException;
import jakarta.servlet.http.Part;
import java.io.IOException;
import java.util.Optional;
import java.util.OptionalInt;

/**
 * Forms that bring files (RFC 7578). All of it stays in memory, within the limit of every other body, so that nothing of a
 * visitor's is left on a disk.
 */
public final class Multipart {
    private static final String SETTING = "org.eclipse.jetty.multipartConfig";
    private static final String NO_FOLDER = "";

    private Multipart() {}

    /** Whether the request brings such a form. */
    public static boolean isSent(Context ctx) {
        return ctx.isMultipartFormData();
    }

    /** Reads the form; afterwards its fields can be asked for like those of others. The status of the refusal, if it cannot. */
    public static OptionalInt refusal(Context ctx) {
        if (ctx.req().getContentLengthLong() > Server.LARGEST_BODY) {
            return OptionalInt.of(413);
        }
        long most = Server.LARGEST_BODY;
        ctx.req().setAttribute(SETTING, new MultipartConfigElement(NO_FOLDER, most, most, (int) most));
        try {
            ctx.req().getParts();
            return OptionalInt.empty();
        } catch (IOException | ServletException | RuntimeException e) {
            // the server ends such a connection; a caller that is not told sends its next request into nothing
            ctx.header("Connection", "close");
            return OptionalInt.of(400);
        }
    }

    /**
     * The bytes of the file that was chosen in a field of the form; empty when none was.
     *
     * @throws IllegalStateException when the form was not read before
     */
    public static Optional<byte[]> file(Context ctx, String field) {
        try {
            Part part = ctx.req().getPart(field);
            String name = part == null ? null : part.getSubmittedFileName();
            return name == null || name.isEmpty()
                    ? Optional.empty()
                    : Optional.of(part.getInputStream().readAllBytes());
        } catch (IOException | ServletException e) {
            throw new IllegalStateException("the form was not read before", e);
        }
    }
}
