package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.treadwarm.intake.Document;
import org.treadwarm.survey.Shape;
import org.treadwarm.survey.Survey;
import org.treadwarm.units.Declared;
import org.treadwarm.units.ReadingParser;

/**
 * Writes what was typed into a form into the document. A field whose text is what stands in the document already changes
 * nothing, so that numbers, spreads and bases stay as they came; an emptied field is taken out.
 */
final class FormData {
    /** Joins a bare number and the unit that the form showed beside it, so that the number alone is shown again. */
    private static final String SHOWN_UNIT = "\u00a0";

    private static final int MOST_DEPTH = 12;

    /** The text without the unit that this form added. */
    static String withoutUnit(String text, String unit) {
        String added = SHOWN_UNIT + unit;
        return !unit.isEmpty() && text.endsWith(added) ? text.substring(0, text.length() - added.length()) : text;
    }

    /** Writes one field. */
    void write(List<String> path, Class<? extends Record> root, JsonNode start, String typed) {
        if (path.size() > MOST_DEPTH || !(start instanceof ObjectNode owner)) {
            return;
        }
        write(owner, path, Shape.of(root), typed.strip());
    }

    @SuppressWarnings("unchecked")
    private void write(ObjectNode owner, List<String> path, Shape shape, String typed) {
        String name = path.get(0);
        Shape.Key key = shape.keys().get(name);
        if (key == null || name.equals("id")) {
            return;
        }
        if (key.holds() == Shape.Holds.OBJECT && path.size() > 1) {
            Shape inner = Shape.of((Class<? extends Record>) key.type());
            if (key.many() == Shape.Many.LIST) {
                JsonNode item = owner.path(name).path(index(path.get(1)));
                if (item instanceof ObjectNode object && path.size() > 2) {
                    write(object, path.subList(2, path.size()), inner, typed);
                }
            } else if (owner.path(name) instanceof ObjectNode object) {
                write(object, path.subList(1, path.size()), inner, typed);
                if (object.isEmpty() && !name.equals("heatedFloor")) {
                    owner.remove(name);
                }
            } else if (!typed.isEmpty() && owner.path(name).isMissingNode()) {
                write(owner.putObject(name), path.subList(1, path.size()), inner, typed);
            }
        } else if (key.many() == Shape.Many.LIST && path.size() == 2) {
            item(owner, key, index(path.get(1)), typed);
        } else if (path.size() == 1 && key.holds() != Shape.Holds.OBJECT && key.many() != Shape.Many.LIST) {
            value(owner, key, typed);
        }
    }

    private static int index(String text) {
        return text.matches("[0-9]{1,4}") ? Integer.parseInt(text) : -1;
    }

    private static void item(ObjectNode owner, Shape.Key key, int index, String typed) {
        ArrayNode list = owner.path(key.name()) instanceof ArrayNode known
                ? known
                : Document.mapper().createArrayNode();
        if (index < 0 || index > list.size() || Forms.shown(list.path(index)).equals(typed)) {
            return;
        }
        if (typed.isEmpty()) {
            list.remove(index);
        } else if (index == list.size()) {
            list.add(typed);
        } else {
            list.set(index, typed);
        }
        if (list.isEmpty()) {
            owner.remove(key.name());
        } else {
            owner.set(key.name(), list);
        }
    }

    private void value(ObjectNode owner, Shape.Key key, String typed) {
        String name = key.name();
        String unit = key.quantity().map(Forms::unit).orElse("");
        String before = withoutUnit(Forms.shown(owner.path(name)), unit);
        if (name.equals("to")
                && Shape.of(org.treadwarm.survey.HeatedFloor.class).keys().get("to") == key) {
            underneath(owner, typed);
        } else if (typed.equals(before.strip())) {
            return;
        } else if (typed.isEmpty()) {
            owner.remove(name);
        } else if (!key.fallback().isEmpty() && key.quantity().isEmpty() && typed.equals(key.fallback())) {
            owner.remove(name);
        } else {
            owner.put(
                    name,
                    key.quantity().isPresent() ? withUnit(typed, key.quantity().get()) : typed);
        }
        if (name.equals("to") && typed.equals(Survey.GROUND) && !owner.has("ground")) {
            owner.putObject("ground").put("kind", "slab");
        } else if (name.equals("to") && !typed.equals(Survey.GROUND) && !typed.isEmpty()) {
            owner.remove("ground");
        }
    }

