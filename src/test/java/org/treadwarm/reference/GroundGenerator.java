package org.treadwarm.reference;

import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;

/** Random ground under a floor; all values are invented. */
final class GroundGenerator {
    private GroundGenerator() {}

    /** Ground under an owner whose floor area serves where {@code areaNeeded} is not set. */
    static ObjectNode ground(Dice dice, boolean areaNeeded) {
        ObjectNode ground = JsonNodeFactory.instance.objectNode();
        ground.put("kind", dice.oneOf("slab", "suspended"));
        ground.put("exposedPerimeter", dice.number(2, 50, 1));
        ground.put("wallThickness", dice.number(0.15, 0.6, 2));
        ground.put("soilConductivity", dice.oneOf(1.5, 2.0, 3.5));
        dice.maybe(areaNeeded ? 1 : 0.5, ground, "area", 5, 150, 1);
        if (ground.get("kind").textValue().equals("suspended")) {
            ground.put("floorHeight", dice.number(0.1, 1.2, 2));
            ground.put("wallUValue", dice.number(0.2, 3, 2));
            ground.put("ventArea", dice.number(0.0005, 0.005, 4));
            ground.put("windSpeed", dice.number(1, 8, 1));
            dice.maybe(0.7, ground, "shielding", "sheltered", "average", "exposed");
        }
        return ground;
    }
}
