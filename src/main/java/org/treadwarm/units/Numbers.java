package org.treadwarm.units;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;

/** Numbers as text for people: rounding belongs to a page, and this is the one place that rounds. */
public final class Numbers {
    private Numbers() {}

    /** A number with a fixed count of decimals, halves away from zero, never "-0"; ∞ for an infinite one. */
    public static String fixed(double number, int decimals) {
        if (Double.isInfinite(number)) {
            return infinite(number);
        }
        BigDecimal rounded = new BigDecimal(Double.toString(number)).setScale(decimals, RoundingMode.HALF_UP);
        if (rounded.signum() == 0) {
            rounded = BigDecimal.ZERO.setScale(decimals);
        }
        return rounded.toPlainString();
    }

    /** A number with a count of significant digits and no trailing zeros; ∞ for an infinite one. */
    public static String significant(double number, int digits) {
        if (Double.isInfinite(number)) {
            return infinite(number);
        }
        if (number == 0) {
            return "0";
        }
        BigDecimal rounded =
                new BigDecimal(Double.toString(number)).round(new MathContext(digits, RoundingMode.HALF_UP));
        return rounded.stripTrailingZeros().toPlainString();
    }

    private static String infinite(double number) {
        return number > 0 ? "∞" : "-∞";
    }

    /** A whole number with a space between thousands; ∞ for an infinite one. */
    public static String grouped(double number) {
        if (Double.isInfinite(number)) {
            return infinite(number);
        }
        String digits = fixed(Math.abs(number), 0);
        StringBuilder text = new StringBuilder(digits);
        for (int i = digits.length() - 3; i > 0; i -= 3) {
            text.insert(i, ' ');
        }
        return number < 0 && !digits.equals("0") ? "-" + text : text.toString();
    }

    /** A unit as print has it: raised exponents and a dot for the product. */
    public static String printed(String unit) {
        return unit.replace("m2", "m²").replace("m3", "m³").replace('.', '·');
    }
}
