package org.treadwarm.physics.section;

/**
 * The temperature at any point of a section. Each quarter of a cell is spanned between the cell's middle, two faces and a corner; a
 * face's temperature follows from the flux through it, so that it is right where materials meet.
 */
final class PointReading {
    private final Balances balances;
    private final Grid grid;
    private final double[] temperature;
    private final double[] known;

    PointReading(Balances balances, double[] temperature, double[] known) {
        this.balances = balances;
        this.grid = balances.grid;
        this.temperature = temperature;
        this.known = known;
    }

    double at(double x, double y) {
        int column = grid.columnAt(x);
        int row = grid.rowAt(y);
        int cell = balances.lattice.cell(column, row);
        if (!balances.materials.isSolid(cell)) {
            return temperature[cell];
        }
        Heading across = x < grid.x(column) ? Heading.LEFT : Heading.RIGHT;
        Heading upward = y < grid.y(row) ? Heading.DOWN : Heading.UP;
        double shareAcross = Math.min(1, Math.abs(x - grid.x(column)) / (grid.width(column) / 2));
        double shareUpward = Math.min(1, Math.abs(y - grid.y(row)) / (grid.height(row) / 2));
        double middle = mix(temperature[cell], face(column, row, across), shareAcross);
        double border = mix(face(column, row, upward), corner(column, row, across, upward), shareAcross);
        return mix(middle, border, shareUpward);
    }

    private static double mix(double a, double b, double share) {
        return a + (b - a) * share;
    }

    /** Temperature of a solid cell's face, on the cell's side of it. */
    private double face(int column, int row, Heading side) {
        boolean across = side == Heading.LEFT || side == Heading.RIGHT;
        double half = across ? balances.materials.halfWidth(column, row) : balances.materials.halfHeight(column, row);
        return temperature[balances.lattice.cell(column, row)]
                - balances.flux(column, row, side, temperature, known) * half;
    }

    /** A corner: what each cell around it would have there, those of higher conductivity counting more. */
    private double corner(int column, int row, Heading across, Heading upward) {
        boolean sheet = balances.materials.sheet(column, upward == Heading.UP ? row + 1 : row) > 0;
        double sum = 0;
        double weights = 0;
        for (int beside = 0; beside < 2; beside++) {
            for (int over = 0; over < (sheet ? 1 : 2); over++) {
                int nearColumn = across == Heading.RIGHT ? column + beside : column - beside;
                int nearRow = upward == Heading.UP ? row + over : row - over;
                if (isSolid(nearColumn, nearRow)) {
                    int cell = balances.lattice.cell(nearColumn, nearRow);
                    Heading toSide = beside == 0 ? across : opposite(across);
                    Heading toLevel = over == 0 ? upward : opposite(upward);
                    double there =
                            face(nearColumn, nearRow, toSide) + face(nearColumn, nearRow, toLevel) - temperature[cell];
                    sum += balances.materials.conductivity(cell) * there;
                    weights += balances.materials.conductivity(cell);
                }
            }
        }
        return sum / weights;
    }

    private boolean isSolid(int column, int row) {
        return column >= 0
                && column < grid.columns()
                && row >= 0
                && row < grid.rows()
                && balances.materials.isSolid(balances.lattice.cell(column, row));
    }

    private static Heading opposite(Heading heading) {
        return switch (heading) {
            case LEFT -> Heading.RIGHT;
            case RIGHT -> Heading.LEFT;
            case DOWN -> Heading.UP;
            case UP -> Heading.DOWN;
        };
    }
}
