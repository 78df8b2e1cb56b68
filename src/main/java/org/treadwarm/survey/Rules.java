package org.treadwarm.survey;

import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Pattern;
import org.treadwarm.units.Numbers;
import org.treadwarm.units.Reading;

/** What must hold between the parts of a survey. Parts that have a problem of their own already are not judged again. */
public final class Rules {
    /** The most unheated spaces that float; their temperatures are solved together. */
    public static final int MOST_FLOATING = 1000;

    /** The most rooms of one survey. */
    public static final int MOST_ROOMS = 5000;

    private static final Pattern ID = Pattern.compile("[A-Za-z0-9-]{1,40}");

    private final Survey survey;
    private final Findings findings;
    private final Set<String> roomNames = new HashSet<>();
    private final Map<String, String> ids = new HashMap<>();
    private boolean onGround;

    private Rules(Survey survey, Findings findings) {
        this.survey = survey;
        this.findings = findings;
    }

    /** Adds what is wrong between the parts of a survey to the findings. */
    public static void check(Survey survey, Findings findings) {
        new Rules(survey, findings).check();
    }

    /** Adds what is wrong within one assembly, addressed from the root. */
    public static void checkAssembly(Assembly assembly, Findings findings) {
        new LayerRules(findings).assembly("", assembly);
    }

    private void check() {
        names();
        ids();
        survey.assemblies()
                .forEach((name, assembly) ->
                        new LayerRules(findings).assembly(Pointer.to("/assemblies", name), assembly));
        survey.spaces().forEach((name, space) -> space(Pointer.to("/spaces", name), name, space));
        for (int i = 0; i < survey.rooms().size(); i++) {
            room(Pointer.to("/rooms", i), survey.rooms().get(i));
        }
        new Listings(survey, findings).check();
        if (onGround && survey.site().annualMeanTemperature().isEmpty()) {
            missing(
                    "/site/annualMeanTemperature",
                    "something lies on the ground, so the annual mean outdoor temperature is needed",
                    "-60 to 60 °C");
        }
        if (findings.isEmpty()) {
            Connections.check(survey, findings);
        }
    }

    private void names() {
        if (survey.rooms().isEmpty() && findings.clean("/rooms")) {
            findings.add("/rooms", "[]", "there is no room yet", "at least one room");
        }
        if (survey.rooms().size() > MOST_ROOMS) {
            findings.add(
                    "/rooms", survey.rooms().size() + " rooms", "there are too many rooms", "at most " + MOST_ROOMS);
        }
        survey.spaces().keySet().forEach(name -> reserved(Pointer.to("/spaces", name), name));
        Set<String> taken = new HashSet<>(survey.spaces().keySet());
        for (int i = 0; i < survey.rooms().size(); i++) {
            String pointer = "/rooms/" + i + "/name";
            String name = survey.rooms().get(i).name();
            if (findings.clean(pointer)) {
                reserved(pointer, name);
                if (!taken.add(name)) {
                    findings.add(
                            pointer, name, "another room or space has this name already", "a name that is used once");
                }
                roomNames.add(name);
            }
        }
    }

    private void reserved(String pointer, String name) {
        if (name.equals(Survey.OUTDOORS) || name.equals(Survey.GROUND)) {
            findings.add(pointer, name, "\"" + name + "\" has a meaning of its own here", "another name");
        }
    }

    private void ids() {
        for (int i = 0; i < survey.rooms().size(); i++) {
            Room room = survey.rooms().get(i);
            String pointer = "/rooms/" + i;
            id(pointer, room.id());
            ids(pointer, room.surfaces(), room.junctions());
        }
        survey.spaces().forEach((name, space) -> ids(Pointer.to("/spaces", name), space.surfaces(), space.junctions()));
    }

    private void ids(String owner, List<Surface> surfaces, List<Junction> junctions) {
        for (int i = 0; i < surfaces.size(); i++) {
            String pointer = owner + "/surfaces/" + i;
            id(pointer, surfaces.get(i).id());
            List<Opening> openings = surfaces.get(i).openings();
            for (int k = 0; k < openings.size(); k++) {
                id(pointer + "/openings/" + k, openings.get(k).id());
            }
        }
        for (int i = 0; i < junctions.size(); i++) {
            id(owner + "/junctions/" + i, junctions.get(i).id());
        }
    }

