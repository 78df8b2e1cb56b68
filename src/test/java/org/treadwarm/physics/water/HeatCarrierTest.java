package org.treadwarm.physics.water;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** Properties of heat carriers beyond the verification values. */
class HeatCarrierTest {
    private final Water water = Water.atAtmosphere();

    /** Water is densest at 3.98 °C: CIPM formula, Tanaka and others 2001 (from memory). */
    @Test
    void isDensestNearFourDegrees() {
        double densest = water.density(3.98);
        assertThat(water.density(3.7)).isLessThan(densest);
        assertThat(water.density(4.3)).isLessThan(densest);
    }

    /** c_p is the slope of the enthalpy, so the two derivatives of the Gibbs energy must agree. */
    @Test
    void specificHeatIsTheSlopeOfTheEnthalpy() {
        for (double kelvin = 275; kelvin < 500; kelvin += 7) {
            double step = 0.01;
            double slope = (LiquidWater.at(kelvin + step, 3e6).specificEnthalpy()
                            - LiquidWater.at(kelvin - step, 3e6).specificEnthalpy())
                    / (2 * step);
            assertThat(LiquidWater.at(kelvin, 3e6).specificHeat()).isCloseTo(slope, within(1e-3));
        }
    }

    @Test
    void flowsMoreEasilyTheWarmer() {
        double last = Double.POSITIVE_INFINITY;
        for (double temperature = 0; temperature <= 95; temperature++) {
            assertThat(water.dynamicViscosity(temperature)).isLessThan(last);
            last = water.dynamicViscosity(temperature);
        }
    }

    @Test
    void thePressureOfAHeatingSystemHardlyMatters() {
        double change = new Water(0.3e6).density(35) / water.density(35) - 1;
        assertThat(change).isBetween(0.0, 2e-4);
    }

    @Test
    void refusesWhatIsNoLiquidWater() {
        assertThatIllegalArgumentException().isThrownBy(() -> water.density(-1));
        assertThatIllegalArgumentException().isThrownBy(() -> water.density(96));
        assertThatIllegalArgumentException().isThrownBy(() -> new Water(0.05e6));
        assertThatIllegalArgumentException().isThrownBy(() -> LiquidWater.at(272, 1e6));
    }
}
