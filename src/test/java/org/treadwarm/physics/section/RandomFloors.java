package org.treadwarm.physics.section;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import org.treadwarm.physics.section.Condition.BasicCharacteristic;
import org.treadwarm.physics.section.Condition.Film;
import org.treadwarm.physics.section.FloorHeater.HeatingCable;
import org.treadwarm.physics.section.FloorHeater.WaterPipe;
import org.treadwarm.physics.section.FloorLayer.Resisting;
import org.treadwarm.physics.section.FloorLayer.Solid;

/** Invented floors by chance: screeds, dry boards and timber floors over voids, with pipes or cables. */
final class RandomFloors {
    private static final double ROOM = 20;

    private final SplittableRandom random;

    RandomFloors(long seed) {
        this.random = new SplittableRandom(seed);
    }

    /** A floor with warm water or a cable, under a film or the basic characteristic, of three to seven layers. */
    FloorSection next() {
        double diameter = random.nextDouble(0.004, 0.026);
        List<FloorLayer> layers = new ArrayList<>();
        for (int i = random.nextInt(0, 3); i > 0; i--) {
            layers.add(covering(i));
        }
        int holding = layers.size();
        double thickness = diameter + random.nextDouble(0.001, 0.09);
        double conductivity = Math.exp(random.nextDouble(Math.log(0.13), Math.log(2.5)));
        layers.add(new Solid("around", thickness, conductivity));
        for (int i = random.nextInt(1, 4); i > 0; i--) {
            layers.add(under(i));
        }
        layers.add(new Solid("insulation", random.nextDouble(0.03, 0.2), random.nextDouble(0.022, 0.05)));
        double depth = random.nextDouble(diameter / 2, thickness - diameter / 2);
        double spacing = random.nextDouble(Math.max(0.05, 1.5 * diameter), 0.3);
        return new FloorSection(
                spacing,
                layers,
                heater(holding, depth, diameter, spacing),
                random.nextBoolean() ? new Film(ROOM, random.nextDouble(4, 12)) : new BasicCharacteristic(ROOM),
                new Film(random.nextDouble(5, 22), Math.exp(random.nextDouble(Math.log(0.3), Math.log(1000)))));
    }

    private FloorHeater heater(int layer, double depth, double diameter, double spacing) {
        if (random.nextBoolean()) {
            return new HeatingCable(layer, depth, diameter, spacing * random.nextDouble(40, 200));
        }
        double wall = diameter * random.nextDouble(0.05, 0.2);
        double conductivity = random.nextBoolean() ? 0.35 : random.nextDouble(0.2, 400);
        double film = random.nextBoolean() ? 2000 : 1e12;
        return new WaterPipe(layer, depth, diameter, wall, conductivity, film, random.nextDouble(32, 55));
    }

    private FloorLayer covering(int number) {
        return random.nextBoolean()
                ? new Resisting("covering " + number, random.nextDouble(0, 0.15))
                : new Solid("board " + number, random.nextDouble(0.004, 0.03), random.nextDouble(0.09, 2));
    }

    private FloorLayer under(int number) {
        return switch (random.nextInt(4)) {
            case 0 -> new Resisting("void " + number, random.nextDouble(0.1, 0.25));
            case 1 -> new Solid("timber " + number, random.nextDouble(0.015, 0.05), 0.13);
            case 2 -> new Solid("concrete " + number, random.nextDouble(0.05, 0.25), random.nextDouble(1, 2.5));
            default -> new Solid("insulation " + number, random.nextDouble(0.01, 0.15), random.nextDouble(0.022, 0.05));
        };
    }
}
