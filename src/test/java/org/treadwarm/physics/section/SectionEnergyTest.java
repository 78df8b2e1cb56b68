package org.treadwarm.physics.section;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.treadwarm.physics.section.Condition.Film;
import org.treadwarm.physics.section.FloorHeater.WaterPipe;

/** What a heater puts into a floor goes up or down, to 1e-10 of it. */
class SectionEnergyTest {
    private static final double GOAL = 1e-10;

    /** A coefficient, W/(m²·K), for which fields are solved: the middle one of the Chebyshev points. */
    private static final double NODE = Math.sqrt(FloorResponse.LOWEST * FloorResponse.HIGHEST);

    /** Pipes of given temperature and cables of given power, under a film and under the basic characteristic. */
    @Test
    void noHeatIsLostInRandomFloors() {
        RandomFloors floors = new RandomFloors(4701);
        Map<String, Integer> kinds = new TreeMap<>();
        for (int i = 0; i < 200; i++) {
            FloorSection floor = floors.next();
            FloorTemperatures got = floor.solve();
            assertThat(lost(got.heatInput(), got.upwardFlux(), got.downwardFlux()))
                    .as("floor %s: %s", i, floor)
                    .isLessThan(GOAL);
            assertThat(got.field().imbalance()).as("floor %s: %s", i, floor).isLessThan(GOAL);
            kinds.merge(kind(floor), 1, Integer::sum);
        }
        assertThat(kinds)
                .hasSize(4)
                .allSatisfy((kind, count) -> assertThat(count).as(kind).isGreaterThan(25));
    }

    private static double lost(double in, double up, double down) {
        return Math.abs(in - up - down) / Math.abs(in);
    }

    private static String kind(FloorSection floor) {
        return (floor.heater() instanceof WaterPipe ? "pipe" : "cable")
                + (floor.above() instanceof Film ? " under a film" : " under the basic characteristic");
    }

    /** The fields of which every flux is made: what a floor's response says goes down is what its field gives below. */
    @Test
    void noHeatIsLostInAResponse() {
        RandomFloors floors = new RandomFloors(4702);
        for (int i = 0; i < 20; i++) {
            FloorSection floor = floors.next();
            FloorResponse response = FloorResponse.of(floor, () -> false);
            FloorState state = response.newState();
            response.evaluateAt(NODE, 50, 20, 12, state);
            boolean wet = floor.heater() instanceof WaterPipe;
            FloorSection driven =
                    at(floor, wet ? state.waterTemperature() : state.heatInput() * floor.spacing(), 20, NODE, 12);
            Grid grid = at(floor, wet ? 20 : 100 * floor.spacing(), 0, 10, 0)
                    .solve()
                    .field()
                    .grid();
            Section section = driven.layout().section(driven.above(), driven.below());
            FloorReading solved =
                    new FloorReading(driven.layout(), Conduction.solve(section, grid, 1e-13, () -> false));
            assertThat(Math.abs(solved.downwardFlux() - state.downwardFlux()))
                    .as("floor %s: %s", i, floor)
                    .isLessThan(1e-9 * state.heatInput());
        }
    }

    private static FloorSection at(FloorSection floor, double drive, double room, double coefficient, double below) {
        return new FloorSection(
                floor.spacing(),
                floor.layers(),
                floor.heater().driven(drive),
                new Film(room, coefficient),
                new Film(below, floor.below().coefficient()));
    }
}
