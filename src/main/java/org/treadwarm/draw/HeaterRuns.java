package org.treadwarm.draw;

/**
 * How cable or pipe is laid.
 *
 * @param words what is laid, such as "heating cable"
 * @param spacing distance of neighbouring runs in m, 0.02 to 1
 * @param clearance distance kept from walls and fixed units in m, 0 to 1
 */
public record HeaterRuns(String words, double spacing, double clearance) {
    /** @throws IllegalArgumentException if a distance is out of its range */
    public HeaterRuns {
        Checks.within("Spacing", spacing, 0.02, 1);
        Checks.within("Clearance", clearance, 0, 1);
    }
}
