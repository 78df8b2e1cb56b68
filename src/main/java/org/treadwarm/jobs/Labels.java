package org.treadwarm.jobs;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.stream.Collectors;
import java.util.stream.Stream;
import org.treadwarm.survey.Shape;

/** Addresses and values of a document in people's words: the labels of the one declaration, and the names of the parts. */
public final class Labels {
    private static final String STEP = " › ";
    private static final int LONGEST_VALUE = 600;

    private final Shape root;
    private final JsonNode first;
    private final JsonNode second;

    /**
     * @param root the shape of both versions
     * @param first where names are looked up first, a version of the document
     * @param second where they are looked up next
     */
    public Labels(Class<? extends Record> root, JsonNode first, JsonNode second) {
        this.root = Shape.of(root);
        this.first = first;
        this.second = second;
    }

    /** Where a difference lies, as labels and names; empty for the whole. */
    public String where(Difference difference) {
        List<String> words = new ArrayList<>();
        Optional<Shape> shape = Optional.of(root);
        Optional<Shape.Key> list = Optional.empty();
        JsonNode one = first;
        JsonNode other = second;
        for (String step : difference.path()) {
            one = Differences.at(one, step);
            other = Differences.at(other, step);
            if (list.isPresent()) {
                words.add(title(one, other, list.get(), step));
                list = Optional.empty();
                continue;
            }
            Optional<Shape.Key> key = shape.map(known -> known.keys().get(step));
            words.add(key.map(Shape.Key::label).orElse(step));
            shape = key.flatMap(Labels::inside);
            list = key.filter(known -> known.many() == Shape.Many.LIST || known.many() == Shape.Many.MAP);
        }
        return String.join(STEP, words);
    }

    @SuppressWarnings("unchecked")
    private static Optional<Shape> inside(Shape.Key key) {
        return key.holds() == Shape.Holds.OBJECT
                ? Optional.of(Shape.of((Class<? extends Record>) key.type()))
                : Optional.empty();
    }

    private static String title(JsonNode one, JsonNode other, Shape.Key list, String step) {
        if (list.many() == Shape.Many.MAP) {
            return step;
        }
        return Stream.of(one, other)
                .flatMap(part -> Stream.of("name", "material", "assembly")
                        .map(key -> part.path(key).asText("").strip()))
                .filter(name -> !name.isEmpty())
                .findFirst()
                .orElseGet(() -> step.matches("[0-9]+") ? "no. " + (Integer.parseInt(step) + 1) : "without a name");
    }

    /** A value for people; long ones are cut. */
    public String value(Difference difference, JsonNode value) {
        Optional<Shape> shape = Optional.of(root);
        boolean inList = false;
        for (String step : difference.path()) {
            if (inList) {
                inList = false;
                continue;
            }
            Optional<Shape.Key> key = shape.map(known -> known.keys().get(step));
            shape = key.flatMap(Labels::inside);
            inList = key.filter(known -> known.many() == Shape.Many.LIST || known.many() == Shape.Many.MAP)
                    .isPresent();
        }
        String words = words(value, shape);
        return words.length() <= LONGEST_VALUE ? words : words.substring(0, LONGEST_VALUE - 1) + "…";
    }

    private static String words(JsonNode value, Optional<Shape> shape) {
        if (value.isMissingNode()) {
            return "nothing";
        }
        if (value.isArray()) {
            return value.isEmpty()
                    ? "an empty list"
                    : stream(value).map(item -> words(item, shape)).collect(Collectors.joining("; "));
        }
        if (value.isObject() && !value.has("reading")) {
            return value.properties().stream()
                    .filter(field -> !field.getKey().equals("id"))
                    .map(field -> field(field.getKey(), field.getValue(), shape))
                    .collect(Collectors.joining(", "));
        }
        String basis = value.path("basis").asText("");
        JsonNode typed = value.isObject() ? value.path("reading") : value;
        String text = typed.isTextual() ? typed.textValue() : typed.toString();
        return basis.isEmpty() ? text : text + " (" + basis + ")";
    }

    private static String field(String name, JsonNode value, Optional<Shape> shape) {
        Optional<Shape.Key> key = shape.map(known -> known.keys().get(name));
        String label = key.map(Shape.Key::label).orElse(name);
        if (label.equals("name")) {
            return words(value, Optional.empty());
        }
        String words = words(value, key.flatMap(Labels::inside));
        return label + " " + (value.isContainerNode() && !value.has("reading") ? "(" + words + ")" : words);
    }

    private static Stream<JsonNode> stream(JsonNode list) {
        List<JsonNode> items = new ArrayList<>();
        list.forEach(items::add);
        return items.stream();
    }
}
