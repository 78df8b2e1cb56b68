package org.treadwarm.sizing;

import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import org.treadwarm.sizing.SectionFloor.Bound;
import org.treadwarm.sizing.SectionFloor.Rising;
import org.treadwarm.sizing.SectionFloor.State;
import org.treadwarm.survey.Zone;

/**
 * A heated floor that is laid in parts, each with its own spacing and zone of use, and fed by one supply: water of one mean temperature
 * flows through all of them, or one cable with one power per metre lies in all of them. What a part gives at that supply is what its
 * own section says; the flux of the floor is the mean over its area (EN 1264-3). A part that would have to take heat gives nothing.
 */
final class PartedFloor {
    /** How far the mean of the parts may be from the flux asked for, relative. */
    private static final double CLOSE = 1e-9;

    final FloorEvaluation plane;
    final List<Part> parts;

    /**
     * One part.
     *
     * @param area m²
     * @param section the floor solved with the part's spacing
     */
    record Part(String name, Zone zone, double area, SectionFloor section) {
        /** What all parts have in common: the mean temperature of the water, or the power of a metre of cable. */
        double supply(State state) {
            return section.geometry.isWater() ? state.water() : state.made() * section.geometry.spacing();
        }
    }

    PartedFloor(FloorEvaluation plane, List<Part> parts) {
        this.plane = plane;
        this.parts = List.copyOf(parts);
    }

    /** The parts, in their order, at one flux of the floor. */
    List<State> at(double flux, double outdoor) {
        double supply = supply(flux, outdoor);
        return parts.stream()
                .map(part -> part.section().at(flux(part, supply, outdoor), outdoor))
                .toList();
    }

    /** Whether one supply can be found at which the parts give this flux. */
    boolean gives(double flux, double outdoor) {
        double found = mean(supply(flux, outdoor), outdoor);
        return Math.abs(found - flux) <= CLOSE * Math.max(1, flux);
    }

    /** The mean of a number over the area of the parts. */
    double mean(List<State> states, ToDoubleFunction<State> number) {
        double sum = 0;
        double area = 0;
        for (int i = 0; i < parts.size(); i++) {
            sum += parts.get(i).area() * number.applyAsDouble(states.get(i));
            area += parts.get(i).area();
        }
        return sum / area;
    }

    private double supply(double flux, double outdoor) {
        double[] even = parts.stream()
                .mapToDouble(part -> part.supply(part.section().at(flux, outdoor)))
                .toArray();
        double low = Arrays.stream(even).min().orElseThrow();
        double high = Arrays.stream(even).max().orElseThrow();
        return low == high ? low : Bracket.root(supply -> mean(supply, outdoor) - flux, low, high);
    }

    private static double flux(Part part, double supply, double outdoor) {
        return part.section().largestFlux(part::supply, supply, outdoor);
    }

    private double mean(double supply, double outdoor) {
        double sum = 0;
        double area = 0;
        for (Part part : parts) {
            sum += part.area() * flux(part, supply, outdoor);
            area += part.area();
        }
        return sum / area;
    }

    /** What the floor gives when a part is at a bound, W/m²; infinite when the part never gets there. */
    double fluxAt(Part part, Rising number, double maximum, double outdoor) {
        double own = part.section().largestFlux(number, maximum, outdoor);
        return Double.isFinite(own)
                ? mean(part.supply(part.section().at(own, outdoor)), outdoor)
                : Double.POSITIVE_INFINITY;
    }

    /** Puts the largest flux of the floor that each bound allows into its slot. */
    void limits(double[] limits) {
        double outdoor = plane.whole().outdoor;
        Arrays.fill(limits, Double.POSITIVE_INFINITY);
        for (int i = 0; i < parts.size(); i++) {
            for (Bound bound : bounds(i)) {
                limits[bound.slot()] = fluxAt(parts.get(i), bound.number(), bound.maximum(), outdoor);
            }
        }
        most().ifPresent(supply -> limits[slot()] = mean(supply, outdoor));
        if (plane.plan.heater().hasDensity()) {
            limits[slot()] = Math.min(limits[slot()], plane.density());
        }
    }

    /** What a part may not exceed, each with the slot of its limit. */
    List<Bound> bounds(int part) {
        double maximum = Limits.zoneMaximum(parts.get(part).zone(), plane.room);
        return parts.get(part).section().temperatures(plane.slotsOfAPart() * part, maximum);
    }

    /** The slot of the limit of the heater: its density, or its water. */
    private int slot() {
        return plane.limits.length - (plane.plan.heater().water() ? 2 : 3);
    }

    /** The most that the supply is; empty when that is not known. */
    private OptionalDouble most() {
        double[] in = plane.whole().in;
        if (plane.plan.heater().hasDensity()) {
            return OptionalDouble.of(in[plane.plan.heater().linearPower()]);
        }
        int supply = plane.plan.heater().supplyTemperature();
        return supply == Stack.NONE
                ? OptionalDouble.empty()
                : OptionalDouble.of(parts.get(0).section().meanWater(in[supply]));
    }

    /** As {@link FloorEvaluation#holdsDownTo}. */
    double lowestOutdoor() {
        return SectionFloor.lowestOutdoor(plane, this::carriesAt);
    }

    private boolean carriesAt(double outdoor) {
        double required = plane.requiredHeat(outdoor) / plane.area;
        if (required == 0) {
            return true;
        }
        if (required > SectionFloor.HIGHEST_FLUX || required > plane.mostMade() || !gives(required, outdoor)) {
            return false;
        }
        List<State> states = at(required, outdoor);
        boolean carries = PartAnswers.whole(this, required, outdoor).heaterFlux() <= plane.matsDensity
                && (most().isEmpty() || supply(required, outdoor) <= most().getAsDouble());
        for (int i = 0; carries && i < parts.size(); i++) {
            State state = states.get(i);
            carries = bounds(i).stream().allMatch(bound -> bound.number().of(state) <= bound.maximum());
        }
        return carries;
    }
}
