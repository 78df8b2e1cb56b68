package org.treadwarm.jobs;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.StreamReadConstraints;
import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.json.JsonMapper;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import org.treadwarm.intake.Document;
import org.treadwarm.store.Piece;

/**
 * A survey as the pieces the store keeps: site, assemblies, spaces, each room by its id, and whatever else stands at the top. A
 * document of another shape is kept whole, so that a draft of any kind is never lost.
 */
final class Pieces {
    private static final String REST = "survey";
    private static final String WHOLE = "document";
    private static final String ROOM = "room";
    /** Reads back whatever was kept: what stands in a draft may be longer than what the door lets in. */
    private static final ObjectMapper KEPT = JsonMapper.builder(JsonFactory.builder()
                    .streamReadConstraints(StreamReadConstraints.builder()
                            .maxStringLength(Integer.MAX_VALUE)
                            .maxNumberLength(Integer.MAX_VALUE)
                            .maxNameLength(Integer.MAX_VALUE)
                            .build())
                    .build())
            .build();

    private static final List<String> PARTS = List.of("site", "assemblies", "spaces");

    private Pieces() {}

    static List<Piece> of(JsonNode survey) {
        if (!canBeSplit(survey)) {
            return List.of(new Piece(WHOLE, WHOLE, text(survey)));
        }
        List<Piece> pieces = new ArrayList<>();
        ObjectNode rest = Document.mapper().createObjectNode();
        for (Map.Entry<String, JsonNode> field : survey.properties()) {
            if (PARTS.contains(field.getKey())) {
                pieces.add(new Piece(field.getKey(), field.getKey(), text(field.getValue())));
            } else if (!field.getKey().equals("rooms")) {
                rest.set(field.getKey(), field.getValue());
            }
        }
        if (!rest.isEmpty()) {
            pieces.add(new Piece(REST, REST, text(rest)));
        }
        survey.path("rooms")
                .forEach(room -> pieces.add(new Piece(ROOM, room.get("id").textValue(), text(room))));
        return pieces;
    }

    static JsonNode survey(List<Piece> pieces) {
        ObjectNode survey = Document.mapper().createObjectNode();
        ArrayNode rooms = Document.mapper().createArrayNode();
        for (Piece piece : pieces) {
            switch (piece.role()) {
                case WHOLE -> {
                    return tree(piece.text());
                }
                case REST -> survey.setAll((ObjectNode) tree(piece.text()));
                case ROOM -> rooms.add(tree(piece.text()));
                default -> survey.set(piece.role(), tree(piece.text()));
            }
        }
        survey.set("rooms", rooms);
        return survey;
    }

    private static boolean canBeSplit(JsonNode survey) {
        if (!survey.isObject() || !survey.path("rooms").isArray()) {
            return false;
        }
        Set<String> ids = new HashSet<>();
        for (JsonNode room : survey.path("rooms")) {
            String id = room.path("id").textValue();
            if (id == null || !id.matches("[A-Za-z0-9-]{1,40}") || !ids.add(id)) {
                return false;
            }
        }
        return true;
    }

    private static String text(JsonNode node) {
        try {
            return Document.mapper().writeValueAsString(node);
        } catch (JsonProcessingException e) {
            throw new IllegalArgumentException("a part of the survey cannot be written", e);
        }
    }

    private static JsonNode tree(String text) {
        try {
            return KEPT.readTree(text);
        } catch (JsonProcessingException e) {
            throw new IllegalStateException("a stored part of a survey cannot be read", e);
        }
    }
}
