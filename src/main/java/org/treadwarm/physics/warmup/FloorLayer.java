package org.treadwarm.physics.warmup;

/** One layer of a floor, as heat passes it. */
public sealed interface FloorLayer {
    /** Resistance of the layer, m²·K/W. */
    double resistance();

    /**
     * A layer that holds heat.
     *
     * @param thickness m, more than 0
     * @param conductivity W/(m·K), more than 0
     * @param density kg/m³, more than 0
     * @param specificHeat J/(kg·K), more than 0
     */
    record Massive(double thickness, double conductivity, double density, double specificHeat) implements FloorLayer {
        /** Throws IllegalArgumentException when a number is not finite and more than 0. */
        public Massive {
            Require.positive("thickness", thickness);
            Require.positive("conductivity", conductivity);
            Require.positive("density", density);
            Require.positive("specific heat capacity", specificHeat);
        }

        @Override
        public double resistance() {
            return thickness / conductivity;
        }

        /** Diffusivity a = lambda/(rho c), m²/s. */
        public double diffusivity() {
            return conductivity / (density * specificHeat);
        }

        /** Heat capacity of the layer, J/(m²·K). */
        public double capacity() {
            return thickness * density * specificHeat;
        }
    }

    /**
     * A layer known by its resistance alone, such as an air gap; it holds no heat.
     *
     * @param resistance m²·K/W, at least 0
     */
    record Massless(double resistance) implements FloorLayer {
        /** Throws IllegalArgumentException when the resistance is negative or not finite. */
        public Massless {
            Require.atLeastZero("resistance", resistance);
        }
    }
}
