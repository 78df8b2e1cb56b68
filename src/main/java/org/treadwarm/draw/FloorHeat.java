package org.treadwarm.draw;

/**
 * What is asked of a heated floor and what it can do.
 *
 * @param requiredWatts heat asked of the floor in W; zero or less if the room needs none
 * @param carriedWatts most the floor can give within its limits in W, not negative
 * @param supplementWatts heat something else must add in W, not negative
 */
public record FloorHeat(double requiredWatts, double carriedWatts, double supplementWatts) {
    /** @throws IllegalArgumentException if a number cannot be drawn or is negative where it must not be */
    public FloorHeat {
        Checks.drawable("Required heat", requiredWatts);
        Checks.notNegative("Carried heat", carriedWatts);
        Checks.notNegative("Supplement", supplementWatts);
    }

    /** What the floor gives: what is asked, up to what it can; none if none is asked. */
    double givenWatts() {
        return requiredWatts <= 0 ? 0 : Math.min(requiredWatts, carriedWatts);
    }
}
