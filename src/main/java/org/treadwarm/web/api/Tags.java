package org.treadwarm.web.api;

import io.javalin.http.Context;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;
import org.treadwarm.web.Problems;

/** Entity tags as RFC 9110 has them: what a change was made from. */
final class Tags {
    private Tags() {}

    /** A tag in its quotes. */
    static String quoted(String tag) {
        return "\"" + tag + "\"";
    }

    /** The tags that the header If-Match lets pass; empty when it is missing and the refusal has been written already. */
    static Optional<Predicate<String>> expected(Context ctx, String whose) {
        String match = ctx.header("If-Match");
        if (match == null || match.isBlank()) {
            Problems.plain(
                    ctx,
                    428,
                    "if-match",
                    "The version that was changed is not named",
                    "Send the ETag of the " + whose + " in the header If-Match, so that nobody's work is overwritten.");
            return Optional.empty();
        }
        return Optional.of(matching(match));
    }

    /** Weak tags never match. */
    static Predicate<String> matching(String match) {
        if (match.strip().equals("*")) {
            return tag -> true;
        }
        List<String> tags = new ArrayList<>();
        for (String each : match.split(",", -1)) {
            String tag = each.strip();
            if (tag.length() > 2 && tag.startsWith("\"") && tag.endsWith("\"")) {
                tags.add(tag.substring(1, tag.length() - 1));
            }
        }
        return tags::contains;
    }
}
