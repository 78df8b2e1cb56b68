package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.treadwarm.jobs.Job;

/**
 * The junctions of a room's heated floor with outdoors whose psi can be solved in section, and why others cannot.
 *
 * @param links titles of the junctions by the address that solves them
 * @param refusals sentences, about junctions and about surfaces that are no walls
 */
record WallFootOffers(Map<String, String> links, List<String> refusals) {
    static final WallFootOffers NONE = new WallFootOffers(Map.of(), List.of());

    static WallFootOffers of(Job job, JsonNode document, Part part) {
        JsonNode room = document.at(part.pointer());
        if (!part.isRoom()) {
            return NONE;
        }
        Map<String, String> feet = new LinkedHashMap<>();
        List<String> refusals = new ArrayList<>();
        for (JsonNode junction : room.path("junctions")) {
            String id = junction.path("id").asText();
            if (WallFootDraft.isAtFloor(junction) && !id.isEmpty()) {
                feet.put(
                        Links.part(job.id(), part.kind(), part.key()) + "/wall-foot/" + id,
                        junction.path("name").asText("junction"));
            }
        }
        if (feet.isEmpty()) {
            return NONE;
        }
        WallFootDraft.Made made = WallFootDraft.of(document, part);
        made.draft()
                .ifPresent(draft -> draft.notWalls()
                        .forEach((surface, why) ->
                                refusals.add("\"" + surface + "\" is not offered as its wall: " + why + ".")));
        String whyNot = made.draft()
                .map(draft -> draft.walls().isEmpty() ? WallFootDraft.NO_WALL : "")
                .orElse(made.whyNot());
        if (!whyNot.isEmpty()) {
            String junctions = String.join(", ", feet.values());
            refusals.add(0, "Psi of " + junctions + " cannot be solved in section. " + whyNot);
            feet.clear();
        }
        return new WallFootOffers(feet, refusals);
    }
}
