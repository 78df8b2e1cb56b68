package org.treadwarm.checks;

import java.util.List;

/**
 * A published case.
 *
 * @param id unique over all files
 * @param standard standard or subject it belongs to
 * @param clause clause, table or circumstances; may be empty
 * @param confidence how far the expected numbers can be trusted
 * @param confidenceWording the original words about that; empty where the word of {@code confidence} says it all
 * @param source title and address
 * @param inputs what the numbers follow from
 * @param expected the expected numbers, in the order of the file
 * @param leftOut published numbers of the case that are not checked, with the reasons
 * @param note what else to know; may be empty
 */
public record CheckCase(
        String id,
        String standard,
        String clause,
        Confidence confidence,
        String confidenceWording,
        String source,
        Inputs inputs,
        List<Expected> expected,
        List<LeftOut> leftOut,
        String note) {
    public CheckCase {
        expected = List.copyOf(expected);
        leftOut = List.copyOf(leftOut);
    }

    /**
     * One expected number.
     *
     * @param name name of the number, or of the list it is in
     * @param index its place in that list, from 0
     * @param count length of that list; 1 for a number of its own
     * @param value the published number
     * @param tolerance largest absolute deviation
     */
    public record Expected(String name, int index, int count, double value, double tolerance) {
        /** The name of the number alone. */
        public String what() {
            return count == 1 ? name : name + " (" + (index + 1) + " of " + count + ")";
        }
    }
}
