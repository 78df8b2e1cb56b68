package org.treadwarm.jobs;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import org.treadwarm.intake.Document;

/** JSON trees for the tests of jobs. */
final class Trees {
    private Trees() {}

    static JsonNode tree(String text) {
        try {
            return Document.mapper().readTree(text);
        } catch (JsonProcessingException e) {
            throw new IllegalArgumentException(text, e);
        }
    }

    /** The invented survey of every feature. */
    static ObjectNode studio() {
        try (InputStream in = Trees.class.getResourceAsStream("/surveys/studio.json")) {
            return (ObjectNode) Document.mapper().readTree(in);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
