package org.treadwarm.checks;

import com.fasterxml.jackson.databind.JsonNode;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.treadwarm.checks.CheckCase.Expected;
import org.treadwarm.intake.Document;

/** Reads the case files in the jar. */
final class CaseFile {
    private CaseFile() {}

    /** The cases of a set, file by file. */
    static List<CheckCase> cases(CaseSet set) {
        List<CheckCase> cases = new ArrayList<>();
        set.files().forEach(file -> tree(file).path("cases").forEach(node -> cases.add(checkCase(node))));
        return List.copyOf(cases);
    }

    /** The cases that were left out of a set. */
    static List<LeftOut> leftOut(CaseSet set) {
        List<LeftOut> leftOut = new ArrayList<>();
        tree("left-out")
                .path(set.word())
                .forEach(node -> leftOut.add(new LeftOut(
                        node.path("id").asText(), node.path("reason").asText())));
        return List.copyOf(leftOut);
    }

    private static JsonNode tree(String file) {
        try (InputStream in = CaseFile.class.getResourceAsStream("/checks/" + file + ".json")) {
            if (in == null) {
                throw new IllegalStateException("the case file " + file + " is missing from the program");
            }
            return Document.mapper().readTree(in);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static CheckCase checkCase(JsonNode node) {
        return new CheckCase(
                node.path("id").asText(),
                node.path("standard").asText(),
                node.path("clause").asText(),
                Confidence.valueOf(node.path("confidence").asText().toUpperCase(Locale.ROOT)),
                node.path("confidenceWording").asText(),
                source(node.path("source")),
                new Inputs(node.path("inputs")),
                expected(node),
                leftOut(node),
                node.path("note").asText());
    }

    private static String source(JsonNode node) {
        String address = node.path("address").asText();
        return node.path("title").asText() + (address.isEmpty() ? "" : ", " + address);
    }

    private static List<Expected> expected(JsonNode node) {
        List<Expected> expected = new ArrayList<>();
        node.path("expected").properties().forEach(field -> {
            JsonNode values = field.getValue();
            int count = values.isArray() ? values.size() : 1;
            for (int i = 0; i < count; i++) {
                double value = number(field.getKey(), values.isArray() ? values.get(i) : values);
                double tolerance = tolerance(node.path("tolerance"), field.getKey(), value);
                expected.add(new Expected(field.getKey(), i, count, value, tolerance));
            }
        });
        return expected;
    }

    private static List<LeftOut> leftOut(JsonNode node) {
        List<LeftOut> leftOut = new ArrayList<>();
        node.path("leftOut")
                .properties()
                .forEach(field ->
                        leftOut.add(new LeftOut(field.getKey(), field.getValue().asText())));
        return leftOut;
    }

    private static double tolerance(JsonNode given, String name, double expected) {
        JsonNode own = given.path(name).isMissingNode() ? given : given.get(name);
        if (own.has("rel")) {
            return number("rel", own.get("rel")) * Math.abs(expected);
        }
        return own.has("abs") ? number("abs", own.get("abs")) : number("tolerance of " + name, own);
    }

    private static double number(String name, JsonNode node) {
        if (!node.isNumber()) {
            throw new IllegalStateException(name + " is " + node + ", not a number");
        }
        return node.doubleValue();
    }
}
