package org.treadwarm.sizing;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.BooleanSupplier;
import org.treadwarm.physics.envelope.HeatFlow;
import org.treadwarm.physics.floor.HeatedFloor;
import org.treadwarm.physics.warmup.BuildUp;
import org.treadwarm.physics.warmup.Film;
import org.treadwarm.physics.warmup.PowerCut;
import org.treadwarm.physics.warmup.Reheat;
import org.treadwarm.physics.warmup.Room;
import org.treadwarm.physics.warmup.State;
import org.treadwarm.physics.warmup.Underside;
import org.treadwarm.physics.warmup.WarmUp;
import org.treadwarm.physics.warmup.WarmUp.Wait;
import org.treadwarm.physics.warmup.Watched;
import org.treadwarm.survey.Layer;

/**
 * How a heated floor warms its room after a setback, and how long the room lasts without it, on the design day.
 *
 * <p>The room starts as the floor keeps it at the setback temperature, or warmer where it is so unheated; then the heater is on at
 * its density throughout. See {@link WarmUp} for what the model leaves out.
 *
 * @param hours until the room is warm; left out when it is not within the time looked at
 * @param reached the temperature at the end of that time, degrees Celsius, when the room is not warm by then
 * @param steadyDensity heat of the heater that keeps the room warm, W/m²
 * @param densityNeeded heat of the heater that warms the room in the time given, W/m²; left out without such a time and when no
 *     density up to {@link WarmUp#HIGHEST_DENSITY} is enough
 * @param reheat what the room's heat load must be raised by for that, W/m² of heated floor; left out with it
 * @param curve temperatures at equal times
 * @param powerCut how long the room lasts when the heater fails in steady state
 */
