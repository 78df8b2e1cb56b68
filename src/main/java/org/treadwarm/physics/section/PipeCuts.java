package org.treadwarm.physics.section;

import java.util.ArrayList;
import java.util.List;
import org.treadwarm.physics.section.Section.Pipe;

/**
 * One pipe in the balances.
 *
 * <p>Links are cut where they cross the pipe's circles: a link through wall and surrounding material has both resistances in series,
 * which is exact where heat flows straight away from the pipe; a link of a cell outside the inner circle to one inside ends at the
 * circle, which keeps the balances symmetric and the temperatures right to second order (F. Gibou, R. P. Fedkiw, L.-T. Cheng, M.
 * Kang, "A second-order-accurate symmetric discretization of the Poisson equation on irregular domains", 2002; from memory). The
 * water's film enters each such link with its share of the circle: the normal flux times the cosine between normal and link,
 * integrated over the link's face; the shares are scaled to add up to the arc.
 */
final class PipeCuts {
    private final Balances balances;
    private final Lattice lattice;
    private final Grid grid;
    private final Pipe pipe;
    private final int known;
    private final double arc;
    private final List<Cut> cuts = new ArrayList<>();

    /**
     * A pipe in a section.
     *
     * @param known number of its water among the known temperatures
     * @param part of the pipe that lies in the section
     */
    PipeCuts(Balances balances, Pipe pipe, int known, double part) {
        this.balances = balances;
        this.lattice = balances.lattice;
        this.grid = balances.grid;
        this.pipe = pipe;
        this.known = known;
        this.arc = 2 * Math.PI * pipe.insideRadius() * part;
    }

    /** A link that ends at the inner circle. */
    private record Cut(int cell, Heading heading, double area, double inside, double share) {}

    void join() {
        for (int row = 0; row < grid.rows(); row++) {
            for (int column = 0; column < grid.columns(); column++) {
                int cell = lattice.cell(column, row);
                if (column + 1 < grid.columns() && offset(grid.y(row) - pipe.y(), pipe.radius()) > 0) {
                    joinRight(cell, column, row);
                }
                if (row + 1 < grid.rows() && offset(grid.x(column) - pipe.x(), pipe.radius()) > 0) {
                    joinUp(cell, column, row);
                }
            }
        }
        Require.that(!cuts.isEmpty(), "the grid is too coarse for a pipe of a radius of " + pipe.radius() + " m");
        double scale = arc / cuts.stream().mapToDouble(Cut::share).sum();
        for (Cut cut : cuts) {
            double film = cut.area() / (cut.share() * scale * pipe.insideCoefficient());
            balances.links.add(cut.cell(), cut.heading(), known, cut.area(), cut.inside(), film);
        }
        takeOut();
    }

    /** Half the length of the circle's chord at a distance from its middle; 0 outside. */
    private static double offset(double distance, double radius) {
        return Math.sqrt(Math.max(0, radius * radius - distance * distance));
    }

    private void joinRight(int cell, int column, int row) {
        double from = grid.x(column);
        double to = grid.x(column + 1);
        double outer = offset(grid.y(row) - pipe.y(), pipe.radius());
        if (to < pipe.x() - outer || from > pipe.x() + outer) {
            return;
        }
        double inner = offset(grid.y(row) - pipe.y(), pipe.insideRadius());
        double share = share(grid.upward(row) - pipe.y(), grid.upward(row + 1) - pipe.y());
        Line line = new Line(
                from - pipe.x(),
                grid.across(column + 1) - pipe.x(),
                to - pipe.x(),
                conductivity(cell),
                conductivity(cell + 1),
                0);
        boolean wet = pipe.holdsWater(from, grid.y(row));
        boolean wetNext = pipe.holdsWater(to, grid.y(row));
        lattice.right[cell] = join(line, inner, outer, wet, wetNext, grid.height(row), share, cell, cell + 1, true);
    }

    private void joinUp(int cell, int column, int row) {
        double from = grid.y(row);
        double to = grid.y(row + 1);
        double outer = offset(grid.x(column) - pipe.x(), pipe.radius());
        if (to < pipe.y() - outer || from > pipe.y() + outer) {
            return;
        }
        int above = cell + grid.columns();
        double inner = offset(grid.x(column) - pipe.x(), pipe.insideRadius());
        double share = share(grid.across(column) - pipe.x(), grid.across(column + 1) - pipe.x());
        Line line = new Line(
                from - pipe.y(),
                grid.upward(row + 1) - pipe.y(),
                to - pipe.y(),
                conductivity(cell),
                conductivity(above),
                balances.materials.sheet(column, row + 1));
        boolean wet = pipe.holdsWater(grid.x(column), from);
        boolean wetNext = pipe.holdsWater(grid.x(column), to);
        lattice.up[cell] = join(line, inner, outer, wet, wetNext, grid.width(column), share, cell, above, false);
    }

    /** The conductance between two cells; 0 when the link ends at the water, which it is then given to. */
    private double join(
            Line line,
            double inner,
            double outer,
            boolean wet,
            boolean wetNext,
            double area,
            double share,
            int cell,
            int next,
            boolean level) {
        if (wet && wetNext) {
            return 0;
        }
        if (wetNext) {
            double inside = line.resistance(line.from(), -inner, outer, pipe.wallConductivity());
            cuts.add(new Cut(cell, level ? Heading.RIGHT : Heading.UP, area, inside, share));
            return 0;
        }
        if (wet) {
            double inside = line.resistance(inner, line.to(), outer, pipe.wallConductivity());
            cuts.add(new Cut(next, level ? Heading.LEFT : Heading.DOWN, area, inside, share));
            return 0;
        }
        return area / line.resistance(line.from(), line.to(), outer, pipe.wallConductivity());
    }

    /** A link between two cells' middles; positions are counted from the pipe's axis. */
    private record Line(double from, double border, double to, double before, double after, double sheet) {
        /** Resistance of a part of the link, of which what lies within the outer circle is wall. */
        double resistance(double start, double end, double outer, double wall) {
            double walled = overlap(start, end, -outer, outer);
            double first = overlap(start, end, from, border) - overlap(start, Math.min(end, border), -outer, outer);
            double second = overlap(start, end, border, to) - overlap(Math.max(start, border), end, -outer, outer);
            return walled / wall + Math.max(0, first) / before + Math.max(0, second) / after + sheet;
        }

        private static double overlap(double from, double to, double start, double end) {
            return Math.max(0, Math.min(to, end) - Math.max(from, start));
        }
    }

    private double conductivity(int cell) {
        Require.that(balances.materials.isSolid(cell), "a pipe must lie in solid material");
        return balances.materials.conductivity(cell);
    }

    /** The integral of the cosine sqrt(1 - (u/r)²) over u from..to, inside the inner circle. */
    private double share(double from, double to) {
        double radius = pipe.insideRadius();
        return radius / 2 * (quarter(to / radius) - quarter(from / radius));
    }

    private static double quarter(double u) {
        double inside = Math.max(-1, Math.min(1, u));
        return inside * Math.sqrt(1 - inside * inside) + Math.asin(inside);
    }

    /** Takes the cells inside the pipe out of the unknowns. */
    private void takeOut() {
        for (int row = 0; row < grid.rows(); row++) {
            for (int column = 0; column < grid.columns(); column++) {
                if (pipe.holdsWater(grid.x(column), grid.y(row))) {
                    balances.materials.replace(lattice.cell(column, row), known);
                }
            }
        }
    }
}
