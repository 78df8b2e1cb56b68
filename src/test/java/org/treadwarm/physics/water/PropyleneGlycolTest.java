package org.treadwarm.physics.water;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;
import static org.assertj.core.api.Assertions.withinPercentage;

import org.junit.jupiter.api.Test;

/** The mixture's formulas against water, against themselves, and where they end. */
class PropyleneGlycolTest {
    private static final Water WATER = Water.atAtmosphere();

    private static double cold(double temperature) {
        return 273.15 / (273.15 + temperature);
    }

    /** The released values of water at 20 °C: IAPWS-IF97, IAPWS 2008 and, for the conductivity, IAPWS 2011 (from memory). */
    @Test
    void fallsOntoWaterWithoutGlycol() {
        assertThat(PropyleneGlycol.density(0, cold(20))).isCloseTo(998.3, within(0.05));
        assertThat(PropyleneGlycol.conductivity(0, cold(20))).isCloseTo(0.598, within(0.001));
        assertThat(PropyleneGlycol.dynamicViscosity(0, cold(20))).isCloseTo(0.998e-3, within(0.001e-3));
        assertThat(PropyleneGlycol.dynamicViscosity(0, cold(20)))
                .isCloseTo(WATER.dynamicViscosity(20), withinPercentage(0.5));
    }

    @Test
    void staysNearWaterOverItsTemperatures() {
        for (double temperature = 0; temperature <= 60; temperature += 5) {
            assertThat(PropyleneGlycol.density(0, cold(temperature)))
                    .isCloseTo(WATER.density(temperature), withinPercentage(0.3));
            assertThat(PropyleneGlycol.specificHeat(0, cold(temperature)))
                    .isCloseTo(WATER.specificHeat(temperature), withinPercentage(1.5));
            assertThat(PropyleneGlycol.dynamicViscosity(0, cold(temperature)))
                    .isCloseTo(WATER.dynamicViscosity(temperature), withinPercentage(temperature <= 40 ? 5 : 14));
        }
    }

    @Test
    void moreGlycolIsThickerDenserAndCarriesLess() {
        PropyleneGlycol last = new PropyleneGlycol(0.15);
        for (double share = 0.2; share < 0.57; share += 0.05) {
            PropyleneGlycol next = new PropyleneGlycol(share);
            for (double temperature = 0; temperature <= 60; temperature += 10) {
                assertThat(next.dynamicViscosity(temperature)).isGreaterThan(last.dynamicViscosity(temperature));
                assertThat(next.density(temperature)).isGreaterThan(last.density(temperature));
                assertThat(next.specificHeat(temperature)).isLessThan(last.specificHeat(temperature));
                assertThat(next.conductivity(temperature)).isLessThan(last.conductivity(temperature));
            }
            assertThat(next.freezingPoint()).isLessThan(last.freezingPoint());
            last = next;
        }
    }

    /** Each value of the formula, worked out by hand at one mixture. */
    @Test
    void isTheFormula() {
        PropyleneGlycol third = new PropyleneGlycol(0.3);
        assertThat(third.density(40)).isCloseTo(1010.1476, within(1e-4));
        assertThat(third.specificHeat(40)).isCloseTo(3892.3265, within(1e-4));
        assertThat(third.conductivity(40)).isCloseTo(0.4823154, within(1e-7));
        assertThat(third.dynamicViscosity(40)).isCloseTo(1.5542097e-3, within(1e-10));
        assertThat(third.freezingPoint()).isCloseTo(-12.90716, within(1e-5));
    }

    @Test
    void turbulentItDropsMoreThanWater() {
        Tube tube = Tube.smooth(0.012);
        PropyleneGlycol third = new PropyleneGlycol(0.3);
        assertThat(tube.flow(0.1, third, 35).pressureGradient())
                .isGreaterThan(tube.flow(0.1, WATER, 35).pressureGradient());
        assertThat(tube.flow(0.03, third, 35).reynolds())
                .isLessThan(tube.flow(0.03, WATER, 35).reynolds() / 2);
    }

    @Test
    void refusesWhatTheModelDoesNotHold() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new PropyleneGlycol(0.149))
                .withMessageContaining("share of glycol");
        assertThatIllegalArgumentException().isThrownBy(() -> new PropyleneGlycol(0.571));
        assertThatIllegalArgumentException().isThrownBy(() -> new PropyleneGlycol(Double.NaN));
        PropyleneGlycol quarter = new PropyleneGlycol(0.25);
        assertThat(quarter.density(quarter.freezingPoint())).isGreaterThan(1000);
        assertThatIllegalArgumentException()
                .isThrownBy(() -> quarter.dynamicViscosity(quarter.freezingPoint() - 0.01))
                .withMessageContaining("temperature of the mixture");
        assertThatIllegalArgumentException().isThrownBy(() -> quarter.specificHeat(60.1));
    }
}
