package org.treadwarm.physics.warmup;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.BooleanSupplier;

/**
 * How a floor and its room warm up and cool down: one-dimensional conduction through the layers, the heater as a plane between
 * two of them, the room as air and mass.
 *
 * <p>What it leaves out: the pattern of the pipes or cables within their plane, so it is right for times in which heat spreads
 * over half their spacing; radiation from the floor straight to the walls, which here warm by way of the air; heat stored in the
 * outer walls beyond the room's mass; a thermostat, since the heater is on or off throughout.
 *
 * <p>Every method polls {@code stopped} at every step and throws CancellationException when it says so; each throws
 * ArithmeticException rather than answer from equations that did not converge.
 */
public final class WarmUp {
    /** The densest heater that is looked for, W/m²; far beyond any floor that can be built. */
    public static final double HIGHEST_DENSITY = 2000;

    /** How near the target the temperature must come, K. */
    private static final double NEAR = 1e-4;

    private static final int MOST_TRIALS = 60;

    private final BuildUp floor;
    private final Room room;
    private final double tolerance;
    private final Chain chain;

    /** A floor and its room at the standard accuracy. */
    public WarmUp(BuildUp floor, Room room) {
        this(floor, room, Accuracy.STANDARD);
    }

    /** A floor and its room at an accuracy; IllegalArgumentException when the layers make too many cells for it. */
    public WarmUp(BuildUp floor, Room room, Accuracy accuracy) {
        this.floor = floor;
        this.room = room;
        this.tolerance = accuracy.tolerance();
        this.chain = new Chain(floor, room, accuracy.refinement());
    }

    /** Whether a temperature was reached, when, and what it was in the end. */
    public record Wait(OptionalDouble seconds, double temperature) {}

    /** Where the heat of a passage went, J/m²: in = stored + lostOutdoors + lostBelow. */
    public record Balance(double in, double stored, double lostOutdoors, double lostBelow) {}

    /** A passage as it was sampled, at equal distances in time from the start to the end. */
    public record Curve(List<Moment> moments, Balance balance) {
        public Curve {
            moments = List.copyOf(moments);
        }
    }

    /** Floor and room all at one temperature. */
    public State uniform(double temperature) {
        Require.finite("temperature", temperature);
        double[] temperatures = new double[chain.nodes()];
        Arrays.fill(temperatures, temperature);
        return new State(0, temperatures);
    }

    /** The state in which the heater, at the density that is told, keeps the room at a temperature; it may have to cool. */
    public State held(double temperature) {
        Require.finite("temperature", temperature);
        double[] temperatures = new double[chain.nodes()];
        SteadyState.fill(chain, floor, room, temperature, temperatures);
        return new State(SteadyState.densityHolding(floor, room, temperature), temperatures);
    }

    /** The state that a heater at a density comes to. */
    public State steady(double density) {
        Require.finite("density", density);
        double[] temperatures = new double[chain.nodes()];
        SteadyState.fill(chain, floor, room, SteadyState.airTemperature(floor, room, density), temperatures);
        return new State(density, temperatures);
    }

    /** The state held by a thermostat that only heats: at the temperature, or warmer where the room is so without the heater. */
    public State heldByHeating(double temperature) {
        State held = held(temperature);
        return held.density() >= 0 ? held : steady(0);
    }

    /** Temperatures and fluxes of a state. */
    public Moment moment(State state) {
        return chain.moment(0, checked(state).temperatures());
    }

    /** One temperature of a state, degrees Celsius. */
    public double value(State state, Watched watched) {
        return chain.value(watched, checked(state).temperatures());
    }

    /** Waits, with the heater at a density, until a temperature has come to a target from either side, for so long at most. */
    public Wait waitFor(
            State start, double density, Watched watched, double target, double mostSeconds, BooleanSupplier stopped) {
        Require.atLeastZero("time", mostSeconds);
        Require.finite("target", target);
        Passage passage = passage(start, density, stopped);
        boolean reached = passage.to(mostSeconds, watched, target);
        return new Wait(
                reached ? OptionalDouble.of(passage.time()) : OptionalDouble.empty(),
                chain.value(watched, passage.stepper().now()));
    }

    /** The temperature after a time with the heater at a density, degrees Celsius. */
    public double after(State start, double density, Watched watched, double seconds, BooleanSupplier stopped) {
        Require.atLeastZero("time", seconds);
        Passage passage = passage(start, density, stopped);
        passage.to(seconds);
        return chain.value(watched, passage.stepper().now());
    }

    /**
     * The density that brings a temperature from a steady start to a target within a time, W/m², at least 0; empty when not even
     * {@link #HIGHEST_DENSITY} does. The temperature then rises throughout, and rises with the density, so the root is one.
     */
    public OptionalDouble densityWithin(
            State start, Watched watched, double target, double seconds, BooleanSupplier stopped) {
        double low = 0;
        double atLow = after(start, low, watched, seconds, stopped) - target;
        if (atLow >= -NEAR) {
            return OptionalDouble.of(0);
        }
        double high = HIGHEST_DENSITY;
        double atHigh = after(start, high, watched, seconds, stopped) - target;
        if (atHigh < 0) {
            return OptionalDouble.empty();
        }
        for (int trial = 0; trial < MOST_TRIALS; trial++) {
            double density = high - atHigh * (high - low) / (atHigh - atLow);
            double gap = after(start, density, watched, seconds, stopped) - target;
            if (Math.abs(gap) <= NEAR) {
                return OptionalDouble.of(density);
            }
            if (gap * atHigh < 0) {
                low = high;
                atLow = atHigh;
            } else {
                atLow /= 2;
            }
            high = density;
            atHigh = gap;
        }
        throw new ArithmeticException("no density found that reaches " + target + " °C after " + seconds + " s");
    }

    /** The passage with the heater at a density, sampled at the start and at the ends of so many equal parts of the time. */
    public Curve curve(State start, double density, double seconds, int parts, BooleanSupplier stopped) {
        Require.positive("time", seconds);
        if (parts < 1 || parts > 10_000) {
            throw new IllegalArgumentException(parts + " parts; there must be 1 to 10000");
        }
        Passage passage = passage(start, density, stopped);
        List<Moment> moments = new ArrayList<>(parts + 1);
        moments.add(passage.moment());
        for (int part = 1; part <= parts; part++) {
            passage.to(seconds * part / parts);
            moments.add(passage.moment());
        }
        return new Curve(moments, balance(start, density, passage));
    }

    /**
     * The longest times by which the floor and its room together come to rest, exp(-t/tau), s, longest first; for a film of one
     * coefficient alone.
     */
    public double[] timeConstants(int count) {
        return TimeConstants.of(chain, count);
    }

    private Balance balance(State start, double density, Passage passage) {
        double stored = 0;
        double[] then = start.temperatures();
        double[] now = passage.stepper().now();
        for (int i = 0; i < now.length; i++) {
            stored += chain.capacity()[i] * (now[i] - then[i]);
        }
        return new Balance(
                (density + room.otherGain()) * passage.time(),
                stored,
                passage.stepper().lostOutdoors(),
                passage.stepper().lostBelow());
    }

    private Passage passage(State start, double density, BooleanSupplier stopped) {
        Require.finite("density", density);
        return new Passage(chain, tolerance, checked(start), density, stopped);
    }

    private State checked(State state) {
        if (state.temperatures().length != chain.nodes()) {
            throw new IllegalArgumentException("the state is of another floor; it must come from this one");
        }
        return state;
    }
}
