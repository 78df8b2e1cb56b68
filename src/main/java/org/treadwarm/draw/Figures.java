package org.treadwarm.draw;

import java.math.BigDecimal;
import java.math.RoundingMode;

/** Writes numbers as a drawing shows them: rounded half up, a true minus sign, the unit held on the same line. */
final class Figures {
    private static final String JOIN = "\u00a0";

    /** So near to the middle between two hundredths the digits decide how to round. */
    private static final double HARDLY = 1e-6;

    private Figures() {}

    /** Whole watts, such as "340 W". */
    static String watts(double watts) {
        return rounded(watts, 0) + JOIN + "W";
    }

    /** W/m² with one decimal. */
    static String flux(double flux) {
        return rounded(flux, 1) + JOIN + "W/m²";
    }

    /** °C with one decimal. */
    static String celsius(double temperature) {
        return degrees(temperature) + JOIN + "°C";
    }

    /** One decimal without the unit, for rows whose heading names it. */
    static String degrees(double temperature) {
        return rounded(temperature, 1);
    }

    /** m²K/W with two decimals. */
    static String resistance(double resistance) {
        return "R" + JOIN + rounded(resistance, 2) + JOIN + "m²K/W";
    }

    /** Millimetres from metres; one decimal where a whole millimetre would hide it. */
    static String thickness(double metres) {
        double millimetres = metres * 1000;
        boolean whole = rounded(millimetres, 1).endsWith(".0");
        return rounded(millimetres, whole ? 0 : 1) + JOIN + "mm";
    }

    /** Hours and whole minutes from hours, such as "2 h 40 min"; whole hours from two days on. */
    static String duration(double hours) {
        long minutes = decimal(hours * 60).setScale(0, RoundingMode.HALF_UP).longValueExact();
        if (minutes >= 48 * 60) {
            return rounded(hours, 0) + JOIN + "h";
        }
        String whole = minutes / 60 + JOIN + "h";
        String rest = minutes % 60 + JOIN + "min";
        return minutes < 60 ? rest : minutes % 60 == 0 ? whole : whole + JOIN + rest;
    }

    /** Metres with two decimals. */
    static String metres(double metres) {
        return rounded(metres, 2) + JOIN + "m";
    }

    /** Whole percent from a fraction; a share that would round to nothing is said to be under 1 %. */
    static String percent(double fraction) {
        if (fraction > 0 && fraction < 0.005) {
            return "under" + JOIN + "1" + JOIN + "%";
        }
        return rounded(fraction * 100, 0) + JOIN + "%";
    }

    static String rounded(double value, int decimals) {
        BigDecimal number = decimal(value).setScale(decimals, RoundingMode.HALF_UP);
        return number.signum() < 0
                ? "\u2212" + number.negate().toPlainString()
                : number.abs().toPlainString();
    }

    /** A coordinate with at most two decimals, in the notation of SVG. */
    static String coordinate(double value) {
        StringBuilder text = new StringBuilder(8);
        coordinate(text, value);
        return text.toString();
    }

    /** Appends a coordinate with at most two decimals, in the notation of SVG. */
    static void coordinate(StringBuilder text, double value) {
        double hundredths = 100 * Math.abs(Checks.drawable("The number", value));
        double below = Math.floor(hundredths);
        double rest = hundredths - below;
        if (Math.abs(rest - 0.5) < HARDLY) {
            BigDecimal number = decimal(value).setScale(2, RoundingMode.HALF_UP);
            text.append(number.signum() == 0 ? "0" : number.stripTrailingZeros().toPlainString());
            return;
        }
        long rounded = (long) below + (rest > 0.5 ? 1 : 0);
        if (value < 0 && rounded > 0) {
            text.append('-');
        }
        text.append(rounded / 100);
        long decimals = rounded % 100;
        if (decimals > 0) {
            text.append('.').append(decimals / 10);
        }
        if (decimals % 10 > 0) {
            text.append(decimals % 10);
        }
    }

    /** By way of the shortest decimal text, so that 0.125 given as 0.125 rounds as a person would round it. */
    private static BigDecimal decimal(double value) {
        return BigDecimal.valueOf(Checks.drawable("The number", value));
    }
}
