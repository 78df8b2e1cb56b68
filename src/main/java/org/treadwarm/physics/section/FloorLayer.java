package org.treadwarm.physics.section;

/** A layer of a floor. */
public sealed interface FloorLayer {
    /** What it is called in messages. */
    String name();

    /** Resistance from face to face, m²·K/W. */
    double resistance();

    /**
     * A layer of known material, which conducts along itself too.
     *
     * @param thickness m, more than 0
     * @param conductivity W/(m·K), more than 0
     */
    record Solid(String name, double thickness, double conductivity) implements FloorLayer {
        public Solid {
            Require.positive("thickness of " + name + ", m", thickness);
            Require.positive("conductivity of " + name + ", W/(m·K)", conductivity);
        }

        @Override
        public double resistance() {
            return thickness / conductivity;
        }
    }

    /**
     * A layer of which only the resistance is known; it has no thickness and conducts nothing along itself.
     *
     * @param resistance m²·K/W, at least 0
     */
    record Resisting(String name, double resistance) implements FloorLayer {
        public Resisting {
            Require.notNegative("resistance of " + name + ", m²·K/W", resistance);
        }
    }
}
