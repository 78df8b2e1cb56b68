package org.treadwarm.intake;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.treadwarm.survey.Findings;
import org.treadwarm.survey.Nearest;
import org.treadwarm.survey.Place;
import org.treadwarm.survey.Room;
import org.treadwarm.survey.Shape;
import org.treadwarm.survey.Unusual;
import org.treadwarm.survey.Word;
import org.treadwarm.units.Basis;
import org.treadwarm.units.Declared;
import org.treadwarm.units.Reading;
import org.treadwarm.units.ReadingException;
import org.treadwarm.units.ReadingParser;

/**
 * Binds a tree to records by their shapes. Whatever cannot be read is found and replaced by a blank, so that the rest is
 * read and judged too; a survey with findings is never sized.
 */
final class Binder {
    private static final String REHEAT = "reheat";
    private static final String WARM_UP = "warmUp";
    private static final int NONE = -1;

    private final Findings findings;
    private final List<Unusual> unusual = new ArrayList<>();

    Binder(Findings findings) {
        this.findings = findings;
    }

    /** The unusual readings bound so far. */
    List<Unusual> unusual() {
        return List.copyOf(unusual);
    }

    /** The record of a tree; null when the tree is no object at all. */
    Record bind(JsonNode tree, Class<? extends Record> type, Place at) {
        if (!tree.isObject()) {
            addUnread(at, Document.shown(tree), "an object is expected here", "a JSON object");
            return null;
        }
        Shape shape = Shape.of(type);
        Object[] values = shape.whenAbsent();
        long open = shape.required();
        for (Map.Entry<String, JsonNode> field : tree.properties()) {
            int index = shape.indexOf(field.getKey());
            if (index < 0) {
                refuseUnknownKey(field.getKey(), shape, at);
            } else {
                values[index] = field.getValue();
                open |= 1L << index;
            }
        }
        int goal = NONE;
        if (type == Room.class && isGoal(tree.get(REHEAT))) {
            int reheat = shape.indexOf(REHEAT);
            goal = shape.indexOf(WARM_UP);
            values[goal] = tree.get(REHEAT);
            values[reheat] = shape.key(reheat).whenAbsent().orElseThrow();
            open = open & ~(1L << reheat) | 1L << goal;
        }
        for (long left = open; left != 0; left &= left - 1) {
            int i = Long.numberOfTrailingZeros(left);
            Shape.Key key = shape.key(i);
            values[i] = values[i] == null
                    ? missing(key, at)
                    : value((JsonNode) values[i], key, at.key(i == goal ? REHEAT : key.name()));
        }
        if (goal != NONE && tree.has(WARM_UP)) {
            add(
                    at.key(WARM_UP),
                    "reheat and warmUp",
                    "a setback is described once",
                    "reheat with from and within, or warmUp");
        }
        return shape.make(values);
    }

    /** A reheat may be written as the setback that it is to be computed from. */
    private static boolean isGoal(JsonNode reheat) {
        return reheat != null && reheat.isObject() && (reheat.has("from") || reheat.has("within"));
    }

    /** Gives rooms that have a setback for a reheat its own key, under which pages show it. */
    static void nameGoals(JsonNode survey) {
        for (JsonNode room : survey.path("rooms")) {
            if (room instanceof ObjectNode object && isGoal(object.get(REHEAT)) && !object.has(WARM_UP)) {
                object.set(WARM_UP, object.remove(REHEAT));
            }
        }
    }

    private void refuseUnknownKey(String name, Shape shape, Place at) {
        String shown = shown(name);
        String nearest = Nearest.to(name, shape.keys().keySet()).orElse("");
        add(
                at.key(name),
                shown,
                "\"" + shown + "\" is no key here; the nearest is \"" + nearest + "\"",
                String.join(", ", shape.keys().keySet()));
    }

    private void add(Place at, String given, String message, String allowed) {
        findings.add(at.pointer(), given, message, allowed);
    }

    private void addUnread(Place at, String given, String message, String allowed) {
        findings.addUnread(at.pointer(), given, message, allowed);
    }

    private static String shown(String name) {
        if (name.isBlank()) {
            return "an empty name";
        }
        return name.length() <= 60 ? name : name.substring(0, 59) + "…";
    }

