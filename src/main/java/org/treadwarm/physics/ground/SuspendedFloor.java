package org.treadwarm.physics.ground;

/**
 * Floor over a ventilated void.
 *
 * <p>Source: ISO 13370:2017, 9.2 (from memory).
 */
public final class SuspendedFloor {
    private SuspendedFloor() {}

    /**
     * Transmittance from the void to the ground Ug, W/(m²·K): the slab's first formula with dg = w + lambda (Rsi + Rg + Rse).
     */
    public static double voidToGround(
            double characteristicDimension, double equivalentThickness, double soilConductivity) {
        return SlabOnGround.littleInsulated(characteristicDimension, equivalentThickness, soilConductivity);
    }

    /**
     * Equivalent transmittance from the void to outdoors, through its walls and its vents: Ux = 2 h Uw/B' + 1450 epsilon v fw/B',
     * W/(m²·K).
     *
     * @param characteristicDimension B', m
     * @param floorHeight height h of the floor's upper face above the ground outside, m
     * @param wallTransmittance U-value of the walls of the void above ground, W/(m²·K)
     * @param ventArea area of the vents per metre of perimeter, m²/m
     * @param windSpeed mean wind speed at 10 m height, m/s
     * @param shielding wind shielding factor fw: 0.02 sheltered, 0.05 average, 0.10 exposed
     */
    public static double voidToOutdoors(
            double characteristicDimension,
            double floorHeight,
            double wallTransmittance,
            double ventArea,
            double windSpeed,
            double shielding) {
        return (2 * floorHeight * wallTransmittance + 1450 * ventArea * windSpeed * shielding)
                / characteristicDimension;
    }

    /** Whole transmittance of an unheated suspended floor: 1/U = 1/Uf + 1/(Ug + Ux), W/(m²·K). */
    public static double transmittance(double floor, double voidToGround, double voidToOutdoors) {
        return 1 / (1 / floor + 1 / (voidToGround + voidToOutdoors));
    }
}
