package org.treadwarm.physics.water;

import org.treadwarm.physics.BilinearTable;

/**
 * A mixture of propylene glycol and water, as far as a published table goes: density and specific heat capacity within its
 * range, taken as bilinear. The table does not say whether its percent go by mass or by volume. No published viscosity and
 * no published freezing point is known to this program.
 */
public final class PropyleneGlycol implements HeatCarrier {
    private final double percent;
    private final BilinearTable density;
    private final BilinearTable specificHeat;

    /**
     * A mixture.
     *
     * @param percent share of glycol as the table counts it
     * @param density kg/m³ by percent and degrees Celsius
     * @param specificHeat J/(kg·K) by percent and degrees Celsius
     */
    public PropyleneGlycol(double percent, BilinearTable density, BilinearTable specificHeat) {
        this.percent = percent;
        this.density = density;
        this.specificHeat = specificHeat;
    }

    @Override
    public double density(double temperature) {
        return density.at(percent, temperature);
    }

    @Override
    public double specificHeat(double temperature) {
        return specificHeat.at(percent, temperature);
    }

    @Override
    public double dynamicViscosity(double temperature) {
        throw new NoPublishedValueException("no published viscosity of propylene glycol known to this program");
    }
}
