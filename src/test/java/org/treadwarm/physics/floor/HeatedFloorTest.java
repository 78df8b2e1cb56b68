package org.treadwarm.physics.floor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The basic characteristic and the roots that invert it. */
class HeatedFloorTest {
    private static final int DRAWS = 2000;

    /** EN 1264-2 prints 100 W/m² for the occupied area and the bathroom, 175 W/m² for the peripheral area. */
    @ParameterizedTest
    @CsvSource({"9, 100, 0.5", "15, 175, 1"})
    void givesThePrintedLimitFluxes(double overtemperature, double flux, double tolerance) {
        assertThat(HeatedFloor.flux(overtemperature)).isCloseTo(flux, within(tolerance));
    }

    @ParameterizedTest
    @ValueSource(doubles = {1e-6, 0.3, 9, 15, 60})
    void comesBackFromTheFlux(double overtemperature) {
        double flux = HeatedFloor.flux(overtemperature);
        assertThat(HeatedFloor.overtemperature(flux)).isCloseTo(overtemperature, within(1e-13 * overtemperature));
    }

    @Test
    void aSurfaceNoWarmerThanTheRoomGivesNothing() {
        assertThat(HeatedFloor.flux(0)).isZero();
        assertThat(HeatedFloor.flux(-5)).isZero();
        assertThat(HeatedFloor.overtemperature(0)).isZero();
        assertThat(HeatedFloor.temperatureBelow(21, 0, 3)).isEqualTo(21);
        assertThat(HeatedFloor.fluxAtTemperature(20, 21, 0.1)).isZero();
        assertThat(HeatedFloor.fluxAtTemperature(21, 21, 0.1)).isZero();
    }

    @Test
    void theSlopeIsThatOfTheCharacteristic() {
        double step = 1e-4;
        double slope = (HeatedFloor.overtemperature(80 + step) - HeatedFloor.overtemperature(80 - step)) / (2 * step);
        assertThat(HeatedFloor.overtemperatureSlope(80)).isCloseTo(slope, within(1e-9));
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void theFluxAtATemperatureMakesThatTemperature(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        for (int i = 0; i < DRAWS; i++) {
            double room = random.nextDouble(-60, 60);
            double maximum = room + Math.pow(10, random.nextDouble(-6, 2.08));
            double resistance = random.nextInt(4) == 0 ? 0 : Math.pow(10, random.nextDouble(-6, 2.2));
            double flux = HeatedFloor.fluxAtTemperature(maximum, room, resistance);
            assertThat(HeatedFloor.temperatureBelow(room, flux, resistance))
                    .as("seed %d: maximum %s, room %s, resistance %s", seed, maximum, room, resistance)
                    .isCloseTo(maximum, within(1e-12 * (1 + Math.abs(maximum))));
        }
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3})
    void theFluxOfADensityUsesUpTheDensity(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        for (int i = 0; i < DRAWS; i++) {
            double density = Math.pow(10, random.nextDouble(-3, 3.3));
            double room = random.nextDouble(0, 30);
            double above = random.nextInt(4) == 0 ? 0 : random.nextDouble(0, 5);
            double coefficient = random.nextInt(5) == 0 ? 0 : random.nextDouble(0, 6);
            double atRoom = random.nextDouble(-50, 150);
            double flux = HeatedFloor.fluxOfDensity(density, room, above, coefficient, atRoom);
            double made = flux + atRoom + coefficient * (HeatedFloor.temperatureBelow(room, flux, above) - room);
            String drawn = "seed %d: density %s, room %s, above %s, coefficient %s, atRoom %s"
                    .formatted(seed, density, room, above, coefficient, atRoom);
            assertThat(flux).as(drawn).isBetween(0.0, density);
            if (flux == 0) {
                assertThat(atRoom).as(drawn).isGreaterThanOrEqualTo(density);
            } else if (flux == density) {
                assertThat(made).as(drawn).isLessThanOrEqualTo(density * (1 + 1e-12));
            } else {
                assertThat(made).as(drawn).isCloseTo(density, within(1e-11 * (density + Math.abs(atRoom))));
            }
        }
    }

    @Test
    void aDensityThatTheLossEatsLeavesNothing() {
        assertThat(HeatedFloor.fluxOfDensity(50, 20, 0.1, 1, 50)).isZero();
        assertThat(HeatedFloor.fluxOfDensity(0, 20, 0.1, 1, 3)).isZero();
        assertThat(HeatedFloor.fluxOfDensity(50, 20, 0.1, 0, 0)).isEqualTo(50);
        assertThat(HeatedFloor.fluxOfDensity(50, 20, 0.1, 0, -9)).isEqualTo(50);
    }
}
