package org.treadwarm.physics.ground;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;

/** Floors on and over the ground: limits that must hold whatever the tables say. */
class GroundFloorTest {
    @Test
    void theTwoSlabFormulasNearlyMeet() {
        double dimension = 6;
        double below = SlabOnGround.littleInsulated(dimension, dimension, 2);
        double above = SlabOnGround.wellInsulated(dimension, dimension, 2);
        assertThat(below).isCloseTo(above, within(2e-4 * above));
        assertThat(SlabOnGround.transmittance(dimension, dimension, 2)).isEqualTo(above);
        assertThat(SlabOnGround.transmittance(dimension, Math.nextDown(dimension), 2))
                .isCloseTo(below, within(1e-12));
    }

    @Test
    void theDimensionIsAreaOverHalfThePerimeter() {
        assertThat(SlabOnGround.characteristicDimension(50, 20)).isEqualTo(5);
        assertThat(SlabOnGround.equivalentThickness(0.3, 2, 0.21)).isCloseTo(0.72, within(1e-15));
    }

    /** B' 4 m and dt 0.615 m, which is w 0.3 m and R 0.21 m²·K/W on clay of 1.5 W/(m·K). */
    @Test
    void anUninsulatedSlabIsAsByHand() {
        double width = Math.PI * 4;
        double byHand = 2 * 1.5 / (width + 0.615) * Math.log(width / 0.615 + 1);
        assertThat(SlabOnGround.transmittance(4, 0.615, 1.5)).isCloseTo(byHand, within(1e-14));
        assertThat(byHand).isCloseTo(0.7, within(0.02));
    }

    @Test
    void aVoidWithoutVentsAndWallsLosesOnlyToTheSoil() {
        assertThat(SuspendedFloor.voidToOutdoors(5, 0, 1.7, 0, 4, 0.05)).isZero();
        double floor = 0.8;
        double soil = 0.5;
        assertThat(SuspendedFloor.transmittance(floor, soil, 0)).isCloseTo(1 / (1 / floor + 1 / soil), within(1e-15));
    }

    @Test
    void windInTheVentsIsAddedToTheWalls() {
        double expected = 2 * 0.4 * 1.7 / 5 + 1450 * 0.0015 * 4 * 0.05 / 5;
        assertThat(SuspendedFloor.voidToOutdoors(5, 0.4, 1.7, 0.0015, 4, 0.05)).isCloseTo(expected, within(1e-15));
    }
}
