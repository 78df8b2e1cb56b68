package org.treadwarm.physics.warmup;

/** Exchange between the floor's surface and the room. */
public sealed interface Film {
    /** Flux given to the room, W/m², by a surface so much warmer than the room, K; negative for a colder surface. */
    double flux(double overtemperature);

    /** How fast the flux rises with the overtemperature, W/(m²·K), more than 0. */
    double slope(double overtemperature);

    /** Surface temperature less room temperature at a flux, K. */
    double overtemperature(double flux);

    /**
     * One coefficient for all differences.
     *
     * @param coefficient W/(m²·K), more than 0
     */
    record Constant(double coefficient) implements Film {
        /** Throws IllegalArgumentException when the coefficient is not finite and more than 0. */
        public Constant {
            Require.positive("coefficient of the film", coefficient);
        }

        @Override
        public double flux(double overtemperature) {
            return coefficient * overtemperature;
        }

        @Override
        public double slope(double overtemperature) {
            return coefficient;
        }

        @Override
        public double overtemperature(double flux) {
            return flux / coefficient;
        }
    }

    /**
     * q = coefficient dT^exponent. A surface colder than the room is taken to draw heat by the same law, although EN 1264-2
     * gives it for heating alone (common practice, no source).
     *
     * @param coefficient W/(m²·K^exponent), more than 0; 8.92 in EN 1264-2
     * @param exponent from 1 to 2; 1.1 in EN 1264-2
     */
    record PowerLaw(double coefficient, double exponent) implements Film {
        /** Below it the slope is that at it, K, since a slope of 0 would leave a bare surface without any. */
        private static final double LEAST = 1e-6;

        /** Throws IllegalArgumentException when a number is out of its range. */
        public PowerLaw {
            Require.positive("coefficient of the film", coefficient);
            if (!(exponent >= 1 && exponent <= 2)) {
                throw new IllegalArgumentException("exponent is " + exponent + "; it must be from 1 to 2");
            }
        }

        @Override
        public double flux(double overtemperature) {
            return Math.copySign(coefficient * Math.pow(Math.abs(overtemperature), exponent), overtemperature);
        }

        @Override
        public double slope(double overtemperature) {
            return coefficient * exponent * Math.pow(Math.max(LEAST, Math.abs(overtemperature)), exponent - 1);
        }

        @Override
        public double overtemperature(double flux) {
            return Math.copySign(Math.pow(Math.abs(flux) / coefficient, 1 / exponent), flux);
        }
    }
}
