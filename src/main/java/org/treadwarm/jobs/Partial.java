package org.treadwarm.jobs;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Function;
import org.treadwarm.intake.Document;
import org.treadwarm.survey.Problem;

/**
 * A sizing of what is finished in a draft. Unfinished rooms are taken for spaces held at their temperature, or left out when
 * that is not known either.
 *
 * @param judgement what the finished part comes to
 * @param unfinished the names of the rooms that are not sized, as typed
 */
public record Partial(Judgement judgement, List<String> unfinished) {
    /** Judges a document; where only some rooms have problems, the others are sized nevertheless. */
    public static Partial of(JsonNode document) {
        return of(document, Judgement::of);
    }

    /** The survey that {@link #of} would size, found without sizing it. */
    public static Partial unsized(JsonNode document) {
        return of(document, Judgement::unsized);
    }

    private static Partial of(JsonNode document, Function<JsonNode, Judgement> judge) {
        Judgement whole = judge.apply(document);
        Set<Integer> broken = new LinkedHashSet<>();
        for (Problem problem : whole.problems()) {
            String[] steps = problem.pointer().split("/");
            if (steps.length > 2 && steps[1].equals("rooms") && steps[2].matches("[0-9]{1,6}")) {
                broken.add(Integer.parseInt(steps[2]));
            }
        }
        if (whole.problems().isEmpty()
                || broken.isEmpty()
                || broken.size() == document.path("rooms").size()) {
            return new Partial(whole, List.of());
        }
        ObjectNode reduced = document.deepCopy();
        ArrayNode rooms = Document.mapper().createArrayNode();
        ObjectNode spaces = reduced.path("spaces") instanceof ObjectNode known ? known : reduced.putObject("spaces");
        List<String> unfinished = new ArrayList<>();
        for (int i = 0; i < document.path("rooms").size(); i++) {
            JsonNode room = document.path("rooms").get(i);
            if (!broken.contains(i)) {
                rooms.add(room);
                continue;
            }
            String name = room.path("name").asText();
            unfinished.add(name.isBlank() ? "room " + (i + 1) : name);
            if (room.has("indoorTemperature") && !name.isBlank() && !spaces.has(name)) {
                spaces.putObject(name).put("kind", "held").set("temperature", room.get("indoorTemperature"));
            }
        }
        reduced.set("rooms", rooms);
        Judgement judged = judge.apply(reduced);
        return new Partial(
                judged.problems().isEmpty() ? judged : whole,
                judged.problems().isEmpty() ? List.copyOf(unfinished) : List.of());
    }
}
