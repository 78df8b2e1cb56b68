package org.treadwarm.physics.warmup;

import java.util.List;

/**
 * A heated floor; the heater is a plane between two layers and holds no heat.
 *
 * @param above layers above the heater, from the finished surface down; may be empty
 * @param below layers below the heater, from the heater down; may be empty
 * @param film exchange between the surface and the room
 * @param underside what lies below the lowest layer
 */
public record BuildUp(List<FloorLayer> above, List<FloorLayer> below, Film film, Underside underside) {
    public BuildUp {
        above = List.copyOf(above);
        below = List.copyOf(below);
    }

    /** Resistance of the layers above the heater, without the film, m²·K/W. */
    public double resistanceAbove() {
        return sum(above);
    }

    /** Resistance of the layers below the heater, without the film, m²·K/W. */
    public double resistanceBelow() {
        return sum(below);
    }

    private static double sum(List<FloorLayer> layers) {
        return layers.stream().mapToDouble(FloorLayer::resistance).sum();
    }
}
