package org.treadwarm.physics.warmup;

import java.util.Arrays;

/**
 * Floor and room as a chain of nodes: the underside, the cells and interfaces of the layers from below, the surface, the air, the
 * mass. Every node exchanges heat with its two neighbours alone, so every system of equations is tridiagonal. Cells hold heat
 * (finite volumes, the temperature at the middle); interfaces, the heater plane among them, hold none.
 */
final class Chain {
    /** Room enough for every build-up of practice at the standard refinement, and a bound for any request. */
    private static final int MOST_NODES = 20_000;

    /** Cells at a layer's faces are as thick as heat spreads in this time, sqrt(a t), s; found by refinement. */
    private static final double FACE_TIME = 8;

    /** Each cell is thicker by this factor than its neighbour towards the face. */
    private static final double GROWTH = 1.2;

    private static final int FEWEST_CELLS = 3;

    final Film film;
    final Room room;
    final double undersideCoefficient;
    final double undersideTemperature;
    final int heater;
    final int surface;
    final int air;
    final int mass;

    private double[] capacity = new double[64];
    private double[] conductance = new double[64];
    private int nodes;

    Chain(BuildUp floor, Room room, int refinement) {
        this.film = floor.film();
        this.room = room;
        if (floor.underside() instanceof Underside.Exchange exchange) {
            undersideCoefficient = exchange.coefficient();
            undersideTemperature = exchange.temperature();
        } else {
            undersideCoefficient = 0;
            undersideTemperature = 0;
        }
        node(0);
        for (int i = floor.below().size() - 1; i >= 0; i--) {
            layer(floor.below().get(i), refinement);
        }
        heater = nodes - 1;
        for (int i = floor.above().size() - 1; i >= 0; i--) {
            layer(floor.above().get(i), refinement);
        }
        surface = nodes - 1;
        air = node(room.airCapacity());
        mass = node(room.massCapacity());
        conductance[air] = room.massCoupling();
        capacity = Arrays.copyOf(capacity, nodes);
        conductance = Arrays.copyOf(conductance, nodes);
    }

    int nodes() {
        return nodes;
    }

    /** Heat capacity of each node, J/(m²·K); 0 for one that holds no heat. */
    double[] capacity() {
        return capacity;
    }

    /** Conductance from each node to the next, W/(m²·K); 0 between surface and air, where the film stands. */
    double[] conductance() {
        return conductance;
    }

    double value(Watched watched, double[] temperatures) {
        return switch (watched) {
            case AIR -> temperatures[air];
            case OPERATIVE -> (temperatures[air] + temperatures[mass]) / 2;
            case SURFACE -> temperatures[surface];
            case HEATER -> temperatures[heater];
        };
    }

    Moment moment(double seconds, double[] temperatures) {
        return new Moment(
                seconds,
                temperatures[surface],
                temperatures[air],
                temperatures[mass],
                temperatures[heater],
                film.flux(temperatures[surface] - temperatures[air]),
                undersideCoefficient * (temperatures[0] - undersideTemperature));
    }

    /** Adds a node that is not linked to the one before it. */
    private int node(double heatCapacity) {
        if (nodes == MOST_NODES) {
            throw new IllegalArgumentException("the layers make more than " + MOST_NODES
                    + " nodes; there must be fewer layers or a smaller refinement");
        }
        if (nodes == capacity.length) {
            capacity = Arrays.copyOf(capacity, 2 * nodes);
            conductance = Arrays.copyOf(conductance, 2 * nodes);
        }
        capacity[nodes] = heatCapacity;
        return nodes++;
    }

    private void node(double heatCapacity, double conductanceToLast) {
        conductance[nodes - 1] = conductanceToLast;
        node(heatCapacity);
    }

    private void layer(FloorLayer layer, int refinement) {
        if (layer instanceof FloorLayer.Massive massive) {
            cells(massive, refinement);
        } else if (layer.resistance() > 0) {
            node(0, 1 / layer.resistance());
        }
    }

    private void cells(FloorLayer.Massive layer, int refinement) {
        int cells = count(layer);
        double unit = layer.thickness() / relativeThickness(cells);
        double half = 0;
        for (int i = 0; i < cells * refinement; i++) {
            double thickness = unit * relativeThickness(i / refinement, cells) / refinement;
            node(layer.density() * layer.specificHeat() * thickness, layer.conductivity() / (half + thickness / 2));
            half = thickness / 2;
        }
        node(0, layer.conductivity() / half);
    }

    private static int count(FloorLayer.Massive layer) {
        double wanted = layer.thickness() / Math.sqrt(layer.diffusivity() * FACE_TIME);
        int cells = FEWEST_CELLS;
        while (relativeThickness(cells) < wanted) {
            cells++;
        }
        return cells;
    }

    /** Thickness of a layer of so many cells in units of the cell at its face. */
    private static double relativeThickness(int cells) {
        double sum = 0;
        for (int i = 0; i < cells; i++) {
            sum += relativeThickness(i, cells);
        }
        return sum;
    }

    private static double relativeThickness(int cell, int cells) {
        return Math.pow(GROWTH, Math.min(cell, cells - 1 - cell));
    }
}
