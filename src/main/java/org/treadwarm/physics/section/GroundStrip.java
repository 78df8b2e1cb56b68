package org.treadwarm.physics.section;

import java.util.List;
import java.util.function.BooleanSupplier;
import org.treadwarm.physics.section.Section.Block;
import org.treadwarm.physics.section.Section.Edge;
import org.treadwarm.physics.section.Section.Side;

/**
 * A long slab on the ground in section.
 *
 * <p>Source: ISO 10211:2017, clauses 5 and 7 (from memory): the floor up to its middle; ground 2.5 times the whole floor's width beside
 * and below; cuts and planes of symmetry adiabatic.
 */
public final class GroundStrip {
    /** Ground beside and below, in widths of the whole floor. */
    static final double GROUND_WIDTHS = 2.5;

    /** Cells grow by this much per metre of distance from the wall's foot, on the first grid. */
    static final double GROWTH = 0.2;

    /** Cells across the wall, on the first grid. */
    static final int CELLS_IN_WALL = 6;

    /** Assumed order of the error where a film ends beside an adiabatic stretch; 2 is observed. */
    private static final double EDGE_ORDER = 1.5;

    private GroundStrip() {}

    /**
     * Transmittance of a long slab with the ground below it, computed in section: the slab as a resistance on the ground, and nothing but
     * an adiabatic stretch where the wall stands.
     *
     * @param halfWidth half the floor's width, m
     * @param wallThickness m
     * @param soilConductivity W/(m·K)
     * @param resistance from the inside temperature to the ground's surface, m²·K/W, more than 0
     * @param outsideFilm resistance outside, m²·K/W, more than 0
     * @param stopped asked at every step of the solver whether to give up
     * @return W/(m²·K) of the floor
     */
    public static double transmittance(
            double halfWidth,
            double wallThickness,
            double soilConductivity,
            double resistance,
            double outsideFilm,
            BooleanSupplier stopped) {
        Require.positive("half width of the floor, m", halfWidth);
        Require.positive("thickness of the wall, m", wallThickness);
        Require.positive("resistance of the floor, m²·K/W", resistance);
        Require.positive("film outside, m²·K/W", outsideFilm);
        double ground = GROUND_WIDTHS * 2 * halfWidth;
        double outer = halfWidth + wallThickness;
        Section section = Section.of(
                List.of(new Block(0, outer + ground, 0, ground, soilConductivity)),
                List.of(
                        new Edge(Side.TOP, 0, halfWidth, new Condition.Film(1, 1 / resistance)),
                        new Edge(Side.TOP, outer, outer + ground, new Condition.Film(0, 1 / outsideFilm))));
        double size = wallThickness / CELLS_IN_WALL;
        Grid grid = new Grid(
                new GridLines(GROWTH, ground)
                        .fine(halfWidth, outer, size)
                        .at(0)
                        .at(outer + ground)
                        .lines(),
                new GridLines(GROWTH, ground)
                        .fine(ground - size, ground, size)
                        .at(0)
                        .lines());
        return Refinement.of(section, grid, field -> field.heatToEdge(1) / halfWidth, EDGE_ORDER, stopped)
                .value();
    }
}
