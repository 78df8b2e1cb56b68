package org.treadwarm.web;

import io.javalin.http.Context;
import java.util.HexFormat;
import java.util.Optional;
import java.util.concurrent.ThreadLocalRandom;
import java.util.regex.Pattern;
import org.slf4j.MDC;

/**
 * Every request has an id: the caller's, if it has the form of one, else a random one. It stands in the answer's headers, in
 * every problem document and in every line of the log that is written meanwhile.
 */
final class RequestIds {
    /** The header, in requests and answers. */
    static final String HEADER = "X-Request-Id";

    /** Its name in the log. */
    static final String LOGGED = "request";

    private static final String ATTRIBUTE = "request-id";

    // What begins like an API key might be one, sent in the wrong header.
    private static final Pattern ALLOWED = Pattern.compile("(?!tw_)[A-Za-z0-9_-]{8,64}");

    private static final HexFormat HEX = HexFormat.of();

    private RequestIds() {}

    /** Gives a request its id. */
    static void begin(Context ctx) {
        String id = of(Optional.ofNullable(ctx.header(HEADER)));
        ctx.attribute(ATTRIBUTE, id);
        ctx.header(HEADER, id);
        MDC.put(LOGGED, id);
    }

    /** Ends that lines of the log carry it. */
    static void end() {
        MDC.remove(LOGGED);
    }

    /** The id of a request; empty if it never began. */
    static Optional<String> id(Context ctx) {
        return Optional.ofNullable(ctx.attribute(ATTRIBUTE));
    }

    /** The id for a request with this header. */
    static String of(Optional<String> given) {
        return given.filter(id -> ALLOWED.matcher(id).matches()).orElseGet(RequestIds::random);
    }

    private static String random() {
        ThreadLocalRandom random = ThreadLocalRandom.current();
        return HEX.toHexDigits(random.nextLong()) + HEX.toHexDigits(random.nextLong());
    }
}
