package org.treadwarm.sizing;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;
import org.treadwarm.physics.warmup.Reheat;
import org.treadwarm.physics.warmup.Watched;
import org.treadwarm.sizing.Plan.RoomIndexes;
import org.treadwarm.sizing.Sizing.WarmUpSizing;
import org.treadwarm.sizing.WarmUpEvaluation.Floor;
import org.treadwarm.sizing.WarmUpEvaluation.RoomHeat;
import org.treadwarm.sizing.WarmUpEvaluation.Task;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.Layer;
import org.treadwarm.survey.LayerMatter;

/**
 * A heated floor that must warm its room after a setback, on the design day: how much its heat load rises by that, and how the
 * morning goes.
 *
 * @param floor the floor as it passes and holds heat
 * @param room what loses and holds heat above it
 * @param task what is asked
 * @param reheatHeat what the heat load rises by, W
 * @param found the densities that it takes, and the flux by which the heat load rises
 * @param evaluation the morning with the density looked at
 */
record WarmUpFloor(
        Floor floor, RoomHeat room, Task task, double reheatHeat, Reheat found, WarmUpEvaluation evaluation) {
    /** Density of air, kg/m³, and its specific heat capacity, J/(kg·K), at 20 °C and sea level (handbook values, from memory). */
    private static final double AIR = 1.2 * 1005;

    /** What follows the air at once, such as furnishings, as a multiple of it; common practice, no source. */
    private static final double WITH_AIR = 2.5;

    /** Heat capacity of walls and furniture that take part, J/(m²·K) of floor; common practice, no source. */
    private static final double MASS = 150_000;

    /** Between the air and that mass, W/(m²·K) of floor; common practice, no source. */
    private static final double COUPLING = 8;

    private static final double LOOKED_AT = 72;

    /** What was made of a floor, or why nothing. */
    record Made(Optional<WarmUpFloor> floor, String whyNot) {
        static Made not(String why) {
            return new Made(Optional.empty(), why);
        }
    }

    /** Follows the warming up of a floor whose losses are evaluated. */
    static Made of(FloorEvaluation floor) {
        Evaluation whole = floor.whole();
        int number = floor.plan.room();
        HeatedFloor given = whole.plan.survey.rooms().get(number).heatedFloor().orElseThrow();
        Optional<String> missing = silent(given.above(), "above").or(() -> silent(given.below(), "below"));
        if (missing.isPresent()) {
            return Made.not("density or specific heat of " + missing.get() + " is not known");
        }
        double span = floor.room - whole.outdoor;
        double loss = whole.roomConstant[number] + whole.roomSlope[number] * whole.outdoor;
        if (!(span > 0 && loss > 0)) {
            return Made.not("the room loses no heat on the design day");
        }
        if (!whole.sections.mayFollow()) {
            return Made.not("one sizing follows at most " + Sections.MOST_NEW + " floors through time");
        }
        try {
            return followed(floor, given, loss / span / floor.area);
        } catch (IllegalArgumentException | ArithmeticException problem) {
            return Made.not(problem.getMessage());
        }
    }

    /** The first layer that does not say what heat it holds. */
    private static Optional<String> silent(List<Layer> layers, String where) {
        return IntStream.range(0, layers.size())
                .filter(i -> !LayerMatter.isResistanceAlone(layers.get(i))
                        && !LayerMatter.of(layers.get(i)).missing().isEmpty())
                .mapToObj(i -> "\"" + layers.get(i).title(i + 1) + "\" " + where + " the heater")
                .findFirst();
    }

    private static Made followed(FloorEvaluation evaluated, HeatedFloor given, double lossCoefficient) {
        Evaluation whole = evaluated.whole();
        RoomIndexes inputs = whole.plan.roomIndexes[evaluated.plan.room()];
        double volume = whole.in[inputs.floorArea()] * whole.in[inputs.height()];
        double share = whole.in[inputs.floorArea()] / evaluated.area;
        double below = Math.max(1e-3, evaluated.resistanceDown - evaluated.resistanceBelow);
        Floor floor = new Floor(
                given.above(),
                given.below(),
                OptionalDouble.empty(),
                1 / below,
                (evaluated.downConstant + evaluated.downSlope * whole.outdoor) / evaluated.downCoefficient);
        RoomHeat room = new RoomHeat(
                WITH_AIR * AIR * volume / evaluated.area,
                MASS * share,
                COUPLING * share,
                lossCoefficient,
                whole.outdoor,
                0);
        double from = whole.in[inputs.setback()];
        double within = whole.in[inputs.warmUpTime()];
        Optional<Reheat> found =
                Reheat.of(floor.buildUp(), room.room(), Watched.AIR, from, evaluated.room, within * 3600, () -> false);
        if (found.isEmpty()) {
            return Made.not("no density up to 2 000 W/m² warms the room in that time");
        }
        double density = evaluated.plan.heater().hasDensity()
                ? evaluated.density()
                : found.get().neededDensity();
        Task task = new Task(density, false, from, evaluated.room, OptionalDouble.empty(), LOOKED_AT);
        return new Made(
                Optional.of(new WarmUpFloor(
                        floor,
                        room,
                        new Task(density, false, from, evaluated.room, OptionalDouble.of(within), LOOKED_AT),
                        found.get().extraHeat() * evaluated.area,
                        found.get(),
                        WarmUpEvaluation.of(floor, room, task, () -> false))),
                "");
    }

    /** What the heat load rises by, W. */
    double reheat() {
        return reheatHeat;
    }

    WarmUpSizing answer() {
        return new WarmUpSizing(
                task.from(),
                task.within().orElseThrow(),
                found.extraHeat(),
                found.steadyDensity(),
                found.neededDensity(),
                task.density(),
                evaluation.hours(),
                room.lossCoefficient(),
                room.airCapacity(),
                room.massCapacity(),
                room.massCoupling(),
                evaluation.powerCut().hoursToFive(),
                evaluation.powerCut().hoursToFreezing());
    }
}
