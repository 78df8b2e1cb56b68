package org.treadwarm.physics.section;

import java.util.List;

/**
 * A rectangular section, 1 m deep, to be computed: what it is made of and what its edges and inner parts are held at. Lengths in m,
 * x from the left, y from below.
 *
 * @param blocks rectangles of one material; a later one covers an earlier one. What no block covers conducts nothing.
 * @param sheets thin layers that only resist, in horizontal lines of the grid
 * @param edges conditions on stretches of the four edges
 * @param airs rectangles of air, which replace what lies there
 * @param pipes water pipes
 * @param cables heating cables
 */
public record Section(
        List<Block> blocks,
        List<Sheet> sheets,
        List<Edge> edges,
        List<Air> airs,
        List<Pipe> pipes,
        List<Cable> cables) {
    public Section {
        blocks = List.copyOf(blocks);
        sheets = List.copyOf(sheets);
        edges = List.copyOf(edges);
        airs = List.copyOf(airs);
        pipes = List.copyOf(pipes);
        cables = List.copyOf(cables);
        Require.that(
                edges.size() + airs.size() + pipes.size() > 0,
                "a section must touch at least one known temperature: an edge, air or a pipe");
    }

    /** A section of blocks and edges alone. */
    public static Section of(List<Block> blocks, List<Edge> edges) {
        return new Section(blocks, List.of(), edges, List.of(), List.of(), List.of());
    }

    /** Number of known temperatures: of the edges, then the airs, then the pipes. */
    int knownCount() {
        return edges.size() + airs.size() + pipes.size();
    }

    /** The known temperatures in that order. */
    double[] known() {
        double[] known = new double[knownCount()];
        int next = 0;
        for (Edge edge : edges) {
            known[next++] = edge.condition().temperature();
        }
        for (Air air : airs) {
            known[next++] = air.temperature();
        }
        for (Pipe pipe : pipes) {
            known[next++] = pipe.water();
        }
        return known;
    }

    /**
     * A rectangle of one material.
     *
     * @param conductivity W/(m·K), more than 0
     */
    public record Block(double left, double right, double bottom, double top, double conductivity) {
        public Block {
            Require.that(right > left && top > bottom, "a block must have a width and a height");
            Require.positive("conductivity, W/(m·K)", conductivity);
        }

        boolean holds(double x, double y) {
            return x > left && x < right && y > bottom && y < top;
        }
    }

    /**
     * A horizontal layer without thickness and without conduction along it.
     *
     * @param height where it lies; must be a line of the grid
     * @param resistance m²·K/W, at least 0
     */
    public record Sheet(double left, double right, double height, double resistance) {
        public Sheet {
            Require.that(right > left, "a sheet must have a width");
            Require.notNegative("resistance of a sheet, m²·K/W", resistance);
        }
    }

    /** One of the four edges. */
    public enum Side {
        LEFT,
        RIGHT,
        BOTTOM,
        TOP
    }

    /** A condition on a stretch of an edge, from..to in x or in y. */
    public record Edge(Side side, double from, double to, Condition condition) {
        public Edge {
            Require.that(to > from, "an edge's stretch must have a length");
        }

        boolean holds(double position) {
            return position > from && position < to;
        }
    }

    /**
     * A rectangle of air.
     *
     * @param temperature degrees Celsius
     * @param levelFilm resistance of its film on horizontal surfaces, m²·K/W, at least 0
     * @param uprightFilm resistance of its film on vertical surfaces, m²·K/W, at least 0
     */
    public record Air(
            double left,
            double right,
            double bottom,
            double top,
            double temperature,
            double levelFilm,
            double uprightFilm) {
        public Air {
            Require.that(right > left && top > bottom, "a rectangle of air must have a width and a height");
            Require.finite("temperature of air, °C", temperature);
            Require.notNegative("film resistance, m²·K/W", levelFilm);
            Require.notNegative("film resistance, m²·K/W", uprightFilm);
        }

        boolean holds(double x, double y) {
            return x > left && x < right && y > bottom && y < top;
        }
    }

    /**
     * A pipe with water. Its axis may lie on an edge, which is then a plane of symmetry.
     *
     * @param radius outside, more than 0
     * @param wallThickness more than 0 and less than the radius
     * @param wallConductivity W/(m·K), more than 0
     * @param insideCoefficient from the water to the wall, W/(m²·K) of inside area, more than 0
     * @param water temperature, degrees Celsius
     */
    public record Pipe(
            double x,
            double y,
            double radius,
            double wallThickness,
            double wallConductivity,
            double insideCoefficient,
            double water) {
        public Pipe {
            Require.positive("radius of a pipe, m", radius);
            Require.positive("wall thickness of a pipe, m", wallThickness);
            Require.that(
                    wallThickness < radius,
                    "a wall of " + wallThickness + " m does not fit into a pipe of a radius of " + radius + " m");
            Require.positive("conductivity of a pipe's wall, W/(m·K)", wallConductivity);
            Require.positive("coefficient inside a pipe, W/(m²·K)", insideCoefficient);
            Require.finite("water temperature, °C", water);
        }

        double insideRadius() {
            return radius - wallThickness;
        }

        /** Resistance of the water's film and the wall, per outside area, m²·K/W. */
        double resistance() {
            return radius / (insideRadius() * insideCoefficient)
                    + radius * Math.log(radius / insideRadius()) / wallConductivity;
        }

        boolean holdsWater(double atX, double atY) {
            return Math.hypot(atX - x, atY - y) < insideRadius();
        }
    }

    /**
     * A heating cable: heat made evenly over its circle, which conducts like what surrounds it. Its axis may lie on an edge, which is
     * then a plane of symmetry; the section then holds half of it.
     *
     * @param radius more than 0
     * @param heat of the whole cable, W/m
     */
    public record Cable(double x, double y, double radius, double heat) {
        public Cable {
            Require.positive("radius of a cable, m", radius);
            Require.finite("heat of a cable, W/m", heat);
        }
    }
}
