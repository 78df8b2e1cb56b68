package org.treadwarm.draw;

import java.util.OptionalDouble;

/** Refuses numbers that cannot be drawn. */
final class Checks {
    /** Far beyond any heat or temperature in a building, yet safe to print and to scale. */
    private static final double LARGEST = 1e6;

    private Checks() {}

    static double drawable(String what, double value) {
        if (!(Math.abs(value) <= LARGEST)) {
            throw new IllegalArgumentException(what + " cannot be drawn: " + value);
        }
        return value;
    }

    static double notNegative(String what, double value) {
        if (drawable(what, value) < 0) {
            throw new IllegalArgumentException(what + " must not be negative: " + value);
        }
        return value;
    }

    static void positive(String what, double value) {
        if (drawable(what, value) <= 0) {
            throw new IllegalArgumentException(what + " must be above 0, not " + value);
        }
    }

    static void within(String what, double value, double least, double most) {
        if (!(value >= least && value <= most)) {
            throw new IllegalArgumentException(what + " is " + least + " to " + most + ", not " + value);
        }
    }

    /** In °C, above absolute zero and below any fire. */
    static void temperature(String what, double value) {
        if (!(value >= -273.15 && value <= 1000)) {
            throw new IllegalArgumentException(what + " cannot be drawn: " + value);
        }
    }

    static void drawable(String what, OptionalDouble value) {
        value.ifPresent(number -> drawable(what, number));
    }
}
