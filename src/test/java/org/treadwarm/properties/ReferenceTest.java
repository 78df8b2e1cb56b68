package org.treadwarm.properties;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.Iterator;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.reference.ReferenceChain;
import org.treadwarm.reference.SurveyGenerator;

/**
 * The program against an independent second implementation of the chain, written from its description alone: every field that
 * the second one answers agrees to 1e-8.
 */
class ReferenceTest {
    private static final double RELATIVE = 1e-8;
    private static final double ABSOLUTE = 1e-9;

    @ParameterizedTest
    @ValueSource(longs = {1, 1001, 2001, 3001, 4001, 5001})
    void agreesWithTheSecondImplementation(long firstSeed) {
        for (long seed = firstSeed; seed < firstSeed + 100; seed++) {
            ObjectNode survey = SurveyGenerator.random(new SplittableRandom(seed));
            List<String> differences = new ArrayList<>();
            compare("", ReferenceChain.size(survey), Surveys.answer(survey), differences);
            assertThat(differences).as("seed %d: %s", seed, survey).isEmpty();
        }
    }

    private static void compare(String pointer, JsonNode expected, JsonNode got, List<String> differences) {
        if (got == null) {
            differences.add(pointer + " is missing, expected " + expected);
        } else if (expected.isObject()) {
            for (Iterator<Map.Entry<String, JsonNode>> fields = expected.fields(); fields.hasNext(); ) {
                Map.Entry<String, JsonNode> field = fields.next();
                compare(pointer + "/" + field.getKey(), field.getValue(), got.get(field.getKey()), differences);
            }
            absent(pointer, expected, got, differences);
        } else if (expected.isArray()) {
            if (expected.size() != got.size()) {
                differences.add(pointer + " has " + got.size() + " items, expected " + expected.size());
            }
            for (int i = 0; i < Math.min(expected.size(), got.size()); i++) {
                compare(pointer + "/" + i, expected.get(i), got.get(i), differences);
            }
        } else if (expected.isNumber()) {
            double difference = Math.abs(expected.doubleValue() - got.doubleValue());
            if (!(difference <= ABSOLUTE + RELATIVE * Math.abs(expected.doubleValue()))) {
                differences.add(pointer + " is " + got + ", expected " + expected);
            }
        } else if (!expected.equals(got)) {
            differences.add(pointer + " is " + got + ", expected " + expected);
        }
    }

    /** Numbers that the second implementation leaves out must not be there either. */
    private static void absent(String pointer, JsonNode expected, JsonNode got, List<String> differences) {
        for (String field : List.of(
                "share",
                "holdsDownTo",
                "holdsDownToReason",
                "marginShare",
                "installedPower",
                "temperatureDifference",
                "fromFloorAbove",
                "buildUpHeight",
                "requiredFlux")) {
            if (!expected.has(field) && got.has(field)) {
                differences.add(pointer + "/" + field + " is there, expected none");
            }
        }
    }
}
