package org.treadwarm.physics.section;

import org.treadwarm.physics.section.FloorLayer.Solid;

/** Reads the temperatures of a wall's foot on a lattice with lines at every face, closer together where they bend most. */
final class FootReading {
    /** Cells at the faces of the wall, the heated plane and the ground, m. */
    private static final double FINE = 0.005;

    private static final double GROWTH = 0.25;

    /** Cells over the width of the window are no larger than one of so many. */
    private static final double COARSE = 40;

    /** Points on a face are read so far within the solid, m. */
    private static final double WITHIN = 1e-7;

    private final WallFoot foot;
    private final FootWindow window;
    private final double outer;
    private final double ground;

    FootReading(WallFoot foot, FootWindow window) {
        this.foot = foot;
        this.window = window;
        this.outer = foot.wall().thickness();
        this.ground = -foot.heatedPlane();
    }

    /** The map of a solved section whose heated plane has this height in it. */
    TemperatureMap map(Field field, double plane) {
        double[] x = columns();
        double[] y = rows();
        double[][] temperature = new double[y.length][x.length];
        for (int row = 0; row < y.length; row++) {
            for (int column = 0; column < x.length; column++) {
                temperature[row][column] =
                        isAir(x[column], y[row]) ? Double.NaN : read(field, plane, x[column], y[row]);
            }
        }
        return new TemperatureMap(x, y, temperature);
    }

    private double[] columns() {
        double width = window.inward() + outer + window.outward();
        GridLines lines =
                new GridLines(GROWTH, width / COARSE).at(-window.inward()).at(outer + window.outward());
        fine(lines, 0);
        fine(lines, outer);
        foot.edge().ifPresent(strip -> at(lines, -strip.thickness(), -window.inward()));
        return lines.lines();
    }

    private double[] rows() {
        double width = window.inward() + outer + window.outward();
        GridLines lines =
                new GridLines(GROWTH, width / COARSE).at(-window.downward()).at(window.upward());
        fine(lines, 0);
        if (foot.heatedPlane() > 0) {
            at(lines, ground, -window.downward());
        }
        double level = 0;
        for (Solid layer : foot.slab()) {
            level -= layer.thickness();
            at(lines, level, -window.downward());
        }
        at(lines, ground - foot.wall().foundation(), -window.downward());
        foot.edge().ifPresent(strip -> at(lines, -strip.depth(), -window.downward()));
        return lines.lines();
    }

    private static void fine(GridLines lines, double position) {
        lines.fine(position - FINE, position, FINE).fine(position, position + FINE, FINE);
    }

    private static void at(GridLines lines, double position, double least) {
        if (position > least) {
            lines.at(position);
        }
    }

    private boolean isAir(double x, double y) {
        return x < -WITHIN && y > WITHIN || x > outer + WITHIN && y > ground + WITHIN;
    }

    private double read(Field field, double plane, double x, double y) {
        boolean onInnerFace = Math.abs(x) < WITHIN && y > -WITHIN;
        boolean onPlane = Math.abs(y) < WITHIN && x < WITHIN;
        boolean onOuterFace = Math.abs(x - outer) < WITHIN && y > ground - WITHIN;
        boolean onGround = Math.abs(y - ground) < WITHIN && x > outer - WITHIN;
        double across = x + (onInnerFace ? WITHIN : 0) - (onOuterFace ? WITHIN : 0);
        double upward = y - (onPlane || onGround ? WITHIN : 0);
        return field.temperature(foot.halfWidth() + across, plane + upward);
    }
}
