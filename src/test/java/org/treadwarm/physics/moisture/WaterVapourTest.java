package org.treadwarm.physics.moisture;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Saturation pressure, its inverse, and the surface temperature factor. */
class WaterVapourTest {
    /** Saturation pressures in Pa, CRC Handbook (from memory). */
    @ParameterizedTest
    @CsvSource({"0, 611.3", "10, 1228", "20, 2339", "30, 4246"})
    void isThatOfTheHandbook(double temperature, double pressure) {
        assertThat(WaterVapour.saturationPressure(temperature)).isCloseTo(pressure, within(0.002 * pressure));
    }

    @ParameterizedTest
    @ValueSource(doubles = {-60, -20, -1e-9, 0, 1e-9, 9.3, 20, 60})
    void theInverseComesBack(double temperature) {
        double pressure = WaterVapour.saturationPressure(temperature);
        assertThat(WaterVapour.saturationTemperature(pressure)).isCloseTo(temperature, within(1e-9));
    }

    @Test
    void theTwoBranchesMeetAtFreezing() {
        assertThat(WaterVapour.saturationPressure(0)).isCloseTo(WaterVapour.saturationPressure(-1e-12), within(1e-9));
    }

    @Test
    void theDewPointOfARoomIsTheKnownOne() {
        assertThat(WaterVapour.dewPoint(20, 0.5)).isCloseTo(9.3, within(0.05));
        assertThat(WaterVapour.dewPoint(20, 1)).isCloseTo(20, within(1e-9));
    }

    @Test
    void theFactorOfAPlaneElementIsThatOfItsTemperatures() {
        double resistance = 0.25 + 1.5 + 0.04;
        double surface = 20 - 0.25 / resistance * 25;
        assertThat(SurfaceTemperature.factorOfPlaneElement(resistance))
                .isCloseTo(SurfaceTemperature.factor(surface, 20, -5), within(1e-13));
    }
}
