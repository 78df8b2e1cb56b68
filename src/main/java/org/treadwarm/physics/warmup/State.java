package org.treadwarm.physics.warmup;

/**
 * The temperatures of every node of one {@link WarmUp}, and the heat of the heater that goes with them.
 */
public final class State {
    private final double density;
    private final double[] temperatures;

    State(double density, double[] temperatures) {
        this.density = density;
        this.temperatures = temperatures;
    }

    /** Heat of the heater that holds this state, or 0 where it is not held, W/m². */
    public double density() {
        return density;
    }

    double[] temperatures() {
        return temperatures;
    }
}
