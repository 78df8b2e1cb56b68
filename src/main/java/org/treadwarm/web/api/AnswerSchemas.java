package org.treadwarm.web.api;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.lang.reflect.ParameterizedType;
import java.lang.reflect.RecordComponent;
import java.lang.reflect.Type;
import java.time.Instant;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** Schemas of what is answered, from the records that hold it. Numbers carry their unit in the description. */
final class AnswerSchemas {
    private static final Map<String, String> UNITS = Map.ofEntries(
            Map.entry("area", "m2"),
            Map.entry("heatedArea", "m2"),
            Map.entry("fixedArea", "m2"),
            Map.entry("coveredArea", "m2"),
            Map.entry("bareArea", "m2"),
            Map.entry("neededPower", "W"),
            Map.entry("MatLayout.margin", "W"),
            Map.entry("meanDensity", "W/m2"),
            Map.entry("MatPieces.density", "W/m2"),
            Map.entry("MatPieces.resistance", "ohm"),
            Map.entry("freeArea", "m2"),
            Map.entry("uValue", "W/(m2.K)"),
            Map.entry("conductance", "W/K, or W/(m2.K) for what lies below a heated floor"),
            Map.entry("temperature", "°C"),
            Map.entry("indoorTemperature", "°C"),
            Map.entry("outdoorTemperature", "°C"),
            Map.entry("surfaceTemperature", "°C"),
            Map.entry("heaterTemperature", "°C"),
            Map.entry("dewPoint", "°C"),
            Map.entry("holdsDownTo", "°C, outdoors"),
            Map.entry("temperatureDifference", "K"),
            Map.entry("heatFlow", "W"),
            Map.entry("total", "W"),
            Map.entry("transmission", "W"),
            Map.entry("junctions", "W"),
            Map.entry("air", "W"),
            Map.entry("reheat", "W"),
            Map.entry("gainsFromNeighbours", "W"),
            Map.entry("heatLoss", "W"),
            Map.entry("heaterPower", "W"),
            Map.entry("installedPower", "W"),
            Map.entry("requiredHeat", "W"),
            Map.entry("shortfall", "W"),
            Map.entry("supplement", "W"),
            Map.entry("fromFloorAbove", "W"),
            Map.entry("residual", "W"),
            Map.entry("requiredFlux", "W/m2"),
            Map.entry("carryingFlux", "W/m2"),
            Map.entry("maximumFlux", "W/m2"),
            Map.entry("margin", "W/m2"),
            Map.entry("downwardFlux", "W/m2"),
            Map.entry("edgeFlux", "W/m2"),
            Map.entry("heaterFlux", "W/m2"),
            Map.entry("resistance", "m2.K/W"),
            Map.entry("framingResistance", "m2.K/W"),
            Map.entry("resistanceAbove", "m2.K/W"),
            Map.entry("resistanceBelow", "m2.K/W"),
            Map.entry("upperLimit", "m2.K/W"),
            Map.entry("lowerLimit", "m2.K/W"),
            Map.entry("insideFilm", "m2.K/W"),
            Map.entry("outsideFilm", "m2.K/W"),
            Map.entry("buildUpHeight", "m"),
            Map.entry("load", "kg/m2"),
            Map.entry("characteristicDimension", "m"),
            Map.entry("equivalentThickness", "m"),
            Map.entry("conductivity", "W/(m.K)"),
            Map.entry("conductivityFrom", "W/(m.K)"),
            Map.entry("conductivityTo", "W/(m.K)"),
            Map.entry("density", "kg/m3"),
            Map.entry("specificHeat", "J/(kg.K)"),
            Map.entry("hours", "h"),
            Map.entry("reached", "°C"),
            Map.entry("steadyDensity", "W/m2"),
            Map.entry("densityNeeded", "W/m2"),
            Map.entry("WarmUpEvaluation.reheat", "W/m2 of heated floor"),
            Map.entry("hour", "h"),
            Map.entry("CurvePoint.floor", "°C"),
            Map.entry("CurvePoint.air", "°C"),
            Map.entry("CurvePoint.heater", "°C"),
            Map.entry("hoursToFive", "h"),
            Map.entry("hoursToFreezing", "h"),
            Map.entry("spacing", "m, axis to axis"),
            Map.entry("diameter", "m, outside"),
            Map.entry("flux", "W/m2"),
            Map.entry("surfaceMean", "°C"),
            Map.entry("surfaceMaximum", "°C"),
            Map.entry("surfaceMinimum", "°C"),
            Map.entry("heaterPlane", "°C, mean over the layers below"),
            Map.entry("waterTemperature", "°C, mean of the water"),
            Map.entry("supplyTemperature", "°C"),
            Map.entry("returnTemperature", "°C"),
            Map.entry("spread", "K"),
            Map.entry("perUpwardFlux", "K per W/m2"),
            Map.entry("perDownwardFlux", "K per W/m2"),
            Map.entry("upwardFlux", "W/m2"),
            Map.entry("mean", "°C"),
            Map.entry("maximum", "°C"),
            Map.entry("minimum", "°C"),
            Map.entry("relativeError", "1, estimated"),
            Map.entry("SectionAccuracy.residual", "1, relative"),
            Map.entry("psi", "W/(m.K)"),
            Map.entry("psiError", "W/(m.K), estimated, either way"),
            Map.entry("coupling", "W/(m.K), the section's L2D"),
            Map.entry("slabTransmittance", "W/(m2.K)"),
            Map.entry("slabTransmittanceInSection", "W/(m2.K)"),
            Map.entry("wallTransmittance", "W/(m2.K)"),
            Map.entry("halfWidth", "m"),
            Map.entry("wallHeight", "m"),
            Map.entry("installedDensity", "W/m2"),
            Map.entry("voltage", "V"),
            Map.entry("cableLength", "m"),
            Map.entry("power", "W"),
            Map.entry("current", "A"),
            Map.entry("breaker", "A"),
            Map.entry("HeatingElementLayout.resistance", "ohm"),
            Map.entry("lowestResistance", "ohm"),
            Map.entry("highestResistance", "ohm"),
            Map.entry("powerAtLowVoltage", "W"),
            Map.entry("powerAtHighVoltage", "W"),
            Map.entry("meanOvertemperature", "K"),
            Map.entry("heat", "W"),
            Map.entry("massFlow", "kg/s"),
            Map.entry("volumeFlow", "m3/s"),
            Map.entry("loopLength", "m"),
            Map.entry("velocity", "m/s"),
            Map.entry("reynolds", "1"),
            Map.entry("frictionFactor", "1"),
            Map.entry("pressureDrop", "Pa"),
            Map.entry("pressure", "Pa"),
            Map.entry("sourceDrop", "Pa"),
            Map.entry("loopDrop", "Pa"),
            Map.entry("ownDrop", "Pa"),
            Map.entry("drop", "Pa"),
            Map.entry("throttled", "Pa"),
            Map.entry("waterContent", "m3"),
            Map.entry("tableCoefficient", "W/(m2.K)"),
            Map.entry("tableMeanOvertemperature", "K"),
            Map.entry("PracticeJudgement.value", "SI unit of what is named"),
            Map.entry("PracticeJudgement.limit", "SI unit of what is named"),
            Map.entry("PracticeJudgement.margin", "SI unit of what is named"),
            Map.entry("from", "°C"),
            Map.entry("within", "h"),
            Map.entry("reheatFlux", "W/m2 of heated floor"),
            Map.entry("WarmUpSizing.density", "W/m2"),
            Map.entry("PartSizing.density", "W/m2"),
            Map.entry("lossCoefficient", "W/(m2.K) of heated floor"),
            Map.entry("airCapacity", "J/(m2.K) of heated floor"),
            Map.entry("massCapacity", "J/(m2.K) of heated floor"),
            Map.entry("massCoupling", "W/(m2.K) of heated floor"),
            Map.entry("voidToGround", "W/(m2.K)"),
            Map.entry("voidToOutdoors", "W/(m2.K)"));

