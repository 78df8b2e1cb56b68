package org.treadwarm.physics.warmup;

import java.util.List;

/** Floors and rooms to try things on; all invented. */
final class Floors {
    static final double HOUR = 3600;
    static final Underside CELLAR = new Underside.Exchange(5.9, 15);

    private static final FloorLayer TILE = new FloorLayer.Massive(0.01, 1.0, 2300, 840);
    private static final FloorLayer SCREED = new FloorLayer.Massive(0.065, 1.2, 2000, 1000);
    private static final FloorLayer INSULATION = new FloorLayer.Massive(0.03, 0.035, 20, 1450);
    private static final FloorLayer CONCRETE = new FloorLayer.Massive(0.1, 2.0, 2400, 1000);

    private Floors() {}

    static BuildUp screed(Film film, Underside underside) {
        return new BuildUp(List.of(TILE, SCREED), List.of(INSULATION, CONCRETE), film, underside);
    }

    static BuildUp screed() {
        return screed(new Film.Constant(10.8), CELLAR);
    }

    /** By the basic characteristic of EN 1264-2, q = 8.92 dT^1.1. */
    static BuildUp screedByPowerLaw() {
        return screed(new Film.PowerLaw(8.92, 1.1), CELLAR);
    }

    static Room room() {
        return room(1.2, 0);
    }

    static Room room(double lossCoefficient, double gain) {
        return new Room(9045, 150_000, 8, lossCoefficient, -5, gain);
    }

    /** A room that stays at a temperature, whatever the floor gives it, once it is there. */
    static Room bath(double temperature) {
        return new Room(1, 1, 1, 1e12, temperature, 0);
    }
}
