package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.treadwarm.intake.Document;
import org.treadwarm.jobs.Partial;
import org.treadwarm.survey.Assembly;
import org.treadwarm.survey.Dimensions;
import org.treadwarm.survey.Direction;
import org.treadwarm.survey.Ground;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.Pointer;
import org.treadwarm.survey.Room;
import org.treadwarm.survey.Surface;
import org.treadwarm.survey.Survey;
import org.treadwarm.survey.WallFootQuestion;
import org.treadwarm.tables.Films;
import org.treadwarm.units.Reading;

/**
 * The question after a wall foot's psi, as far as a room of a job answers it: its slab, its ground and one of its walls. What the
 * room does not know is asked in a form of its own.
 *
 * @param room the room
 * @param floor its heated floor on a slab on the ground
 * @param document the job's document
 * @param roomPointer where the room stands in it
 * @param survey what could be read of it
 */
record WallFootDraft(Room room, HeatedFloor floor, JsonNode document, String roomPointer, Survey survey) {
    /** What the form asks for. */
    static final Set<String> ASKED =
            Set.of("heatedPlane", "foundation", "footConductivity", "edgeThickness", "edgeConductivity", "edgeDepth");

    static final String NO_WALL = "This room has no upright surface to outdoors, so no wall stands at its floor.";

    /** Of a wall known by its U-value, without films, m²·K/W; less is no wall but films. */
    private static final double LEAST_RESISTANCE = 0.01;

    /** The draft of a room, or why there is none. */
    record Made(Optional<WallFootDraft> draft, String whyNot) {
        static Made not(String why) {
            return new Made(Optional.empty(), why);
        }
    }

    /** Whether a junction of a room's document is a wall foot that can be solved in section. */
    static boolean isFoot(JsonNode room, JsonNode junction) {
        return isAtFloor(junction)
                && room.at("/heatedFloor/ground/kind").asText().equals("slab");
    }

    /** Whether a junction of a room's document is where the heated floor meets outdoors. */
    static boolean isAtFloor(JsonNode junction) {
        return junction.path("at").asText().equals("heated floor")
                && junction.path("to").asText(Survey.OUTDOORS).equals(Survey.OUTDOORS);
    }

    static Made of(JsonNode document, Part part) {
        if (!document.at(part.pointer() + "/heatedFloor/ground/kind").asText().equals("slab")) {
            return Made.not("Only a heated floor on a slab on the ground has a wall foot that is solved here.");
        }
        Optional<Survey> survey = Partial.unsized(document).judgement().survey();
        Optional<Room> room = survey.stream()
                .flatMap(all -> all.rooms().stream())
                .filter(each -> each.id().equals(Optional.of(part.key())))
                .findFirst();
        if (room.isEmpty()) {
            return Made.not("This room is a draft: what is marked on its page must be put right first.");
        }
        if (survey.get().site().dimensions() == Dimensions.EXTERNAL) {
            return Made.not(
                    "This job is taped by external dimensions; psi is solved here for internal ones, and must not"
                            + " be mixed with them.");
        }
        return new Made(
                Optional.of(new WallFootDraft(
                        room.get(), room.get().heatedFloor().orElseThrow(), document, part.pointer(), survey.get())),
                "");
    }

    /**
     * The walls to choose from: the assemblies of upright surfaces to outdoors, each with the surfaces that it is in. Upright is what
     * lies within 30° of it, whose heat flows horizontally (ISO 6946:2017, table 7, from memory); the section's wall stands upright with
     * those films, and a wall that the sizing counts with others would not add up with its psi.
     */
    Map<String, String> walls() {
        Map<String, String> walls = new LinkedHashMap<>();
        for (Surface surface : room.surfaces()) {
            Optional<Assembly> assembly =
                    Optional.ofNullable(survey.assemblies().get(surface.assembly()));
            boolean upright = assembly.filter(each -> each.heatFlow() == Direction.HORIZONTAL)
                    .isPresent();
            if (surface.to().equals(Survey.OUTDOORS) && upright) {
                walls.merge(surface.assembly(), surface.title(), (known, more) -> known + ", " + more);
            }
        }
        return walls;
    }