    private final ObjectNode schemas;

    AnswerSchemas(ObjectNode schemas) {
        this.schemas = schemas;
    }

    /** Adds the schema of a record and of every record below it. */
    void add(Class<?> type) {
        if (schemas.has(type.getSimpleName())) {
            return;
        }
        ObjectNode schema = schemas.putObject(type.getSimpleName());
        schema.put("type", "object");
        schema.put("additionalProperties", false);
        ObjectNode properties = schema.putObject("properties");
        ArrayNode required = schema.putArray("required");
        for (RecordComponent component : type.getRecordComponents()) {
            ObjectNode property = properties.putObject(component.getName());
            boolean optional = property(property, component);
            boolean omittedWhenEmpty = type.getSimpleName().equals("FloorSizing") && component.getType() == List.class;
            if (!optional && !omittedWhenEmpty) {
                required.add(component.getName());
            }
        }
    }

    /** Adds a list to a schema that is there only when it was asked for. */
    void addOptionalList(Class<?> type, String name, Class<?> items) {
        ObjectNode properties = (ObjectNode) schemas.path(type.getSimpleName()).path("properties");
        ObjectNode property = properties.putObject(name).put("type", "array");
        property.putObject("items").put("$ref", "#/components/schemas/" + items.getSimpleName());
    }

