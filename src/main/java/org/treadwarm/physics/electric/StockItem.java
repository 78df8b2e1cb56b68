package org.treadwarm.physics.electric;

import org.treadwarm.physics.Require;

/**
 * A cable or mat that can be had, never cut.
 *
 * @param name its name
 * @param extent what it covers
 * @param power W
 * @param most how many can be had, at least 1; {@link #UNLIMITED} for as many as wanted
 */
public record StockItem(String name, Extent extent, double power, int most) {
    /** As many as wanted. */
    public static final int UNLIMITED = Integer.MAX_VALUE;

    public StockItem {
        Require.positive("power of " + name, power);
        Require.within("number of " + name, most, 1, UNLIMITED);
    }

    /** An item of which as many can be had as wanted. */
    public StockItem(String name, Extent extent, double power) {
        this(name, extent, power, UNLIMITED);
    }

    /** What an item covers. */
    public sealed interface Extent {
        /**
         * A mat: its own area, at its own density.
         *
         * @param area m²
         */
        record Mat(double area) implements Extent {
            public Mat {
                Require.positive("area of a mat", area);
            }
        }

        /**
         * A cable: whatever area its runs are spread over.
         *
         * @param length m
         */
        record Cable(double length) implements Extent {
            public Cable {
                Require.positive("length of a cable", length);
            }
        }
    }

    /** Area of a mat, m²; 0 for a cable. */
    double matArea() {
        return extent instanceof Extent.Mat mat ? mat.area() : 0;
    }

    /** Length of a cable, m; 0 for a mat. */
    double cableLength() {
        return extent instanceof Extent.Cable cable ? cable.length() : 0;
    }
}
