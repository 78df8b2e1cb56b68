package org.treadwarm.draw;

import java.util.List;

/**
 * A heated floor in section between its cables or pipes, with its temperatures.
 *
 * @param name the floor's name
 * @param room the room above
 * @param layers the layers from the finished surface down, at least one of them with a thickness
 * @param heater the cable or pipe
 * @param spacing distance between the axes of neighbouring cables or pipes in m, 0.005 to 5
 * @param field temperatures from the axis of a heater (x = 0) to the plane midway to the next one, or on to its axis,
 *     where the section is mirrored; not below the last layer
 * @param surface temperatures of the finished surface
 * @param beneath what lies under the floor
 * @param fluxUp heat flux up in W/m²; negative if it goes down
 * @param fluxDown heat flux down in W/m²; negative if heat comes up from beneath
 */
public record IsothermSection(
        String name,
        AirSide room,
        List<Layer> layers,
        HeaterCut heater,
        double spacing,
        TemperatureField field,
        SurfaceProfile surface,
        Beneath beneath,
        double fluxUp,
        double fluxDown) {
    /** Places are sums of thicknesses; they may miss one another by this part. */
    private static final double ROUNDING = 1e-6;

    /** @throws IllegalArgumentException if the parts do not go together or a number cannot be drawn */
    public IsothermSection {
        layers = List.copyOf(layers);
        double depth = depth(layers);
        Checks.within("Depth of the layers that have a thickness", depth, 0.001, 10);
        Checks.within("Spacing", spacing, 0.005, 5);
        Checks.within("Depth of the heater", heater.depth(), 0, depth);
        Checks.within("Diameter of the heater", heater.diameter(), 0, spacing);
        Checks.within("Deepest row", field.y(field.rows() - 1), 0, depth * (1 + ROUNDING));
        Checks.within("Last column", field.x(field.columns() - 1), 0, spacing * (1 + ROUNDING));
        if (surface.temperatures().size() != field.columns()) {
            throw new IllegalArgumentException(field.columns() + " columns do not go with "
                    + surface.temperatures().size() + " surface temperatures");
        }
        Checks.drawable("Flux up", fluxUp);
        Checks.drawable("Flux down", fluxDown);
    }

    /** Depth of all layers that have a thickness, in m. */
    double depth() {
        return depth(layers);
    }

    /** Width of what the field covers in m: half a spacing or a whole one. */
    double window() {
        double half = spacing / 2;
        return field.x(field.columns() - 1) <= half * (1 + ROUNDING) ? half : spacing;
    }

    private static double depth(List<Layer> layers) {
        return layers.stream().mapToDouble(layer -> layer.thickness().orElse(0)).sum();
    }
}
