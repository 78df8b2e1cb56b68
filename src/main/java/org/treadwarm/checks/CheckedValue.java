package org.treadwarm.checks;

/**
 * One expected number and what the program makes of it. Numbers are in the units of the case, SI unless its name says
 * otherwise.
 *
 * @param caseId the case, unique over all files
 * @param what name of the number in its case
 * @param standard standard or subject it belongs to
 * @param clause clause, table or circumstances; may be empty
 * @param source where the number, or what it was derived from, can be found
 * @param confidence how far the expected number can be trusted
 * @param expected the published number
 * @param got the program's number
 * @param tolerance largest absolute deviation that passes, at least 0
 */
public record CheckedValue(
        String caseId,
        String what,
        String standard,
        String clause,
        String source,
        Confidence confidence,
        double expected,
        double got,
        double tolerance) {
    /** What the program gives less what is published. */
    public double deviation() {
        return got - expected;
    }

    /** Whether the deviation lies within the tolerance; never for a number that is none. */
    public boolean passes() {
        return Math.abs(deviation()) <= tolerance;
    }
}
