package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.physics.moisture.SurfaceTemperature;
import org.treadwarm.sizing.Plan.Face;
import org.treadwarm.sizing.Plan.Link;
import org.treadwarm.sizing.Plan.LinkKind;
import org.treadwarm.sizing.Plan.Side;
import org.treadwarm.sizing.Sizing.RoomSizing;
import org.treadwarm.sizing.Sizing.Warning;
import org.treadwarm.survey.Air;
import org.treadwarm.survey.Assembly;
import org.treadwarm.survey.Bridging;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.Heater;
import org.treadwarm.survey.HeaterKind;
import org.treadwarm.survey.Layer;
import org.treadwarm.survey.Place;
import org.treadwarm.survey.Room;
import org.treadwarm.survey.Space;
import org.treadwarm.survey.Surface;
import org.treadwarm.survey.Survey;
import org.treadwarm.survey.Unusual;
import org.treadwarm.units.Declared;
import org.treadwarm.units.Numbers;
import org.treadwarm.units.Reading;

/** The good sense of an old hand: what is possible but deserves a second look, with why and what would settle it. */
final class Warnings {
    /** Temperature rise allowed between the two limits of the combined method (ISO 6946:2017, 6.7.2, from memory). */
    private static final double MOST_LIMIT_RATIO = 1.5;

    /** No metal used in building conducts less, no other material more, W/(m·K) (common practice, no source). */
    private static final double LEAST_OF_METALS = 10;

    private static final Place ASSEMBLIES = Place.ROOT.at("/assemblies");
    private static final Place SPACES = Place.ROOT.at("/spaces");

    private final Plan plan;
    private final Survey survey;
    private final Evaluation numbers;
    private final List<Warning> warnings = new ArrayList<>();
    private final List<Warning> ofRooms = new ArrayList<>();
    private final FloorWarnings floorWarnings;
    private final List<Unusual> unusual;

    Warnings(Plan plan, Evaluation numbers, List<Unusual> unusual) {
        this.plan = plan;
        this.survey = plan.survey;
        this.numbers = numbers;
        this.unusual = unusual;
        this.floorWarnings = new FloorWarnings(survey, ofRooms);
    }

    /**
     * Looks at a room. To be called for each room in survey order, best as soon as its answer stands: in a job of many
     * rooms, coming back to a room later costs more than looking at it.
     */
    void room(int i, RoomSizing answer) {
        Room room = survey.rooms().get(i);
        Place at = Place.ROOT.item("/rooms", i);
        double volume = room.air()
                .flatMap(Air::volume)
                .map(Reading::value)
                .orElse(room.floorArea().value() * room.height().value());
        changes(at.at("/air"), room.air(), volume, ofRooms);
        gains(i, answer, at);
        if (room.heatedFloor().isPresent()) {
            floorWarnings.check(i, room, answer);
        }
    }

    /** All there is to say, once every room has been looked at. */
    List<Warning> all() {
        unusual.forEach(this::unusual);
        site();
        assemblies();
        grounds();
        spaces();
        warnings.addAll(ofRooms);
        return List.copyOf(warnings);
    }

    private void add(String code, String pointer, String message, String why, String settle) {
        warnings.add(new Warning(code, pointer, message, why, settle));
    }

    private void unusual(Unusual found) {
        Declared declared = found.declared();
        double value = found.reading().value();
        boolean low = value < declared.plausibleFrom();
        String unit = declared.kind().siUnit();
        add(
                "unusual-reading",
                found.at().pointer(),
                "The " + declared.label() + " of " + Numbers.significant(value, 6) + (unit.isEmpty() ? "" : " " + unit)
                        + " is unusually " + (low ? "low" : "high") + ".",
                "Usual is " + (low ? "at least " : "at most ")
                        + Numbers.significant(low ? declared.plausibleFrom() : declared.plausibleTo(), 6)
                        + (unit.isEmpty() ? "" : " " + unit)
                        + " (common practice, no source); a slip of the unit or of the decimal mark is likely.",
                "Look at the reading as it was typed, \"" + found.reading().typed()
                        + "\", and take it again if in doubt.");
    }

    private void site() {
        survey.site().annualMeanTemperature().ifPresent(mean -> {
            if (survey.site().outdoorTemperature().value() > mean.value()) {
                add(
                        "outdoor-above-annual-mean",
                        "/site/outdoorTemperature",
                        "The design outdoor temperature is above the annual mean.",
                        "The coldest design day is colder than the average of the year.",
                        "Look both up again for the place.");
            }
        });
        if (survey.site().heatSourceDrop().isPresent()
                && survey.rooms().stream().noneMatch(Warnings::isHeatedByWater)) {
            add(
                    "drop-without-effect",
                    "/site/heatSourceDrop",
                    "The pressure drop of the heat source has no effect.",
                    "It counts for the pump, and no room of the survey has warm water in its floor.",
                    "Leave it out, or say which floors are heated by water.");
        }
    }

