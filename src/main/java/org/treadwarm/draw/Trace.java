package org.treadwarm.draw;

import java.util.List;

/**
 * The temperatures of one place over time.
 *
 * @param place where they are taken
 * @param temperatures in °C, one at each time of the curve
 */
public record Trace(Place place, List<Double> temperatures) {
    /** Where temperatures are followed. */
    public enum Place {
        SURFACE("floor surface", ""),
        AIR("air", "9 5"),
        HEATER("heater plane", "2 4");

        private final String words;
        private final String dashes;

        Place(String words, String dashes) {
            this.words = words;
            this.dashes = dashes;
        }

        String words() {
            return words;
        }

        String dashes() {
            return dashes;
        }
    }

    /** @throws IllegalArgumentException if a temperature cannot be drawn */
    public Trace {
        temperatures = List.copyOf(temperatures);
        temperatures.forEach(degrees -> Checks.temperature("Temperature of the " + place.words(), degrees));
    }

    double last() {
        return temperatures.get(temperatures.size() - 1);
    }
}
