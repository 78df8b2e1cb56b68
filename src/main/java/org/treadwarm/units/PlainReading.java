package org.treadwarm.units;

import java.util.Optional;

/**
 * The reading that nearly every reading is: one decimal number of at most 15 digits and one unit, as in {@code 3.2 m}. Means
 * what {@link ReadingParser} makes of it, in one look; everything else is left to that.
 */
final class PlainReading {
    /** A whole number of so many digits is exact as a double, and so is each power of ten below; hence their quotient is the nearest double. */
    private static final int MOST_DIGITS = 15;

    private static final double[] POWERS_OF_TEN = {
        1, 1e1, 1e2, 1e3, 1e4, 1e5, 1e6, 1e7, 1e8, 1e9, 1e10, 1e11, 1e12, 1e13, 1e14, 1e15
    };

    private PlainReading() {}

    /** The reading in a text, when it is a plain one. */
    static Optional<Reading> in(String text, QuantityKind kind) {
        int length = text.length();
        boolean negative = length > 0 && text.charAt(0) == '-';
        int start = negative ? 1 : 0;
        int at = start;
        int mark = -1;
        long digits = 0;
        for (; at < length; at++) {
            char c = text.charAt(at);
            if (ReadingScanner.isDigit(c)) {
                digits = 10 * digits + (c - '0');
            } else if ((c == '.' || c == ',') && mark < 0 && at > start) {
                mark = at;
            } else {
                break;
            }
            if (at - start > MOST_DIGITS) {
                return Optional.empty();
            }
        }
        int decimals = mark < 0 ? 0 : at - mark - 1;
        if (at == start || mark >= 0 && decimals == 0 || at - start > MOST_DIGITS) {
            return Optional.empty();
        }
        double number = digits / POWERS_OF_TEN[decimals];
        return inUnit(text, at, negative ? -number : number, kind);
    }

    private static Optional<Reading> inUnit(String text, int end, double number, QuantityKind kind) {
        int at = end;
        while (at < text.length() && text.charAt(at) == ' ') {
            at++;
        }
        if (at == text.length()) {
            return kind == QuantityKind.RATIO ? Optional.of(reading(number, text)) : Optional.empty();
        }
        Optional<Unit> unit = UnitTable.asWritten(kind, text, at);
        return unit.isPresent() ? Optional.of(reading(unit.get().toSi(number), text)) : Optional.empty();
    }

    private static Reading reading(double value, String text) {
        // Adding 0 makes 0 of -0, as a sum of terms does.
        return new Reading(value + 0.0, 0, text, Optional.empty());
    }
}
