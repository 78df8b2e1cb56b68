package org.treadwarm.physics.section;

/**
 * What a {@link FloorResponse} answers at one flux. It is filled anew by each evaluation, so that evaluating makes no garbage;
 * every thread needs its own. Temperatures in degrees Celsius, fluxes in W/m² of floor.
 */
public final class FloorState {
    double flux;
    double room;
    double surfaceMean;
    final double[] weights;
    final double[] numbers;

    FloorState(int nodes, int numbers) {
        this.weights = new double[nodes];
        this.numbers = new double[numbers];
    }

    /** Flux to the room that was asked for. */
    public double upwardFlux() {
        return flux;
    }

    /** Mean temperature of the finished surface. */
    public double surfaceMean() {
        return surfaceMean;
    }

    /** Highest temperature of the finished surface. */
    public double surfaceMaximum() {
        return Math.max(numbers[FloorResponse.AT_HEATER], numbers[FloorResponse.BETWEEN]);
    }

    /** Lowest temperature of the finished surface. */
    public double surfaceMinimum() {
        return Math.min(numbers[FloorResponse.AT_HEATER], numbers[FloorResponse.BETWEEN]);
    }

    /** Mean temperature of the cable's skin or the pipe's outside. */
    public double heaterTemperature() {
        return numbers[FloorResponse.HEATER];
    }

    /**
     * Temperature of the water.
     *
     * @throws IllegalStateException when a cable heats the floor
     */
    public double waterTemperature() {
        double water = numbers[FloorResponse.WATER];
        if (Double.isNaN(water)) {
            throw new IllegalStateException("a floor heated by a cable has no water");
        }
        return water;
    }

    /** Heat from the heater. */
    public double heatInput() {
        return numbers[FloorResponse.INPUT];
    }

    /** Flux to what is below: what is put in less what goes up. */
    public double downwardFlux() {
        return numbers[FloorResponse.INPUT] - flux;
    }

    /** Number of layers. */
    public int layers() {
        return numbers.length - FloorResponse.FACES;
    }

    /**
     * Highest temperature of a layer's face towards the heater: the temperature in the plane of the heater's axis. For the heater's own
     * layer, the mean of the heater's outside.
     *
     * @param layer the topmost one is 0
     */
    public double warmFace(int layer) {
        return numbers[FloorResponse.FACES + layer];
    }

    /**
     * How much warmer than the room the warmest place of the surface is, in parts of what its mean is warmer; at least 1 for a floor
     * that heats.
     *
     * @throws IllegalStateException when no flux was asked for
     */
    public double peakFactor() {
        if (flux == 0) {
            throw new IllegalStateException("a floor without flux has no peak factor");
        }
        return (surfaceMaximum() - room) / (surfaceMean - room);
    }
}
