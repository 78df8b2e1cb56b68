package org.treadwarm.physics.section;

import java.util.Arrays;
import org.treadwarm.physics.section.Section.Air;
import org.treadwarm.physics.section.Section.Block;
import org.treadwarm.physics.section.Section.Sheet;

/** What each cell of a grid is made of. */
final class Materials {
    /** Marks a cell of solid material. */
    private static final int SOLID = -1;

    /** Marks a cell without material. */
    private static final int EMPTY = -2;

    private final Section section;
    private final Grid grid;
    private final double[] conductivity;
    private final int[] kind;
    private final double[] sheets;

    Materials(Section section, Grid grid) {
        this.section = section;
        this.grid = grid;
        this.conductivity = new double[(int) grid.cells()];
        this.kind = new int[conductivity.length];
        this.sheets = new double[grid.columns() * (grid.rows() + 1)];
        paint();
        lay();
    }

    private void paint() {
        Arrays.fill(kind, EMPTY);
        for (Block block : section.blocks()) {
            paint(block.left(), block.right(), block.bottom(), block.top(), SOLID, block.conductivity());
        }
        for (int i = 0; i < section.airs().size(); i++) {
            Air air = section.airs().get(i);
            paint(
                    air.left(),
                    air.right(),
                    air.bottom(),
                    air.top(),
                    section.edges().size() + i,
                    0);
        }
    }

    private void paint(double left, double right, double bottom, double top, int mark, double conducts) {
        grid.requireAcross(left, right);
        grid.requireUpward(bottom, top);
        for (int row = 0; row < grid.rows(); row++) {
            double y = grid.y(row);
            for (int column = 0; y > bottom && y < top && column < grid.columns(); column++) {
                if (grid.x(column) > left && grid.x(column) < right) {
                    kind[cell(column, row)] = mark;
                    conductivity[cell(column, row)] = conducts;
                }
            }
        }
    }

    private void lay() {
        for (Sheet sheet : section.sheets()) {
            grid.requireAcross(sheet.left(), sheet.right());
            int line = grid.lineAt(sheet.height());
            for (int column = 0; column < grid.columns(); column++) {
                if (grid.x(column) > sheet.left() && grid.x(column) < sheet.right()) {
                    sheets[line * grid.columns() + column] += sheet.resistance();
                }
            }
        }
    }

    /** Takes a cell out of the unknowns: it is inside a known temperature. */
    void replace(int cell, int known) {
        kind[cell] = known;
    }

    boolean isSolid(int cell) {
        return kind[cell] == SOLID;
    }

    /** The known temperature that fills a cell, or a negative number for a solid or empty cell. */
    int knownIn(int cell) {
        return kind[cell];
    }

    double conductivity(int cell) {
        return conductivity[cell];
    }

    double sheet(int column, int line) {
        return sheets[line * grid.columns() + column];
    }

    double halfWidth(int column, int row) {
        return grid.width(column) / 2 / conductivity[cell(column, row)];
    }

    double halfHeight(int column, int row) {
        return grid.height(row) / 2 / conductivity[cell(column, row)];
    }

    private int cell(int column, int row) {
        return row * grid.columns() + column;
    }
}
