package org.treadwarm.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.SplittableRandom;
import java.util.TreeSet;
import java.util.function.Function;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.treadwarm.properties.Surveys;
import org.treadwarm.reference.SurveyGenerator;
import org.treadwarm.tables.Formulas;
import org.treadwarm.tables.Formulas.Formula;

/** Every number of an answer follows from what its step cites. */
class WorkingTest {
    private static final int RANDOM_SURVEYS = 60;

    private static final List<WorkingReplay> REPLAYS = new ArrayList<>();

    @BeforeAll
    static void replay() {
        REPLAYS.add(new WorkingReplay(WorkingJob.survey()));
        REPLAYS.add(new WorkingReplay(Surveys.everything()));
        REPLAYS.addAll(SolvedJob.all().stream().map(WorkingReplay::new).toList());
        REPLAYS.addAll(PartedJob.all().stream().map(WorkingReplay::new).toList());
        for (long seed = 1; seed <= RANDOM_SURVEYS; seed++) {
            REPLAYS.add(new WorkingReplay(SurveyGenerator.random(new SplittableRandom(seed))));
        }
    }

    @Test
    void everyStepOfTheJobHolds() {
        assertThat(REPLAYS.get(0).faults()).isEmpty();
    }

    @Test
    void everyStepOfRandomSurveysHolds() {
        for (int i = 1; i < REPLAYS.size(); i++) {
            assertThat(REPLAYS.get(i).faults()).as("seed %d", i).isEmpty();
        }
    }

    @Test
    void everyFormulaIsUsedAndExplained() {
        Set<String> used = new TreeSet<>();
        REPLAYS.forEach(replay -> used.addAll(replay.formulas()));
        assertThat(Formulas.all().stream().map(Formula::id)).containsExactlyInAnyOrderElementsOf(used);
        assertThat(Formulas.all()).allSatisfy(row -> {
            assertThat(row.formula()).contains(" = ");
            assertThat(row.words()).endsWith(".");
            assertThat(row.source()).isNotBlank();
        });
    }

    @Test
    void citesMaterialsByTheirOwnName() {
        Step step = step(REPLAYS.get(0), "/rooms/0/floor/layersAbove/1/resistance");
        assertThat(step.formula()).isEqualTo("layer-resistance");
        assertThat(step.symbols().get("d")).containsExactly("survey:/rooms/0/heatedFloor/above/1/thickness");
        assertThat(step.symbols().get("lambda")).containsExactly("table:materials/cement screed/conductivity");
    }

    @Test
    void escapesNamesInAddresses() {
        Step step = step(REPLAYS.get(0), "/assemblies/0/layers/2/resistance");
        assertThat(step.symbols().get("d")).containsExactly("survey:/assemblies/wall ~1 north/layers/2/thickness");
    }

    @Test
    void aSpaceFollowsOneKelvinOutdoorsByItsFactor() {
        ObjectNode warmer = WorkingJob.survey();
        ((ObjectNode) warmer.get("site")).put("outdoorTemperature", -8);
        JsonNode before = REPLAYS.get(0).answer().get("spaces");
        JsonNode after = Surveys.answer(warmer).get("spaces");
        for (int i = 0; i < before.size(); i++) {
            double rise = after.get(i).get("temperature").doubleValue()
                    - before.get(i).get("temperature").doubleValue();
            assertThat(rise).isCloseTo(before.get(i).get("temperatureFactor").doubleValue(), within(1e-12));
        }
    }

    @Test
    void aGroundFloorOfGivenUValueHasNoSlab() {
        JsonNode survey = WorkingJob.survey();
        ((ObjectNode) survey.at("/spaces/garage/surfaces/1"))
                .set("ground", survey.at("/rooms/0/heatedFloor/ground").deepCopy());
        ((ObjectNode) survey.at("/spaces/garage/surfaces/1/ground")).put("area", 30);
        WorkingReplay replay = new WorkingReplay((ObjectNode) survey);
        assertThat(replay.faults()).isEmpty();
        assertThat(replay.answer().findParents("characteristicDimension"))
                .allSatisfy(ground -> assertThat(
                                ground.get("characteristicDimension").doubleValue())
                        .isPositive());
    }

    @Test
    void findsStepsThatAreMissingTwiceOrWrong() {
        String flux = "/rooms/0/floor/requiredFlux";
        assertThat(changed(flux, step -> List.of())).containsExactly(flux + " has no step");
        assertThat(changed(flux, step -> List.of(step, step))).containsExactly(flux + " has two steps");
        assertThat(changed(flux, step -> List.of(new Step(flux, "heater-power", step.symbols()))))
                .hasSize(1);
        assertThat(changed(flux, step -> List.of(with(step, "A_F", "survey:/rooms/0/floorArea"))))
                .hasSize(1);
        assertThat(changed(flux, step -> List.of(with(step, "A_F", "survey:/rooms/0/nothing"))))
                .hasSize(1);
        assertThat(changed(flux, step -> List.of(with(step, "extra", "survey:/rooms/0/floorArea"))))
                .hasSize(1);
        assertThat(changed(flux, step -> List.of(new Step("/method/version", step.formula(), step.symbols()))))
                .hasSize(3);
    }

    private static List<String> changed(String address, Function<Step, List<Step>> change) {
        return new WorkingReplay(
                        WorkingJob.survey(),
                        steps -> steps.stream()
                                .flatMap(step ->
                                        step.address().equals(address) ? change.apply(step).stream() : Stream.of(step))
                                .toList())
                .faults();
    }

    private static Step with(Step step, String symbol, String address) {
        Map<String, List<String>> symbols = new HashMap<>(step.symbols());
        symbols.put(symbol, List.of(address));
        return new Step(step.address(), step.formula(), symbols);
    }

    private static Step step(WorkingReplay replay, String address) {
        return replay.steps().stream()
                .filter(step -> step.address().equals(address))
                .findFirst()
                .orElseThrow();
    }
}
