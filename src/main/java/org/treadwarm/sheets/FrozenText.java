package org.treadwarm.sheets;

import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.databind.JsonNode;
import org.treadwarm.intake.Document;

/** Reads the documents that a sheet keeps. */
public final class FrozenText {
    private FrozenText() {}

    /**
     * A kept document as a tree.
     *
     * @throws IllegalStateException if it is no JSON document any more
     */
    public static JsonNode tree(String text) {
        try {
            return Document.mapper().readTree(text);
        } catch (JsonProcessingException e) {
            throw new IllegalStateException("a document kept by a sheet cannot be read", e);
        }
    }
}