    private void id(String owner, Optional<String> id) {
        if (id.isEmpty()) {
            return;
        }
        String pointer = owner + "/id";
        String text = id.get();
        if (!ID.matcher(text).matches()) {
            findings.add(pointer, text, "this is no id", "1 to 40 of the letters A-Z, a-z, digits and -");
        } else {
            String other = ids.putIfAbsent(text, pointer);
            if (other != null) {
                findings.add(pointer, text, "this id stands at " + other + " already", "an id that is used once");
            }
        }
    }

    private void space(String pointer, String name, Space space) {
        if (!findings.clean(pointer, "/kind")) {
            return;
        }
        if (space.kind() == SpaceKind.HELD) {
            if (space.temperature().isEmpty()) {
                missing(pointer + "/temperature", "a held space needs the temperature it is held at", "-60 to 60 °C");
            }
            forbidden(pointer, space, "a held space is known by its temperature alone");
            space.temperatureFactor()
                    .ifPresent(factor -> findings.add(
                            pointer + "/temperatureFactor",
                            factor.typed(),
                            "a held space has a temperature, not a factor",
                            "leave it out"));
            return;
        }
        space.temperature()
                .ifPresent(temperature -> findings.add(
                        pointer + "/temperature",
                        temperature.typed(),
                        "an unheated space finds its own temperature",
                        "leave it out, or make the space \"held\""));
        if (space.temperatureFactor().isPresent()) {
            forbidden(pointer, space, "a space with a temperature factor has nothing else");
            return;
        }
        surfaces(pointer, name, false, space.surfaces(), Optional.empty());
        junctions(pointer, name, space.junctions(), false, false);
        space.air().ifPresent(air -> {
            air(pointer + "/air", air);
            if (air.volume().isEmpty()) {
                missing(
                        pointer + "/air/volume",
                        "the air of a space needs its volume",
                        "more than 0 m3, at most 100 000 m3");
            }
        });
    }

    private void forbidden(String pointer, Space space, String why) {
        if (!space.surfaces().isEmpty()) {
            findings.add(pointer + "/surfaces", space.surfaces().size() + " surfaces", why, "leave them out");
        }
        if (!space.junctions().isEmpty()) {
            findings.add(pointer + "/junctions", space.junctions().size() + " junctions", why, "leave them out");
        }
        if (space.air().isPresent()) {
            findings.add(pointer + "/air", "air", why, "leave it out");
        }
    }

    private void room(String pointer, Room room) {
        surfaces(pointer, room.name(), true, room.surfaces(), Optional.of(room));
        boolean heated = room.heatedFloor().isPresent() || !findings.clean(pointer, "/heatedFloor");
        junctions(pointer, room.name(), room.junctions(), true, heated);
        room.air().ifPresent(air -> air(pointer + "/air", air));
        room.heatedFloor().ifPresent(floor -> heatedFloor(pointer + "/heatedFloor", room, floor));
    }

    private void surfaces(String owner, String name, boolean isRoom, List<Surface> surfaces, Optional<Room> room) {
        for (int i = 0; i < surfaces.size(); i++) {
            surface(owner + "/surfaces/" + i, name, isRoom, surfaces.get(i), room.isPresent());
        }
    }

    private void surface(String pointer, String owner, boolean isRoom, Surface surface, boolean hasFloorArea) {
        assembly(pointer + "/assembly", surface.assembly());
        area(pointer, surface.area(), surface.width(), surface.height());
        boolean ground = surface.to().equals(Survey.GROUND);
        if (!ground) {
            otherSide(pointer + "/to", surface.to(), owner, isRoom);
            surface.ground()
                    .filter(given -> findings.clean(pointer, "/to"))
                    .ifPresent(given -> findings.add(
                            pointer + "/ground",
                            "ground",
                            "only a surface to ground lies on the ground",
                            "leave it out, or write \"to\": \"ground\""));
        } else {
            ground(pointer, surface, hasFloorArea);
        }
        double cut = 0;
        for (int i = 0; i < surface.openings().size(); i++) {
            Opening opening = surface.openings().get(i);
            assembly(pointer + "/openings/" + i + "/assembly", opening.assembly());
            area(pointer + "/openings/" + i, opening.area(), opening.width(), opening.height());
            cut += opening.totalArea();
        }
        if (cut > surface.grossArea() * (1 + 1e-12) && surface.grossArea() > 0) {
            findings.add(
                    pointer + "/openings",
                    sensible(cut) + " m2 of openings",
                    "the openings are larger than their surface",
                    "at most its area, " + sensible(surface.grossArea()) + " m2");
        }
        if (ground && !surface.openings().isEmpty()) {
            findings.add(
                    pointer + "/openings",
                    surface.openings().size() + " openings",
                    "a surface on the ground has no openings",
                    "leave them out");
        }
    }

