package org.treadwarm.physics.warmup;

/**
 * The room above the floor as two nodes, everything per m² of heated floor: the air, which takes the floor's heat and loses heat
 * to outdoors, and the mass of walls and furniture, which exchanges heat with the air alone.
 *
 * @param airCapacity heat capacity of the air and of what follows it at once, J/(m²·K), more than 0
 * @param massCapacity heat capacity of the mass, J/(m²·K), more than 0
 * @param massCoupling between air and mass, W/(m²·K), more than 0
 * @param lossCoefficient from the air to outdoors, W/(m²·K), more than 0
 * @param outdoorTemperature degrees Celsius
 * @param otherGain heat that reaches the air from elsewhere, W/m²
 */
public record Room(
        double airCapacity,
        double massCapacity,
        double massCoupling,
        double lossCoefficient,
        double outdoorTemperature,
        double otherGain) {
    /** Throws IllegalArgumentException when a number is out of its range. */
    public Room {
        Require.positive("heat capacity of the air", airCapacity);
        Require.positive("heat capacity of the mass", massCapacity);
        Require.positive("coupling of air and mass", massCoupling);
        Require.positive("loss coefficient", lossCoefficient);
        Require.finite("outdoor temperature", outdoorTemperature);
        Require.finite("other gain", otherGain);
    }

    /** Heat the room loses beyond its gain at an air temperature that stays, W/m². */
    public double steadyLoss(double temperature) {
        return lossCoefficient * (temperature - outdoorTemperature) - otherGain;
    }
}
