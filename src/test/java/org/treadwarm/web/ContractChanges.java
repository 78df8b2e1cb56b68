package org.treadwarm.web;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.MissingNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;

/**
 * What in a new description of the API breaks a client of the old one. Requests may ask for less and answers may say more;
 * not the other way round.
 */
final class ContractChanges {
    private static final Set<String> METHODS = Set.of("get", "put", "post", "delete", "patch");
    private static final List<String> UPPER_BOUNDS = List.of("maxLength", "maximum", "maxItems");
    private static final List<String> LOWER_BOUNDS = List.of("minLength", "minimum", "minItems");

    private final JsonNode before;
    private final JsonNode after;
    private final List<String> found = new ArrayList<>();
    private final Set<String> compared = new TreeSet<>();

    private ContractChanges(JsonNode before, JsonNode after) {
        this.before = before;
        this.after = after;
    }

    /** Which side writes what a schema describes. */
    private enum Side {
        REQUEST,
        ANSWER
    }

    /** Every breaking change, with its place; empty if there is none. */
    static List<String> breaking(JsonNode before, JsonNode after) {
        ContractChanges changes = new ContractChanges(before, after);
        before.path("paths").properties().forEach(path -> changes.path(path.getKey(), path.getValue()));
        return changes.found;
    }

    private void path(String path, JsonNode old) {
        JsonNode now = after.path("paths").path(path);
        if (now.isMissingNode()) {
            found.add(path + " was removed");
            return;
        }
        for (Map.Entry<String, JsonNode> method : old.properties()) {
            if (METHODS.contains(method.getKey())) {
                operation(method.getKey() + " " + path, method.getValue(), now.path(method.getKey()));
            }
        }
    }

    private void operation(String call, JsonNode old, JsonNode now) {
        if (now.isMissingNode()) {
            found.add(call + " was removed");
            return;
        }
        parameters(call, old.path("parameters"), now.path("parameters"));
        if (!old.path("requestBody").path("required").asBoolean()
                && now.path("requestBody").path("required").asBoolean()) {
            found.add(call + " now needs a body");
        }
        contents(call + " body", old.path("requestBody"), now.path("requestBody"), Side.REQUEST);
        for (Map.Entry<String, JsonNode> response : old.path("responses").properties()) {
            String place = call + " -> " + response.getKey();
            JsonNode answer = now.path("responses").path(response.getKey());
            if (answer.isMissingNode()) {
                found.add(place + " was removed");
            } else {
                removed(place + " header", response.getValue().path("headers"), answer.path("headers"));
                contents(place, response.getValue(), answer, Side.ANSWER);
            }
        }
    }

    private void parameters(String call, JsonNode old, JsonNode now) {
        for (JsonNode each : old) {
            JsonNode same = parameter(now, each);
            String place = call + " parameter " + each.path("name").asText();
            if (same.isMissingNode()) {
                found.add(place + " was removed");
            } else {
                schema(place, each.path("schema"), same.path("schema"), Side.REQUEST);
            }
        }
        for (JsonNode each : now) {
            if (each.path("required").asBoolean()
                    && !parameter(old, each).path("required").asBoolean()) {
                found.add(call + " now needs the parameter " + each.path("name").asText());
            }
        }
    }

    private static JsonNode parameter(JsonNode all, JsonNode like) {
        for (JsonNode each : all) {
            if (each.path("name").equals(like.path("name")) && each.path("in").equals(like.path("in"))) {
                return each;
            }
        }
        return MissingNode.getInstance();
    }

    private void contents(String place, JsonNode old, JsonNode now, Side side) {
        removed(place + " type", old.path("content"), now.path("content"));
        old.path("content").properties().forEach(type -> {
            JsonNode same = now.path("content").path(type.getKey());
            schema(place, type.getValue().path("schema"), same.path("schema"), side);
        });
    }

    private void removed(String place, JsonNode old, JsonNode now) {
        old.fieldNames().forEachRemaining(name -> {
            if (!now.has(name)) {
                found.add(place + " " + name + " was removed");
            }
        });
    }

