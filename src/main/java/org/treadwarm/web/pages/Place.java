package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;

/**
 * Where an address lies, for people: the part by its name, the page it is on, and the way within it.
 *
 * @param name the part's name
 * @param link its page
 * @param within the rest of the address
 */
public record Place(String name, String link, String within) {
    /** The place of an address of a job's document. */
    static Place of(String job, JsonNode document, String pointer) {
        List<String> steps = pointer.isEmpty() ? List.of("") : FormData.steps(pointer);
        String kind = steps.get(0);
        String rest = String.join(" ", steps.subList(Math.min(2, steps.size()), steps.size()));
        if (steps.size() > 1 && kind.equals("rooms")) {
            JsonNode room = document.at("/rooms/" + steps.get(1));
            String name = room.path("name").asText("");
            return new Place(
                    name.isBlank() ? "room " + steps.get(1) : name,
                    Links.part(job, kind, room.path("id").asText()),
                    rest);
        }
        if (steps.size() > 1 && (kind.equals("spaces") || kind.equals("assemblies"))) {
            return new Place(steps.get(1), Links.part(job, kind, steps.get(1)), rest);
        }
        return new Place(
                kind.isEmpty() ? "the job" : kind, "/jobs/" + job, String.join(" ", steps.subList(1, steps.size())));
    }
}