    private boolean property(ObjectNode property, RecordComponent component) {
        Class<?> type = component.getType();
        if (type == OptionalDouble.class) {
            number(property, component.getDeclaringRecord(), component.getName());
            return true;
        }
        if (type == Optional.class) {
            held(property, argument(component.getGenericType()), component);
            return true;
        }
        if (type == Map.class) {
            ObjectNode lists = property.put("type", "object").putObject("additionalProperties");
            lists.put("type", "array").putObject("items").put("type", "string");
            return false;
        }
        if (type == List.class) {
            property.put("type", "array");
            held(property.putObject("items"), argument(component.getGenericType()), component);
            return false;
        }
        held(property, type, component);
        return false;
    }

    private void held(ObjectNode property, Class<?> type, RecordComponent component) {
        if (type == String.class) {
            property.put("type", "string");
        } else if (type == Instant.class) {
            property.put("type", "string").put("format", "date-time");
        } else if (type == double.class) {
            number(property, component.getDeclaringRecord(), component.getName());
        } else if (type == int.class || type == long.class) {
            property.put("type", "integer");
        } else if (type == boolean.class) {
            property.put("type", "boolean");
        } else if (type == JsonNode.class && component.getDeclaringRecord() == DifferenceAnswer.class) {
            property.put("description", "any value of JSON: a text, a number, a list or an object");
        } else if (type == JsonNode.class) {
            String words = component.getName().equals("sizing") ? "the sizing as issued" : "the survey as it was typed";
            property.put("type", "object").put("description", words);
        } else if (type.isEnum()) {
            ArrayNode words = property.put("type", "string").putArray("enum");
            for (Object constant : type.getEnumConstants()) {
                words.add(constant.toString());
            }
        } else {
            add(type);
            property.put("$ref", "#/components/schemas/" + type.getSimpleName());
        }
    }

    /** The unit goes by the name alone, unless the record gives that name another meaning. */
    private static void number(ObjectNode property, Class<?> record, String name) {
        String unit = UNITS.getOrDefault(name, "a pure number");
        property.put("type", "number");
        property.put("description", UNITS.getOrDefault(record.getSimpleName() + "." + name, unit));
    }

    private static Class<?> argument(Type type) {
        return (Class<?>) ((ParameterizedType) type).getActualTypeArguments()[0];
    }
}
