package org.treadwarm.draw;

import java.util.List;
import java.util.OptionalDouble;

/**
 * Temperatures along a floor's finished surface.
 *
 * @param temperatures in °C, one at each column of the section's field
 * @param highest the highest in °C
 * @param mean the mean in °C
 * @param lowest the lowest in °C
 * @param limit temperature the surface must not pass in °C, if there is one
 */
public record SurfaceProfile(
        List<Double> temperatures, double highest, double mean, double lowest, OptionalDouble limit) {
    /** @throws IllegalArgumentException if the mean is not between the two others or a number cannot be drawn */
    public SurfaceProfile {
        temperatures = List.copyOf(temperatures);
        temperatures.forEach(degrees -> Checks.temperature("Surface temperature", degrees));
        Checks.temperature("Highest surface temperature", highest);
        Checks.temperature("Lowest surface temperature", lowest);
        if (!(lowest <= mean && mean <= highest)) {
            throw new IllegalArgumentException(
                    "The mean surface temperature is between lowest and highest, not " + mean);
        }
        limit.ifPresent(degrees -> Checks.temperature("Limit of the surface temperature", degrees));
    }
}
