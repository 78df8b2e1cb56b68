package org.treadwarm.physics.section;

import org.treadwarm.physics.section.Section.Cable;
import org.treadwarm.physics.section.Section.Pipe;

/** Pipes and cables in the balances: {@link PipeCuts} and the heat of cables. */
final class Circles {
    /** Points in each direction by which the part of a cell inside a cable is found. */
    private static final int POINTS = 16;

    private Circles() {}

    static void join(Balances balances) {
        Section section = balances.section;
        int first = section.edges().size() + section.airs().size();
        for (int i = 0; i < section.pipes().size(); i++) {
            Pipe pipe = section.pipes().get(i);
            new PipeCuts(balances, pipe, first + i, partInside(balances.grid, pipe.x(), pipe.y(), pipe.radius()))
                    .join();
        }
        for (Cable cable : section.cables()) {
            heat(balances, cable);
        }
    }

    /** The part of a circle that lies in the section: whole, or half or a quarter when its middle is on edges. */
    private static double partInside(Grid grid, double x, double y, double radius) {
        return part(x, radius, grid.across(0), grid.across(grid.columns()))
                * part(y, radius, grid.upward(0), grid.upward(grid.rows()));
    }

    private static double part(double middle, double radius, double from, double to) {
        if (middle == from || middle == to) {
            return 0.5;
        }
        double slack = 1e-9 * (to - from);
        Require.that(
                middle - radius >= from - slack && middle + radius <= to + slack,
                "a pipe or cable must lie inside the section, or with its axis on an edge");
        return 1;
    }

    private static void heat(Balances balances, Cable cable) {
        Grid grid = balances.grid;
        double total = 0;
        double[] covered = new double[balances.lattice.cells()];
        for (int row = 0; row < grid.rows(); row++) {
            for (int column = 0; column < grid.columns(); column++) {
                int cell = balances.lattice.cell(column, row);
                covered[cell] = covered(grid, cable, column, row);
                total += covered[cell];
            }
        }
        double heat = cable.heat() * partInside(grid, cable.x(), cable.y(), cable.radius());
        Require.that(total > 0, "the grid is too coarse for a cable of a radius of " + cable.radius() + " m");
        for (int cell = 0; cell < covered.length; cell++) {
            if (covered[cell] > 0) {
                Require.that(balances.materials.isSolid(cell), "a cable must lie in solid material");
                balances.heat[cell] += heat * covered[cell] / total;
            }
        }
    }

    /** Area of a cell that lies inside a cable. */
    private static double covered(Grid grid, Cable cable, int column, int row) {
        double width = grid.width(column);
        double height = grid.height(row);
        double nearX = Math.max(0, Math.abs(grid.x(column) - cable.x()) - width / 2);
        double nearY = Math.max(0, Math.abs(grid.y(row) - cable.y()) - height / 2);
        if (Math.hypot(nearX, nearY) >= cable.radius()) {
            return 0;
        }
        int inside = 0;
        for (int i = 0; i < POINTS; i++) {
            for (int j = 0; j < POINTS; j++) {
                double x = grid.across(column) + (i + 0.5) / POINTS * width - cable.x();
                double y = grid.upward(row) + (j + 0.5) / POINTS * height - cable.y();
                inside += Math.hypot(x, y) < cable.radius() ? 1 : 0;
            }
        }
        return width * height * inside / (POINTS * POINTS);
    }
}
