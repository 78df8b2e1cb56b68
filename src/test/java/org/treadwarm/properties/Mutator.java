package org.treadwarm.properties;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;

/** Surveys gone wrong in the ways that people, programs and vandals bring about. */
final class Mutator {
    private static final JsonNodeFactory NODES = JsonNodeFactory.instance;
    private static final double[] NUMBERS = {
        0,
        -0.0,
        1,
        -1,
        1e-300,
        1e300,
        -1e300,
        Double.MIN_VALUE,
        Double.MAX_VALUE,
        1e-5,
        0.001,
        50,
        60,
        -60,
        273.15,
        1000,
        10000,
        4.9e-324,
        1e15,
        0.5,
        1.0000000000000002
    };
    private static final List<String> TEXTS = List.of(
            "",
            " ",
            "NaN",
            "Infinity",
            "-Infinity",
            "null",
            "1e999 m",
            "5 K",
            "5 m",
            "5 m2",
            "R 19",
            "-273.15 °C",
            "0 K",
            "12 %",
            "100 %",
            "0.001 W/(m.K)",
            "1 ± 1e308 m",
            "140 ± 10 mm",
            "12' 6 1/2\"",
            "1,2.3 m",
            "outdoors",
            "ground",
            "studio",
            "loft",
            "parlour",
            "unheated",
            "held",
            "slab",
            "suspended",
            "heated floor",
            "water",
            "electric",
            "up",
            "down",
            "bathroom",
            "aerogel (range)",
            "EPS",
            "../../etc",
            "<script>",
            "\u0000",
            "\u202etxt",
            "\ud83d\ude00",
            "~1~0/",
            "#/a");

    private final SplittableRandom random;

    Mutator(SplittableRandom random) {
        this.random = random;
    }

    /** A mutant of a survey as JSON text; the survey itself stays as it is. */
    byte[] mutant(ObjectNode survey) {
        ObjectNode tree = survey.deepCopy();
        for (int count = random.nextInt(1, 4); count > 0; count--) {
            change(tree);
        }
        String text = tree.toString();
        if (random.nextInt(12) == 0) {
            text = spoiled(text);
        }
        return text.getBytes(StandardCharsets.UTF_8);
    }

    private void change(ObjectNode tree) {
        List<String> pointers = new ArrayList<>();
        Trees.visit("", tree, (pointer, node) -> pointers.add(pointer));
        if (pointers.size() == 1) {
            return;
        }
        String pointer = pointers.get(random.nextInt(1, pointers.size()));
        JsonNode node = tree.at(pointer);
        switch (random.nextInt(9)) {
            case 0 -> Trees.remove(tree, pointer);
            case 1 -> Trees.set(tree, pointer, NODES.numberNode(NUMBERS[random.nextInt(NUMBERS.length)]));
            case 2 -> Trees.set(tree, pointer, NODES.textNode(TEXTS.get(random.nextInt(TEXTS.size()))));
            case 3 -> Trees.set(tree, pointer, otherType());
            case 4 -> rename(tree, pointer);
            case 5 ->
                Trees.set(
                        tree,
                        pointer,
                        tree.at(pointers.get(random.nextInt(pointers.size()))).deepCopy());
            case 6 -> repeat(tree, pointer);
            case 7 -> Trees.set(tree, pointer, scaled(node));
            default -> Trees.set(tree, pointer, random.nextBoolean() ? nested(node) : NODES.textNode(huge()));
        }
    }

    private JsonNode otherType() {
        return switch (random.nextInt(6)) {
            case 0 -> NODES.nullNode();
            case 1 -> NODES.booleanNode(true);
            case 2 -> NODES.arrayNode();
            case 3 -> NODES.objectNode();
            case 4 -> NODES.arrayNode().add(1).add("x").addNull();
            default -> NODES.objectNode().put("reading", "3 m").put("basis", "taped");
        };
    }

    private void rename(ObjectNode tree, String pointer) {
        JsonNode value = tree.at(pointer);
        int cut = pointer.lastIndexOf('/');
        if (tree.at(pointer.substring(0, cut)) instanceof ObjectNode parent) {
            Trees.remove(tree, pointer);
            String key = pointer.substring(cut + 1);
            parent.set(
                    switch (random.nextInt(4)) {
                        case 0 -> key + "s";
                        case 1 -> key.toUpperCase(java.util.Locale.ROOT);
                        case 2 -> "a/b~c";
                        default -> TEXTS.get(random.nextInt(1, TEXTS.size())).strip() + "k";
                    },
                    value);
        }
    }

    private void repeat(ObjectNode tree, String pointer) {
        JsonNode node = tree.at(pointer);
        if (tree.at(pointer.substring(0, pointer.lastIndexOf('/'))) instanceof ArrayNode list) {
            list.add(node.deepCopy());
        } else if (node instanceof ArrayNode list && !list.isEmpty()) {
            list.add(list.get(0).deepCopy());
        }
    }

    private JsonNode scaled(JsonNode node) {
        double factor = new double[] {-1, 1000, 1e-3, 1e6, 1.8, 0}[random.nextInt(6)];
        if (node.isNumber()) {
            return NODES.numberNode(node.doubleValue() * factor);
        }
        return NODES.textNode(factor + " " + node.asText());
    }

    private JsonNode nested(JsonNode node) {
        JsonNode nested = node.deepCopy();
        for (int depth = random.nextInt(1, 60); depth > 0; depth--) {
            nested = random.nextBoolean()
                    ? NODES.arrayNode().add(nested)
                    : NODES.objectNode().set("layers", nested);
        }
        return nested;
    }

    private String huge() {
        return "x".repeat(random.nextInt(2) == 0 ? 300 : 12_000);
    }

    private String spoiled(String text) {
        int at = random.nextInt(text.length());
        return switch (random.nextInt(6)) {
            case 0 -> text.substring(0, at);
            case 1 -> text.substring(0, at) + (char) random.nextInt(0x300) + text.substring(at);
            case 2 -> text.replaceFirst("\"name\":", "\"name\":1,\"name\":");
            case 3 -> text.replaceFirst(":-?[0-9][0-9.]*", ":NaN");
            case 4 -> text + text;
            default -> text.substring(0, at) + text.substring(Math.min(text.length(), at + 5));
        };
    }
}