    private void schema(String place, JsonNode old, JsonNode now, Side side) {
        if (old.has("$ref") && now.path("$ref").equals(old.path("$ref"))) {
            String name = old.path("$ref").asText();
            if (compared.add(side + name)) {
                schema(name.substring(name.lastIndexOf('/') + 1), resolved(before, old), resolved(after, now), side);
            }
            return;
        }
        JsonNode was = resolved(before, old);
        JsonNode is = resolved(after, now);
        if (!was.path("type").equals(is.path("type"))) {
            found.add(place + " changed its type from " + was.path("type") + " to " + is.path("type"));
        }
        words(place, was, is, side);
        bounds(place, was, is, side);
        properties(place, was, is, side);
        if (was.has("items")) {
            schema(place + "[]", was.path("items"), is.path("items"), side);
        }
        if (was.path("additionalProperties").isObject()) {
            schema(place + "{}", was.path("additionalProperties"), is.path("additionalProperties"), side);
        }
        alternatives(place, was, is, side);
    }

    private static JsonNode resolved(JsonNode description, JsonNode schema) {
        String reference = schema.path("$ref").asText();
        return reference.isEmpty() ? schema : description.at(reference.substring(1));
    }

    /** Requests may use every word they could; answers may use no new one that a client could not know. */
    private void words(String place, JsonNode old, JsonNode now, Side side) {
        if (side == Side.REQUEST) {
            old.path("enum").forEach(word -> {
                if (now.has("enum") && !contains(now.path("enum"), word)) {
                    found.add(place + " no longer takes " + word);
                }
            });
            if (!old.has("enum") && now.has("enum")) {
                found.add(place + " now takes certain words only");
            }
        } else if (old.has("enum") && !now.has("enum")) {
            found.add(place + " may now be any text");
        }
    }

    private static boolean contains(JsonNode list, JsonNode word) {
        for (JsonNode each : list) {
            if (each.equals(word)) {
                return true;
            }
        }
        return false;
    }

    private void bounds(String place, JsonNode old, JsonNode now, Side side) {
        if (side == Side.ANSWER) {
            return;
        }
        for (String bound : UPPER_BOUNDS) {
            if (now.has(bound) && now.path(bound).asDouble() < old.path(bound).asDouble(Double.MAX_VALUE)) {
                found.add(place + " has a lower " + bound);
            }
        }
        for (String bound : LOWER_BOUNDS) {
            if (now.has(bound) && now.path(bound).asDouble() > old.path(bound).asDouble(-Double.MAX_VALUE)) {
                found.add(place + " has a higher " + bound);
            }
        }
        if (now.has("pattern") && !now.path("pattern").equals(old.path("pattern"))) {
            found.add(place + " has another pattern");
        }
    }

    private void properties(String place, JsonNode old, JsonNode now, Side side) {
        old.path("properties").properties().forEach(property -> {
            String name = place + "." + property.getKey();
            JsonNode same = now.path("properties").path(property.getKey());
            if (same.isMissingNode()) {
                found.add(name + " was removed");
            } else {
                schema(name, property.getValue(), same, side);
            }
        });
        JsonNode stricter = side == Side.REQUEST ? now : old;
        JsonNode looser = side == Side.REQUEST ? old : now;
        stricter.path("required").forEach(name -> {
            if (!contains(looser.path("required"), name)) {
                found.add(place + "." + name.asText()
                        + (side == Side.REQUEST ? " is now required" : " is no longer always there"));
            }
        });
    }

    private void alternatives(String place, JsonNode old, JsonNode now, Side side) {
        for (String kind : List.of("oneOf", "anyOf", "allOf")) {
            int count = old.path(kind).size();
            if (now.path(kind).size() < count) {
                found.add(place + " has fewer alternatives");
                continue;
            }
            for (int i = 0; i < count; i++) {
                schema(place + "|" + i, old.path(kind).path(i), now.path(kind).path(i), side);
            }
        }
    }
}
