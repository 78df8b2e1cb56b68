package org.treadwarm.draw;

/**
 * Where the runs are fed or controlled from.
 *
 * @param kind what is marked
 * @param x distance from the room's left wall in m, not negative
 * @param y distance from the room's upper wall, as drawn, in m, not negative
 */
public record PlanMark(Kind kind, double x, double y) {
    /** What can be marked. */
    public enum Kind {
        MANIFOLD("M", "manifold"),
        THERMOSTAT("T", "thermostat");

        private final String letter;
        private final String words;

        Kind(String letter, String words) {
            this.letter = letter;
            this.words = words;
        }

        String letter() {
            return letter;
        }

        String words() {
            return words;
        }
    }

    /** @throws IllegalArgumentException if it lies outside */
    public PlanMark {
        Checks.notNegative("Place of the " + kind.words(), x);
        Checks.notNegative("Place of the " + kind.words(), y);
    }
}
