package org.treadwarm.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.ObjectNode;
import org.junit.jupiter.api.Test;
import org.treadwarm.physics.section.Condition.Film;
import org.treadwarm.physics.section.FloorHeater.WaterPipe;
import org.treadwarm.physics.section.FloorSection;
import org.treadwarm.physics.section.FloorTemperatures;
import org.treadwarm.properties.Surveys;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.Limit;
import org.treadwarm.sizing.Sizing.SectionState;
import org.treadwarm.survey.Survey;

/** Floors solved between their cables or pipes, in a sizing. */
class SectionSizingTest {
    private static final ObjectNode SURVEY = Surveys.solved();
    private static final Sizing SIZING = Surveys.sized(SURVEY);

    private static FloorSizing floor(int room) {
        return SIZING.rooms().get(room).floor();
    }

    private static Evaluation evaluation() {
        Survey survey = Surveys.accepted(SURVEY);
        Plan plan = Plan.of(survey);
        Evaluation evaluation = new Evaluation(plan);
        assertThat(evaluation.evaluate(plan.values)).isTrue();
        return evaluation;
    }

    /** Every state of the answer against one section solved with its heater, its water and its surroundings as they are. */
    @Test
    void isThatOfTheSectionSolvedAnew() {
        Evaluation evaluation = evaluation();
        for (int room = 0; room < 4; room++) {
            FloorEvaluation floor = evaluation.floors[room];
            for (double flux : new double[] {20, floor.requiredFlux, 90}) {
                SectionFloor.State state = floor.section.at(flux, evaluation.outdoor);
                FloorTemperatures solved = solved(floor, flux, state);
                assertThat(solved.upwardFlux()).isCloseTo(flux, within(2e-3 * flux));
                assertThat(solved.downwardFlux()).isCloseTo(state.downward(), within(2e-3 * flux));
                assertThat(solved.surfaceMean()).isCloseTo(state.mean(), within(0.02));
                assertThat(solved.surfaceMaximum()).isCloseTo(state.warmest(), within(0.05));
                assertThat(solved.surfaceMinimum()).isCloseTo(state.coldest(), within(0.05));
                assertThat(solved.heaterTemperature()).isCloseTo(state.heater(), within(0.1));
            }
        }
    }

    private static FloorTemperatures solved(FloorEvaluation floor, double flux, SectionFloor.State state) {
        SectionGeometry geometry = floor.section.geometry;
        boolean water = geometry.heater() instanceof WaterPipe;
        double drive = water ? state.water() : (flux + state.downward()) * geometry.spacing();
        return new FloorSection(
                        geometry.spacing(),
                        geometry.layers(),
                        geometry.heater().driven(drive),
                        new Film(floor.room, flux / (state.mean() - floor.room)),
                        new Film(state.below(), geometry.coefficientBelow()))
                .solve();
    }

    @Test
    void reachesEachLimitAtItsFlux() {
        SectionState hall = floor(0).section().orElseThrow().atCarryingFlux();
        assertThat(floor(0).limits().stream().filter(Limit::governs).map(Limit::name))
                .containsExactly("water supply");
        assertThat(hall.supplyTemperature().orElseThrow()).isCloseTo(38, within(1e-6));

        SectionState bath = floor(1).section().orElseThrow().atCarryingFlux();
        assertThat(floor(1).limits().stream().filter(Limit::governs).map(Limit::name))
                .containsExactly("surface temperature, bathroom");
        assertThat(bath.surfaceMaximum()).isCloseTo(33, within(1e-6));
    }

    @Test
    void takesTheWarmestPointAndSaysSo() {
        FloorSizing bath = floor(1);
        assertThat(bath.surfaceBasis()).contains("warmest point (section)");
        assertThat(bath.surfaceTemperature().orElseThrow())
                .isEqualTo(bath.section().orElseThrow().atRequiredFlux().surfaceMaximum())
                .isGreaterThan(bath.section().orElseThrow().atRequiredFlux().surfaceMean() + 1);
    }

