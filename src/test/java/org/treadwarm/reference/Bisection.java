package org.treadwarm.reference;

import java.util.function.DoublePredicate;
import java.util.function.DoubleUnaryOperator;

/** Roots by halving until two neighbouring doubles enclose them. */
final class Bisection {
    private Bisection() {}

    /** Where a rising function reaches a value, between two ends that enclose it. */
    static double whereReached(DoubleUnaryOperator rising, double value, double low, double high) {
        return firstHolding(argument -> rising.applyAsDouble(argument) >= value, low, high);
    }

    /** The lowest argument for which a condition holds that fails at the low end and holds at the high end. */
    static double firstHolding(DoublePredicate condition, double low, double high) {
        double fails = low;
        double holds = high;
        double middle = (fails + holds) / 2;
        // The width is a floor for roots at zero, where halving would go on through the subnormal numbers.
        while (fails < middle && middle < holds && holds - fails > 1e-18) {
            if (condition.test(middle)) {
                holds = middle;
            } else {
                fails = middle;
            }
            middle = (fails + holds) / 2;
        }
        return holds;
    }
}
