package org.treadwarm.draw;

import java.util.List;
import java.util.stream.DoubleStream;

/**
 * What a floor must give against what its limits let it carry, per area of heated floor.
 *
 * @param floor the floor's or room's name
 * @param requiredFlux flux asked of the floor in W/m²
 * @param carriedFlux flux the floor can carry in W/m²
 * @param limits the limits in the order they are to be listed
 */
public record FluxScale(String floor, double requiredFlux, double carriedFlux, List<FluxLimit> limits) {
    /** A limit beyond so many times the rest would crush the scale. */
    private static final double FAR = 2.5;

    /** @throws IllegalArgumentException if a flux cannot be drawn */
    public FluxScale {
        limits = List.copyOf(limits);
        Checks.drawable("Required flux", requiredFlux);
        Checks.drawable("Carried flux", carriedFlux);
    }

    /** What is left over in W/m²; negative where the floor falls short. */
    double margin() {
        return carriedFlux - requiredFlux;
    }

    /** An axis from zero, or from below it if a flux is negative, that leaves out limits far beyond the rest. */
    Ticks axis(int steps) {
        double lowest = Math.min(0, all().min().orElse(0));
        double near = Math.max(requiredFlux, carriedFlux);
        double reach = near > 0 ? FAR * near : Double.MAX_VALUE;
        double highest = all().filter(flux -> flux <= reach).max().orElse(near);
        return Ticks.around(lowest, Math.max(highest, lowest + 1), steps);
    }

    private DoubleStream all() {
        DoubleStream pointers = DoubleStream.of(requiredFlux, carriedFlux);
        return DoubleStream.concat(pointers, limits.stream().mapToDouble(FluxLimit::maximumFlux));
    }
}