    /** Runs close together are a plane. */
    @Test
    void tendsToThePlaneModel() {
        ObjectNode close = Surveys.solved();
        close.withObject("/rooms/1/heatedFloor/heater").put("spacing", 0.006).put("linearPower", 0.9);
        ObjectNode plane = close.deepCopy();
        plane.withObject("/rooms/1/heatedFloor/heater").remove("spacing");
        plane.withObject("/rooms/1/heatedFloor/heater").remove("linearPower");
        plane.withObject("/rooms/1/heatedFloor/heater").put("density", 150);

        FloorSizing solved = Surveys.sized(close).rooms().get(1).floor();
        FloorSizing flat = Surveys.sized(plane).rooms().get(1).floor();

        assertThat(solved.surfaceBasis()).contains("warmest point (section)");
        assertThat(solved.carryingFlux().orElseThrow())
                .isCloseTo(
                        flat.carryingFlux().orElseThrow(),
                        within(0.01 * flat.carryingFlux().orElseThrow()));
        assertThat(solved.downwardFlux().orElseThrow())
                .isCloseTo(
                        flat.downwardFlux().orElseThrow(),
                        within(0.01 * flat.requiredFlux().orElseThrow()));
    }

    @Test
    void holdsDownToWhatItsLimitAllows() {
        ObjectNode there = Surveys.solved();
        there.withObject("/rooms/1").remove("reheat");
        double cold = Surveys.sized(there).rooms().get(1).floor().holdsDownTo().orElseThrow();
        there.withObject("/site").put("outdoorTemperature", cold);
        FloorSizing at = Surveys.sized(there).rooms().get(1).floor();
        assertThat(at.margin().orElseThrow()).isCloseTo(0, within(1e-6));
    }

    @Test
    void saysWhyAFloorIsNotSolved() {
        ObjectNode survey = Surveys.solved();
        survey.withObject("/rooms/1/heatedFloor/above/1").removeAll().put("resistance", 0.01);
        FloorSizing floor = Surveys.sized(survey).rooms().get(1).floor();
        assertThat(floor.section()).isEmpty();
        assertThat(floor.surfaceBasis()).contains("mean (plane)");
        assertThat(floor.sectionReason().orElseThrow()).contains("resistance alone");
    }

    @Test
    void laysLoopsOfEqualHeatAndBalancesThem() {
        var water = SIZING.total().water().orElseThrow();
        var hall = floor(0).water().orElseThrow();
        assertThat(hall.heat()).isCloseTo(floor(0).heaterPower().orElseThrow(), within(1e-6));
        assertThat(hall.loopLength())
                .isCloseTo(18 / 0.15 / hall.loops() + 6, within(1e-9))
                .isLessThanOrEqualTo(100);
        assertThat(water.valves())
                .allSatisfy(valve ->
                        assertThat(valve.drop() + valve.throttled()).isCloseTo(water.pressure(), within(1e-6)));
        assertThat(water.massFlow()).isCloseTo(hall.massFlow(), within(1e-12));
    }

    @Test
    void glycolChangesFlowAndDropAndNoTemperatureOfTheFloor() {
        ObjectNode mixed = Surveys.solved();
        mixed.withObject("/rooms/0/heatedFloor/heater").put("glycol", 0.3);
        mixed.withObject("/rooms/3/heatedFloor/heater").put("glycol", 0.3);
        Sizing answer = Surveys.sized(mixed);
        var plain = floor(0).water().orElseThrow();
        var hall = answer.rooms().get(0).floor().water().orElseThrow();
        assertThat(hall.supplyTemperature()).isEqualTo(plain.supplyTemperature());
        assertThat(hall.heat()).isEqualTo(plain.heat());
        assertThat(hall.massFlow()).isGreaterThan(1.05 * plain.massFlow());
        assertThat(hall.reynolds()).isLessThan(0.6 * plain.reynolds());
        assertThat(hall.waterContent()).isEqualTo(plain.waterContent());
        assertThat(answer.rooms().get(0).cautions())
                .anyMatch(caution -> caution.code().equals("glycol-maker"));
        assertThat(SIZING.rooms().get(0).cautions())
                .noneMatch(caution -> caution.code().equals("glycol-maker"));
    }

    @Test
    void feedsElectricElements() {
        var bath = floor(1).electric().orElseThrow();
        assertThat(bath.elements()).singleElement().satisfies(element -> {
            assertThat(element.current()).isCloseTo(600 / 230.0, within(1e-9));
            assertThat(element.resistance()).isCloseTo(230 * 230 / 600.0, within(1e-9));
            assertThat(element.breaker()).isEqualTo(6);
        });
        var landing = floor(2).electric().orElseThrow();
        assertThat(landing.elements()).singleElement().satisfies(element -> {
            assertThat(element.current()).isCloseTo(15, within(1e-9));
            assertThat(element.breaker()).isEqualTo(20);
        });
    }
}
