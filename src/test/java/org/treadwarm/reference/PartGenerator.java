package org.treadwarm.reference;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;

/** Adds random surfaces, junctions and air to a room or space; all values are invented. */
final class PartGenerator {
    private final Dice dice;
    private final JsonNode assemblies;
    private final List<String> assemblyNames;
    private final PartNames names = new PartNames();

    /** Parts built of the given assemblies. */
    PartGenerator(Dice dice, ObjectNode assemblies) {
        this.dice = dice;
        this.assemblies = assemblies;
        this.assemblyNames =
                assemblies.properties().stream().map(entry -> entry.getKey()).toList();
    }

    /** Adds a surface; {@code owner} is a room, or a space (which has no floor area to fall back upon). */
    void surface(String from, ObjectNode owner, String to) {
        ObjectNode surface = owner.withArray("surfaces").addObject();
        String assembly = dice.oneOf(assemblyNames);
        surface.put("assembly", assembly).put("to", to);
        name(surface, from, to, assembly, "wall", "ceiling", "party wall", "gable ~ 1/2");
        if (dice.chance(0.3)) {
            surface.put("width", dice.number(3, 8, 2)).put("height", dice.number(2, 4, 2));
        } else {
            surface.put("area", dice.number(5, 40, 1));
        }
        boolean direct = assemblies.get(assembly).has("uValue");
        if (to.equals(Couplings.GROUND) && !(direct && dice.chance(0.5))) {
            surface.set("ground", GroundGenerator.ground(dice, !owner.has("floorArea")));
        } else if (!to.equals(Couplings.GROUND) && dice.chance(0.35)) {
            openings(surface);
        }
    }

    private void openings(ObjectNode surface) {
        double gross = Fields.area(surface);
        if (surface.has("area") && dice.chance(0.08)) {
            opening(surface).put("area", gross);
            return;
        }
        for (int index = dice.whole(1, 2); index > 0; index--) {
            ObjectNode opening = opening(surface);
            int count = dice.whole(1, 3);
            double side = Math.sqrt(gross * 0.4 / count);
            if (count > 1 || dice.chance(0.3)) {
                opening.put("count", count);
            }
            if (dice.chance(0.5)) {
                opening.put("width", dice.number(0.3, side, 2)).put("height", dice.number(0.3, side, 2));
            } else {
                opening.put("area", dice.number(0.2, side * side, 2));
            }
        }
    }

    private ObjectNode opening(ObjectNode surface) {
        ObjectNode opening = surface.withArray("openings").addObject();
        opening.put("assembly", dice.oneOf(assemblyNames));
        dice.maybe(0.6, opening, "name", "sash", "door", "roof light");
        identify(opening);
        return opening;
    }

    /** Adds a junction, with a psi that may be negative. */
    void junction(String from, ObjectNode owner, String to) {
        junction(from, owner, to, -0.08);
    }

    /** Adds a junction whose psi is not negative, so that a floating space keeps a positive conductance. */
    void lossyJunction(String from, ObjectNode owner, String to) {
        junction(from, owner, to, 0);
    }

    /** Adds a junction at the heated floor of a room. */
    void heatedFloorJunction(String from, ObjectNode room, String to) {
        junction(from, room, to, -0.02).put("at", "heated floor");
    }

    private ObjectNode junction(String from, ObjectNode owner, String to, double lowest) {
        ObjectNode junction = owner.withArray("junctions").addObject();
        name(junction, from, to, "junction", "corner", "sill", "wall foot");
        junction.put("psi", dice.chance(0.05) ? 0 : dice.number(lowest, 0.5, 3));
        junction.put("length", dice.number(0.5, 15, 1));
        if (!to.equals(Couplings.OUTDOORS) || dice.chance(0.5)) {
            junction.put("to", to);
        }
        if (owner.has("floorArea")) {
            dice.maybe(0.3, junction, "at", "room");
        }
        return junction;
    }

    /** Adds air; a space has no floor area and height, so that it needs a volume. */
    void air(ObjectNode owner) {
        ObjectNode air = owner.putObject("air");
        switch (dice.whole(0, 3)) {
            case 0 -> air.put("flow", dice.number(0, 0.04, 4));
            case 1 -> air.put("supply", dice.number(0.002, 0.05, 4)).put("recovery", dice.number(0.3, 0.92, 2));
            default -> air.put("changeRate", dice.chance(0.05) ? 0 : dice.number(0.1, 3, 2));
        }
        dice.maybe(owner.has("floorArea") ? 0.3 : 1, air, "volume", 10, 200, 1);
    }

    private void name(ObjectNode part, String from, String to, String standard, String... choices) {
        String chosen = dice.oneOf(choices);
        if (dice.chance(0.3) && names.claim(from, to, standard)) {
            identify(part);
        } else if (names.claim(from, to, chosen)) {
            part.put("name", chosen);
        } else {
            part.put("name", names.make(from, to));
        }
    }

    private void identify(ObjectNode part) {
        if (dice.chance(0.1)) {
            part.put("id", "p-" + names.next());
        }
        dice.maybe(0.05, part, "remark", "seen from outside", "behind the cupboard");
    }
}
