package org.treadwarm.reference;

import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.JsonNodeFactory;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.HashMap;
import java.util.Map;

/** Random layers; all values are invented. */
final class LayerGenerator {
    private static final int CROSSINGS_AT_MOST = 3;

    private final Dice dice;
    private final Map<String, Double> shareOfFrame = new HashMap<>();
    private int crossings;

    private LayerGenerator(Dice dice) {
        this.dice = dice;
    }

    static ArrayNode layers(Dice dice, int count, boolean bridged) {
        LayerGenerator generator = new LayerGenerator(dice);
        ArrayNode layers = JsonNodeFactory.instance.arrayNode();
        for (int index = 0; index < count; index++) {
            ObjectNode layer = generator.layer();
            if (bridged && dice.chance(0.4)) {
                generator.bridge(layer);
            }
            layers.add(layer);
        }
        return layers;
    }

    private ObjectNode layer() {
        ObjectNode layer = JsonNodeFactory.instance.objectNode();
        dice.maybe(0.6, layer, "name", "wool", "board", "render", "screed", "cavity / void", "brick");
        int form = dice.whole(0, 5);
        if (form == 0) {
            airGap(layer.putObject("airGap"));
        } else if (form == 1) {
            layer.put("resistance", dice.number(0.02, 3, 3));
            dice.maybe(0.5, layer, "thickness", 0.005, 0.2, 4);
        } else {
            layer.put("thickness", dice.number(0.005, 0.3, 4));
            layer.put("conductivity", dice.oneOf(0.022, 0.035, 0.04, 0.13, 0.25, 0.6, 1.2, 2.3));
            dice.maybe(0.2, layer, "density", 20, 2400, 0);
            dice.maybe(0.1, layer, "specificHeat", 800, 1600, 0);
        }
        return layer;
    }

    private void airGap(ObjectNode gap) {
        gap.put("thickness", dice.oneOf(0.005, 0.012, 0.025, 0.05, 0.1, 0.2));
        dice.maybe(0.5, gap, "direction", "up", "horizontal", "down");
        if (dice.chance(0.5)) {
            gap.putArray("emissivities").add(dice.number(0.03, 0.95, 2)).add(dice.number(0.03, 0.95, 2));
        }
    }

    private void bridge(ObjectNode layer) {
        String frame = dice.oneOf("", "studs", "studs", "battens");
        boolean joins = !frame.isEmpty() && shareOfFrame.containsKey(frame);
        if (!joins && crossings == CROSSINGS_AT_MOST) {
            return;
        }
        crossings += joins ? 0 : 1;
        double share = joins ? shareOfFrame.get(frame) : dice.number(0.01, 0.4, 3);
        ObjectNode bridging = layer.putObject("bridging").put("share", share);
        if (!frame.isEmpty()) {
            shareOfFrame.put(frame, share);
            bridging.put("frame", frame);
        }
        if (LayerResistance.thickness(layer).isPresent() && dice.chance(0.7)) {
            bridging.put("conductivity", dice.oneOf(0.13, 0.18, 0.9, 2.3));
        } else {
            bridging.put("resistance", dice.number(0.01, 2, 3));
        }
    }
}
