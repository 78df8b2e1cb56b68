package org.treadwarm.reference;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.OptionalDouble;

/** Resistance of one layer and of its bridge, m²K/W. */
final class LayerResistance {
    private static final double STEFAN_BOLTZMANN = 5.670374419e-8;
    private static final double MEAN_KELVIN = 283.15;

    private LayerResistance() {}

    /** Face to face beside the bridge; {@code direction} of the heat flow serves an air gap that names none. */
    static double of(JsonNode layer, String direction) {
        if (layer.has("resistance")) {
            return Fields.number(layer, "resistance");
        }
        if (layer.has("airGap")) {
            return airGap(layer.get("airGap"), direction);
        }
        return Fields.number(layer, "thickness") / Fields.number(layer, "conductivity");
    }

    /** Through the bridge of a layer that has one. */
    static double ofBridge(JsonNode layer) {
        JsonNode bridging = layer.get("bridging");
        if (bridging.has("resistance")) {
            return Fields.number(bridging, "resistance");
        }
        double thickness = thickness(layer)
                .orElseThrow(() -> new IllegalArgumentException("a bridge with a conductivity needs a thickness"));
        return thickness / Fields.number(bridging, "conductivity");
    }

    /** Thickness in m, of an air gap too; empty when the layer has only a resistance. */
    static OptionalDouble thickness(JsonNode layer) {
        if (layer.has("airGap")) {
            return OptionalDouble.of(Fields.number(layer.get("airGap"), "thickness"));
        }
        return layer.has("thickness") ? OptionalDouble.of(Fields.number(layer, "thickness")) : OptionalDouble.empty();
    }

    /** ISO 6946, unventilated air layer at 10 °C mean and at most 5 K across; coefficients from memory. */
    private static double airGap(JsonNode gap, String direction) {
        double thickness = Fields.number(gap, "thickness");
        double convection = switch (Fields.text(gap, "direction", direction)) {
            case "up" -> 1.95;
            case "horizontal" -> 1.25;
            case "down" -> 0.12 * Math.pow(thickness, -0.44);
            default -> throw new IllegalArgumentException("direction of " + gap);
        };
        double first = gap.has("emissivities") ? gap.get("emissivities").get(0).doubleValue() : 0.9;
        double second = gap.has("emissivities") ? gap.get("emissivities").get(1).doubleValue() : 0.9;
        double exchange = 1 / (1 / first + 1 / second - 1);
        double blackRadiation = 4 * STEFAN_BOLTZMANN * MEAN_KELVIN * MEAN_KELVIN * MEAN_KELVIN;
        return 1 / (Math.max(convection, 0.025 / thickness) + exchange * blackRadiation);
    }
}
