package org.treadwarm.properties;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.DoubleNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.survey.Readings;
import org.treadwarm.units.QuantityKind;

/** Readings off by a thousand, or in the other unit of temperature: refused or warned of at their place, or listed with a reason. */
class WrongUnitsTest {
    private static final ObjectNode SURVEY = Surveys.everything();

    private static final String NEAR_NOTHING = "a junction may lose next to nothing";
    private static final String NEAR_FREEZING = "a thousandth is near 0 °C, which is as good a temperature as another";

    private static final String AT_THE_WALL = "a fixed part may stand at the wall";

    private static final Map<String, String> SMALL_AND_POSSIBLE = Map.ofEntries(
            Map.entry("/rooms/0/junctions/0/psi", NEAR_NOTHING),
            Map.entry("/rooms/0/junctions/1/psi", NEAR_NOTHING),
            Map.entry("/rooms/0/junctions/2/psi", NEAR_NOTHING),
            Map.entry("/spaces/loft/junctions/0/psi", NEAR_NOTHING),
            Map.entry("/rooms/0/heatedFloor/plan/fixed/0/x", AT_THE_WALL),
            Map.entry("/rooms/0/heatedFloor/plan/fixed/0/y", AT_THE_WALL),
            Map.entry("/rooms/0/heatedFloor/plan/fixed/1/x", AT_THE_WALL),
            Map.entry("/rooms/0/heatedFloor/plan/fixed/1/y", AT_THE_WALL),
            Map.entry("/site/altitude", "many places lie at the sea"),
            Map.entry("/site/annualMeanTemperature", NEAR_FREEZING),
            Map.entry("/site/outdoorTemperature", NEAR_FREEZING),
            Map.entry("/spaces/neighbour/temperature", NEAR_FREEZING));

    private static final Map<String, String> COLD_AND_POSSIBLE =
            Map.of("/site/outdoorTemperature", "-11 °F is a design day of many places");

    private record Slip(String pointer, QuantityKind kind, double value) {}

    private static List<Slip> readings() {
        List<Slip> readings = new ArrayList<>();
        Readings.visit(
                Surveys.accepted(SURVEY),
                "",
                (pointer, declared, reading) -> readings.add(new Slip(pointer, declared.kind(), reading.value())));
        return readings;
    }

    /** Whether a value is refused or warned of at its own address. */
    private static boolean noticed(String pointer, double value) {
        ObjectNode survey = SURVEY.deepCopy();
        Trees.set(survey, pointer, DoubleNode.valueOf(value));
        if (!Surveys.problems(survey).isEmpty()) {
            return true;
        }
        return Surveys.sized(survey).warnings().stream()
                .map(Sizing.Warning::pointer)
                .anyMatch(warned -> warned.equals(pointer));
    }

    private static Map<String, Double> unnoticed(double factor) {
        Map<String, Double> unnoticed = new TreeMap<>();
        for (Slip reading : readings()) {
            double value = reading.value() * factor;
            if (value != reading.value() && !noticed(reading.pointer(), value)) {
                unnoticed.put(reading.pointer(), value);
            }
        }
        return unnoticed;
    }

    @Test
    void aThousandTimesTooLarge() {
        assertThat(unnoticed(1000)).isEmpty();
    }

    @Test
    void aThousandTimesTooSmall() {
        assertThat(unnoticed(1e-3)).containsOnlyKeys(SMALL_AND_POSSIBLE.keySet());
    }

    @Test
    void fahrenheitForCelsius() {
        assertThat(temperatures(1.8, 32)).isEmpty();
    }

    @Test
    void celsiusForFahrenheit() {
        assertThat(temperatures(1 / 1.8, -32 / 1.8)).containsOnlyKeys(COLD_AND_POSSIBLE.keySet());
    }

    @Test
    void kelvinForCelsius() {
        assertThat(temperatures(1, 273.15)).isEmpty();
        assertThat(temperatures(1, -273.15)).isEmpty();
    }

    private static Map<String, Double> temperatures(double factor, double offset) {
        Map<String, Double> unnoticed = new TreeMap<>();
        for (Slip reading : readings()) {
            double value = reading.value() * factor + offset;
            if (reading.kind() == QuantityKind.TEMPERATURE && !noticed(reading.pointer(), value)) {
                unnoticed.put(reading.pointer(), value);
            }
        }
        return unnoticed;
    }
}
