package org.treadwarm.sizing;

import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.RoomSizing;
import org.treadwarm.sizing.Sizing.Warning;
import org.treadwarm.survey.FloorPart;
import org.treadwarm.survey.Ground;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.Heater;
import org.treadwarm.survey.HeaterKind;
import org.treadwarm.survey.Junction;
import org.treadwarm.survey.JunctionPlace;
import org.treadwarm.survey.Layer;
import org.treadwarm.survey.Place;
import org.treadwarm.survey.Pointer;
import org.treadwarm.survey.Room;
import org.treadwarm.survey.Space;
import org.treadwarm.survey.SpaceKind;
import org.treadwarm.survey.Surface;
import org.treadwarm.survey.Survey;
import org.treadwarm.survey.Zone;
import org.treadwarm.units.Numbers;

/** Second looks at a heated floor. */
final class FloorWarnings {
    private static final double MOST_COVERING = 0.15;
    private static final double HIGH_FLUX = 100;
    private static final double HOT_PLANE = 55;
    private static final List<String> TENDER = List.of(
            "timber",
            "wood",
            "oak",
            "parquet",
            "plywood",
            "chipboard",
            "particleboard",
            "cork",
            "laminate",
            "vinyl",
            "pvc",
            "plastic");

    private final Survey survey;
    private final List<Warning> warnings;
    private final Map<String, Integer> roomNumbers = new HashMap<>();

    FloorWarnings(Survey survey, List<Warning> warnings) {
        this.survey = survey;
        this.warnings = warnings;
        for (int i = 0; i < survey.rooms().size(); i++) {
            roomNumbers.put(survey.rooms().get(i).name(), i);
        }
    }

    private void add(String code, String pointer, String message, String why, String settle) {
        warnings.add(new Warning(code, pointer, message, why, settle));
    }

    void check(int i, Room room, RoomSizing answer) {
        HeatedFloor floor = room.heatedFloor().orElseThrow();
        String pointer = "/rooms/" + i + "/heatedFloor";
        areas(pointer, room, floor);
        below(pointer, room, floor, answer.floor());
        covering(pointer, floor, answer.floor());
        flux(pointer, floor, answer.floor());
        heater(pointer, floor, answer.floor());
        warmUp("/rooms/" + i + "/warmUp", answer.floor());
        new LayoutWarnings(warnings).check(pointer, room, floor, answer.floor());
        sameTwo(i, room, floor);
    }

    private void areas(String pointer, Room room, HeatedFloor floor) {
        double heated = floor.area().value();
        double whole = room.floorArea().value();
        if (heated > whole) {
            add(
                    "heated-area-too-large",
                    pointer + "/area",
                    "The heated area is larger than the room's floor.",
                    "Only free floor can be heated.",
                    "Tape the floor and the heated part again.");
        }
        if (whole > 1.05 * heated && room.surfaces().stream().noneMatch(surface -> Warnings.isFloor(surface, survey))) {
            add(
                    "rest-of-floor-not-listed",
                    pointer + "/area",
                    Numbers.fixed(whole - heated, 1) + " m2 of floor are not heated and stand in no surface.",
                    "The unheated rest of the floor loses heat too.",
                    "List it as a surface, with what lies below it.");
        }
        double strips = 0;
        for (int k = 0; k < floor.parts().size(); k++) {
            FloorPart part = floor.parts().get(k);
            strips += part.zone() == Zone.PERIPHERAL ? part.area().value() : 0;
            if (part.zone() == Zone.PERIPHERAL) {
                strip(pointer + "/parts/" + k + "/zone", strips, room, floor);
            }
        }
        if (floor.zone() == Zone.PERIPHERAL && floor.parts().isEmpty()) {
            strip(pointer + "/zone", heated, room, floor);
        }
    }

