package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import org.treadwarm.intake.Ranges;
import org.treadwarm.survey.Room;
import org.treadwarm.survey.Shape;
import org.treadwarm.survey.Survey;
import org.treadwarm.survey.WarmUpGoal;
import org.treadwarm.survey.Word;
import org.treadwarm.units.Basis;
import org.treadwarm.units.Declared;
import org.treadwarm.units.ReadingParser;

/** Schemas of what is sent in, from the shapes that read it. */
final class SurveySchemas {
    private final ObjectNode schemas;

    SurveySchemas(ObjectNode schemas) {
        this.schemas = schemas;
    }

    /** Adds the schema of a record and of every record below it. */
    @SuppressWarnings("unchecked")
    void add(Class<? extends Record> type) {
        if (schemas.has(type.getSimpleName())) {
            return;
        }
        ObjectNode schema = schemas.putObject(type.getSimpleName());
        schema.put("type", "object");
        schema.put("additionalProperties", false);
        ObjectNode properties = schema.putObject("properties");
        ArrayNode required = schema.putArray("required");
        for (Shape.Key key : Shape.of(type).keys().values()) {
            if (key.required()) {
                required.add(key.name());
            }
            if (key.holds() == Shape.Holds.OBJECT) {
                add((Class<? extends Record>) key.type());
            }
            many(properties.putObject(key.name()), key);
        }
        if (type == Room.class) {
            ((ArrayNode) properties.get("reheat").get("oneOf"))
                    .addObject()
                    .put("$ref", "#/components/schemas/" + WarmUpGoal.class.getSimpleName());
        }
        if (type == Survey.class) {
            required.add("rooms");
            ((ObjectNode) properties.get("rooms")).put("minItems", 1);
        }
        if (required.isEmpty()) {
            schema.remove("required");
        }
    }

    private static void many(ObjectNode property, Shape.Key key) {
        switch (key.many()) {
            case LIST -> {
                property.put("type", "array");
                one(property.putObject("items"), key);
            }
            case MAP -> {
                property.put("type", "object");
                one(property.putObject("additionalProperties"), key);
            }
            case ONE, OPTIONAL -> one(property, key);
        }
    }

    private static void one(ObjectNode property, Shape.Key key) {
        switch (key.holds()) {
            case OBJECT ->
                property.put("$ref", "#/components/schemas/" + key.type().getSimpleName());
            case QUANTITY -> quantity(property, key.quantity().orElseThrow());
            case TEXT -> {
                property.put("type", "string");
                property.put("maxLength", key.longest());
                if (key.name().equals("id")) {
                    property.put("pattern", "^[A-Za-z0-9-]{1,40}$");
                }
                describe(property, key);
            }
            case WORD -> {
                property.put("type", "string");
                ArrayNode words = property.putArray("enum");
                key.words().stream().map(Word::word).forEach(words::add);
                describe(property, key);
            }
        }
    }

    private static void describe(ObjectNode property, Shape.Key key) {
        property.put("description", key.help().isEmpty() ? key.label() : key.label() + ". " + key.help());
        if (!key.fallback().isEmpty()) {
            property.put("default", key.fallback());
        }
    }

    private static void quantity(ObjectNode property, Declared declared) {
        String unit = declared.kind().siUnit().isEmpty()
                ? "a pure ratio"
                : "in " + declared.kind().siUnit();
        String help = declared.help().isEmpty() ? "" : " " + declared.help();
        property.put("description", declared.label() + ", " + unit + ": " + Ranges.words(declared) + "." + help);
        ArrayNode ways = property.putArray("oneOf");
        ObjectNode number = ways.addObject();
        number.put("type", declared.whole() ? "integer" : "number");
        number.put(declared.moreThanMin() ? "exclusiveMinimum" : "minimum", declared.min());
        number.put(declared.lessThanMax() ? "exclusiveMaximum" : "maximum", declared.max());
        text(ways.addObject());
        ObjectNode object = ways.addObject();
        object.put("type", "object");
        object.put("additionalProperties", false);
        ObjectNode parts = object.putObject("properties");
        ArrayNode readings = parts.putObject("reading").putArray("oneOf");
        readings.addObject().put("type", "number");
        text(readings.addObject());
        ArrayNode bases = parts.putObject("basis").put("type", "string").putArray("enum");
        for (Basis basis : Basis.values()) {
            bases.add(basis.word());
        }
        parts.putObject("name").put("type", "string");
        parts.putObject("remark").put("type", "string");
        object.putArray("required").add("reading");
        if (!declared.fallback().isEmpty()) {
            property.put("default", declared.fallback());
        }
    }

    private static void text(ObjectNode way) {
        way.put("type", "string");
        way.put("maxLength", ReadingParser.LONGEST);
        way.put("description", "a reading with its unit and, if wanted, a spread");
    }
}
