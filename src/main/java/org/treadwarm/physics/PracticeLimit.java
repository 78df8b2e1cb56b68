package org.treadwarm.physics;

/**
 * A limit that practice sets, with where it was read.
 *
 * @param name the quantity that is limited
 * @param sense from which side
 * @param limit its value, SI units and degrees Celsius
 * @param source where it was read, or "common practice, no source"
 */
public record PracticeLimit(String name, Sense sense, double limit, String source) {
    /** From which side a limit limits. */
    public enum Sense {
        /** The value may not exceed it. */
        AT_MOST,
        /** The value may not fall short of it. */
        AT_LEAST
    }

    /**
     * A value beside its limit.
     *
     * @param name the quantity
     * @param sense from which side the limit limits
     * @param limit the limit
     * @param value the value
     * @param margin what is left up to the limit; negative when the value is beyond it
     * @param source where the limit was read
     */
    public record Judged(String name, Sense sense, double limit, double value, double margin, String source) {
        /** Whether the value keeps the limit. */
        public boolean keeps() {
            return margin >= 0;
        }
    }

    /** The value beside this limit. */
    public Judged judge(double value) {
        double margin = sense == Sense.AT_MOST ? limit - value : value - limit;
        return new Judged(name, sense, limit, value, margin, source);
    }
}
