package org.treadwarm.physics.warmup;

/** What lies below the lowest layer. */
public sealed interface Underside {
    /** No heat passes. */
    record Adiabatic() implements Underside {}

    /**
     * A film to a temperature that stays.
     *
     * @param coefficient W/(m²·K), more than 0
     * @param temperature degrees Celsius
     */
    record Exchange(double coefficient, double temperature) implements Underside {
        /** Throws IllegalArgumentException when the coefficient is not more than 0 or a number is not finite. */
        public Exchange {
            Require.positive("coefficient below", coefficient);
            Require.finite("temperature below", temperature);
        }
    }
}
