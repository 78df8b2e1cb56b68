package org.treadwarm.intake;

import org.treadwarm.units.Declared;
import org.treadwarm.units.Numbers;

/** The possible range of a declared quantity, as a test and as words. */
public final class Ranges {
    private Ranges() {}

    /** Whether an SI value is possible. */
    public static boolean possible(double value, Declared declared) {
        return Double.isFinite(value)
                && (declared.moreThanMin() ? value > declared.min() : value >= declared.min())
                && (declared.lessThanMax() ? value < declared.max() : value <= declared.max());
    }

    /** The possible range in words, in the SI unit. */
    public static String words(Declared declared) {
        String unit =
                declared.kind().siUnit().isEmpty() ? "" : " " + declared.kind().siUnit();
        String from = (declared.moreThanMin() ? "more than " : "at least ") + number(declared.min()) + unit;
        String to = (declared.lessThanMax() ? "less than " : "at most ") + number(declared.max()) + unit;
        return from + ", " + to + (declared.whole() ? ", a whole number" : "");
    }

    private static String number(double value) {
        return Math.abs(value) >= 10000 && value == Math.rint(value)
                ? Numbers.grouped(value)
                : Numbers.significant(value, 6);
    }
}
