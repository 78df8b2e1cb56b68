package org.treadwarm.physics.section;

import java.util.Arrays;
import org.treadwarm.physics.section.Section.Edge;
import org.treadwarm.physics.section.Section.Side;

/**
 * The heat balances of a section's cells by finite volumes (ISO 10211:2017 asks for balances of cells; two half cells in series
 * between middles, so that fluxes through layers are exact).
 */
final class Balances {
    final Section section;
    final Grid grid;
    final Lattice lattice;

    /** Links from cells to known temperatures. */
    final KnownLinks links;

    /** Heat made in each cell, W/m. */
    final double[] heat;

    final Materials materials;

    Balances(Section section, Grid grid) {
        this.section = section;
        this.grid = grid;
        this.lattice = new Lattice(grid.columns(), grid.rows());
        this.links = new KnownLinks(section.knownCount());
        this.heat = new double[lattice.cells()];
        this.materials = new Materials(section, grid);
        joinInside();
        for (int edge = 0; edge < section.edges().size(); edge++) {
            joinEdge(edge, section.edges().get(edge));
        }
        Circles.join(this);
        hold();
    }

    private void joinInside() {
        for (int row = 0; row < grid.rows(); row++) {
            for (int column = 0; column < grid.columns(); column++) {
                int cell = lattice.cell(column, row);
                if (column + 1 < grid.columns()) {
                    joinRight(cell, column, row);
                }
                if (row + 1 < grid.rows()) {
                    joinUp(cell, column, row);
                }
            }
        }
    }

    private void joinRight(int cell, int column, int row) {
        int next = cell + 1;
        double area = grid.height(row);
        if (materials.isSolid(cell) && materials.isSolid(next)) {
            lattice.right[cell] = area / (materials.halfWidth(column, row) + materials.halfWidth(column + 1, row));
        } else if (materials.isSolid(cell) && materials.knownIn(next) >= 0) {
            known(
                    cell,
                    Heading.RIGHT,
                    materials.knownIn(next),
                    area,
                    materials.halfWidth(column, row),
                    upright(materials.knownIn(next)));
        } else if (materials.knownIn(cell) >= 0 && materials.isSolid(next)) {
            known(
                    next,
                    Heading.LEFT,
                    materials.knownIn(cell),
                    area,
                    materials.halfWidth(column + 1, row),
                    upright(materials.knownIn(cell)));
        }
    }

    private void joinUp(int cell, int column, int row) {
        int above = cell + grid.columns();
        double area = grid.width(column);
        double sheet = materials.sheet(column, row + 1);
        if (materials.isSolid(cell) && materials.isSolid(above)) {
            lattice.up[cell] =
                    area / (materials.halfHeight(column, row) + sheet + materials.halfHeight(column, row + 1));
        } else if (materials.isSolid(cell) && materials.knownIn(above) >= 0) {
            known(
                    cell,
                    Heading.UP,
                    materials.knownIn(above),
                    area,
                    materials.halfHeight(column, row) + sheet,
                    level(materials.knownIn(above)));
        } else if (materials.knownIn(cell) >= 0 && materials.isSolid(above)) {
            known(
                    above,
                    Heading.DOWN,
                    materials.knownIn(cell),
                    area,
                    materials.halfHeight(column, row + 1) + sheet,
                    level(materials.knownIn(cell)));
        }
    }

    private double level(int known) {
        return section.airs().get(known - section.edges().size()).levelFilm();
    }

    private double upright(int known) {
        return section.airs().get(known - section.edges().size()).uprightFilm();
    }

    private void joinEdge(int known, Edge edge) {
        boolean upright = edge.side() == Side.LEFT || edge.side() == Side.RIGHT;
        if (upright) {
            grid.requireUpward(edge.from(), edge.to());
        } else {
            grid.requireAcross(edge.from(), edge.to());
        }
        int count = upright ? grid.rows() : grid.columns();
        for (int i = 0; i < count; i++) {
            if (edge.holds(upright ? grid.y(i) : grid.x(i))) {
                int column = upright ? (edge.side() == Side.LEFT ? 0 : grid.columns() - 1) : i;
                int row = upright ? i : (edge.side() == Side.BOTTOM ? 0 : grid.rows() - 1);
                joinEdge(known, edge, column, row);
            }
        }
    }

    private void joinEdge(int known, Edge edge, int column, int row) {
        int cell = lattice.cell(column, row);
        if (!materials.isSolid(cell)) {
            return;
        }
        double film = film(edge.condition());
        switch (edge.side()) {
            case LEFT -> known(cell, Heading.LEFT, known, grid.height(row), materials.halfWidth(column, row), film);
            case RIGHT -> known(cell, Heading.RIGHT, known, grid.height(row), materials.halfWidth(column, row), film);
            case BOTTOM ->
                known(
                        cell,
                        Heading.DOWN,
                        known,
                        grid.width(column),
                        materials.halfHeight(column, row) + materials.sheet(column, 0),
                        film);
            case TOP ->
                known(
                        cell,
                        Heading.UP,
                        known,
                        grid.width(column),
                        materials.halfHeight(column, row) + materials.sheet(column, grid.rows()),
                        film);
        }
    }

    /** The film's resistance; that of the basic characteristic at first for a surface 9 K warmer than the room. */
    private static double film(Condition condition) {
        if (condition instanceof Condition.Film film) {
            return 1 / film.coefficient();
        }
        return condition instanceof Condition.Held ? 0 : 1 / Condition.BasicCharacteristic.coefficient(9);
    }

    private void known(int cell, Heading heading, int known, double area, double inside, double film) {
        links.add(cell, heading, known, area, inside, film);
    }

    /** Puts the links to known temperatures into the lattice, and 0 into cells that are no unknowns. */
    private void hold() {
        Arrays.fill(lattice.held, 0);
        links.addTo(lattice.held);
        for (int cell = 0; cell < lattice.cells(); cell++) {
            if (!materials.isSolid(cell)) {
                lattice.held[cell] = 1;
            }
        }
    }

    /** Takes over films that have changed. */
    void filmsChanged() {
        hold();
    }

    /** Flux out of a solid cell through one of its faces, W/m²; 0 through an adiabatic one. */
    double flux(int column, int row, Heading side, double[] temperature, double[] known) {
        int cell = lattice.cell(column, row);
        int link = links.find(cell, side);
        if (link != KnownLinks.NONE) {
            return links.flux(link, temperature, known);
        }
        return switch (side) {
            case LEFT ->
                column == 0
                        ? 0
                        : lattice.right[cell - 1] * (temperature[cell] - temperature[cell - 1]) / grid.height(row);
            case RIGHT ->
                column + 1 == grid.columns()
                        ? 0
                        : lattice.right[cell] * (temperature[cell] - temperature[cell + 1]) / grid.height(row);
            case DOWN ->
                row == 0
                        ? 0
                        : lattice.up[cell - grid.columns()]
                                * (temperature[cell] - temperature[cell - grid.columns()])
                                / grid.width(column);
            case UP ->
                row + 1 == grid.rows()
                        ? 0
                        : lattice.up[cell]
                                * (temperature[cell] - temperature[cell + grid.columns()])
                                / grid.width(column);
        };
    }

    /** Right-hand side for known temperatures and so many times the cables' heat. */
    double[] load(double[] known, double heatFactor) {
        double[] load = new double[lattice.cells()];
        for (int cell = 0; cell < load.length; cell++) {
            load[cell] = heatFactor * heat[cell];
        }
        links.addHeat(known, load);
        return load;
    }
}