public record WarmUpEvaluation(
        OptionalDouble hours,
        OptionalDouble reached,
        double steadyDensity,
        OptionalDouble densityNeeded,
        OptionalDouble reheat,
        List<CurvePoint> curve,
        PowerCutHours powerCut) {
    private static final double HOUR = 3600;
    private static final int PARTS = 48;

    /** So that the last mark of a cooling curve stands within it. */
    private static final double BEYOND = 1.1;

    public WarmUpEvaluation {
        curve = List.copyOf(curve);
    }

    /** Temperatures at one hour, degrees Celsius. */
    public record CurvePoint(double hour, double floor, double air, double heater) {}

    /**
     * Cooling when the heater fails in steady state.
     *
     * @param hoursToFive until the air is at 5 °C; left out when not within the time looked at
     * @param hoursToFreezing until the heater plane is at 0 °C; left out when not within that time
     * @param curve temperatures at equal times, a little beyond the later of the two, or over all the time looked at
     */
    public record PowerCutHours(OptionalDouble hoursToFive, OptionalDouble hoursToFreezing, List<CurvePoint> curve) {
        public PowerCutHours {
            curve = List.copyOf(curve);
        }
    }

    /**
     * A floor under its room.
     *
     * @param above from the finished surface down to the heater
     * @param below from the heater down
     * @param surfaceCoefficient W/(m²·K); empty for the basic characteristic of EN 1264-2
     * @param belowCoefficient W/(m²·K)
     * @param belowTemperature degrees Celsius
     */
    public record Floor(
            List<Layer> above,
            List<Layer> below,
            OptionalDouble surfaceCoefficient,
            double belowCoefficient,
            double belowTemperature) {
        BuildUp buildUp() {
            return new BuildUp(
                    ThermalLayers.of(above, HeatFlow.UP),
                    ThermalLayers.of(below, HeatFlow.DOWN),
                    surfaceCoefficient.isPresent()
                            ? new Film.Constant(surfaceCoefficient.getAsDouble())
                            : new Film.PowerLaw(HeatedFloor.COEFFICIENT, HeatedFloor.EXPONENT),
                    new Underside.Exchange(belowCoefficient, belowTemperature));
        }
    }

    /**
     * The room above the floor, everything per m² of heated floor; see {@link Room}.
     *
     * @param airCapacity J/(m²·K)
     * @param massCapacity J/(m²·K)
     * @param massCoupling W/(m²·K)
     * @param lossCoefficient W/(m²·K)
     * @param outdoorTemperature degrees Celsius
     * @param otherGain W/m²
     */
    public record RoomHeat(
            double airCapacity,
            double massCapacity,
            double massCoupling,
            double lossCoefficient,
            double outdoorTemperature,
            double otherGain) {
        Room room() {
            return new Room(airCapacity, massCapacity, massCoupling, lossCoefficient, outdoorTemperature, otherGain);
        }
    }

    /**
     * What is asked of it.
     *
     * @param density heat of the heater, W/m²
     * @param operative whether the mean of air and mass counts, not the air
     * @param from setback, degrees Celsius
     * @param to setpoint, degrees Celsius, at least the setback
     * @param within hours in which the room is to be warm; empty for none
     * @param lookedAt hours after which nothing more is looked at
     */
    public record Task(
            double density, boolean operative, double from, double to, OptionalDouble within, double lookedAt) {
        Watched watched() {
            return operative ? Watched.OPERATIVE : Watched.AIR;
        }
    }

    /** Evaluates a floor that intake accepted; CancellationException when it is stopped. */
    public static WarmUpEvaluation of(Floor floor, RoomHeat roomHeat, Task task, BooleanSupplier stopped) {
        BuildUp buildUp = floor.buildUp();
        Room room = roomHeat.room();
        WarmUp warmUp = new WarmUp(buildUp, room);
        State start = warmUp.heldByHeating(task.from());
        Wait wait = warmUp.waitFor(start, task.density(), task.watched(), task.to(), task.lookedAt() * HOUR, stopped);
        boolean warmAtOnce = warmUp.value(start, task.watched()) >= task.to();
        OptionalDouble hours = warmAtOnce ? OptionalDouble.of(0) : hours(wait.seconds());
        OptionalDouble needed = OptionalDouble.empty();
        OptionalDouble reheat = OptionalDouble.empty();
        if (task.within().isPresent()) {
            Optional<Reheat> found = Reheat.of(
                    buildUp,
                    room,
                    task.watched(),
                    task.from(),
                    task.to(),
                    task.within().getAsDouble() * HOUR,
                    stopped);
            if (found.isPresent()) {
                needed = OptionalDouble.of(found.get().neededDensity());
                reheat = OptionalDouble.of(found.get().extraHeat());
            }
        }
        double shown = Math.max(hours.orElse(task.lookedAt()), task.within().orElse(0));
        PowerCut cut = PowerCut.of(warmUp, task.to(), task.lookedAt() * HOUR, stopped);
        return new WarmUpEvaluation(
                hours,
                hours.isPresent() ? OptionalDouble.empty() : OptionalDouble.of(wait.temperature()),
                warmUp.heldByHeating(task.to()).density(),
                needed,
                reheat,
                shown > 0 ? curve(warmUp, start, task.density(), shown, stopped) : List.of(),
                powerCut(warmUp, cut, task, stopped));
    }

    private static PowerCutHours powerCut(WarmUp warmUp, PowerCut cut, Task task, BooleanSupplier stopped) {
        OptionalDouble five = hours(cut.secondsToFive());
        OptionalDouble freezing = hours(cut.secondsToFreezing());
        double last = Math.max(five.orElse(task.lookedAt()), freezing.orElse(task.lookedAt()));
        double shown = Math.min(task.lookedAt(), BEYOND * last);
        return new PowerCutHours(
                five,
                freezing,
                shown > 0 ? curve(warmUp, warmUp.heldByHeating(task.to()), 0, shown, stopped) : List.of());
    }

    private static List<CurvePoint> curve(
            WarmUp warmUp, State start, double density, double hours, BooleanSupplier stopped) {
        return warmUp.curve(start, density, hours * HOUR, PARTS, stopped).moments().stream()
                .map(moment -> new CurvePoint(moment.seconds() / HOUR, moment.surface(), moment.air(), moment.heater()))
                .toList();
    }

    private static OptionalDouble hours(OptionalDouble seconds) {
        return seconds.isPresent() ? OptionalDouble.of(seconds.getAsDouble() / HOUR) : seconds;
    }
}
