package org.treadwarm.draw;

/**
 * The air on one side of an assembly.
 *
 * @param name where it is
 * @param temperature its temperature in °C
 */
public record AirSide(String name, double temperature) {
    /** @throws IllegalArgumentException if the temperature cannot be drawn */
    public AirSide {
        Checks.temperature("Air temperature", temperature);
    }

    String words() {
        return name + ", " + Figures.celsius(temperature);
    }
}
