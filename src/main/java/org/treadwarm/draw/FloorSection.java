package org.treadwarm.draw;

import java.util.List;
import java.util.OptionalDouble;

/**
 * A heated floor in section.
 *
 * @param name the floor's name
 * @param room the room above
 * @param above layers above the heater from the top; may be empty
 * @param heater what heats, such as "heating cable"
 * @param below layers below the heater from the top; may be empty
 * @param beneath what lies under the floor
 * @param surfaceTemperature temperature of the floor's surface in °C
 * @param heaterTemperature temperature of the heater's plane in °C
 * @param fluxUp heat flux up in W/m²; negative if it goes down
 * @param fluxDown heat flux down in W/m²; negative if heat comes up from beneath
 * @param fluxEdge heat flux out by the edges per floor area in W/m², if it is reckoned apart
 */
public record FloorSection(
        String name,
        AirSide room,
        List<Layer> above,
        String heater,
        List<Layer> below,
        Beneath beneath,
        double surfaceTemperature,
        double heaterTemperature,
        double fluxUp,
        double fluxDown,
        OptionalDouble fluxEdge) {
    /** @throws IllegalArgumentException if there is no layer or a number cannot be drawn */
    public FloorSection {
        above = List.copyOf(above);
        below = List.copyOf(below);
        if (above.isEmpty() && below.isEmpty()) {
            throw new IllegalArgumentException("A floor has at least one layer");
        }
        Checks.temperature("Surface temperature", surfaceTemperature);
        Checks.temperature("Heater temperature", heaterTemperature);
        Checks.drawable("Flux up", fluxUp);
        Checks.drawable("Flux down", fluxDown);
        Checks.drawable("Flux by the edges", fluxEdge);
    }
}
