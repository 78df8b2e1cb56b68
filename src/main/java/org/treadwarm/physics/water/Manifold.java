package org.treadwarm.physics.water;

import java.util.List;
import java.util.stream.IntStream;
import java.util.stream.Stream;
import org.treadwarm.physics.Require;
import org.treadwarm.physics.water.RoomCircuits.Loops;

/**
 * A manifold: which valve throttles how much, and what the pump has to give. Loops hang in parallel, so each has the pressure
 * drop of the worst; what its own pipe leaves of that is throttled at its valve.
 *
 * @param valves one for every loop, in the order of the rooms
 * @param worst room of the loop with the largest drop, the first of equal ones
 * @param duty what the pump has to give
 * @param content water in the loops, m³
 */
public record Manifold(List<Valve> valves, String worst, Duty duty, double content) {
    public Manifold {
        valves = List.copyOf(valves);
    }

    /**
     * One loop's valve.
     *
     * @param room its name
     * @param loop number of the loop in its room, from 1
     * @param massFlow kg/s
     * @param drop of its pipe, Pa
     * @param throttled what its valve has to take away, Pa, 0 at the worst loop
     */
    public record Valve(String room, int loop, double massFlow, double drop, double throttled) {}

    /**
     * Duty point of the pump.
     *
     * @param massFlow of all loops, kg/s
     * @param volumeFlow of all loops, m³/s
     * @param pressure drop of the worst loop and of what lies in series with it, Pa
     */
    public record Duty(double massFlow, double volumeFlow, double pressure) {}

    /**
     * Balances the loops of a manifold.
     *
     * @param rooms the loops of its rooms, one room or more
     * @param inSeries pressure drop of manifold, boiler and the pipes to them at the whole flow, Pa, at least 0
     * @param density of the water at the pump, kg/m³
     */
    public static Manifold balance(List<Loops> rooms, double inSeries, double density) {
        Require.within("pressure drop in series", inSeries, 0, Double.MAX_VALUE);
        Require.positive("density of the water", density);
        Loops worst = rooms.stream()
                .reduce((one, other) -> other.pressureDrop() > one.pressureDrop() ? other : one)
                .orElseThrow(() -> new IllegalArgumentException("the manifold has no loop, allowed is one or more"));
        List<Valve> valves = rooms.stream()
                .flatMap(loops -> valves(loops, worst.pressureDrop()))
                .toList();
        double massFlow = valves.stream().mapToDouble(Valve::massFlow).sum();
        return new Manifold(
                valves,
                worst.room(),
                new Duty(massFlow, massFlow / density, worst.pressureDrop() + inSeries),
                rooms.stream().mapToDouble(Loops::content).sum());
    }

    private static Stream<Valve> valves(Loops loops, double worst) {
        return IntStream.rangeClosed(1, loops.count())
                .mapToObj(loop -> new Valve(
                        loops.room(), loop, loops.massFlow(), loops.pressureDrop(), worst - loops.pressureDrop()));
    }
}
