package org.treadwarm.physics.section;

/** Refuses numbers that make no section. */
final class Require {
    private Require() {}

    static void positive(String what, double value) {
        if (!(value > 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(what + ", must be more than 0, not " + value);
        }
    }

    static void notNegative(String what, double value) {
        if (!(value >= 0) || Double.isInfinite(value)) {
            throw new IllegalArgumentException(what + ", must be at least 0, not " + value);
        }
    }

    static void finite(String what, double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException(what + ", must be a number, not " + value);
        }
    }

    static void that(boolean holds, String otherwise) {
        if (!holds) {
            throw new IllegalArgumentException(otherwise);
        }
    }
}
