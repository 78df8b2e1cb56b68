package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.DoublePredicate;
import org.treadwarm.physics.section.FloorResponse;
import org.treadwarm.physics.section.FloorState;
import org.treadwarm.sizing.Plan.LayerLimit;
import org.treadwarm.sizing.Sizing.FluxSplit;

/**
 * A heated floor that is solved between its cables or pipes. Its mean surface temperature follows from the flux as everywhere
 * (EN 1264-2); how much warmer it is over the heaters, how warm the heaters are, and what goes down, comes from the section.
 *
 * <p>Downward the section's own condition is the resistance to what lies below. Where the survey's balance asks for more, as the
 * season factor on the ground does, the temperature below is set so that the section's downward flux is that balance's, with the
 * heater's temperature there being the mean over the upper face of the layers below.
 */
final class SectionFloor {
    /** The largest flux looked at, W/m²; no floor comes near it. */
    static final double HIGHEST_FLUX = 4000;

    /** Change of the downward flux per tenth of a kelvin below the floor that tells anything, W/m²; built floors have 1e-4 and more. */
    private static final double LEAST_REACTION = 1e-9;

    final FloorEvaluation plane;
    final SectionGeometry geometry;
    final FloorResponse response;

    private final double downwardResistance;
    private final FloorState buffer;

    /** Temperatures in degrees Celsius and heat in W/m² at one flux and outdoor temperature. */
    record State(
            double flux,
            double below,
            double mean,
            double warmest,
            double coldest,
            double plane,
            double downward,
            double edge,
            double heater,
            double water,
            double[] faces) {
        /** Heat that the heater makes. */
        double made() {
            return flux + downward + edge;
        }
    }

    SectionFloor(FloorEvaluation plane, SectionGeometry geometry, FloorResponse response) {
        this.plane = plane;
        this.geometry = geometry;
        this.response = response;
        this.buffer = response.newState();
        this.downwardResistance = plane.resistanceBelow + 1 / geometry.coefficientBelow();
    }

    /** The floor giving a flux of at most {@link #HIGHEST_FLUX} at an outdoor temperature. */
    State at(double flux, double outdoor) {
        double below = (plane.downConstant + plane.downSlope * outdoor) / plane.downCoefficient;
        double atZero = downward(flux, 0);
        double perKelvin = downward(flux, 1) - atZero;
        double open = 1 - plane.downCoefficient * downwardResistance;
        double equivalent =
                (plane.downCoefficient * below + atZero * open) / (plane.downCoefficient - perKelvin * open);
        return solved(flux, equivalent, outdoor);
    }

    private double downward(double flux, double below) {
        response.evaluate(flux, plane.room, below, buffer);
        return buffer.downwardFlux();
    }

    private State solved(double flux, double below, double outdoor) {
        response.evaluate(flux, plane.room, below, buffer);
        double heaterPlane = below + buffer.downwardFlux() * downwardResistance;
        double[] faces = new double[buffer.layers()];
        Arrays.setAll(faces, buffer::warmFace);
        return new State(
                flux,
                below,
                buffer.surfaceMean(),
                buffer.surfaceMaximum(),
                buffer.surfaceMinimum(),
                heaterPlane,
                buffer.downwardFlux(),
                plane.edgeFlux(heaterPlane, outdoor),
                buffer.heaterTemperature(),
                plane.plan.heater().water() ? buffer.waterTemperature() : Double.NaN,
                faces);
    }

    /** How a temperature of the floor rises over the room's with the upward and the downward flux; at one flux both are linear. */
    FluxSplit split(Rising temperature, double flux, double outdoor) {
        State here = at(flux, outdoor);
        // Away from the room's temperature, so that the warmest point stays where it is.
        State near = solved(flux, here.below() + Math.copySign(0.1, here.below() - plane.room), outdoor);
        double reaction = near.downward() - here.downward();
        // Where next to nothing can go down, nothing follows from it, and the quotient would be one of roundings.
        double perDownward =
                Math.abs(reaction) < LEAST_REACTION ? 0 : (temperature.of(near) - temperature.of(here)) / reaction;
        double left = temperature.of(here) - plane.room - perDownward * here.downward();
        return new FluxSplit(flux > 0 ? left / flux : 0, perDownward);
    }

    /** A number of a state that rises with the flux. */
    interface Rising {
        double of(State state);
    }

    /** What may not be exceeded: a number of a state, and its maximum. */
    record Bound(int slot, Rising number, double maximum) {}

