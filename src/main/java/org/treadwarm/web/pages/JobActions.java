package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import org.treadwarm.jobs.Job;

/** What the buttons of a job's page do to its document: rooms and parts come, are copied and go. */
final class JobActions {
    private final ObjectNode document;
    private final String name;

    /**
     * @param document the job's document, which is changed
     * @param name what stands in the field for the name of something new
     */
    JobActions(ObjectNode document, String name) {
        this.document = document;
        this.name = name;
    }

    /** Does what a button says; gives a sentence when it cannot, and nothing when it could. */
    String act(String action, TypedSite site) {
        String[] words = action.split(":", 2);
        String target = words.length > 1 ? words[1] : "";
        switch (words[0]) {
            case "add-room" -> {
                return addRoom();
            }
            case "add-space" -> {
                return addPart("spaces");
            }
            case "add-assembly" -> {
                return addPart("assemblies");
            }
            case "copy-room" -> copyRoom(target);
            case "remove-room" -> removeRoom(target);
            case "assume" -> {
                if (target.startsWith("/site/")) {
                    site.assume(target);
                }
            }
            default -> {}
        }
        return "";
    }

    private String addRoom() {
        if (name.isEmpty()) {
            return "The new room needs a name.";
        }
        rooms().addObject().put("name", name);
        return "";
    }

    private String addPart(String parts) {
        ObjectNode all = document.path(parts) instanceof ObjectNode known ? known : document.putObject(parts);
        if (name.isEmpty() || name.length() > JobPages.LONGEST_NAME || all.has(name)) {
            return name.isEmpty() ? "The new part needs a name." : "That name is too long, or taken already.";
        }
        ObjectNode fresh = all.putObject(name);
        if (parts.equals("spaces")) {
            fresh.put("kind", "unheated")
                    .putObject("temperatureFactor")
                    .put("reading", "0.8")
                    .put("basis", "assumed");
        }
        return "";
    }

    private void copyRoom(String id) {
        ArrayNode rooms = rooms();
        for (JsonNode room : rooms) {
            if (room.path("id").asText().equals(id)) {
                ObjectNode copy = room.deepCopy();
                withoutIds(copy);
                copy.put("name", freeName(room.path("name").asText()));
                rooms.add(copy);
                return;
            }
        }
    }

    private static void withoutIds(JsonNode node) {
        if (node instanceof ObjectNode object) {
            object.remove("id");
        }
        node.forEach(JobActions::withoutIds);
    }

    private String freeName(String taken) {
        List<String> names = new ArrayList<>();
        document.path("rooms").forEach(room -> names.add(room.path("name").asText()));
        document.path("spaces").fieldNames().forEachRemaining(names::add);
        for (int i = 2; ; i++) {
            String free = taken + " (" + i + ")";
            if (!names.contains(free)) {
                return free;
            }
        }
    }

    private void removeRoom(String id) {
        ArrayNode rooms = rooms();
        for (int i = 0; i < rooms.size(); i++) {
            if (rooms.get(i).path("id").asText().equals(id)) {
                rooms.remove(i);
                return;
            }
        }
    }

    private ArrayNode rooms() {
        return document.path("rooms") instanceof ArrayNode known ? known : document.putArray("rooms");
    }

    /** The page that shows what a button did, once the job is saved. */
    String pageAfter(Job saved, String action) {
        return switch (action.split(":", 2)[0]) {
            case "add-space" -> Links.part(saved.id(), "spaces", name);
            case "add-assembly" -> Links.part(saved.id(), "assemblies", name);
            case "add-room", "copy-room" -> {
                JsonNode rooms = saved.document().path("rooms");
                yield Links.part(
                        saved.id(),
                        "rooms",
                        rooms.path(rooms.size() - 1).path("id").asText());
            }
            default -> "/jobs/" + saved.id();
        };
    }
}
