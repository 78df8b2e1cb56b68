package org.treadwarm.draw;

import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;

/**
 * An assembly's layers and the temperatures through them.
 *
 * @param name the assembly's name
 * @param horizontal whether it lies flat: then the first layer is drawn at the top, otherwise at the left
 * @param first the air before the first layer; the inside of a wall
 * @param last the air behind the last layer
 * @param layers the layers from first to last, at least one
 * @param temperatures surface and interface temperatures in °C from first to last, one more than layers
 * @param dewPoint dew point in °C to mark, if any
 */
public record BuildUp(
        String name,
        boolean horizontal,
        AirSide first,
        AirSide last,
        List<Layer> layers,
        List<Double> temperatures,
        OptionalDouble dewPoint) {
    /** @throws IllegalArgumentException if there is no layer, the counts disagree or a number cannot be drawn */
    public BuildUp {
        layers = List.copyOf(layers);
        temperatures = List.copyOf(temperatures);
        if (layers.isEmpty() || temperatures.size() != layers.size() + 1) {
            throw new IllegalArgumentException(
                    layers.size() + " layers do not go with " + temperatures.size() + " temperatures");
        }
        temperatures.forEach(temperature -> Checks.temperature("Interface temperature", temperature));
        dewPoint.ifPresent(degrees -> Checks.temperature("Dew point", degrees));
    }

    /** Every temperature that is drawn, for the axis. */
    DoubleStream drawn() {
        DoubleStream.Builder all = DoubleStream.builder();
        all.add(first.temperature()).add(last.temperature());
        temperatures.forEach(all::add);
        dewPoint.ifPresent(all::add);
        return all.build();
    }
}
