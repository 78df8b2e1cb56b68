package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.JsonNode;
import io.javalin.http.Context;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import java.util.TreeSet;
import org.treadwarm.store.Sheets;
import org.treadwarm.survey.Pointer;
import org.treadwarm.survey.Problem;
import org.treadwarm.web.Problems;

/** Reads the bodies of requests about sheets. */
final class SheetBodies {
    private static final int LARGEST = 64 * 1024;

    private SheetBodies() {}

    /** What is to be issued. */
    record Order(long revision, Optional<String> replaces) {}

    /** The order in the body; empty when the refusal has been written already. */
    static Optional<Order> order(Context ctx) {
        Optional<JsonNode> tree = read(ctx, Set.of("revision", "replaces"), SheetBodies::orderProblems);
        return tree.map(body -> new Order(
                body.get("revision").longValue(),
                Optional.ofNullable(body.get("replaces")).map(JsonNode::textValue)));
    }

    private static List<Problem> orderProblems(JsonNode body) {
        List<Problem> problems = new ArrayList<>();
        JsonNode revision = body.path("revision");
        if (!revision.isIntegralNumber() || !revision.canConvertToLong() || revision.longValue() < 1) {
            problems.add(new Problem(
                    "/revision", given(revision), "the revision to issue is missing", "a whole number from 1"));
        }
        JsonNode replaces = body.path("replaces");
        if (!replaces.isMissingNode() && !(replaces.isTextual() && isNumber(replaces.textValue()))) {
            problems.add(new Problem(
                    "/replaces", given(replaces), "this is no number of a sheet", "a number such as 2026-0001"));
        }
        return problems;
    }

    /** The reason in the body; empty when the refusal has been written already. */
    static Optional<String> reason(Context ctx) {
        return read(ctx, Set.of("reason"), SheetBodies::reasonProblems)
                .map(body -> body.get("reason").textValue().strip());
    }

    private static List<Problem> reasonProblems(JsonNode body) {
        JsonNode reason = body.path("reason");
        boolean good = reason.isTextual()
                && !reason.textValue().isBlank()
                && reason.textValue().strip().length() <= Sheets.LONGEST_REASON
                && reason.textValue().indexOf('\0') < 0;
        return good
                ? List.of()
                : List.of(new Problem(
                        "/reason",
                        given(reason),
                        "the reason for withdrawing is missing or cannot be used",
                        "1 to " + Sheets.LONGEST_REASON + " characters"));
    }

    /** Whether a text has the form of a sheet's number. */
    static boolean isNumber(String text) {
        return text.matches("[0-9]{4}-[0-9]{4,9}");
    }

    @FunctionalInterface
    private interface Check {
        List<Problem> problems(JsonNode body);
    }

    private static Optional<JsonNode> read(Context ctx, Set<String> keys, Check check) {
        Optional<JsonNode> tree = Bodies.read(ctx, LARGEST);
        if (tree.isEmpty()) {
            return tree;
        }
        List<Problem> problems = new ArrayList<>(check.problems(tree.get()));
        String allowed = String.join(", ", new TreeSet<>(keys));
        for (Iterator<String> names = tree.get().fieldNames(); names.hasNext(); ) {
            String name = names.next();
            if (!keys.contains(name)) {
                problems.add(new Problem(Pointer.to("", name), shortened(name), "this is no key here", allowed));
            }
        }
        if (!problems.isEmpty()) {
            Problems.invalid(ctx, problems);
            return Optional.empty();
        }
        return tree;
    }

    private static String given(JsonNode node) {
        return node.isMissingNode() ? "nothing" : shortened(node.toString());
    }

    private static String shortened(String text) {
        return text.length() <= 100 ? text : text.substring(0, 99) + "…";
    }
}
