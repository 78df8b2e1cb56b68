package org.treadwarm.reference;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;

/** Reads a survey whose quantities are plain numbers in SI units; what is missing without a default is an error. */
final class Fields {
    private Fields() {}

    /**
     * The number under a key.
     *
     * @throws IllegalArgumentException when it is missing or no number
     */
    static double number(JsonNode object, String key) {
        if (!object.path(key).isNumber()) {
            throw new IllegalArgumentException("no number under " + key + " in " + object);
        }
        return object.get(key).doubleValue();
    }

    /** The number under a key, or the survey's documented default. */
    static double number(JsonNode object, String key, double standard) {
        return object.has(key) ? number(object, key) : standard;
    }

    /**
     * The text under a key.
     *
     * @throws IllegalArgumentException when it is missing or no text
     */
    static String text(JsonNode object, String key) {
        if (!object.path(key).isTextual()) {
            throw new IllegalArgumentException("no text under " + key + " in " + object);
        }
        return object.get(key).textValue();
    }

    /** The text under a key, or the survey's documented default. */
    static String text(JsonNode object, String key, String standard) {
        return object.has(key) ? text(object, key) : standard;
    }

    /** The elements of the array under a key; a missing array is an empty one. */
    static List<JsonNode> list(JsonNode object, String key) {
        List<JsonNode> elements = new ArrayList<>();
        object.path(key).forEach(elements::add);
        return elements;
    }

    /** The area of a surface or opening in m²: given, or width times height. */
    static double area(JsonNode part) {
        return part.has("area") ? number(part, "area") : number(part, "width") * number(part, "height");
    }
}