    private Object value(JsonNode node, Shape.Key key, Place at) {
        if (node.isNull()) {
            addUnread(at, "null", "null is no value", "leave the key out");
            return blank(key);
        }
        return switch (key.many()) {
            case ONE -> one(node, key, at);
            case OPTIONAL -> Optional.ofNullable(known(one(node, key, at)));
            case LIST -> list(node, key, at);
            case MAP -> map(node, key, at);
        };
    }

    /** A blank stands for what could not be read; behind an Optional it is left out. */
    private static Object known(Object value) {
        return value instanceof Reading reading && Double.isNaN(reading.value()) ? null : value;
    }

    private Object missing(Shape.Key key, Place at) {
        addUnread(at.key(key.name()), "nothing", "the " + key.label() + " is missing", allowed(key));
        return blank(key);
    }

    private Object blank(Shape.Key key) {
        return switch (key.many()) {
            case OPTIONAL -> Optional.empty();
            case LIST -> List.of();
            case MAP -> Map.of();
            case ONE -> blankOne(key);
        };
    }

    private Object blankOne(Shape.Key key) {
        return switch (key.holds()) {
            case QUANTITY -> Reading.of(Double.NaN);
            case TEXT -> "";
            case WORD -> key.type().getEnumConstants()[0];
            case OBJECT ->
                new Binder(new Findings()).bind(Document.mapper().createObjectNode(), record(key), Place.ROOT);
        };
    }

    private Object one(JsonNode node, Shape.Key key, Place at) {
        return switch (key.holds()) {
            case QUANTITY -> {
                Declared declared = key.quantity().orElseThrow();
                yield noted(quantity(node, declared, at), declared, at);
            }
            case TEXT -> text(node, key, at);
            case WORD -> word(node, key, at);
            case OBJECT -> object(node, key, at);
        };
    }

    private Reading noted(Reading reading, Declared declared, Place at) {
        if (Unusual.is(declared, reading)) {
            unusual.add(new Unusual(at, declared, reading));
        }
        return reading;
    }

    private Object object(JsonNode node, Shape.Key key, Place at) {
        Record bound = bind(node, record(key), at);
        return bound == null && key.many() == Shape.Many.ONE ? blankOne(key) : bound;
    }

    @SuppressWarnings("unchecked")
    private static Class<? extends Record> record(Shape.Key key) {
        return (Class<? extends Record>) key.type();
    }

    private List<Object> list(JsonNode node, Shape.Key key, Place at) {
        if (!node.isArray()) {
            addUnread(at, Document.shown(node), "a list is expected here", "a JSON list");
            return List.of();
        }
        List<Object> items = new ArrayList<>(node.size());
        for (int i = 0; i < node.size(); i++) {
            Object item = one(node.get(i), key, at.item(i));
            items.add(item == null ? blankOne(key) : item);
        }
        return Collections.unmodifiableList(items);
    }

    private Map<String, Object> map(JsonNode node, Shape.Key key, Place at) {
        if (!node.isObject()) {
            addUnread(at, Document.shown(node), "an object of names is expected here", "a JSON object");
            return Map.of();
        }
        Map<String, Object> items = new LinkedHashMap<>();
        node.properties().forEach(entry -> {
            Place own = at.key(entry.getKey());
            String name = entry.getKey().strip();
            if (name.isEmpty() || name.length() > 200) {
                add(own, Document.shown(entry.getValue()), "this name is empty or too long", "1 to 200 characters");
                return;
            }
            Object item = one(entry.getValue(), key, own);
            if (items.put(name, item == null ? blankOne(key) : item) != null) {
                add(own, name, "this name stands twice", "each name once");
            }
        });
        return Collections.unmodifiableMap(items);
    }

    private Object text(JsonNode node, Shape.Key key, Place at) {
        if (!node.isTextual()) {
            add(at, Document.shown(node), "a text is expected for the " + key.label(), allowed(key));
            return "";
        }
        String text = node.textValue().strip();
        int longest = key.longest();
        boolean control = hasControl(text);
        if (text.length() > longest || control) {
            add(
                    at,
                    Document.shown(node),
                    control ? "there are control characters in this text" : "this text is too long",
                    "at most " + longest + " characters");
            return "";
        }
        if (text.isEmpty()) {
            if (key.many() == Shape.Many.OPTIONAL && !key.name().equals("id")) {
                return null;
            }
            add(at, "an empty text", "the " + key.label() + " is empty", allowed(key));
        }
        return text;
    }

