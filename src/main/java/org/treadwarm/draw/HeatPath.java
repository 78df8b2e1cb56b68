package org.treadwarm.draw;

import java.util.OptionalDouble;

/**
 * One way heat leaves a room or comes into it.
 *
 * @param label what the heat goes through
 * @param watts heat flow out of the room in W; negative where the room gains heat
 * @param share part of the total as a fraction, if it is to be shown
 */
public record HeatPath(String label, double watts, OptionalDouble share) {
    /** @throws IllegalArgumentException if a number cannot be drawn */
    public HeatPath {
        Checks.drawable("Heat flow", watts);
        Checks.drawable("Share", share);
    }
}
