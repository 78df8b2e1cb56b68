package org.treadwarm.physics.warmup;

/** What arguments must be. */
final class Require {
    private Require() {}

    static void positive(String what, double value) {
        if (!(value > 0 && Double.isFinite(value))) {
            throw new IllegalArgumentException(what + " is " + value + "; it must be finite and more than 0");
        }
    }

    static void atLeastZero(String what, double value) {
        if (!(value >= 0 && Double.isFinite(value))) {
            throw new IllegalArgumentException(what + " is " + value + "; it must be finite and at least 0");
        }
    }

    static void finite(String what, double value) {
        if (!Double.isFinite(value)) {
            throw new IllegalArgumentException(what + " is " + value + "; it must be finite");
        }
    }
}