    private static boolean hasControl(String text) {
        for (int i = 0; i < text.length(); i++) {
            char c = text.charAt(i);
            if (Character.isISOControl(c) && c != '\n' && c != '\r' && c != '\t') {
                return true;
            }
        }
        return false;
    }

    private Object word(JsonNode node, Shape.Key key, Place at) {
        Optional<Word> word = node.isTextual() ? word(key, node.textValue().strip()) : Optional.empty();
        if (word.isEmpty()) {
            add(at, Document.shown(node), "this is no " + key.label() + " that is known here", "one of " + words(key));
            return key.many() == Shape.Many.OPTIONAL ? null : key.type().getEnumConstants()[0];
        }
        return word.get();
    }

    private static Optional<Word> word(Shape.Key key, String text) {
        for (Word word : key.words()) {
            if (word.word().equals(text)) {
                return Optional.of(word);
            }
        }
        return Optional.empty();
    }

    private static String words(Shape.Key key) {
        return key.words().stream().map(Word::word).collect(Collectors.joining(", "));
    }

    private Reading quantity(JsonNode node, Declared declared, Place at) {
        if (node.isObject()) {
            return readingObject(node, declared, at);
        }
        if (node.isNumber()) {
            Reading reading = new Reading(node.doubleValue(), 0, node.asText(), Optional.empty());
            return inRange(reading, node, declared, at);
        }
        if (!node.isTextual()) {
            add(
                    at,
                    Document.shown(node),
                    "the " + declared.label() + " is a number or a text with a unit",
                    Ranges.words(declared));
            return Reading.of(Double.NaN);
        }
        try {
            return inRange(ReadingParser.parse(node.textValue(), declared.kind()), node, declared, at);
        } catch (ReadingException e) {
            add(at, Document.shown(node), e.getMessage(), Ranges.words(declared));
            return Reading.of(Double.NaN);
        }
    }

    private Reading readingObject(JsonNode node, Declared declared, Place at) {
        JsonNode reading = node.get("reading");
        for (Iterator<String> names = node.fieldNames(); names.hasNext(); ) {
            String name = names.next();
            if (!List.of("reading", "basis", "name", "remark").contains(name)) {
                String nearest =
                        Nearest.to(name, List.of("reading", "basis", "remark")).orElseThrow();
                add(
                        at.key(name),
                        shown(name),
                        "this is no key of a reading; the nearest is \"" + nearest + "\"",
                        "reading, basis, remark");
            }
        }
        if (reading == null || reading.isContainerNode()) {
            add(
                    at.key("reading"),
                    reading == null ? "nothing" : Document.shown(reading),
                    "the " + declared.label() + " itself is missing",
                    Ranges.words(declared));
            return Reading.of(Double.NaN);
        }
        Reading value = quantity(reading, declared, at.key("reading"));
        JsonNode basis = node.get("basis");
        if (basis == null) {
            return value;
        }
        for (Basis known : Basis.values()) {
            if (basis.isTextual() && known.word().equals(basis.textValue().strip())) {
                return value.on(known);
            }
        }
        add(
                at.key("basis"),
                Document.shown(basis),
                "this is no basis of a reading",
                "taped, drawing, told, assumed or solved");
        return value;
    }

    private Reading inRange(Reading reading, JsonNode node, Declared declared, Place at) {
        if (!Ranges.possible(reading.value(), declared)) {
            add(
                    at,
                    Document.shown(node),
                    "the " + declared.label() + " is outside what is possible" + help(declared),
                    Ranges.words(declared));
            return Reading.of(Double.NaN);
        }
        if (declared.whole() && reading.value() != Math.rint(reading.value())) {
            add(at, Document.shown(node), "the " + declared.label() + " is a whole number", Ranges.words(declared));
            return Reading.of(Double.NaN);
        }
        return reading;
    }

    private static String help(Declared declared) {
        return declared.help().isEmpty() ? "" : ". " + declared.help();
    }

    private static String allowed(Shape.Key key) {
        return switch (key.holds()) {
            case QUANTITY -> Ranges.words(key.quantity().orElseThrow());
            case TEXT -> "1 to " + key.longest() + " characters";
            case WORD -> "one of " + words(key);
            case OBJECT -> "an object";
        };
    }
}