    /** The bounds of the survey, each with the slot of its limit. */
    List<Bound> bounds() {
        double[] in = plane.whole().in;
        List<Bound> bounds = new ArrayList<>(temperatures(0, plane.zoneMaximum()));
        int last = 2 + plane.plan.layerLimits().size();
        if (plane.plan.heater().hasDensity()) {
            bounds.add(new Bound(last, State::made, plane.density()));
        }
        if (plane.plan.heater().supplyTemperature() != Stack.NONE) {
            bounds.add(new Bound(
                    last + 1, State::water, meanWater(in[plane.plan.heater().supplyTemperature()])));
        }
        if (plane.mats.layout().isPresent()) {
            bounds.add(new Bound(last + 2, State::made, plane.matsDensity));
        }
        return bounds;
    }

    /**
     * The bounds that are temperatures of surface and layers.
     *
     * @param first slot of the first
     * @param zoneMaximum what the surface may be by its zone, degrees Celsius
     */
    List<Bound> temperatures(int first, double zoneMaximum) {
        double[] in = plane.whole().in;
        List<Bound> bounds = new ArrayList<>();
        bounds.add(new Bound(first, State::warmest, zoneMaximum));
        if (plane.plan.maximumSurface() != Stack.NONE) {
            bounds.add(new Bound(first + 1, State::warmest, in[plane.plan.maximumSurface()]));
        }
        List<LayerLimit> layers = plane.plan.layerLimits();
        for (int i = 0; i < layers.size(); i++) {
            int layer = layers.get(i).layer();
            bounds.add(new Bound(
                    first + 2 + i,
                    state -> state.faces()[layer],
                    in[layers.get(i).maximum()]));
        }
        return bounds;
    }

    /** Mean temperature of the water for a supply temperature: the room's and the logarithmic mean over-temperature (EN 1264-2). */
    double meanWater(double supply) {
        double over = supply - plane.room;
        double spread = spread();
        return over <= spread ? Double.NEGATIVE_INFINITY : plane.room + spread / Math.log(over / (over - spread));
    }

    /** Supply temperature at which the water has a mean temperature: the inverse of {@link #meanWater}. */
    double supply(double meanWater) {
        double spread = spread();
        return plane.room - spread / Math.expm1(-spread / (meanWater - plane.room));
    }

    /** Between supply and return, K. */
    double spread() {
        return plane.waterSpread();
    }

    /** Puts the largest flux that each bound allows into its slot. */
    void limits(double[] limits) {
        double outdoor = plane.whole().outdoor;
        Arrays.fill(limits, Double.POSITIVE_INFINITY);
        for (Bound bound : bounds()) {
            limits[bound.slot()] = largestFlux(bound.number(), bound.maximum(), outdoor);
        }
        int density = 2 + plane.plan.layerLimits().size();
        if (plane.plan.heater().hasDensity()) {
            limits[density] = Math.min(limits[density], plane.density());
        }
    }

    /** As {@link FloorEvaluation#holdsDownTo}. */
    double lowestOutdoor() {
        List<Bound> bounds = bounds();
        return lowestOutdoor(plane, outdoor -> carriesAt(outdoor, bounds));
    }

    static double lowestOutdoor(FloorEvaluation plane, DoublePredicate carriesAt) {
        if (carriesAt.test(FloorEvaluation.COLDEST)) {
            return Double.NEGATIVE_INFINITY;
        }
        if (!carriesAt.test(plane.room)) {
            return Double.POSITIVE_INFINITY;
        }
        double low = FloorEvaluation.COLDEST;
        double high = plane.room;
        while (high - low > 1e-11 * (1 + Math.abs(low))) {
            double middle = (low + high) / 2;
            if (carriesAt.test(middle)) {
                high = middle;
            } else {
                low = middle;
            }
        }
        return high;
    }

    private boolean carriesAt(double outdoor, List<Bound> bounds) {
        double required = plane.requiredHeat(outdoor) / plane.area;
        if (required == 0) {
            return true;
        }
        if (required > HIGHEST_FLUX || required > plane.mostMade()) {
            return false;
        }
        State state = at(required, outdoor);
        return bounds.stream().allMatch(bound -> bound.number().of(state) <= bound.maximum());
    }

    /** The largest flux at which a rising number stays at or below a maximum; 0 when it is above already without any flux. */
    double largestFlux(Rising number, double maximum, double outdoor) {
        if (number.of(at(0, outdoor)) >= maximum) {
            return 0;
        }
        double low = 0;
        double high = 50;
        while (number.of(at(high, outdoor)) < maximum) {
            if (high == HIGHEST_FLUX) {
                return Double.POSITIVE_INFINITY;
            }
            low = high;
            high = Math.min(HIGHEST_FLUX, 2 * high);
        }
        return Bracket.root(flux -> number.of(at(flux, outdoor)) - maximum, low, high);
    }
}
