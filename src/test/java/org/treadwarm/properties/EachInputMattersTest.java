package org.treadwarm.properties;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.DoubleNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;
import org.treadwarm.survey.Readings;
import org.treadwarm.units.Declared;

/** Every reading of the survey with everything in it moves some number of the answer, or stands in the list of those that do not. */
class EachInputMattersTest {
    private static final ObjectNode SURVEY = Surveys.everything();
    private static final JsonNode ANSWER = Surveys.answer(SURVEY);

    /** Readings without effect on a number, each with its reason. */
    private static final Map<String, String> WITHOUT_EFFECT = Map.ofEntries(
            Map.entry("/rooms/0/heatedFloor/heater/linearPower", "the density is given too, and is what counts"),
            Map.entry(
                    "/rooms/0/heatedFloor/below/0/maximumTemperature", "a warning when the heater is warmer, no limit"),
            Map.entry(
                    "/rooms/0/height", "the air's volume is given, and nothing else of this room asks for its height"),
            Map.entry("/rooms/0/air/volume", "a supply is given; the volume tells only how often it replaces the air"),
            Map.entry(
                    "/spaces/garage/air/volume",
                    "a flow is given; the volume tells only how often it replaces the air"),
            Map.entry("/rooms/1/otherHeat", "this floor carries, so that there is no supplement to set it against"),
            Map.entry("/rooms/2/otherHeat", "this floor carries, so that there is no supplement to set it against"),
            Map.entry("/assemblies/timber wall/layers/1/density", "weight is told of heated floors only"),
            Map.entry("/assemblies/timber wall/layers/1/specificHeat", "a steady state stores no heat"),
            Map.entry(
                    "/assemblies/timber wall/layers/3/airGap/thickness",
                    "wide enough for its air to turn over, it insulates no better when wider (ISO 6946)"));

    /** A reheat that is left at 0 W/m², for beside a setback any other is refused. */
    private static final String BESIDE_A_SETBACK = "/rooms/2/reheat";

    /** Areas that must stay the sum of one another; they are moved together. */
    private static final List<String> PARTS_AND_WHOLE = List.of(
            "/rooms/2/heatedFloor/area", "/rooms/2/heatedFloor/parts/0/area", "/rooms/2/heatedFloor/parts/1/area");

    static List<Arguments> readings() {
        List<Arguments> readings = new ArrayList<>();
        Readings.visit(Surveys.accepted(SURVEY), "", (pointer, declared, reading) -> {
            if (!pointer.equals(BESIDE_A_SETBACK) && !PARTS_AND_WHOLE.contains(pointer)) {
                readings.add(Arguments.of(pointer, declared, reading.value()));
            }
        });
        return readings;
    }

    @ParameterizedTest(name = "{0}")
    @MethodSource("readings")
    void movesANumber(String pointer, Declared declared, double value) {
        ObjectNode changed = SURVEY.deepCopy();
        Trees.set(changed, pointer, DoubleNode.valueOf(moved(declared, value)));
        boolean moved = !Trees.numbers(Surveys.answer(changed)).equals(Trees.numbers(ANSWER));
        assertThat(moved).isEqualTo(!WITHOUT_EFFECT.containsKey(pointer));
    }

    @Test
    void theAreasOfPartsAndWholeMoveNumbersTogether() {
        for (int part = 1; part <= 2; part++) {
            ObjectNode changed = SURVEY.deepCopy();
            Trees.set(changed, PARTS_AND_WHOLE.get(0), DoubleNode.valueOf(11.6));
            Trees.set(changed, PARTS_AND_WHOLE.get(part), DoubleNode.valueOf(part == 1 ? 2.6 : 9.1));
            assertThat(Trees.numbers(Surveys.answer(changed))).isNotEqualTo(Trees.numbers(ANSWER));
        }
    }

    private static double moved(Declared declared, double value) {
        if (declared.whole()) {
            return value + 1;
        }
        return value == 0 ? 0.01 : value * 1.01;
    }

    @Test
    void theListHoldsOnlyReadingsThatAreThere() {
        List<Object> addresses =
                readings().stream().map(reading -> reading.get()[0]).toList();
        assertThat(addresses).containsAll(WITHOUT_EFFECT.keySet());
        assertThat(WITHOUT_EFFECT.values())
                .allSatisfy(reason -> assertThat(reason).isNotBlank());
    }

    @Test
    void theSurveyHasEveryQuantityThatCanBeDeclared() {
        List<String> used = readings().stream()
                .map(reading -> ((Declared) reading.get()[1]).label())
                .distinct()
                .toList();
        assertThat(used).hasSizeGreaterThan(45);
    }
}
