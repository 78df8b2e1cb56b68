package org.treadwarm.jobs;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/**
 * Where two versions of a document differ. Parts that have an id are compared by it, wherever they stand in their list; a
 * reading with its basis is one value; lists of parts without ids are compared place by place if they are equally long,
 * else as one value.
 */
public final class Differences {
    private Differences() {}

    /** The values that differ, in the order of the first version; the order of parts that have an id does not count. */
    public static List<Difference> between(JsonNode before, JsonNode after) {
        List<Difference> found = new ArrayList<>();
        compare(List.of(), before, after, found);
        return found;
    }

    private static void compare(List<String> path, JsonNode before, JsonNode after, List<Difference> found) {
        if (before.equals(after)) {
            return;
        }
        if (isParent(before) && isParent(after)) {
            Set<String> names = new LinkedHashSet<>();
            before.fieldNames().forEachRemaining(names::add);
            after.fieldNames().forEachRemaining(names::add);
            names.forEach(name -> compare(step(path, name), before.path(name), after.path(name), found));
        } else if (hasIds(before) && hasIds(after)) {
            Set<String> ids = new LinkedHashSet<>();
            before.forEach(part -> ids.add(part.get("id").textValue()));
            after.forEach(part -> ids.add(part.get("id").textValue()));
            ids.forEach(id -> compare(step(path, id), at(before, id), at(after, id), found));
        } else if (isListOfParts(before) && isListOfParts(after) && before.size() == after.size()) {
            for (int i = 0; i < before.size(); i++) {
                compare(step(path, Integer.toString(i)), before.get(i), after.get(i), found);
            }
        } else {
            found.add(new Difference(path, before, after));
        }
    }

    private static List<String> step(List<String> path, String step) {
        List<String> longer = new ArrayList<>(path);
        longer.add(step);
        return List.copyOf(longer);
    }

    private static boolean isParent(JsonNode node) {
        return node.isObject() && !node.has("reading");
    }

    private static boolean isListOfParts(JsonNode node) {
        for (JsonNode item : node) {
            if (!isParent(item)) {
                return false;
            }
        }
        return node.isArray() && !node.isEmpty();
    }

    private static boolean hasIds(JsonNode node) {
        Set<String> ids = new HashSet<>();
        for (JsonNode item : node) {
            if (!item.path("id").isTextual() || !ids.add(item.path("id").textValue())) {
                return false;
            }
        }
        return node.isArray();
    }

    /** What stands one step further; a missing node for nothing. */
    public static JsonNode at(JsonNode node, String step) {
        if (!node.isArray()) {
            return node.path(step);
        }
        int index = index(node, step);
        return index < 0 ? MissingNode.getInstance() : node.get(index);
    }

    private static int index(JsonNode list, String step) {
        for (int i = 0; i < list.size(); i++) {
            if (list.get(i).path("id").asText().equals(step)) {
                return i;
            }
        }
        boolean place = step.matches("[0-9]{1,6}") && !(hasIds(list) && !list.isEmpty());
        return place && Integer.parseInt(step) < list.size() ? Integer.parseInt(step) : -1;
    }

    /**
     * Writes a value of another version into a document, in place; a missing node takes out what stands there, and a part
     * that is not in its list comes last.
     *
     * @param path a path of {@link #between}, of at least one step
     */
    public static void write(JsonNode document, List<String> path, JsonNode value) {
        JsonNode owner = document;
        for (String step : path.subList(0, path.size() - 1)) {
            owner = at(owner, step);
        }
        String last = path.get(path.size() - 1);
        if (owner instanceof ObjectNode object) {
            if (value.isMissingNode()) {
                object.remove(last);
            } else {
                object.set(last, value.deepCopy());
            }
        } else if (owner instanceof ArrayNode list) {
            write(list, index(list, last), value);
        }
    }

    private static void write(ArrayNode list, int index, JsonNode value) {
        if (index < 0 && !value.isMissingNode()) {
            list.add(value.deepCopy());
        } else if (index >= 0 && value.isMissingNode()) {
            list.remove(index);
        } else if (index >= 0) {
            list.set(index, value.deepCopy());
        }
    }
}
