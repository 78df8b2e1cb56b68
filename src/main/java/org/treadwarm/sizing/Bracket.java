package org.treadwarm.sizing;

import java.util.function.DoubleUnaryOperator;

/** Finds where a rising function reaches nothing between two points. */
final class Bracket {
    private static final int MOST_STEPS = 200;

    private Bracket() {}

    /**
     * The secant through both ends of a bracket; an end that stays is given half its weight, so that it does not stay for ever.
     *
     * @param function rising, at most 0 at the lower end and at least 0 at the upper
     * @return the last point found at which it is 0 or less, to 1e-12 of the upper end
     */
    static double root(DoubleUnaryOperator function, double from, double to) {
        double low = from;
        double high = to;
        double atLow = function.applyAsDouble(low);
        double atHigh = function.applyAsDouble(high);
        int kept = 0;
        for (int step = 0; step < MOST_STEPS && high - low > 1e-12 * high; step++) {
            double next = high - atHigh * (high - low) / (atHigh - atLow);
            if (!(next > low && next < high)) {
                next = (low + high) / 2;
            }
            double atNext = function.applyAsDouble(next);
            if (atNext == 0) {
                return next;
            }
            if (atNext < 0) {
                low = next;
                atLow = atNext;
                atHigh = kept > 0 ? atHigh / 2 : atHigh;
                kept = 1;
            } else {
                high = next;
                atHigh = atNext;
                atLow = kept < 0 ? atLow / 2 : atLow;
                kept = -1;
            }
        }
        return low;
    }
}
