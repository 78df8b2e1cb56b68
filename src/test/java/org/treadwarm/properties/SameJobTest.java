package org.treadwarm.properties;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.Collections;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.treadwarm.reference.SurveyGenerator;

/** The same job written down otherwise: pieces split in two, lists turned round, names and remarks added. Nothing moves. */
class SameJobTest {
    /** Relative to the largest number of the same room or space. */
    private static final double RELATIVE = 1e-12;

    /** The lowest outdoor temperature is a difference of large numbers over a slope that may be small. */
    private static final double OF_THE_LOWEST_OUTDOOR = 1e-8;

    static LongStream seeds() {
        return LongStream.range(30_000, 30_080);
    }

    private static ObjectNode survey(long seed) {
        return SurveyGenerator.random(new SplittableRandom(seed));
    }

    private static List<ObjectNode> objects(JsonNode survey, String key) {
        List<ObjectNode> owners = new ArrayList<>();
        survey.findParents(key).forEach(parent -> owners.add((ObjectNode) parent));
        return owners;
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void aLayerInTwo(long seed) {
        ObjectNode split = survey(seed);
        for (String key : List.of("layers", "above", "below")) {
            objects(split, key).forEach(owner -> owner.set(key, halved((ArrayNode) owner.get(key))));
        }
        assertSame(seed, survey(seed), split, true);
    }

    private static ArrayNode halved(ArrayNode layers) {
        ArrayNode halves = layers.arrayNode();
        for (int i = 0; i < layers.size(); i++) {
            ObjectNode layer = (ObjectNode) layers.get(i);
            if (layer.has("airGap")) {
                halves.add(layer);
                continue;
            }
            halve(layer, "thickness");
            halve(layer, "resistance");
            if (layer.get("bridging") instanceof ObjectNode bridging) {
                halve(bridging, "resistance");
                if (!bridging.has("frame")) {
                    bridging.put("frame", "frame of layer " + i);
                }
            }
            ObjectNode upper = layer.deepCopy();
            upper.remove("maximumTemperature");
            halves.add(upper).add(layer);
        }
        return halves;
    }

    private static void halve(ObjectNode owner, String key) {
        if (owner.has(key)) {
            owner.put(key, owner.get(key).doubleValue() / 2);
        }
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void aSurfaceInTwo(long seed) {
        ObjectNode split = survey(seed);
        objects(split, "surfaces").forEach(owner -> {
            ArrayNode surfaces = (ArrayNode) owner.get("surfaces");
            for (int i = surfaces.size() - 1; i >= 0; i--) {
                ObjectNode surface = (ObjectNode) surfaces.get(i);
                double net = net(surface);
                if (net > 1) {
                    ObjectNode rest = surface.deepCopy();
                    rest.remove(List.of("openings", "id", "width", "height"));
                    surface.put("area", area(surface) - net / 2).remove(List.of("width", "height"));
                    surfaces.add(rest.put("area", net / 2));
                }
            }
        });
        assertSame(seed, survey(seed), split, false);
    }

    private static double area(JsonNode extent) {
        return extent.has("area")
                ? extent.get("area").doubleValue()
                : extent.get("width").doubleValue() * extent.get("height").doubleValue();
    }

    private static double net(JsonNode surface) {
        double net = area(surface);
        for (JsonNode opening : surface.path("openings")) {
            net -= area(opening) * opening.path("count").asInt(1);
        }
        return net;
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void aJunctionInTwo(long seed) {
        ObjectNode split = survey(seed);
        objects(split, "junctions").forEach(owner -> {
            ArrayNode junctions = (ArrayNode) owner.get("junctions");
            for (int i = junctions.size() - 1; i >= 0; i--) {
                ObjectNode half = (ObjectNode) junctions.get(i);
                halve(half, "length");
                ObjectNode other = half.deepCopy();
                other.remove("id");
                junctions.add(other);
            }
        });
        assertSame(seed, survey(seed), split, false);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void listsTurnedRound(long seed) {
        ObjectNode turned = survey(seed);
        for (String key : List.of("surfaces", "openings", "junctions", "rooms")) {
            objects(turned, key).forEach(owner -> reverse((ArrayNode) owner.get(key)));
        }
        for (String key : List.of("spaces", "assemblies")) {
            objects(turned, key).forEach(owner -> owner.set(key, reversed((ObjectNode) owner.get(key))));
        }
        assertSame(seed, survey(seed), turned, false);
    }

    private static void reverse(ArrayNode list) {
        List<JsonNode> items = new ArrayList<>();
        list.forEach(items::add);
        Collections.reverse(items);
        list.removeAll().addAll(items);
    }

    private static ObjectNode reversed(ObjectNode map) {
        List<Map.Entry<String, JsonNode>> entries = new ArrayList<>(map.properties());
        Collections.reverse(entries);
        ObjectNode reversed = map.objectNode();
        entries.forEach(entry -> reversed.set(entry.getKey(), entry.getValue()));
        return reversed;
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void remarksAndIds(long seed) {
        ObjectNode told = survey(seed);
        int[] next = {0};
        for (String key : List.of("floorArea", "to", "psi", "share", "zone", "kind", "site")) {
            objects(told, key).forEach(owner -> owner.put("remark", "seen " + next[0]++));
        }
        for (String key : List.of("floorArea", "psi", "assembly")) {
            objects(told, key).forEach(owner -> owner.put("id", "id-" + next[0]++));
        }
        assertThat(Surveys.answer(told)).as("seed %d", seed).isEqualTo(Surveys.answer(survey(seed)));
    }

    private static void assertSame(long seed, JsonNode survey, JsonNode other, boolean samePaths) {
        Map<String, Double> expected = byName(Surveys.answer(survey), samePaths);
        Map<String, Double> got = byName(Surveys.answer(other), samePaths);
        Map<String, Double> largest = new HashMap<>();
        expected.forEach((pointer, number) -> largest.merge(owner(pointer), Math.abs(number), Math::max));
        assertThat(got.keySet()).as("seed %d", seed).isEqualTo(expected.keySet());
        expected.forEach((pointer, number) -> {
            double tolerance = pointer.endsWith("/holdsDownTo") ? OF_THE_LOWEST_OUTDOOR : RELATIVE;
            assertThat(got.get(pointer))
                    .as("seed %d, %s", seed, pointer)
                    .isCloseTo(number, within(tolerance * (1 + largest.get(owner(pointer)))));
        });
    }

    private static String owner(String pointer) {
        return pointer.substring(0, pointer.indexOf('/', 1));
    }

    /** The numbers of rooms, spaces and the total, addressed by name instead of position. */
    private static Map<String, Double> byName(JsonNode answer, boolean withPaths) {
        Map<String, Double> numbers = new HashMap<>();
        for (String list : List.of("rooms", "spaces")) {
            answer.get(list).forEach(node -> {
                ObjectNode owner = node.deepCopy();
                // The lists of layers repeat the survey's own lists, so they are longer where a layer was split.
                owner.findParents("layersAbove").forEach(parent -> ((ObjectNode) parent).remove("layersAbove"));
                owner.findParents("layersBelow").forEach(parent -> ((ObjectNode) parent).remove("layersBelow"));
                if (!withPaths) {
                    owner.remove("paths");
                    owner.findParents("paths").forEach(parent -> ((ObjectNode) parent).remove("paths"));
                    owner.findParents("edges").forEach(parent -> ((ObjectNode) parent).remove("edges"));
                }
                String name = "/" + Trees.escape(node.get("name").asText());
                Trees.numbers(owner).forEach((pointer, number) -> numbers.put(name + pointer, number));
            });
        }
        Trees.numbers(answer.get("total")).forEach((pointer, number) -> numbers.put("/total" + pointer, number));
        return numbers;
    }
}