    private void strip(String pointer, double area, Room room, HeatedFloor floor) {
        if (area > perimeter(room, floor)) {
            add(
                    "peripheral-area-too-wide",
                    pointer,
                    "The peripheral area is wider than 1 m along the outer walls.",
                    "35 °C is meant for a strip of at most 1 m along outer walls, where nobody stays (EN 1264-3).",
                    "Make it an occupied area, or heat only the strip.");
        }
    }

    /** Length of outer wall in m: the ground floor's perimeter, or that of the outer walls over the room's height. */
    private double perimeter(Room room, HeatedFloor floor) {
        if (floor.ground().isPresent()) {
            return floor.ground().get().exposedPerimeter().value();
        }
        return room.surfaces().stream()
                        .filter(surface -> surface.to().equals(Survey.OUTDOORS) && !Warnings.isFloor(surface, survey))
                        .mapToDouble(Surface::grossArea)
                        .sum()
                / room.height().value();
    }

    private void below(String pointer, Room room, HeatedFloor floor, FloorSizing answer) {
        if (floor.below().isEmpty()) {
            add(
                    "nothing-below",
                    pointer + "/below",
                    "No layer lies below the heater.",
                    "Without insulation much of the heat goes down.",
                    "List the insulation, or add some.");
        }
        Optional<Ground> ground = floor.ground();
        if (ground.isPresent()
                && room.junctions().stream().map(Junction::at).noneMatch(JunctionPlace.HEATED_FLOOR::equals)) {
            add(
                    "no-slab-edge",
                    "/rooms" + pointer.substring(6, pointer.indexOf("/heatedFloor")) + "/junctions",
                    "A heated floor on the ground has no junction at the heated floor.",
                    "At the wall foot the warm slab meets the cold outside.",
                    "List the wall foot with its psi, or leave it out knowingly.");
        }
        Warnings.metal(Place.ROOT.at(pointer + "/below"), floor.below(), warnings);
        Minimum least = minimum(floor);
        double below = answer.resistanceBelow().orElseThrow();
        if (below < least.resistance()) {
            add(
                    "little-insulation-below",
                    pointer + "/below",
                    "The layers below the heater have R " + Numbers.fixed(below, 2) + " m2.K/W; over " + least.over()
                            + " " + Numbers.fixed(least.resistance(), 2) + " is the least.",
                    "EN 1264-4, least insulation below a heated floor (from memory).",
                    "More insulation below the heater.");
        }
        double down = answer.downwardFlux().orElseThrow();
        if (down < 0) {
            add(
                    "heated-from-below",
                    pointer,
                    "This floor is heated from below.",
                    "What lies below is warmer than the heater plane.",
                    "Check the temperature below; it may be off on the coldest day.");
        }
        for (int k = 0; k < floor.below().size(); k++) {
            Layer layer = floor.below().get(k);
            if (layer.maximumTemperature().isPresent()
                    && answer.heaterTemperature().orElseThrow()
                            > layer.maximumTemperature().get().value()) {
                add(
                        "layer-below-too-warm",
                        Pointer.to(pointer + "/below", k) + "/maximumTemperature",
                        "The heater plane would be warmer than \"" + layer.title(k + 1) + "\" may be.",
                        "The layer lies at the heater.",
                        "Another material, or less flux.");
            }
        }
    }

    /** The least resistance below a heated floor and what it is over. */
    private record Minimum(double resistance, String over) {}

    private Minimum minimum(HeatedFloor floor) {
        if (floor.ground().isPresent()) {
            return new Minimum(1.25, "the ground");
        }
        String to = floor.to().orElseThrow();
        if (to.equals(Survey.OUTDOORS)) {
            double outdoor = survey.site().outdoorTemperature().value();
            return new Minimum(outdoor >= 0 ? 1.25 : outdoor >= -5 ? 1.50 : 2.00, "outdoors");
        }
        Space space = survey.spaces().get(to);
        if (space == null) {
            return new Minimum(0.75, "a heated room");
        }
        return new Minimum(1.25, space.kind() == SpaceKind.HELD ? "a neighbour" : "an unheated space");
    }