    /** Surfaces to outdoors that are not among the walls, each with the reason in words. */
    Map<String, String> notWalls() {
        Map<String, String> reasons = new LinkedHashMap<>();
        for (Surface surface : room.surfaces()) {
            Optional<Assembly> assembly =
                    Optional.ofNullable(survey.assemblies().get(surface.assembly()));
            if (surface.to().equals(Survey.OUTDOORS)
                    && assembly.filter(each -> each.heatFlow() != Direction.HORIZONTAL)
                            .isPresent()) {
                reasons.put(
                        surface.title(),
                        "the heat of its assembly \"" + surface.assembly() + "\" flows "
                                + assembly.orElseThrow().heatFlow().word()
                                + ", so it counts as a roof or a floor, more than 30° from upright. If it is a wall, set"
                                + " the assembly's heat flow to horizontal");
            }
        }
        return reasons;
    }

    /** The question for one of the walls, with what was typed. */
    ObjectNode question(String wall, Map<String, List<String>> typed) {
        ObjectNode question = Document.mapper().createObjectNode();
        Ground ground = floor.ground().orElseThrow();
        double area = ground.area().orElse(room.floorArea()).value();
        JsonNode here = document.at(roomPointer + "/heatedFloor");
        question.put(
                "characteristicDimension",
                area / (0.5 * ground.exposedPerimeter().value()));
        question.set("soilConductivity", here.at("/ground/soilConductivity").deepCopy());
        question.set("wallThickness", here.at("/ground/wallThickness").deepCopy());
        question.set("below", here.path("below").deepCopy());
        question.put("above", thicknessAbove());
        JsonNode assembly = document.at(Pointer.to("/assemblies", wall));
        for (String film : List.of("insideCoefficient", "outsideCoefficient")) {
            if (assembly.has(film)) {
                question.set(film, assembly.path(film).deepCopy());
            }
        }
        if (assembly.path("layers").isArray() && !assembly.path("layers").isEmpty()) {
            question.set("wall", assembly.path("layers").deepCopy());
        } else {
            ofUValue(wall, ground).ifPresent(layer -> question.putArray("wall").add(layer));
        }
        FormData data = new FormData();
        typed.forEach((name, values) -> {
            if (name.startsWith("/") && ASKED.contains(name.substring(1))) {
                data.write(List.of(name.substring(1)), WallFootQuestion.class, question, values.get(0));
            }
        });
        return question;
    }

    /**
     * A wall known by its U-value alone, as one layer as thick as the slab's outer walls: the section takes every wall as one material.
     * Empty where films alone resist more.
     */
    private Optional<ObjectNode> ofUValue(String wall, Ground ground) {
        Assembly assembly = survey.assemblies().get(wall);
        double inside = assembly.insideCoefficient()
                .map(film -> 1 / film.value())
                .orElse(Films.inside(Direction.HORIZONTAL.word()));
        double outside = assembly.outsideCoefficient()
                .map(film -> 1 / film.value())
                .orElse(Films.outside(Direction.HORIZONTAL.word()));
        return assembly.uValue()
                .map(u -> 1 / u.value() - inside - outside)
                .filter(resistance -> resistance > LEAST_RESISTANCE)
                .map(resistance -> Document.mapper()
                        .createObjectNode()
                        .put("name", wall)
                        .put("thickness", ground.wallThickness().value())
                        .put("resistance", resistance));
    }

    /** Layers known by their resistance alone, such as a carpet, count as thin. */
    private double thicknessAbove() {
        return floor.above().stream()
                .flatMap(layer -> layer.anyThickness().stream())
                .mapToDouble(Reading::value)
                .sum();
    }
}
