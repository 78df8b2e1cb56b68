package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/** Schemas of the API in words, with links to the documents they name. */
final class ContractTypes {
    private static final String DOCUMENTS = "#/components/schemas/";
    private static final Map<String, String> WORDS = Map.of(
            "string", "text",
            "integer", "whole number",
            "number", "number",
            "boolean", "true or false",
            "object", "object",
            "array", "list");

    private final JsonNode description;

    ContractTypes(JsonNode description) {
        this.description = description;
    }

    /**
     * A word of a type.
     *
     * @param document the document that it names; empty for none
     */
    public record Term(String text, String document) {
        static Term word(String text) {
            return new Term(text, "");
        }
    }

    /** A value in a document, or a parameter. */
    public record Field(String name, List<Term> type, boolean required, String words) {
        Field saying(String other) {
            return new Field(name, type, required, other);
        }
    }

    /** The type of a value. */
    List<Term> type(JsonNode schema) {
        String reference = schema.path("$ref").asText();
        if (!reference.isEmpty()) {
            String name = reference.substring(DOCUMENTS.length());
            return List.of(new Term(name, description.at("/components/schemas").has(name) ? name : ""));
        }
        for (String alternatives : List.of("oneOf", "anyOf")) {
            if (schema.path(alternatives).isArray() && !schema.has("type")) {
                return alternatives(schema.path(alternatives));
            }
        }
        return ofWord(schema);
    }

    private List<Term> ofWord(JsonNode schema) {
        List<Term> words = new ArrayList<>();
        String type = schema.path("type").asText();
        if (schema.path("enum").isArray()) {
            List<String> choices = new ArrayList<>();
            schema.path("enum").forEach(each -> choices.add(each.asText()));
            words.add(Term.word(String.join(" | ", choices)));
        } else if (type.equals("array")) {
            words.add(Term.word("list of "));
            words.addAll(type(schema.path("items")));
        } else if (schema.path("additionalProperties").isObject()) {
            words.add(Term.word("by name: "));
            words.addAll(type(schema.path("additionalProperties")));
        } else {
            boolean time = schema.path("format").asText().equals("date-time");
            words.add(Term.word(time ? "time (ISO 8601)" : WORDS.getOrDefault(type, "any value")));
        }
        return words;
    }

    private List<Term> alternatives(JsonNode all) {
        boolean reading = false;
        for (JsonNode each : all) {
            reading |= each.at("/properties/reading").isObject();
        }
        Set<List<Term>> told = new LinkedHashSet<>();
        for (JsonNode each : all) {
            boolean wayOfReading = reading && !each.has("$ref");
            told.add(wayOfReading ? List.of(Term.word("reading")) : type(each));
        }
        List<Term> words = new ArrayList<>();
        for (List<Term> type : told) {
            if (!words.isEmpty()) {
                words.add(Term.word(" or "));
            }
            words.addAll(type);
        }
        return words;
    }

    /** The values in an object, those of objects without a name of their own among them. */
    List<Field> fields(JsonNode schema) {
        List<Field> fields = new ArrayList<>();
        collect("", schema, fields);
        return fields;
    }

    private void collect(String above, JsonNode schema, List<Field> fields) {
        Set<String> required = new HashSet<>();
        schema.path("required").forEach(each -> required.add(each.asText()));
        schema.path("properties").properties().forEach(each -> {
            String name = above + each.getKey();
            fields.add(field(name, each.getValue(), required.contains(each.getKey())));
            collect(name + ".", each.getValue(), fields);
            collect(name + "[].", each.getValue().path("items"), fields);
        });
    }

    /** A value with its bounds in words. */
    Field field(String name, JsonNode schema, boolean required) {
        List<String> words = new ArrayList<>();
        bound(words, schema, "minimum", "at least ", "");
        bound(words, schema, "maximum", "at most ", "");
        bound(words, schema, "minLength", "at least ", " characters");
        bound(words, schema, "maxLength", "at most ", " characters");
        bound(words, schema, "minItems", "at least ", " of them");
        bound(words, schema, "maxItems", "at most ", " of them");
        bound(words, schema, "pattern", "like ", "");
        bound(words, schema, "default", "", " where left out");
        words.replaceAll(each -> each.equals("at least 1 characters") ? "not empty" : each);
        String description = schema.path("description").asText();
        if (!description.isEmpty()) {
            words.add(0, words.isEmpty() ? description : description.replaceFirst("\\.$", ""));
        }
        return new Field(name, type(schema), required, String.join("; ", words));
    }

    private static void bound(List<String> words, JsonNode schema, String key, String before, String after) {
        if (schema.path(key).isValueNode() && !schema.path(key).asText().isEmpty()) {
            words.add(before + schema.path(key).asText() + after);
        }
    }
}