    private void covering(String pointer, HeatedFloor floor, FloorSizing answer) {
        double above = answer.resistanceAbove().orElseThrow();
        if (above > MOST_COVERING) {
            add(
                    "thick-covering",
                    pointer + "/above",
                    "The layers above the heater have R " + Numbers.fixed(above, 2) + " m2.K/W.",
                    "More than 0.15 makes the heater hot and sluggish (EN 1264-3, read in trade planning handbooks).",
                    "A thinner covering, or one made for heated floors.");
        }
        if (!floor.above().isEmpty()
                && floor.maximumSurfaceTemperature().isEmpty()
                && isTender(floor.above().get(0))) {
            add(
                    "covering-limit-missing",
                    pointer + "/maximumSurfaceTemperature",
                    "The covering may not like the warmth, and no highest surface temperature is given.",
                    "Timber, cork, laminate and vinyl are limited, usually to 27 °C (common practice, no source); the maker's figure decides.",
                    "Give the maker's figure, or 27 °C.");
        }
    }

    private static boolean isScreed(Layer layer) {
        String words = words(layer);
        return words.contains("screed") || words.contains("concrete") || words.contains("mortar");
    }

    private static boolean isTender(Layer layer) {
        String words = words(layer);
        for (String tender : TENDER) {
            if (words.contains(tender)) {
                return true;
            }
        }
        return false;
    }

    private static String words(Layer layer) {
        return (" " + layer.name().orElse("") + " " + layer.material().orElse("")).toLowerCase(Locale.ROOT);
    }

    private void flux(String pointer, HeatedFloor floor, FloorSizing answer) {
        double required = answer.requiredFlux().orElseThrow();
        if (required > HIGH_FLUX) {
            add(
                    "high-flux",
                    pointer,
                    "The floor would have to give " + Numbers.fixed(required, 1) + " W/m2.",
                    "100 W/m2 is what a floor gives at 29 °C in a room at 20 °C (EN 1264-2).",
                    "Lose less heat first: insulation, windows, draughts; or heat more of the floor.");
        }
        double heater = answer.heaterTemperature().orElseThrow();
        if (heater > HOT_PLANE && floor.above().stream().anyMatch(FloorWarnings::isScreed)) {
            add(
                    "hot-heater-plane",
                    pointer,
                    "The heater plane would be " + Numbers.fixed(heater, 1) + " °C warm.",
                    "Cement and calcium sulfate screeds bear 55 °C (DIN 18560-2, read on a trade page).",
                    "A thinner covering, or less flux.");
        }
    }

    private void heater(String pointer, HeatedFloor floor, FloorSizing answer) {
        floor.heater().ifPresent(heater -> {
            if (heater.kind() == HeaterKind.WATER
                    && heater.spacing().isEmpty()
                    && floor.parts().isEmpty()) {
                add(
                        "water-not-checked",
                        pointer + "/heater",
                        "What the warm water can give is not yet checked.",
                        "Without a spacing of the pipes there is no limit for the water.",
                        "Lay the circuit out before ordering.");
            }
            answer.sectionReason()
                    .ifPresent(
                            reason -> add(
                                    "spacing-not-solved",
                                    pointer + "/heater/spacing",
                                    "The floor between the cables or pipes was not solved: " + reason + ".",
                                    "The heater is taken as a plane: between cables or pipes the surface is cooler, above them warmer.",
                                    "Give thickness and conductivity of the layer that holds the heater; keep a reserve to the surface limit."));
            if (heater.kind() == HeaterKind.WATER
                    && (answer.section().isPresent() || !answer.parts().isEmpty())
                    && answer.water().isEmpty()) {
                add(
                        "loops-not-laid",
                        pointer + "/heater",
                        "No loops are laid for this floor.",
                        "It gives no heat, needs water above 95 °C (60 °C with glycol), or no number of loops keeps 100 m and 25 kPa.",
                        "Look at the flux, the feeders and the pipe; another manifold may be nearer.");
            }
            density(pointer + "/heater", heater);
        });
    }

