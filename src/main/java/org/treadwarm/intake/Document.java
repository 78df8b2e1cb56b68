package org.treadwarm.intake;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonParser;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.core.StreamReadFeature;
import com.fasterxml.jackson.databind.DeserializationFeature;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import org.treadwarm.survey.Pointer;
import org.treadwarm.survey.Problem;

/** JSON text as a tree, or what keeps it from being JSON. */
public final class Document {
    /** How deep objects and lists may lie in each other. */
    public static final int DEEPEST = 40;

    /** The longest single text. */
    public static final int LONGEST_TEXT = 10_000;

    private static final ObjectMapper MAPPER = JsonMapper.builder(JsonFactory.builder()
                    .streamReadConstraints(StreamReadConstraints.builder()
                            .maxNestingDepth(DEEPEST)
                            .maxStringLength(LONGEST_TEXT)
                            .maxNameLength(LONGEST_TEXT)
                            .maxNumberLength(200)
                            .build())
                    .enable(StreamReadFeature.USE_FAST_DOUBLE_PARSER)
                    .build())
            .enable(DeserializationFeature.FAIL_ON_READING_DUP_TREE_KEY)
            .build();

    private Document() {}

    /** The mapper that reads and writes documents, with their limits. */
    public static ObjectMapper mapper() {
        return MAPPER;
    }

    /**
     * Reads JSON.
     *
     * @throws NotJsonException when the text is no JSON, holds a key twice, or is nested too deep
     */
    public static JsonNode read(byte[] json) throws NotJsonException {
        try (JsonParser parser = MAPPER.createParser(json)) {
            JsonNode tree = read(parser);
            if (mayHoldHalfCharacters(json)) {
                refuseHalfCharacters(tree, "");
            }
            return tree;
        } catch (IOException e) {
            throw new NotJsonException(new Problem("", "the text", "this could not be read", "JSON in UTF-8"));
        }
    }

    /** Only an escape can write half of a character that needs two. */
    private static boolean mayHoldHalfCharacters(byte[] json) {
        // As a text of single bytes, since the Java machine finds characters in texts many at a time.
        String bytes = new String(json, StandardCharsets.ISO_8859_1);
        return bytes.indexOf('\\') >= 0 && (bytes.contains("\\ud") || bytes.contains("\\uD"));
    }

    private static void refuseHalfCharacters(JsonNode node, String pointer) throws NotJsonException {
        if (node.isTextual() && isHalf(node.textValue())) {
            throw halfCharacter(pointer);
        }
        for (Map.Entry<String, JsonNode> field : node.properties()) {
            String at = Pointer.to(pointer, field.getKey());
            if (isHalf(field.getKey())) {
                throw halfCharacter(pointer);
            }
            refuseHalfCharacters(field.getValue(), at);
        }
        if (node.isArray()) {
            for (int i = 0; i < node.size(); i++) {
                refuseHalfCharacters(node.get(i), Pointer.to(pointer, i));
            }
        }
    }

    private static boolean isHalf(String text) {
        return !StandardCharsets.UTF_8.newEncoder().canEncode(text);
    }

    private static NotJsonException halfCharacter(String pointer) {
        return new NotJsonException(new Problem(
                pointer, "half a character", "this text holds half of a character", "whole Unicode characters"));
    }

    private static JsonNode read(JsonParser parser) throws NotJsonException, IOException {
        try {
            JsonNode tree = MAPPER.readTree(parser);
            if (tree == null || tree.isMissingNode()) {
                throw new NotJsonException(new Problem("", "nothing", "there is no document", "a JSON object"));
            }
            if (parser.nextToken() != null) {
                throw new NotJsonException(
                        new Problem("", "more text", "something follows the document", "one JSON object"));
            }
            return tree;
        } catch (JsonProcessingException e) {
            throw new NotJsonException(problem(parser, e));
        }
    }

    private static Problem problem(JsonParser parser, JsonProcessingException e) {
        String pointer = parser.getParsingContext().pathAsPointer().toString();
        String original = e.getOriginalMessage() == null ? "" : e.getOriginalMessage();
        String where = e.getLocation() == null
                ? ""
                : " (line " + e.getLocation().getLineNr() + ", column "
                        + e.getLocation().getColumnNr() + ")";
        if (original.startsWith("Duplicate")) {
            return new Problem(pointer, "a key twice", "this key stands twice in one object" + where, "each key once");
        }
        if (original.contains("nesting depth")) {
            return new Problem(
                    pointer,
                    "deep nesting",
                    "the document is nested too deep" + where,
                    "at most " + DEEPEST + " levels");
        }
        if (original.contains("exceeds the maximum")) {
            return new Problem(
                    pointer,
                    "a very long text or number",
                    "this text or number is too long" + where,
                    "at most " + LONGEST_TEXT + " characters for a text and 200 for a number");
        }
        JsonToken token = parser.currentToken();
        return new Problem(
                pointer,
                token == null ? "the text" : "the text after " + token.name().toLowerCase(java.util.Locale.ROOT),
                "this is not JSON" + where,
                "JSON (RFC 8259)");
    }

    /** What was given, as text for a message: shortened to 200 characters. */
    static String shown(JsonNode node) {
        if (node.isNumber() && !Double.isFinite(node.doubleValue())) {
            return "a number beyond all bounds";
        }
        String text = node.isTextual() ? node.textValue() : node.isContainerNode() ? container(node) : node.toString();
        if (text.isBlank()) {
            return "an empty text";
        }
        return text.length() <= 200 ? text : text.substring(0, 199) + "…";
    }

    private static String container(JsonNode node) {
        List<String> words = node.isObject() ? List.of("an object with ", " keys") : List.of("a list of ", "");
        return words.get(0) + node.size() + words.get(1);
    }
}