    private static String sensible(double area) {
        return Numbers.significant(area, 6);
    }

    private void area(String pointer, Optional<Reading> area, Optional<Reading> width, Optional<Reading> height) {
        boolean sides = width.isPresent() || height.isPresent();
        if (area.isPresent() && sides) {
            findings.add(
                    pointer + "/area", area.get().typed(), "area and width with height are both given", "one of them");
        } else if (area.isEmpty()) {
            if (!sides) {
                missing(pointer + "/area", "the area is missing", "an area, or a width and a height");
            } else if (width.isEmpty()) {
                missing(pointer + "/width", "with a height, the width is needed too", "a width, or an area instead");
            } else if (height.isEmpty()) {
                missing(pointer + "/height", "with a width, the height is needed too", "a height, or an area instead");
            } else if (Extent.area(area, width, height) > 10000) {
                findings.add(
                        pointer + "/width",
                        width.get().typed(),
                        "width times height is more than 10 000 m2",
                        "at most 10 000 m2");
            }
        }
    }

    private void ground(String pointer, Surface surface, boolean hasFloorArea) {
        onGround = true;
        boolean givenUValue = Optional.ofNullable(survey.assemblies().get(surface.assembly()))
                .flatMap(Assembly::uValue)
                .isPresent();
        if (surface.ground().isEmpty()) {
            if (!givenUValue) {
                missing(
                        pointer + "/ground",
                        "a surface to ground needs the slab it belongs to",
                        "kind, exposedPerimeter, wallThickness, soilConductivity");
            }
            return;
        }
        groundFloor(pointer + "/ground", surface.ground().get());
        if (!hasFloorArea && surface.ground().get().area().isEmpty()) {
            missing(
                    pointer + "/ground/area",
                    "a space has no floor area, so the slab's area is needed",
                    "more than 0 m2, at most 10 000 m2");
        }
    }

    private void groundFloor(String pointer, Ground ground) {
        if (!findings.clean(pointer, "/kind")) {
            return;
        }
        boolean suspended = ground.kind() == GroundKind.SUSPENDED;
        only(pointer + "/floorHeight", ground.floorHeight().isPresent(), suspended, "0 to 1 000 m");
        only(pointer + "/wallUValue", ground.wallUValue().isPresent(), suspended, "0.01 to 20 W/(m2.K)");
        only(pointer + "/ventArea", ground.ventArea().isPresent(), suspended, "0 to 10 m2/m");
        only(pointer + "/windSpeed", ground.windSpeed().isPresent(), suspended, "0 to 60 m/s");
    }

    private void only(String pointer, boolean given, boolean suspended, String allowed) {
        if (suspended && !given) {
            missing(pointer, "a suspended floor needs this", allowed);
        } else if (!suspended && given) {
            findings.add(pointer, "a value", "only a suspended floor has this", "leave it out");
        }
    }

    private void junctions(
            String owner, String name, List<Junction> junctions, boolean isRoom, boolean hasHeatedFloor) {
        for (int i = 0; i < junctions.size(); i++) {
            Junction junction = junctions.get(i);
            String pointer = owner + "/junctions/" + i;
            if (junction.to().equals(Survey.GROUND)) {
                findings.add(
                        pointer + "/to", junction.to(), "a junction does not lead to the ground", sides("outdoors"));
            } else {
                otherSide(pointer + "/to", junction.to(), name, isRoom);
            }
            if (junction.at() == JunctionPlace.HEATED_FLOOR && !hasHeatedFloor) {
                findings.add(
                        pointer + "/at",
                        junction.at().word(),
                        "there is no heated floor here for the junction to be at",
                        "room");
            }
        }
    }

