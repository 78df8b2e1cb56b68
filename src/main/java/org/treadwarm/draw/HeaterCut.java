package org.treadwarm.draw;

/**
 * A cable or pipe cut across.
 *
 * @param words what it is, such as "cable 6 mm" or "pipe 16 mm"
 * @param depth depth of its axis below the finished surface in m, above 0
 * @param diameter outer diameter in m, above 0
 */
public record HeaterCut(String words, double depth, double diameter) {
    /** @throws IllegalArgumentException if it is not below the surface or has no size */
    public HeaterCut {
        Checks.positive("Depth of the heater", depth);
        Checks.positive("Diameter of the heater", diameter);
    }
}