    /** A heated floor names what lies below it, or describes the ground. */
    private static void underneath(ObjectNode floor, String typed) {
        if (typed.equals(Survey.GROUND) || typed.isEmpty()) {
            floor.remove("to");
        } else {
            floor.put("to", typed);
        }
    }

    private static String withUnit(String typed, Declared declared) {
        String unit = Forms.unit(declared);
        return !unit.isEmpty() && ReadingParser.isBare(typed) ? typed + SHOWN_UNIT + unit : typed;
    }

    /** The text that a form shows for one field. */
    String shown(List<String> path, Class<? extends Record> root, JsonNode start) {
        String unit = declared(path, Shape.of(root))
                .flatMap(Shape.Key::quantity)
                .map(Forms::unit)
                .orElse("");
        return withoutUnit(Forms.shown(at(path, start)), unit);
    }

    /** Puts an assumption where somebody said "not known". */
    void assume(List<String> path, Class<? extends Record> root, JsonNode start) {
        declared(path, Shape.of(root)).filter(key -> key.quantity().isPresent()).ifPresent(key -> {
            Declared quantity = key.quantity().get();
            if (!quantity.assume().isEmpty()) {
                write(path, root, start, "0");
                JsonNode owner = start;
                for (String step : path.subList(0, path.size() - 1)) {
                    owner = owner.isArray() ? owner.path(index(step)) : owner.path(step);
                }
                if (owner instanceof ObjectNode object) {
                    object.putObject(key.name())
                            .put("reading", quantity.assume())
                            .put("basis", "assumed");
                }
            }
        });
    }

    @SuppressWarnings("unchecked")
    private static Optional<Shape.Key> declared(List<String> path, Shape shape) {
        Shape.Key key = shape.keys().get(path.get(0));
        if (key == null || path.size() == 1) {
            return Optional.ofNullable(key);
        }
        if (key.holds() != Shape.Holds.OBJECT) {
            return Optional.empty();
        }
        int used = key.many() == Shape.Many.LIST ? 2 : 1;
        return path.size() <= used
                ? Optional.empty()
                : declared(path.subList(used, path.size()), Shape.of((Class<? extends Record>) key.type()));
    }

    /** Adds an empty object to a list, or an empty object where none was. */
    @SuppressWarnings("unchecked")
    void add(List<String> path, Class<? extends Record> root, JsonNode start) {
        Optional<Shape.Key> key = declared(path, Shape.of(root));
        JsonNode owner = start;
        for (String step : path.subList(0, path.size() - 1)) {
            owner = owner.isArray() ? owner.path(index(step)) : owner.path(step);
        }
        if (key.isEmpty() || key.get().holds() != Shape.Holds.OBJECT || !(owner instanceof ObjectNode object)) {
            return;
        }
        String name = key.get().name();
        if (key.get().many() == Shape.Many.LIST) {
            ArrayNode list = object.path(name) instanceof ArrayNode known ? known : object.putArray(name);
            list.addObject();
        } else if (!object.has(name)) {
            ObjectNode fresh = object.putObject(name);
            if (name.equals("heatedFloor")) {
                fresh.put("zone", "occupied");
                fresh.putObject("ground").put("kind", "slab");
            }
        }
    }

    /** Takes an object out; a list that has become empty goes with it. */
    void remove(List<String> path, JsonNode start) {
        List<String> above = path.subList(0, path.size() - 1);
        JsonNode owner = at(above, start);
        String last = path.get(path.size() - 1);
        if (owner instanceof ObjectNode object) {
            object.remove(last);
        } else if (owner instanceof ArrayNode list && index(last) >= 0 && index(last) < list.size()) {
            list.remove(index(last));
            if (list.isEmpty()) {
                remove(above, start);
            }
        }
    }

    private static JsonNode at(List<String> path, JsonNode start) {
        JsonNode node = start;
        for (String step : path) {
            node = node.isArray() ? node.path(index(step)) : node.path(step);
        }
        return node;
    }

    /** The steps of a pointer, unescaped. */
    static List<String> steps(String pointer) {
        List<String> steps = new ArrayList<>();
        for (String step : pointer.substring(1).split("/", -1)) {
            steps.add(step.replace("~1", "/").replace("~0", "~"));
        }
        return steps;
    }
}
