package org.treadwarm.reference;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;

/** Adds a random heated floor to a room; all values are invented. */
final class HeatedFloorGenerator {
    private final Dice dice;
    private final PartGenerator parts;

    HeatedFloorGenerator(Dice dice, PartGenerator parts) {
        this.dice = dice;
        this.parts = parts;
    }

    /** {@code others}: outdoors and what the room may name. */
    void heatedFloor(String name, ObjectNode room, List<String> others) {
        ObjectNode floor = room.putObject("heatedFloor");
        double floorArea = Fields.number(room, "floorArea");
        floor.put("area", dice.number(floorArea * 0.4, floorArea * (dice.chance(0.05) ? 1.2 : 1), 1));
        floor.put("zone", dice.oneOf("occupied", "peripheral", "bathroom"));
        if (dice.chance(0.4)) {
            floor.set("ground", GroundGenerator.ground(dice, false));
        } else {
            floor.put("to", dice.oneOf(others));
        }
        if (dice.chance(0.9)) {
            floor.set("above", above());
        }
        if (dice.chance(0.9)) {
            floor.set("below", LayerGenerator.layers(dice, dice.whole(0, 4), true));
        }
        dice.maybe(0.3, floor, "maximumSurfaceTemperature", 25, 33, 1);
        heater(floor);
        for (int count = dice.whole(0, 2); count > 0; count--) {
            parts.heatedFloorJunction(name, room, dice.chance(0.6) ? Couplings.OUTDOORS : dice.oneOf(others));
        }
    }

    private ArrayNode above() {
        ArrayNode layers = LayerGenerator.layers(dice, dice.whole(0, 3), false);
        layers.forEach(layer -> dice.maybe(0.3, (ObjectNode) layer, "maximumTemperature", 24, 55, 1));
        return layers;
    }

    private void heater(ObjectNode floor) {
        switch (dice.whole(0, 4)) {
            case 0 -> floor.putObject("heater").put("kind", "water");
            case 1 -> floor.putObject("heater").put("kind", "electric");
            case 2, 3 -> floor.putObject("heater").put("kind", "electric").put("density", dice.number(20, 300, 0));
            default -> {}
        }
    }
}