    private void warmUp(String pointer, FloorSizing answer) {
        answer.warmupReason()
                .ifPresent(reason -> add(
                        "warm-up-not-followed",
                        pointer,
                        "The warming up is not followed, and no reheat is counted: " + reason + ".",
                        "Without it the room may be slow to warm.",
                        "Give density and specific heat of the layers, or a reheat per floor area."));
        answer.warmup()
                .filter(found -> found.density() < found.densityNeeded() * (1 - 1e-9))
                .ifPresent(found -> add(
                        "warm-up-too-slow",
                        pointer,
                        "The installed " + Numbers.fixed(found.density(), 0) + " W/m2 warm the room "
                                + (found.hours().isPresent()
                                        ? "in " + Numbers.fixed(found.hours().getAsDouble(), 1) + " h"
                                        : "not within 72 h")
                                + ", not in " + Numbers.fixed(found.within(), 1) + " h; that takes "
                                + Numbers.fixed(found.densityNeeded(), 0) + " W/m2.",
                        "A heavy floor warms slowly, and its heater also makes up for what is lost meanwhile.",
                        "A shallower setback, a longer time, less heat loss or more density."));
    }

    private void density(String pointer, Heater heater) {
        if (heater.density().isEmpty()
                || heater.linearPower().isEmpty()
                || heater.spacing().isEmpty()) {
            return;
        }
        double made =
                heater.linearPower().get().value() / heater.spacing().get().value();
        if (Math.abs(made - heater.density().get().value()) > 0.05 * made) {
            add(
                    "density-differs",
                    pointer + "/density",
                    "The cable's power over its spacing is " + Numbers.fixed(made, 0) + " W/m2, not the density given.",
                    "The density given is what this sizing uses.",
                    "Correct one of density, power per metre and spacing.");
        }
    }

    /** A surface and a heated floor between the same two rooms or spaces are most likely the same construction twice. */
    private void sameTwo(int i, Room room, HeatedFloor floor) {
        if (floor.to().isEmpty() || floor.to().get().equals(Survey.OUTDOORS)) {
            return;
        }
        String other = floor.to().get();
        List<Surface> own = room.surfaces();
        for (int k = 0; k < own.size(); k++) {
            if (own.get(k).to().equals(other)) {
                twice(i, floor, "/rooms/" + i + "/surfaces/" + k, own.get(k));
            }
        }
        Integer below = roomNumbers.get(other);
        if (below != null) {
            heard(i, room, floor, "/rooms/" + below, survey.rooms().get(below).surfaces());
        }
        Space space = survey.spaces().get(other);
        if (space != null) {
            heard(i, room, floor, Pointer.to("/spaces", other), space.surfaces());
        }
    }

    private void heard(int i, Room room, HeatedFloor floor, String owner, List<Surface> surfaces) {
        for (int k = 0; k < surfaces.size(); k++) {
            if (surfaces.get(k).to().equals(room.name())) {
                twice(i, floor, owner + "/surfaces/" + k, surfaces.get(k));
            }
        }
    }

    private void twice(int i, HeatedFloor floor, String surfacePointer, Surface surface) {
        String floorPointer = "/rooms/" + i + "/heatedFloor";
        String areas = "the surface \"" + surface.title() + "\" of " + Numbers.fixed(surface.grossArea(), 1)
                + " m2 and the heated floor of " + Numbers.fixed(floor.area().value(), 1) + " m2";
        for (String pointer : List.of(surfacePointer, floorPointer)) {
            add(
                    "construction-twice",
                    pointer,
                    "Between the same two, " + areas + " are both listed.",
                    "The construction under a heated floor is not also a ceiling or floor surface.",
                    "Cut the heated area out of the surface, or leave the surface out.");
        }
    }
}
