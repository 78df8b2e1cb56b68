package org.treadwarm.draw;

import java.util.OptionalDouble;

/**
 * How cable or pipe is laid.
 *
 * @param words what is laid, such as "heating cable"
 * @param spacing distance of neighbouring runs in m, 0.02 to 1; empty where they are not known, as in mats
 * @param clearance distance kept from walls and fixed units in m, 0 to 1
 */
public record HeaterRuns(String words, OptionalDouble spacing, double clearance) {
    /** @throws IllegalArgumentException if a distance is out of its range */
    public HeaterRuns {
        spacing.ifPresent(distance -> Checks.within("Spacing", distance, 0.02, 1));
        Checks.within("Clearance", clearance, 0, 1);
    }
}
