package org.treadwarm.physics.section;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.physics.floor.HeatedFloor;
import org.treadwarm.physics.section.Condition.Film;
import org.treadwarm.physics.section.FloorHeater.HeatingCable;
import org.treadwarm.physics.section.FloorLayer.Resisting;
import org.treadwarm.physics.section.FloorLayer.Solid;

/** The response agrees with sections solved one by one. */
class FloorResponseTest {
    @ParameterizedTest
    @ValueSource(doubles = {3, 4.1, 6.5, 10.8, 12.3, 15.9})
    void agreesWithASectionSolvedForTheSameCoefficient(double coefficient) {
        agrees(Floors.wet(0.15, 0.05), coefficient);
        agrees(Floors.electric(0.12, 0.006, 0, 110), coefficient);
    }

    @Test
    void agreesForACableBareAtTheSurfaceToo() {
        FloorSection bare = new FloorSection(
                0.25,
                List.of(new Solid("board", 0.005, 0.1), new Resisting("insulation", 0.8)),
                new HeatingCable(0, 0.002, 0.0028, 25),
                new Film(20, 10.8),
                new Film(10, 6));
        agrees(bare, 3.3);
        agrees(bare, 10);
    }

    private static void agrees(FloorSection floor, double coefficient) {
        FloorResponse response = FloorResponse.of(floor, () -> false);
        FloorSection given = Floors.with(floor, new Film(22, coefficient));
        FloorTemperatures solved = given.solve();
        FloorState state = response.newState();
        response.evaluateAt(coefficient, solved.upwardFlux(), 22, floor.below().temperature(), state);
        double goal = 1e-4 * (solved.heaterTemperature() - 20);
        if (solved.accuracy().cells() != response.accuracy().cells()) {
            goal += 3 * FloorSection.ERROR_GOAL * (solved.heaterTemperature() - 20);
        }
        assertThat(state.surfaceMean()).isCloseTo(solved.surfaceMean(), within(1e-9));
        assertThat(state.surfaceMaximum()).isCloseTo(solved.surfaceMaximum(), within(goal));
        assertThat(state.surfaceMinimum()).isCloseTo(solved.surfaceMinimum(), within(goal));
        assertThat(state.heaterTemperature()).isCloseTo(solved.heaterTemperature(), within(goal));
        assertThat(state.heatInput()).isCloseTo(solved.heatInput(), within(1e-3 * solved.heatInput()));
        assertThat(state.downwardFlux()).isCloseTo(solved.downwardFlux(), within(1e-3 * solved.heatInput()));
        for (int layer = 0; layer < state.layers(); layer++) {
            assertThat(state.warmFace(layer)).isCloseTo(solved.warmFaces().get(layer), within(goal));
        }
    }

    @Test
    void takesTheCoefficientOfTheMeanSurface() {
        FloorResponse response = FloorResponse.of(Floors.wet(0.2, 0.1), () -> false);
        FloorState state = response.newState();
        for (double flux : new double[] {1, 50, 100}) {
            response.evaluate(flux, 21, 8, state);
            assertThat(state.surfaceMean()).isCloseTo(21 + HeatedFloor.overtemperature(flux), within(1e-9));
            assertThat(state.upwardFlux()).isEqualTo(flux);
        }
        assertThat(state.peakFactor()).isBetween(1.01, 1.5);
        assertThat(state.waterTemperature()).isGreaterThan(state.heaterTemperature());
    }

    @Test
    void isLinearInTheFluxAtOneCoefficient() {
        FloorResponse response = FloorResponse.of(Floors.electric(0.1, 0.006, 0.1, 100), () -> false);
        FloorState none = response.newState();
        FloorState some = response.newState();
        FloorState twice = response.newState();
        response.evaluateAt(10, 0, 20, 5, none);
        response.evaluateAt(10, 40, 20, 5, some);
        response.evaluateAt(10, 80, 20, 5, twice);
        assertThat(twice.heaterTemperature() - some.heaterTemperature())
                .isCloseTo(some.heaterTemperature() - none.heaterTemperature(), within(1e-10));
        assertThat(none.downwardFlux()).isPositive();
    }

    @Test
    void refusesWhatItDoesNotKnow() {
        FloorResponse response = FloorResponse.of(Floors.electric(0.1, 0.006, 0.1, 100), () -> false);
        FloorState state = response.newState();
        assertThatThrownBy(() -> response.evaluate(-1, 20, 10, state)).isInstanceOf(IllegalArgumentException.class);
        assertThatThrownBy(() -> response.evaluateAt(17, 1, 20, 10, state))
                .isInstanceOf(IllegalArgumentException.class);
        response.evaluate(0, 20, 10, state);
        assertThat(state.surfaceMean()).isEqualTo(20);
        assertThatThrownBy(state::peakFactor).isInstanceOf(IllegalStateException.class);
        assertThatThrownBy(state::waterTemperature).isInstanceOf(IllegalStateException.class);
    }
}
