package org.treadwarm.physics.warmup;

/**
 * A layer at one temperature throughout behind one film: closed forms to hold the numerical solution against. They hold where the
 * layer's own resistance is small beside the film's.
 *
 * @param capacity J/(m²·K), more than 0
 * @param coefficient of the film, W/(m²·K), more than 0
 */
public record LumpedLayer(double capacity, double coefficient) {
    /** Throws IllegalArgumentException when a number is not finite and more than 0. */
    public LumpedLayer {
        Require.positive("heat capacity", capacity);
        Require.positive("coefficient", coefficient);
    }

    /** Time constant tau = C/h, s. */
    public double timeConstant() {
        return capacity / coefficient;
    }

    /** What is left of a difference to the surroundings after a time, K. */
    public double left(double difference, double seconds) {
        return difference * Math.exp(-seconds / timeConstant());
    }

    /** Rise above the surroundings after a time under a flux, K. */
    public double rise(double flux, double seconds) {
        return -flux / coefficient * Math.expm1(-seconds / timeConstant());
    }
}
