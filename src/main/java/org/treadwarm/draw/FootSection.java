package org.treadwarm.draw;

import java.util.List;
import java.util.Optional;

/**
 * The foot of an outer wall beside a heated slab on the ground, in section, with its temperatures.
 *
 * @param name what it is called
 * @param slab layers below the heated plane, from above; each has a thickness
 * @param above thickness of the floor above the heated plane, m
 * @param heatedPlane its height above the ground outside, m
 * @param wall the wall as one material; it has a thickness
 * @param foundation its depth below the ground outside, m
 * @param footWords what is told of the foundation in the key
 * @param soilWords what is told of the ground in the key
 * @param edge the edge insulation
 * @param inward floor that is seen, m
 * @param outward ground outside that is seen, m
 * @param upward wall that is seen above the heated plane, m
 * @param downward what is seen below it, m
 * @param field temperatures in percent of the difference between inside and outdoors; places from the upper left corner
 */
public record FootSection(
        String name,
        List<Layer> slab,
        double above,
        double heatedPlane,
        Layer wall,
        double foundation,
        String footWords,
        String soilWords,
        Optional<EdgeStrip> edge,
        double inward,
        double outward,
        double upward,
        double downward,
        TemperatureField field) {
    /**
     * Upright insulation between floor and wall.
     *
     * @param layer what it is; it has a thickness
     * @param depth from the heated plane down, m
     */
    public record EdgeStrip(Layer layer, double depth) {
        /** @throws IllegalArgumentException if it cannot be drawn */
        public EdgeStrip {
            thickness("Edge insulation", layer);
            Checks.within("Depth of the edge insulation", depth, 0, 10);
        }
    }

    /** @throws IllegalArgumentException if a number cannot be drawn */
    public FootSection {
        slab = List.copyOf(slab);
        slab.forEach(layer -> thickness("A layer of the slab", layer));
        thickness("The wall", wall);
        Checks.within("Floor above the heated plane", above, 0, upward);
        Checks.within("Height of the heated plane", heatedPlane, 0, downward);
        Checks.within("Depth of the foundation", foundation, 0, 10);
        Checks.within("Floor that is seen", inward, 0.05, 20);
        Checks.within("Ground that is seen", outward, 0.05, 20);
        Checks.within("Wall that is seen", upward, 0.05, 20);
        Checks.within("Depth that is seen", downward, 0.05, 20);
    }

    private static void thickness(String what, Layer layer) {
        if (layer.thickness().isEmpty()) {
            throw new IllegalArgumentException(what + " must have a thickness");
        }
    }

    double wallThickness() {
        return wall.thickness().orElseThrow();
    }

    double width() {
        return inward + wallThickness() + outward;
    }

    double height() {
        return upward + downward;
    }

    /** Whether the foundation ends within what is seen. */
    boolean showsFoundation() {
        return heatedPlane + foundation < downward - 1e-9;
    }
}
