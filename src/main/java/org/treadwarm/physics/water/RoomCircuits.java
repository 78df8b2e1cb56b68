package org.treadwarm.physics.water;

import java.util.List;
import org.treadwarm.physics.Require;

/**
 * What a room asks of its circuits.
 *
 * @param room its name
 * @param zones parts of its floor; every loop runs through all of them alike
 * @param feederLength pipe of one loop between the manifold and the room, there and back, m, at least 0
 * @param supply temperature of the water at the manifold, degrees Celsius
 * @param spread supply less return, K
 */
public record RoomCircuits(String room, List<HeatedZone> zones, double feederLength, double supply, double spread) {
    /** More loops than this in one room are a slip of the input. */
    private static final int MOST_LOOPS = 1000;

    public RoomCircuits {
        zones = List.copyOf(zones);
        if (zones.isEmpty()) {
            throw new IllegalArgumentException("room " + room + " has no heated zone, allowed is one or more");
        }
        Require.within("length of the feeders", feederLength, 0, Double.MAX_VALUE);
        Require.positive("spread", spread);
    }

    /**
     * The loops of a room, all alike. Pressure drops are those of the straight pipe: bends and fittings are not in them.
     *
     * @param room its name
     * @param count how many
     * @param length of one loop with its feeders, m
     * @param heat that one loop carries, W
     * @param massFlow of one loop, kg/s
     * @param flow in one loop
     * @param pressureDrop of one loop, Pa
     * @param content water in all of them, m³
     */
    public record Loops(
            String room,
            int count,
            double length,
            double heat,
            double massFlow,
            Tube.Flow flow,
            double pressureDrop,
            double content) {}

    /** Heat that the water leaves in the room's floor, W. */
    public double heat() {
        return zones.stream().mapToDouble(HeatedZone::heat).sum();
    }

    /**
     * The fewest equal loops that keep a length and a pressure drop. The water's properties are taken at the mean of supply and
     * return.
     *
     * @param tube the pipe
     * @param carrier what flows in it
     * @param longest length of a loop, m
     * @param largestDrop pressure drop of a loop, Pa
     * @throws IllegalArgumentException when no number of loops keeps both, as when the feeders alone are too long
     */
    public Loops lay(Tube tube, HeatCarrier carrier, double longest, double largestDrop) {
        Require.positive("longest loop", longest);
        Require.positive("largest pressure drop", largestDrop);
        for (int count = 1; count <= MOST_LOOPS; count++) {
            Loops loops = lay(tube, carrier, count);
            if (loops.length() <= longest && loops.pressureDrop() <= largestDrop) {
                return loops;
            }
        }
        throw new IllegalArgumentException("room " + room + " with feeders of " + feederLength
                + " m finds no number of loops of at most " + longest + " m and " + largestDrop + " Pa");
    }

    /** So many equal loops. */
    public Loops lay(Tube tube, HeatCarrier carrier, int count) {
        if (count < 1) {
            throw new IllegalArgumentException("the number of loops is " + count + ", allowed is at least 1");
        }
        double temperature = supply - spread / 2;
        double heat = heat() / count;
        double laid = zones.stream().mapToDouble(HeatedZone::pipeLength).sum();
        double length = laid / count + feederLength;
        double massFlow = HeatingWater.massFlow(heat, spread, carrier.specificHeat(temperature));
        Tube.Flow flow = tube.flow(massFlow, carrier, temperature);
        double drop = flow.pressureGradient() * length;
        return new Loops(room, count, length, heat, massFlow, flow, drop, count * tube.content(length));
    }
}
