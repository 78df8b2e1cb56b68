package org.treadwarm.web.csv;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;

/** Finds, or makes, the part of a survey that a row of a table is about. */
final class RowTarget {
    private final ObjectNode document;
    private final Set<String> taken = new HashSet<>();

    RowTarget(ObjectNode document) {
        this.document = document;
    }

    /** A part and where it stands. */
    record Found(ObjectNode part, String pointer) {}

    Optional<Found> room(int number, Map<String, String> row, List<CellProblem> problems) {
        String id = row.getOrDefault("id", "");
        String name = row.getOrDefault("room", "");
        List<Found> rooms = id.isEmpty() ? named(rooms(), name) : withId(rooms(), id);
        if (!id.isEmpty() && rooms.isEmpty()) {
            problems.add(new CellProblem(number, "id", id, "no room of this job has this id", "an id, or nothing"));
            return Optional.empty();
        }
        if (name.isEmpty() && id.isEmpty()) {
            problems.add(new CellProblem(number, "room", "", "the room's name is missing", "a name"));
            return Optional.empty();
        }
        if (rooms.size() > 1) {
            problems.add(several(number, "room", name));
            return Optional.empty();
        }
        return once(rooms.isEmpty() ? added(document, "", "rooms") : rooms.get(0), number, "room", name, problems);
    }

    Optional<Found> opening(int number, Map<String, String> row, List<CellProblem> problems) {
        String room = row.getOrDefault("room", "");
        String surface = row.getOrDefault("surface", "");
        List<Found> rooms = named(rooms(), room);
        if (rooms.size() != 1) {
            problems.add(
                    rooms.isEmpty()
                            ? new CellProblem(number, "room", room, "the job has no room of this name", "a room's name")
                            : several(number, "room", room));
            return Optional.empty();
        }
        List<Found> surfaces =
                new ArrayList<>(parts(rooms.get(0).part(), rooms.get(0).pointer(), "surfaces"));
        surfaces.removeIf(each -> !TableExport.title(each.part()).strip().equals(surface));
        String id = row.getOrDefault("id", "");
        if (!id.isEmpty()) {
            return known(number, id, surfaces, problems);
        }
        if (surfaces.size() != 1) {
            problems.add(
                    surfaces.isEmpty()
                            ? new CellProblem(
                                    number,
                                    "surface",
                                    surface,
                                    "the room has no surface of this name",
                                    "a surface's name")
                            : several(number, "surface", surface));
            return Optional.empty();
        }
        Found wall = surfaces.get(0);
        String name = row.getOrDefault("opening", "");
        List<Found> openings = name.isEmpty() ? List.of() : named(parts(wall.part(), wall.pointer(), "openings"), name);
        if (openings.size() > 1) {
            problems.add(several(number, "opening", name));
            return Optional.empty();
        }
        return once(
                openings.isEmpty() ? added(wall.part(), wall.pointer(), "openings") : openings.get(0),
                number,
                "opening",
                name,
                problems);
    }

    private Optional<Found> known(int number, String id, List<Found> surfaces, List<CellProblem> problems) {
        List<Found> openings = new ArrayList<>();
        surfaces.forEach(wall -> openings.addAll(withId(parts(wall.part(), wall.pointer(), "openings"), id)));
        if (openings.isEmpty()) {
            problems.add(new CellProblem(
                    number, "id", id, "no opening of this room and surface has this id", "an id, or nothing"));
            return Optional.empty();
        }
        return once(openings.get(0), number, "id", id, problems);
    }

    private Optional<Found> once(Found found, int number, String column, String given, List<CellProblem> problems) {
        if (taken.add(found.pointer())) {
            return Optional.of(found);
        }
        problems.add(new CellProblem(number, column, given, "this stands in the file twice", "one row each"));
        return Optional.empty();
    }

    private static CellProblem several(int number, String column, String given) {
        return new CellProblem(
                number,
                column,
                given,
                "several are called this, so it is not clear which",
                "a name that stands once, or the id");
    }

    private List<Found> rooms() {
        return parts(document, "", "rooms");
    }

    private static List<Found> parts(JsonNode owner, String pointer, String key) {
        List<Found> parts = new ArrayList<>();
        for (int i = 0; i < owner.path(key).size(); i++) {
            if (owner.path(key).path(i) instanceof ObjectNode part) {
                parts.add(new Found(part, pointer + "/" + key + "/" + i));
            }
        }
        return parts;
    }

    private static List<Found> named(List<Found> parts, String name) {
        return parts.stream()
                .filter(each -> each.part().path("name").asText("").strip().equals(name))
                .toList();
    }

    private static List<Found> withId(List<Found> parts, String id) {
        return parts.stream()
                .filter(each -> each.part().path("id").asText("").equals(id))
                .toList();
    }

    private static Found added(ObjectNode owner, String pointer, String key) {
        ArrayNode list = owner.path(key) instanceof ArrayNode known ? known : owner.putArray(key);
        return new Found(list.addObject(), pointer + "/" + key + "/" + (list.size() - 1));
    }
}