    private static boolean isHeatedByWater(Room room) {
        return room.heatedFloor()
                .flatMap(HeatedFloor::heater)
                .map(Heater::kind)
                .filter(HeaterKind.WATER::equals)
                .isPresent();
    }

    private void assemblies() {
        for (int i = 0; i < plan.faces.size(); i++) {
            Face face = plan.faces.get(i);
            Plan.AssemblyPlan compiled = plan.assemblies.get(face.assembly());
            Place at = ASSEMBLIES.key(compiled.name());
            if (face.side() != Side.GROUND) {
                uValue(at, compiled.name(), numbers.faceUValue[i]);
            }
            if (compiled.stack() != Stack.NONE && numbers.faceUpper[i] > MOST_LIMIT_RATIO * numbers.faceLower[i]) {
                add(
                        "bridging-limits-far-apart",
                        at.at("/layers").pointer(),
                        "The two limits of the combined method lie far apart: R' is "
                                + Numbers.fixed(numbers.faceUpper[i] / numbers.faceLower[i], 2) + " times R''.",
                        "ISO 6946 holds while R' is at most 1.5 times R'' (from memory); metal through insulation is outside its scope.",
                        "A two-dimensional calculation by ISO 10211, or the maker's tested U-value.");
            }
        }
        mouldAndUnused();
    }

    private void uValue(Place at, String name, double uValue) {
        if (uValue < 0.05 || uValue > 7) {
            add(
                    "unusual-u-value",
                    at.pointer(),
                    "The U-value of \"" + name + "\" comes out at " + Numbers.significant(uValue, 3) + " W/(m2.K).",
                    "Built parts lie between 0.05 and 7 W/(m2.K) (common practice, no source).",
                    "Check each layer's thickness and conductivity.");
        }
    }

    private void mouldAndUnused() {
        boolean[] opaqueOutside = new boolean[plan.assemblies.size()];
        for (Link link : plan.links) {
            if (link.kind() == LinkKind.SURFACE && link.other() == plan.outdoors && link.owner() < plan.rooms) {
                opaqueOutside[plan.faces.get(link.face()).assembly()] = true;
            }
        }
        int i = 0;
        for (Map.Entry<String, Assembly> entry : survey.assemblies().entrySet()) {
            Place at = ASSEMBLIES.key(entry.getKey());
            Assembly assembly = entry.getValue();
            if (opaqueOutside[i]) {
                mould(at, entry.getKey(), plan.assemblies.get(i));
            }
            if (assembly.uValue().isPresent()
                    && (assembly.insideCoefficient().isPresent()
                            || assembly.outsideCoefficient().isPresent())) {
                add(
                        "coefficient-without-effect",
                        at.pointer(),
                        "A surface coefficient beside a U-value has no effect.",
                        "A U-value is used as given, films included.",
                        "Leave the coefficient out, or describe the layers.");
            }
            Place layers = at.at("/layers");
            layersWithoutUse(layers, assembly.layers());
            metal(layers, assembly.layers(), warnings);
            i++;
        }
    }

    /** Metal through a layer is outside the scope of the combined method, however little of it there is. */
    static void metal(Place at, List<Layer> layers, List<Warning> warnings) {
        for (int k = 0; k < layers.size(); k++) {
            double conductivity = Answers.value(layers.get(k).bridging().flatMap(Bridging::conductivity));
            if (conductivity > LEAST_OF_METALS) {
                warnings.add(new Warning(
                        "metal-through-layer",
                        at.item(k).at("/bridging").pointer(),
                        "Metal seems to cross this layer.",
                        "Metal through insulation is out of scope of the combined method of ISO 6946 (from memory).",
                        "A two-dimensional calculation by ISO 10211, or the maker's tested U-value."));
            }
        }
    }

    private void layersWithoutUse(Place at, List<Layer> layers) {
        for (int k = 0; k < layers.size(); k++) {
            if (layers.get(k).maximumTemperature().isPresent()) {
                add(
                        "limit-without-effect",
                        at.item(k).at("/maximumTemperature").pointer(),
                        "A highest temperature counts only for layers above a heater.",
                        "Layers of an assembly are not heated from within.",
                        "Leave it out here.");
            }
        }
    }

