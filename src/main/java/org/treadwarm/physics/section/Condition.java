package org.treadwarm.physics.section;

/** What a stretch of an edge gives its heat to. An edge without a condition is adiabatic: a plane of symmetry or a cut. */
public sealed interface Condition {
    /** Degrees Celsius of what the heat goes to. */
    double temperature();

    /**
     * A surface film.
     *
     * @param temperature of the air behind it, degrees Celsius
     * @param coefficient W/(m²·K), more than 0
     */
    record Film(double temperature, double coefficient) implements Condition {
        public Film {
            Require.finite("temperature behind a film, °C", temperature);
            Require.positive("film coefficient, W/(m²·K)", coefficient);
        }
    }

    /**
     * A surface of given temperature.
     *
     * @param temperature degrees Celsius
     */
    record Held(double temperature) implements Condition {
        public Held {
            Require.finite("temperature of a surface, °C", temperature);
        }
    }

    /**
     * A heated floor that gives q = 8.92 (theta - theta_i)^1.1 to the room at every place by itself.
     *
     * <p>The standard states it for the mean surface temperature; taking it at every place is the refinement of a
     * two-dimensional section. It holds for surfaces warmer than the room.
     *
     * @param temperature of the room, degrees Celsius
     */
    record BasicCharacteristic(double temperature) implements Condition {
        /** Coefficient, W/(m²·K^1.1): EN 1264-2:2008+A1:2012, clause 4; the formula was read at ikz.de. */
        static final double COEFFICIENT = 8.92;

        /** Exponent, same source. */
        static final double EXPONENT = 1.1;

        public BasicCharacteristic {
            Require.finite("room temperature, °C", temperature);
        }

        /** Surface temperature less room temperature at a flux of more than 0, K. */
        static double overtemperature(double flux) {
            return Math.pow(flux / COEFFICIENT, 1 / EXPONENT);
        }

        /** Flux over overtemperature at an overtemperature of more than 0, W/(m²·K). */
        static double coefficient(double overtemperature) {
            return COEFFICIENT * Math.pow(overtemperature, EXPONENT - 1);
        }
    }
}