    private void otherSide(String pointer, String to, String owner, boolean ownerIsRoom) {
        if (!findings.clean(pointer) || to.equals(Survey.OUTDOORS)) {
            return;
        }
        if (to.equals(owner)) {
            findings.add(pointer, to, "this leads back to where it comes from", sides("outdoors"));
            return;
        }
        Space space = survey.spaces().get(to);
        if (space == null && !roomNames.contains(to)) {
            findings.add(
                    pointer,
                    to,
                    "no room or space is called \"" + to + "\"" + findings.hint(to, this::otherSides),
                    sides("outdoors, ground"));
        } else if (space != null && space.temperatureFactor().isPresent() && !ownerIsRoom) {
            findings.add(
                    pointer,
                    to,
                    "only rooms may look at a space that is known by its temperature factor",
                    "a space of its own temperature, a room, or outdoors");
        }
    }

    private Set<String> otherSides() {
        Set<String> names = new HashSet<>(roomNames);
        names.addAll(survey.spaces().keySet());
        names.add(Survey.OUTDOORS);
        names.add(Survey.GROUND);
        return names;
    }

    private static String sides(String fixed) {
        return fixed + ", or the name of a space or of another room";
    }

    private void assembly(String pointer, String name) {
        if (findings.clean(pointer) && !survey.assemblies().containsKey(name)) {
            String hint = findings.hint(name, survey.assemblies()::keySet);
            findings.add(pointer, name, "no assembly is called \"" + name + "\"" + hint, "the name of an assembly");
        }
    }

    private void air(String pointer, Air air) {
        int ways = (air.changeRate().isPresent() ? 1 : 0)
                + (air.flow().isPresent() ? 1 : 0)
                + (air.supply().isPresent() ? 1 : 0);
        boolean judged = findings.clean(pointer, "/changeRate")
                && findings.clean(pointer, "/flow")
                && findings.clean(pointer, "/supply");
        if (ways != 1 && judged) {
            findings.add(
                    pointer,
                    ways + " of them",
                    "the air is known by one of a change rate, a flow, or a supply with recovery",
                    "exactly one of changeRate; flow; supply with recovery");
        }
        if (air.supply().isPresent() && air.recovery().isEmpty()) {
            missing(pointer + "/recovery", "a supply needs the share of heat recovered", "0 to 1");
        }
        if (air.supply().isEmpty() && air.recovery().isPresent() && judged) {
            findings.add(
                    pointer + "/recovery",
                    air.recovery().get().typed(),
                    "heat is recovered only from a supply",
                    "leave it out, or give the supply");
        }
    }

    private void heatedFloor(String pointer, Room room, HeatedFloor floor) {
        boolean judged = findings.clean(pointer, "/ground") && findings.clean(pointer, "/to");
        if (floor.ground().isPresent() == floor.to().isPresent() && judged) {
            findings.add(
                    pointer,
                    floor.to().isPresent() ? "ground and to" : "neither ground nor to",
                    "a heated floor lies either on the ground or over something",
                    "exactly one of ground and to");
        }
        floor.ground().ifPresent(ground -> {
            onGround = true;
            groundFloor(pointer + "/ground", ground);
        });
        floor.to().ifPresent(to -> {
            if (to.equals(Survey.GROUND)) {
                findings.add(
                        pointer + "/to",
                        to,
                        "a heated floor on the ground is described by \"ground\"",
                        "outdoors, or the name of a space or of another room");
            } else {
                otherSide(pointer + "/to", to, room.name(), true);
            }
        });
        LayerRules layers = new LayerRules(findings);
        layers.layers(pointer + "/above", floor.above());
        layers.layers(pointer + "/below", floor.below());
        for (int i = 0; i < floor.above().size(); i++) {
            if (floor.above().get(i).bridging().isPresent()) {
                findings.add(
                        pointer + "/above/" + i + "/bridging",
                        "framing",
                        "layers above the heater cannot be crossed by framing",
                        "leave it out");
            }
        }
        floor.heater()
                .filter(heater ->
                        heater.kind() == HeaterKind.WATER && heater.density().isPresent())
                .filter(heater -> findings.clean(pointer, "/heater/kind"))
                .ifPresent(heater -> findings.add(
                        pointer + "/heater/density",
                        heater.density().get().typed(),
                        "only an electric heater has an installed density",
                        "leave it out"));
    }

    private void missing(String pointer, String message, String allowed) {
        if (findings.clean(pointer)) {
            findings.add(pointer, "nothing", message, allowed);
        }
    }
}
