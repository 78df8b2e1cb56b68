package org.treadwarm.properties;

import com.fasterxml.jackson.core.JsonPointer;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.BiConsumer;
import org.treadwarm.intake.Document;
import org.treadwarm.intake.NotJsonException;

/** Looking at and changing JSON trees by pointer. */
public final class Trees {
    private Trees() {}

    /** A stored document. */
    public static JsonNode resource(String name) {
        try (InputStream in = Trees.class.getResourceAsStream(name)) {
            return Document.read(in.readAllBytes());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (NotJsonException e) {
            throw new AssertionError(name + ": " + e.problem(), e);
        }
    }

    /** JSON text, in which ' stands for ". */
    public static JsonNode json(String text) {
        try {
            return Document.mapper().readTree(text.replace('\'', '"'));
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Puts a value where the pointer leads; its parent must be there. */
    public static void set(JsonNode tree, String pointer, JsonNode value) {
        JsonPointer at = JsonPointer.compile(pointer);
        JsonNode parent = tree.at(at.head());
        if (parent instanceof ArrayNode list) {
            list.set(at.last().getMatchingIndex(), value);
        } else {
            ((ObjectNode) parent).set(at.last().getMatchingProperty(), value);
        }
    }

    /** Takes away what the pointer leads to. */
    public static void remove(JsonNode tree, String pointer) {
        JsonPointer at = JsonPointer.compile(pointer);
        JsonNode parent = tree.at(at.head());
        if (parent instanceof ArrayNode list) {
            list.remove(at.last().getMatchingIndex());
        } else {
            ((ObjectNode) parent).remove(at.last().getMatchingProperty());
        }
    }

    /** Visits everything below a node with its pointer, the node itself first. */
    public static void visit(String pointer, JsonNode node, BiConsumer<String, JsonNode> visitor) {
        visitor.accept(pointer, node);
        if (node.isArray()) {
            for (int i = 0; i < node.size(); i++) {
                visit(pointer + "/" + i, node.get(i), visitor);
            }
        }
        node.properties().forEach(field -> visit(pointer + "/" + escape(field.getKey()), field.getValue(), visitor));
    }

    /** A key as it stands in a pointer (RFC 6901). */
    public static String escape(String key) {
        return key.replace("~", "~0").replace("/", "~1");
    }

    /** Every number of an answer by its pointer. */
    public static Map<String, Double> numbers(JsonNode tree) {
        Map<String, Double> numbers = new TreeMap<>();
        visit("", tree, (pointer, node) -> {
            if (node.isNumber()) {
                numbers.put(pointer, node.doubleValue());
            }
        });
        return numbers;
    }
}
