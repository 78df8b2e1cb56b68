package org.treadwarm.physics.air;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Heat of moving air, and thin air. */
class AirHeatTest {
    @Test
    void aHundredCubicMetresAnHourCarryThirtyFourWattsPerKelvin() {
        assertThat(AirHeat.conductance(100, 1)).isCloseTo(34, within(1e-12));
        assertThat(AirHeat.conductance(100, 0.8)).isCloseTo(27.2, within(1e-12));
        assertThat(AirHeat.conductance(0, 1)).isZero();
    }

    /** Pressures of the standard atmosphere in hPa, ISO 2533 (from memory). */
    @ParameterizedTest
    @CsvSource({"0, 1013.25", "1000, 898.75", "2000, 794.95", "3000, 701.09", "5000, 540.20"})
    void pressureFallsAsInTheStandardAtmosphere(double altitude, double pressure) {
        assertThat(AirHeat.pressureRatio(altitude)).isCloseTo(pressure / 1013.25, within(1e-4));
    }

    @Test
    void belowTheSeaAirIsDenser() {
        assertThat(AirHeat.pressureRatio(-430)).isCloseTo(1.0520, within(1e-3));
    }
}