    private void mould(Place at, String name, Plan.AssemblyPlan assembly) {
        double resistance;
        if (assembly.stack() == Stack.NONE) {
            resistance = 1 / numbers.in[assembly.uValue()] - assembly.insideFilm() + SurfaceTemperature.MOULD_FILM;
        } else {
            double films = SurfaceTemperature.MOULD_FILM + numbers.otherFilm(assembly, Side.OUTDOORS);
            resistance = numbers.resistance(assembly.stack(), films);
        }
        double factor = SurfaceTemperature.factorOfPlaneElement(resistance);
        if (factor < SurfaceTemperature.LEAST_FACTOR) {
            add(
                    "cold-surface",
                    at.pointer(),
                    "\"" + name + "\" has a cold inside surface: its temperature factor f_Rsi is "
                            + Numbers.fixed(factor, 2) + ".",
                    "Below 0.70 mould is likely in a dwelling at 20 °C and 50 % (ISO 13788 and DIN 4108-2, from memory).",
                    "Insulate it, or keep the room drier; look at corners and openings first.");
        }
    }

    private void grounds() {
        for (int i = 0; i < plan.grounds.size(); i++) {
            double dimension = numbers.groundDimension[i];
            if (dimension < 1 || dimension > 40) {
                String address = plan.address(plan.grounds.get(i).perimeter());
                add(
                        "unusual-slab",
                        address,
                        "The slab's area over half its perimeter, B', is " + Numbers.significant(dimension, 3) + " m.",
                        "Real slabs lie between 1 and 40 m (common practice, no source); area and perimeter must be of one and the same slab.",
                        "Give the whole slab's area and perimeter, or the room's own for both.");
            }
        }
    }

    private void spaces() {
        boolean[] named = namedNodes();
        int node = plan.rooms;
        for (Map.Entry<String, Space> entry : survey.spaces().entrySet()) {
            Place at = SPACES.key(entry.getKey());
            Space space = entry.getValue();
            if (!named[node]) {
                add(
                        "space-not-named",
                        at.pointer(),
                        "No room looks at the space \"" + entry.getKey() + "\".",
                        "It has no effect on any room.",
                        "Name it as the other side of a surface, or leave it out.");
            }
            changes(at.at("/air"), space.air(), Answers.value(space.air().flatMap(Air::volume)), warnings);
            node++;
        }
    }

    /** Which nodes something leads to, or lead to a room or space themselves. */
    private boolean[] namedNodes() {
        boolean[] named = new boolean[plan.nodeNames.length];
        for (Link link : plan.links) {
            named[link.other()] = true;
            named[link.owner()] |= link.other() < plan.outdoors;
        }
        for (Plan.FloorPlan floor : plan.floors) {
            if (floor != null && floor.other() != Stack.NONE) {
                named[floor.other()] = true;
            }
        }
        return named;
    }

    private static void changes(Place at, Optional<Air> air, double volume, List<Warning> warnings) {
        if (air.isEmpty() || volume <= 0 || air.get().changeRate().isPresent()) {
            return;
        }
        double flow = Answers.value(air.get().flow()) + Answers.value(air.get().supply());
        double rate = flow * 3600 / volume;
        if (rate > 5) {
            warnings.add(new Warning(
                    "many-air-changes",
                    at.pointer(),
                    "This flow replaces the air " + Numbers.significant(rate, 3) + " times an hour.",
                    "More than 5 air changes are unusual (common practice, no source).",
                    "Check the flow's unit and the volume."));
        }
    }

    private void gains(int i, RoomSizing room, Place at) {
        double gains = room.heatLoss().gainsFromNeighbours();
        double losses = room.heatLoss().total() + gains;
        if (gains <= 0.1 * losses || losses <= 0) {
            return;
        }
        double allowance = numbers.in[plan.roomIndexes[i].allowance()];
        String without = room.floor().area().isPresent()
                ? " Without them the floor would have to give "
                        + Numbers.fixed(
                                losses * (1 + allowance) / room.floor().area().getAsDouble(), 1) + " W/m2."
                : "";
        ofRooms.add(new Warning(
                "gains-from-neighbours",
                at.pointer(),
                "Warmer neighbours cover " + Numbers.fixed(100 * gains / losses, 0) + " % of this room's losses."
                        + without,
                "They may be off on the coldest day.",
                "Agree with the client whether the neighbours' heat may be counted on."));
    }

    /** Whether a surface is a piece of the floor. */
    static boolean isFloor(Surface surface, Survey survey) {
        return surface.to().equals(Survey.GROUND)
                || survey.assemblies().get(surface.assembly()).heatFlow() == org.treadwarm.survey.Direction.DOWN;
    }
}
