package org.treadwarm.physics.water;

import java.util.List;
import org.treadwarm.physics.Require;

/**
 * One supply temperature for the rooms of a job: the room that needs the hottest water with the design spread governs; the
 * others get the spread, and so the flow, that their own mean overtemperature leaves at that supply.
 *
 * <p>Source: EN 1264-3, design supply temperature (from memory), with the exact logarithmic mean in place of its series. The
 * standard leaves bathrooms out of the choice; whoever calls decides which rooms to give.
 *
 * @param supply degrees Celsius
 * @param governing name of the room that governs, the first of equal ones
 * @param rooms what each room gets, in the order given
 */
public record JobSupply(double supply, String governing, List<RoomWater> rooms) {
    public JobSupply {
        rooms = List.copyOf(rooms);
    }

    /**
     * What a room needs.
     *
     * @param room its name
     * @param temperature theta_i, degrees Celsius
     * @param meanOvertemperature dT_H that gives its flux at its chosen spacing, K
     * @param heat that its water carries, upward and downward, W
     */
    public record RoomNeed(String room, double temperature, double meanOvertemperature, double heat) {
        public RoomNeed {
            Require.positive("mean overtemperature of the water", meanOvertemperature);
            Require.positive("heat of the water", heat);
        }

        private double supply(double spread) {
            return temperature + HeatingWater.supplyOvertemperature(meanOvertemperature, spread);
        }
    }

    /**
     * What a room gets.
     *
     * @param room its name
     * @param spread supply less return, K
     * @param returning temperature of its return, degrees Celsius
     * @param massFlow kg/s
     */
    public record RoomWater(String room, double spread, double returning, double massFlow) {}

    /**
     * The supply of a job.
     *
     * @param needs the rooms, one or more
     * @param designSpread spread of the governing room, K, above 0
     * @param carrier what carries the heat
     */
    public static JobSupply of(List<RoomNeed> needs, double designSpread, HeatCarrier carrier) {
        Require.positive("design spread", designSpread);
        RoomNeed governing = needs.stream()
                .reduce((one, other) -> other.supply(designSpread) > one.supply(designSpread) ? other : one)
                .orElseThrow(() -> new IllegalArgumentException("the job has no room, allowed is one or more"));
        double supply = governing.supply(designSpread);
        return new JobSupply(
                supply,
                governing.room(),
                needs.stream().map(need -> water(need, supply, carrier)).toList());
    }

    private static RoomWater water(RoomNeed need, double supply, HeatCarrier carrier) {
        double spread = HeatingWater.spread(need.meanOvertemperature(), supply - need.temperature());
        double specificHeat = carrier.specificHeat(supply - spread / 2);
        return new RoomWater(
                need.room(), spread, supply - spread, HeatingWater.massFlow(need.heat(), spread, specificHeat));
    }
}
