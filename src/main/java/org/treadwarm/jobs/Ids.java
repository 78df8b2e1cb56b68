package org.treadwarm.jobs;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.security.SecureRandom;
import java.util.HashSet;
import java.util.Set;

/**
 * Ids for the rooms, surfaces, openings and junctions that come without one: those they had in the revision before, where
 * room name and place agree, else new ones.
 */
final class Ids {
    private static final String LETTERS = "abcdefghijkmnpqrstuvwxyz23456789";
    private static final int LENGTH = 10;
    private static final SecureRandom RANDOM = new SecureRandom();

    private final Set<String> taken = new HashSet<>();

    private Ids() {}

    /** Gives ids to a survey's parts, in place; does nothing to what is no survey. */
    static void give(JsonNode survey, JsonNode before) {
        new Ids().survey(survey, before);
    }

    private void survey(JsonNode survey, JsonNode before) {
        collect(survey.path("rooms"));
        survey.path("spaces").forEach(this::collectParts);
        for (JsonNode room : survey.path("rooms")) {
            JsonNode old = byName(before.path("rooms"), room.path("name").asText());
            id(room, old);
            parts(room, old);
        }
        survey.path("spaces")
                .properties()
                .forEach(space -> parts(space.getValue(), before.path("spaces").path(space.getKey())));
    }

    private void collect(JsonNode rooms) {
        rooms.forEach(room -> {
            take(room);
            collectParts(room);
        });
    }

    private void collectParts(JsonNode owner) {
        owner.path("surfaces").forEach(surface -> {
            take(surface);
            surface.path("openings").forEach(this::take);
        });
        owner.path("junctions").forEach(this::take);
    }

    private void take(JsonNode part) {
        if (part.path("id").isTextual()) {
            taken.add(part.path("id").textValue());
        }
    }

    private static JsonNode byName(JsonNode rooms, String name) {
        for (JsonNode room : rooms) {
            if (room.path("name").asText().equals(name)) {
                return room;
            }
        }
        return rooms.path(-1);
    }

    private void parts(JsonNode owner, JsonNode before) {
        list(owner.path("surfaces"), before.path("surfaces"));
        for (int i = 0; i < owner.path("surfaces").size(); i++) {
            list(
                    owner.path("surfaces").path(i).path("openings"),
                    before.path("surfaces").path(i).path("openings"));
        }
        list(owner.path("junctions"), before.path("junctions"));
    }

    private void list(JsonNode parts, JsonNode before) {
        if (parts.isArray()) {
            for (int i = 0; i < parts.size(); i++) {
                id(parts.get(i), before.path(i));
            }
        }
    }

    private void id(JsonNode part, JsonNode before) {
        if (!(part instanceof ObjectNode object) || object.has("id")) {
            return;
        }
        String known = before.path("id").asText("");
        String id = !known.isEmpty() && taken.add(known) ? known : fresh();
        object.put("id", id);
    }

    private String fresh() {
        while (true) {
            StringBuilder id = new StringBuilder(LENGTH);
            for (int i = 0; i < LENGTH; i++) {
                id.append(LETTERS.charAt(RANDOM.nextInt(LETTERS.length())));
            }
            if (taken.add(id.toString())) {
                return id.toString();
            }
        }
    }
}
