package org.treadwarm.reference;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.ArrayList;
import java.util.List;
import java.util.random.RandomGenerator;

/** Random valid surveys in plain SI numbers, with every feature of the survey; all values are invented. */
public final class SurveyGenerator {
    private static final List<String> ROOM_NAMES =
            List.of("studio", "kitchen", "bath / shower", "hall", "upper room", "workshop");
    private static final List<String> HELD_NAMES = List.of("shop next door", "boiler ~ room");
    private static final List<String> FLOATING_NAMES = List.of("loft", "garage", "cellar");
    private static final List<String> FACTOR_NAMES = List.of("stair", "corridor");

    private final Dice dice;
    private final ObjectNode survey = JsonNodeFactory.instance.objectNode();
    private final List<String> roomNames;
    private final List<String> heldNames;
    private final List<String> floatingNames;
    private final List<String> factorNames;
    private final List<String> listedByFirstRoom = new ArrayList<>();

    private SurveyGenerator(Dice dice) {
        this.dice = dice;
        this.roomNames = ROOM_NAMES.subList(0, dice.whole(1, ROOM_NAMES.size()));
        this.heldNames = HELD_NAMES.subList(0, dice.whole(0, HELD_NAMES.size()));
        this.floatingNames = FLOATING_NAMES.subList(0, dice.whole(0, FLOATING_NAMES.size()));
        this.factorNames = FACTOR_NAMES.subList(0, dice.whole(0, FACTOR_NAMES.size()));
    }

    /** The same generator state gives the same survey. */
    public static ObjectNode random(RandomGenerator random) {
        return new SurveyGenerator(new Dice(random)).survey();
    }

    private ObjectNode survey() {
        survey.putObject("site");
        ObjectNode assemblies = survey.putObject("assemblies");
        for (int count = dice.whole(2, 6); count > 0; count--) {
            assemblies.set("build-up " + count, assembly());
        }
        PartGenerator parts = new PartGenerator(dice, assemblies);
        spaces(parts);
        survey.putArray("rooms");
        roomNames.forEach(name -> room(name, parts));
        site();
        return survey;
    }

    private ObjectNode assembly() {
        ObjectNode assembly = JsonNodeFactory.instance.objectNode();
        if (dice.chance(0.3)) {
            return assembly.put("uValue", dice.number(0.15, 4, 2));
        }
        dice.maybe(0.7, assembly, "heatFlow", "up", "horizontal", "down");
        dice.maybe(0.15, assembly, "insideCoefficient", 2, 15, 1);
        dice.maybe(0.15, assembly, "outsideCoefficient", 8, 40, 1);
        assembly.set("layers", LayerGenerator.layers(dice, dice.whole(1, 5), true));
        return assembly;
    }

    private void spaces(PartGenerator parts) {
        if (heldNames.isEmpty() && floatingNames.isEmpty() && factorNames.isEmpty()) {
            return;
        }
        ObjectNode spaces = survey.putObject("spaces");
        heldNames.forEach(
                name -> spaces.putObject(name).put("kind", "held").put("temperature", dice.number(-5, 28, 1)));
        factorNames.forEach(
                name -> spaces.putObject(name).put("kind", "unheated").put("temperatureFactor", dice.number(0, 1, 2)));
        floatingNames.forEach(name -> floatingSpace(name, spaces.putObject(name), parts));
    }

    /** Its surfaces lead to fixed temperatures or to floating spaces before it, which do; or the first room lists it. */
    private void floatingSpace(String name, ObjectNode space, PartGenerator parts) {
        space.put("kind", "unheated");
        List<String> anchors = new ArrayList<>(List.of(Couplings.OUTDOORS, Couplings.GROUND));
        anchors.addAll(roomNames);
        anchors.addAll(heldNames);
        anchors.addAll(floatingNames.subList(0, floatingNames.indexOf(name)));
        if (dice.chance(0.2)) {
            listedByFirstRoom.add(name);
        }
        for (int count = dice.whole(listedByFirstRoom.contains(name) ? 0 : 1, 3); count > 0; count--) {
            parts.surface(name, space, dice.oneOf(anchors));
        }
        anchors.remove(Couplings.GROUND);
        for (int count = dice.whole(-1, 2); count > 0; count--) {
            parts.lossyJunction(name, space, dice.oneOf(anchors));
        }
        if (dice.chance(0.5)) {
            parts.air(space);
        }
    }

    private void room(String name, PartGenerator parts) {
        ObjectNode room = survey.withArray("rooms").addObject();
        room.put("name", name).put("indoorTemperature", dice.number(12, 25, 1));
        room.put("floorArea", dice.number(6, 60, 1)).put("height", dice.number(2.1, 4, 2));
        List<String> others = others(name);
        for (int count = dice.whole(0, 5); count > 0; count--) {
            boolean ground = dice.chance(0.15);
            String inAir = dice.chance(0.5) ? Couplings.OUTDOORS : dice.oneOf(others);
            parts.surface(name, room, ground ? Couplings.GROUND : inAir);
        }
        if (name.equals(roomNames.get(0))) {
            listedByFirstRoom.forEach(space -> parts.surface(name, room, space));
        }
        for (int count = dice.whole(-1, 2); count > 0; count--) {
            junction(name, room, parts, dice.oneOf(others));
        }
        if (dice.chance(0.7)) {
            parts.air(room);
        }
        dice.maybe(0.3, room, "reheat", 0, 20, 0);
        dice.maybe(0.3, room, "allowance", 0, 0.3, 2);
        dice.maybe(0.3, room, "otherHeat", 0, 1500, 0);
        if (dice.chance(0.8)) {
            new HeatedFloorGenerator(dice, parts).heatedFloor(name, room, others);
        }
    }

    private void junction(String name, ObjectNode room, PartGenerator parts, String to) {
        if (floatingNames.contains(to)) {
            parts.lossyJunction(name, room, to);
        } else {
            parts.junction(name, room, to);
        }
    }

    /** What a room may name: outdoors, the other rooms, every space. */
    private List<String> others(String room) {
        List<String> others = new ArrayList<>(List.of(Couplings.OUTDOORS));
        roomNames.stream().filter(name -> !name.equals(room)).forEach(others::add);
        others.addAll(heldNames);
        others.addAll(floatingNames);
        others.addAll(factorNames);
        return others;
    }

    /** Comes last, because the annual mean belongs only to a survey with something on ground. */
    private void site() {
        ObjectNode site = (ObjectNode) survey.get("site");
        site.put("outdoorTemperature", dice.number(-30, 12, 1));
        if (!survey.findValues("ground").isEmpty()
                || survey.findValuesAsText("to").contains(Couplings.GROUND)) {
            site.put("annualMeanTemperature", dice.number(2, 14, 1));
        }
        dice.maybe(0.5, site, "altitude", -100, 2500, 0);
        dice.maybe(0.3, site, "groundSeasonFactor", 1, 1.6, 2);
        dice.maybe(0.3, site, "groundwaterFactor", 1, 1.2, 2);
        dice.maybe(0.3, site, "dimensions", "internal", "overall internal", "external");
    }
}
