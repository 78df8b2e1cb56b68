package org.treadwarm.web.api;

import io.javalin.http.Context;
import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.util.Base64;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.treadwarm.web.Problems;

/**
 * Which part of a list a request asks for: {@code limit} says how many, {@code cursor} where to go on. A cursor is a text of
 * ours that clients hand back as it is.
 *
 * @param limit 1 to 200
 * @param after where to go on; empty for the first part
 */
record Paging(String list, int limit, Optional<Cursor> after) {
    private static final Set<String> FILTERS = Set.of("find", "archived");
    private static final int USUAL = 100;
    private static final int MOST = 200;
    private static final int LONGEST_CURSOR = 200;

    /** The parts of a cursor, counted from 1. */
    record Cursor(Matcher parts) {
        String text(int part) {
            return parts.group(part);
        }

        long number(int part) {
            return Long.parseLong(parts.group(part));
        }

        Instant instant(int part) {
            return Instant.ofEpochMilli(number(part));
        }
    }

    /**
     * What a request asks for; empty when the refusal has been written already.
     *
     * @param form what a cursor of this list looks like: the list's name and the parts as groups
     */
    static Optional<Paging> of(Context ctx, Pattern form) {
        Optional<String> garbled = garbled(ctx);
        if (garbled.isPresent()) {
            refuse(ctx, shortened(garbled.get()) + " is not encoded as an address needs it (RFC 3986, 2.1).");
            return Optional.empty();
        }
        String limit = Optional.ofNullable(ctx.queryParam("limit")).orElse(Integer.toString(USUAL));
        if (!limit.matches("[0-9]{1,3}") || Integer.parseInt(limit) < 1 || Integer.parseInt(limit) > MOST) {
            refuse(ctx, "limit is a whole number of 1 to " + MOST + ", not \"" + shortened(limit) + "\".");
            return Optional.empty();
        }
        String name = form.pattern().substring(0, form.pattern().indexOf(' '));
        String given = ctx.queryParam("cursor");
        if (given == null) {
            return Optional.of(new Paging(name, Integer.parseInt(limit), Optional.empty()));
        }
        Matcher parts = form.matcher(decoded(given));
        if (!parts.matches()) {
            refuse(
                    ctx,
                    "cursor is a text from the \"next\" of an answer of this list, not \"" + shortened(given)
                            + "\". If it was given before the program was renewed, begin the list again.");
            return Optional.empty();
        }
        return Optional.of(new Paging(name, Integer.parseInt(limit), Optional.of(new Cursor(parts))));
    }

    /** A parameter whose value cannot be decoded; taken for left out, it would ask for something else. */
    private static Optional<String> garbled(Context ctx) {
        return ctx.queryParamMap().entrySet().stream()
                .filter(parameter -> parameter.getValue().isEmpty())
                .map(Map.Entry::getKey)
                .findFirst();
    }

    private static void refuse(Context ctx, String detail) {
        Problems.plain(ctx, 400, "query", "This part of the list cannot be asked for", detail);
    }

    private static String shortened(String text) {
        return text.length() <= 40 ? text : text.substring(0, 39) + "…";
    }

    private static String decoded(String cursor) {
        try {
            return cursor.length() > LONGEST_CURSOR
                    ? ""
                    : new String(Base64.getUrlDecoder().decode(cursor), StandardCharsets.US_ASCII);
        } catch (IllegalArgumentException noCursor) {
            return "";
        }
    }

    /** The address of the part after the one that ends so, with everything else that was asked for. */
    String next(Context ctx, Object... last) {
        String plain = Stream.concat(Stream.of(list), Stream.of(last).map(Object::toString))
                .collect(Collectors.joining(" "));
        String cursor =
                Base64.getUrlEncoder().withoutPadding().encodeToString(plain.getBytes(StandardCharsets.US_ASCII));
        String others = ctx.queryParamMap().entrySet().stream()
                .filter(parameter -> FILTERS.contains(parameter.getKey()))
                .map(parameter -> parameter.getKey() + "="
                        + URLEncoder.encode(parameter.getValue().get(0), StandardCharsets.UTF_8) + "&")
                .collect(Collectors.joining());
        String address = ctx.path() + "?" + others + "limit=" + limit + "&cursor=" + cursor;
        ctx.header("Link", "<" + address + ">; rel=\"next\"");
        return address;
    }
}
