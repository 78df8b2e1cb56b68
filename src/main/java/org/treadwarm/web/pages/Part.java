package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.survey.Assembly;
import org.treadwarm.survey.Pointer;
import org.treadwarm.survey.Room;
import org.treadwarm.survey.Space;

/**
 * A part of a survey that has a page of its own.
 *
 * @param kind rooms, spaces or assemblies
 * @param key a room's id, or the name of a space or an assembly
 * @param title its heading
 * @param pointer its address
 * @param type its shape
 */
public record Part(String kind, String key, String title, String pointer, Class<? extends Record> type) {
    /** The part of this kind and key, if the document has it. */
    static Optional<Part> find(JsonNode document, String kind, String key) {
        if (kind.equals("rooms")) {
            for (int i = 0; i < document.path("rooms").size(); i++) {
                JsonNode room = document.path("rooms").path(i);
                if (room.path("id").asText().equals(key)) {
                    return Optional.of(room(i, key, room.path("name").asText()));
                }
            }
            return Optional.empty();
        }
        boolean known = (kind.equals("spaces") || kind.equals("assemblies"))
                && document.path(kind).path(key).isObject();
        return known
                ? Optional.of(new Part(
                        kind,
                        key,
                        key,
                        Pointer.to("/" + kind, key),
                        kind.equals("spaces") ? Space.class : Assembly.class))
                : Optional.empty();
    }

    /** A room as a part. */
    static Part room(int index, String id, String name) {
        return new Part("rooms", id, name.isBlank() ? "Room without a name" : name, "/rooms/" + index, Room.class);
    }

    /** Whether an address lies in it. */
    boolean holds(String address) {
        return address.equals(pointer) || address.startsWith(pointer + "/");
    }

    /** The heading of its form. */
    String formTitle() {
        return isRoom() ? "Room" : isAssembly() ? "Build-up" : "Space";
    }

    /** Whether it is a room. */
    public boolean isRoom() {
        return kind.equals("rooms");
    }

    /** Whether it is an assembly. */
    public boolean isAssembly() {
        return kind.equals("assemblies");
    }

    /** Writes the fields of a form into it; a room's fields keep to it, even if it has moved in the list since. */
    void write(ObjectNode document, Map<String, List<String>> fields) {
        FormData data = new FormData();
        JsonNode own = document.at(pointer);
        fields.forEach((name, values) -> within(name).ifPresent(steps -> data.write(steps, type, own, values.get(0))));
    }

    /** The steps below this part of a field's name. */
    private Optional<List<String>> within(String name) {
        if (!name.startsWith("/")) {
            return Optional.empty();
        }
        List<String> steps = FormData.steps(name);
        boolean ours = steps.size() > 2
                && steps.get(0).equals(kind)
                && (isRoom() ? steps.get(1).matches("[0-9]+") : steps.get(1).equals(key));
        return ours ? Optional.of(steps.subList(2, steps.size())) : Optional.empty();
    }

    /** Does what a button says, and gives the part's key afterwards. */
    String act(ObjectNode document, String action, String newName) {
        String[] words = action.split(":", 2);
        FormData data = new FormData();
        JsonNode own = document.at(pointer);
        Optional<List<String>> steps = words.length > 1 ? within(words[1]) : Optional.empty();
        steps.ifPresent(path -> {
            switch (words[0]) {
                case "add" -> data.add(path, type, own);
                case "remove" -> data.remove(path, own);
                case "assume" -> data.assume(path, type, own);
                default -> {}
            }
        });
        return isRoom() || newName.isEmpty() || newName.equals(key) ? key : rename(document, newName);
    }

    /** Why a new name cannot be taken; empty when it can. */
    String refusal(JsonNode document, String name) {
        if (isRoom() || name.equals(key)) {
            return "";
        }
        if (name.isEmpty() || name.length() > 200) {
            return "A name has 1 to 200 characters.";
        }
        return document.path(kind).has(name) ? "This name is taken already." : "";
    }

    /** Gives a space or an assembly another name, everywhere it is named. */
    private String rename(ObjectNode document, String name) {
        ObjectNode all = (ObjectNode) document.path(kind);
        List<Map.Entry<String, JsonNode>> entries = new ArrayList<>();
        all.properties().forEach(entry -> entries.add(Map.entry(entry.getKey(), entry.getValue())));
        all.removeAll();
        entries.forEach(entry -> all.set(entry.getKey().equals(key) ? name : entry.getKey(), entry.getValue()));
        renameIn(document, kind.equals("spaces") ? "to" : "assembly", name);
        return name;
    }

    private void renameIn(JsonNode node, String field, String name) {
        if (node instanceof ObjectNode object && object.path(field).asText().equals(key)) {
            object.put(field, name);
        }
        node.forEach(child -> renameIn(child, field, name));
    }

    /** Takes it out of the document. */
    void remove(ObjectNode document) {
        if (document.path(kind) instanceof ArrayNode rooms) {
            rooms.remove(Integer.parseInt(pointer.substring("/rooms/".length())));
        } else if (document.path(kind) instanceof ObjectNode all) {
            all.remove(key);
        }
    }

    /** The place in the page that a button's doing is to be seen at. */
    static Optional<String> anchor(String action) {
        String[] words = action.split(":", 2);
        return words.length > 1 && !words[0].equals("remove") ? Optional.of(Forms.id(words[1])) : Optional.empty();
    }
}
