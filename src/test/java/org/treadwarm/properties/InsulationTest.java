package org.treadwarm.properties;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.DoubleNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.SplittableRandom;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.treadwarm.reference.SurveyGenerator;
import org.treadwarm.sizing.Sizing;

/** More insulation in what a room loses heat through never raises the flux that its floor must give. */
class InsulationTest {
    private static final double MORE = 1.25;

    static LongStream seeds() {
        return LongStream.range(20_000, 20_060);
    }

    /** Outdoors colder than every room and space: else insulation may well keep warmth out. */
    private static ObjectNode cold(long seed) {
        ObjectNode survey = SurveyGenerator.random(new SplittableRandom(seed));
        ((ObjectNode) survey.get("site")).put("outdoorTemperature", -12);
        if (survey.get("site").has("annualMeanTemperature")) {
            ((ObjectNode) survey.get("site")).put("annualMeanTemperature", 8);
        }
        survey.get("rooms").forEach(room -> ((ObjectNode) room).put("indoorTemperature", 20));
        survey.path("spaces").forEach(space -> {
            if (space.has("temperature")) {
                ((ObjectNode) space).put("temperature", 11);
            }
        });
        return survey;
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void neverRaisesTheRequiredFlux(long seed) {
        ObjectNode survey = cold(seed);
        for (int room = 0; room < survey.get("rooms").size(); room++) {
            JsonNode surfaces = survey.get("rooms").get(room).path("surfaces");
            for (int i = 0; i < surfaces.size(); i++) {
                ofItsOwn(seed, survey, room, "/rooms/" + room + "/surfaces/" + i);
            }
        }
    }

    /** Gives the surface an assembly of its own, since insulating the neighbours' parts of a space may well cool that space. */
    private static void ofItsOwn(long seed, ObjectNode survey, int room, String surface) {
        ObjectNode changed = survey.deepCopy();
        ObjectNode assemblies = (ObjectNode) changed.get("assemblies");
        JsonNode own =
                assemblies.get(changed.at(surface).get("assembly").asText()).deepCopy();
        assemblies.set("own", own);
        ((ObjectNode) changed.at(surface)).put("name", "of its own").put("assembly", "own");
        double was = requiredFlux(changed, room);
        for (int i = 0; i < own.path("layers").size(); i++) {
            String layer = "/assemblies/own/layers/" + i;
            String pointer = layer + (own.get("layers").get(i).has("resistance") ? "/resistance" : "/thickness");
            JsonNode given = changed.at(pointer);
            if (!given.isMissingNode()) {
                Trees.set(changed, pointer, DoubleNode.valueOf(given.doubleValue() * MORE));
                double is = requiredFlux(changed, room);
                assertThat(is)
                        .as("seed %d, %s, %s", seed, surface, pointer)
                        .isLessThanOrEqualTo(was + 1e-9 * (1 + was));
                Trees.set(changed, pointer, given);
            }
        }
    }

    private static double requiredFlux(JsonNode survey, int room) {
        return Surveys.sized(survey).rooms().get(room).floor().requiredFlux().orElse(0);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void belowTheHeaterNeverRaisesTheDownwardFlux(long seed) {
        ObjectNode survey = cold(seed);
        Sizing before = Surveys.sized(survey);
        for (int i = 0; i < survey.get("rooms").size(); i++) {
            JsonNode below = survey.at("/rooms/" + i + "/heatedFloor/below");
            for (int k = 0; k < below.size(); k++) {
                String pointer = "/rooms/" + i + "/heatedFloor/below/" + k
                        + (below.get(k).has("resistance") ? "/resistance" : "/thickness");
                if (survey.at(pointer).isMissingNode()) {
                    continue;
                }
                ObjectNode better = survey.deepCopy();
                Trees.set(better, pointer, DoubleNode.valueOf(survey.at(pointer).doubleValue() * MORE));
                double was = before.rooms().get(i).floor().downwardFlux().orElseThrow();
                double is = Surveys.sized(better)
                        .rooms()
                        .get(i)
                        .floor()
                        .downwardFlux()
                        .orElseThrow();
                assertThat(Math.abs(is)).as("seed %d, %s", seed, pointer).isLessThanOrEqualTo(Math.abs(was) + 1e-9);
            }
        }
    }
}
