package org.treadwarm.physics.section;

import java.util.List;
import org.treadwarm.physics.section.Condition.Film;
import org.treadwarm.physics.section.FloorHeater.HeatingCable;
import org.treadwarm.physics.section.FloorHeater.WaterPipe;
import org.treadwarm.physics.section.FloorLayer.Resisting;
import org.treadwarm.physics.section.FloorLayer.Solid;

/** Invented floors to compute. */
final class Floors {
    private Floors() {}

    private static List<FloorLayer> layers(double covering, double screed, double insulation) {
        return List.of(
                new Resisting("covering", covering),
                new Solid("screed", screed, 1.2),
                new Solid("insulation", insulation, 0.04));
    }

    static FloorSection wet(double spacing, double covering) {
        return new FloorSection(
                spacing,
                layers(covering, 0.065, 0.03),
                new WaterPipe(1, 0.055, 0.02, 0.002, 0.35, 2000, 40),
                new Film(20, 10.8),
                new Film(20, 1 / 0.17));
    }

    static FloorSection electric(double spacing, double diameter, double covering, double heatPerArea) {
        return new FloorSection(
                spacing,
                layers(covering, 0.05, 0.05),
                new HeatingCable(1, 0.03, diameter, heatPerArea * spacing),
                new Film(20, 10.8),
                new Film(10, 1 / 0.17));
    }

    static FloorSection with(FloorSection floor, Condition above) {
        return new FloorSection(floor.spacing(), floor.layers(), floor.heater(), above, floor.below());
    }
}
