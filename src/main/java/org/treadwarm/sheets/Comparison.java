package org.treadwarm.sheets;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import org.treadwarm.sheets.Verification.Difference;
import org.treadwarm.survey.Pointer;

/**
 * Two answers beside each other.
 *
 * @param compared how many values both have
 * @param differences values that differ, in order of address
 * @param added addresses of objects' fields that only the second has
 */
record Comparison(int compared, List<Difference> differences, List<String> added) {
    static final Comparison NOTHING_COMPARED = new Comparison(0, List.of(), List.of());

    /** The largest difference of two equal numbers, as a share of the larger one. */
    private static final double TOLERANCE = 1e-9;

    static Comparison of(JsonNode issued, JsonNode today) {
        Walk walk = new Walk();
        walk.compare("", issued, today);
        return new Comparison(walk.compared, List.copyOf(walk.differences), List.copyOf(walk.added));
    }

    private static final class Walk {
        private final List<Difference> differences = new ArrayList<>();
        private final List<String> added = new ArrayList<>();
        private int compared;

        void compare(String address, JsonNode issued, JsonNode today) {
            if (issued.isObject() && today.isObject()) {
                objects(address, issued, today);
            } else if (issued.isArray() && today.isArray()) {
                for (int i = 0; i < Math.max(issued.size(), today.size()); i++) {
                    compare(Pointer.to(address, i), issued.path(i), today.path(i));
                }
            } else {
                compared++;
                if (!same(issued, today)) {
                    differences.add(new Difference(address, shown(issued), shown(today)));
                }
            }
        }

        private void objects(String address, JsonNode issued, JsonNode today) {
            Set<String> names = new TreeSet<>();
            issued.fieldNames().forEachRemaining(names::add);
            today.fieldNames().forEachRemaining(names::add);
            for (String name : names) {
                String at = Pointer.to(address, name);
                if (issued.has(name)) {
                    compare(at, issued.get(name), today.path(name));
                } else {
                    added.add(at);
                }
            }
        }

        private static boolean same(JsonNode issued, JsonNode today) {
            if (!issued.isNumber() || !today.isNumber()) {
                return issued.equals(today);
            }
            double a = issued.doubleValue();
            double b = today.doubleValue();
            return Math.abs(a - b) <= TOLERANCE * Math.max(Math.abs(a), Math.abs(b));
        }

        private static String shown(JsonNode node) {
            if (node instanceof MissingNode) {
                return "nothing";
            }
            return node.isContainerNode() ? node.isArray() ? "a list" : "an object" : node.toString();
        }
    }
}
