package org.treadwarm.physics.section;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.function.BooleanSupplier;
import org.treadwarm.physics.section.FloorLayer.Solid;
import org.treadwarm.physics.section.Section.Air;
import org.treadwarm.physics.section.Section.Block;

/**
 * The foot of an outer wall beside a heated slab on the ground, in section, as a thermal coupling L2D and a psi value.
 *
 * <p>Source: ISO 10211:2017, clauses 5 and 7 (from memory): the floor up to its middle, B'/2 wide; ground 2.5 times the whole floor's
 * width beside and below; cuts and planes of symmetry adiabatic. Inside counts as one temperature: the heated plane under the floor and
 * the air along the wall.
 *
 * @param halfWidth half the floor's characteristic dimension B', m
 * @param slab layers under the heated plane, from above; they end at the wall
 * @param heatedPlane height of the heated plane above the ground outside, m, at least 0
 * @param wall the wall and its foundation
 * @param edge upright insulation between slab and wall
 * @param soilConductivity W/(m·K)
 * @param insideFilm resistance along the wall, m²·K/W
 * @param outsideFilm resistance outside, m²·K/W
 */
public record WallFoot(
        double halfWidth,
        List<Solid> slab,
        double heatedPlane,
        Wall wall,
        Optional<EdgeInsulation> edge,
        double soilConductivity,
        double insideFilm,
        double outsideFilm) {
    /**
     * Cells where the heated plane ends at the wall or at the edge insulation, m. The flux grows there without bound, at the wall as the
     * distance to the power of -2/3: a given temperature meets an almost adiabatic face at an angle of 270°.
     */
    private static final double CORNER = 2e-4;

    private static final double DRAWN_RESIDUAL = 1e-8;

    /** Assumed order of the coupling's error; 1 to 1.6 is observed. */
    private static final double CORNER_ORDER = 1;

    public WallFoot {
        slab = List.copyOf(slab);
        Require.positive("half width of the floor, m", halfWidth);
        Require.notNegative("height of the heated plane above the ground, m", heatedPlane);
        Require.positive("conductivity of the soil, W/(m·K)", soilConductivity);
        Require.positive("film along the wall, m²·K/W", insideFilm);
        Require.positive("film outside, m²·K/W", outsideFilm);
        Require.that(!slab.isEmpty(), "a slab must have at least one layer");
        edge.ifPresent(strip -> Require.that(
                strip.thickness() < halfWidth, "edge insulation must be thinner than half the floor's width"));
    }

    /**
     * The wall, of one material that stands for its build-up.
     *
     * @param thickness m
     * @param conductivity thickness over the resistance of the build-up without films, W/(m·K)
     * @param height from the heated plane to the cut, m; at least 1 m, and three thicknesses (ISO 10211:2017, 5.2.3, from memory)
     * @param foundation depth of its foot below the ground outside, m
     * @param footConductivity of what stands under the wall, from the heated plane down, W/(m·K)
     */
    public record Wall(
            double thickness, double conductivity, double height, double foundation, double footConductivity) {
        /** The least height inside of a wall of this thickness, m. */
        public static double leastHeight(double thickness) {
            return Math.max(1, 3 * thickness);
        }

        public Wall {
            Require.positive("thickness of the wall, m", thickness);
            Require.positive("conductivity of the wall, W/(m·K)", conductivity);
            Require.positive("conductivity of the wall's foot, W/(m·K)", footConductivity);
            Require.that(
                    height >= leastHeight(thickness),
                    "the wall must reach 1 m and three thicknesses above the heated plane, not " + height + " m");
            Require.notNegative("depth of the foundation, m", foundation);
        }
    }

    /**
     * A strip of insulation along the slab's edge, against the wall.
     *
     * @param thickness m
     * @param conductivity W/(m·K)
     * @param depth from the heated plane down, m
     */
    public record EdgeInsulation(double thickness, double conductivity, double depth) {
        public EdgeInsulation {
            Require.positive("thickness of the edge insulation, m", thickness);
            Require.positive("conductivity of the edge insulation, W/(m·K)", conductivity);
            Require.positive("depth of the edge insulation, m", depth);
        }
    }

    /**
     * The coupling and what its psi value is made of.
     *
     * @param stopped asked at every step of the solver whether to give up
     */
    public WallFootCoupling solve(BooleanSupplier stopped) {
        return solve(slabCoefficient(stopped), stopped);
    }

    /** Transmittance of the slab with its ground, computed in section without the wall and its edge insulation, W/(m²·K). */
    public double slabCoefficient(BooleanSupplier stopped) {
        return GroundStrip.transmittance(
                halfWidth, wall.thickness(), soilConductivity, slabResistance(), outsideFilm, stopped);
    }

    /** The coupling with a slab coefficient that is known already, as it does not depend on the edge insulation. */
    public WallFootCoupling solve(double slabCoefficient, BooleanSupplier stopped) {
        Refinement.Answer coupling =
                Refinement.of(section(), grid(), field -> field.heatToAir(0), CORNER_ORDER, stopped);
        return new WallFootCoupling(
                coupling.value(),
                slabCoefficient,
                1 / (insideFilm + wall.thickness() / wall.conductivity() + outsideFilm),
                halfWidth,
                wall.height(),
                coupling.accuracy());
    }

    /**
     * Temperatures over a part of the section, for drawing: 1 inside and 0 outside, so that each is the share of the difference. They
     * come from one grid, whose error is not estimated; it is far below what a drawing shows.
     *
     * @param window the part of the section
     * @param stopped asked at every step of the solver whether to give up
     */
    public TemperatureMap map(FootWindow window, BooleanSupplier stopped) {
        Require.that(
                window.inward() <= halfWidth
                        && window.outward() <= groundDepth()
                        && window.upward() <= wall.height()
                        && window.downward() <= plane(),
                "the window must lie within the section");
        return new FootReading(this, window)
                .map(Conduction.solve(section(), grid().halved(), DRAWN_RESIDUAL, stopped), plane());
    }

    /** Resistance of the slab's layers, m²·K/W. */
    public double slabResistance() {
        return slab.stream().mapToDouble(FloorLayer::resistance).sum();
    }

    /** How deep the section's ground is below the ground outside, and how wide outside, m. */
    public double groundDepth() {
        return GroundStrip.GROUND_WIDTHS * 2 * halfWidth;
    }

    private double plane() {
        return groundDepth() + heatedPlane;
    }

    private double width() {
        return halfWidth + wall.thickness() + groundDepth();
    }

    private double top() {
        return plane() + wall.height();
    }

    private Section section() {
        double outer = halfWidth + wall.thickness();
        List<Block> blocks = new ArrayList<>();
        blocks.add(new Block(0, width(), 0, groundDepth(), soilConductivity));
        if (heatedPlane > 0) {
            blocks.add(new Block(0, halfWidth, groundDepth(), plane(), soilConductivity));
        }
        double level = plane();
        for (Solid layer : slab) {
            blocks.add(new Block(0, halfWidth, level - layer.thickness(), level, layer.conductivity()));
            level -= layer.thickness();
        }
        edge.ifPresent(strip -> blocks.add(new Block(
                halfWidth - strip.thickness(), halfWidth, plane() - strip.depth(), plane(), strip.conductivity())));
        blocks.add(new Block(halfWidth, outer, plane(), top(), wall.conductivity()));
        if (heatedPlane + wall.foundation() > 0) {
            blocks.add(
                    new Block(halfWidth, outer, groundDepth() - wall.foundation(), plane(), wall.footConductivity()));
        }
        List<Air> airs = new ArrayList<>();
        airs.add(new Air(outer, width(), groundDepth(), top(), 0, outsideFilm, outsideFilm));
        airs.add(new Air(0, halfWidth, plane(), top(), 1, 0, insideFilm));
        // The heated plane ends at the strip, whose top sees the room.
        edge.ifPresent(strip ->
                airs.add(new Air(halfWidth - strip.thickness(), halfWidth, plane(), top(), 1, insideFilm, insideFilm)));
        return new Section(blocks, List.of(), List.of(), airs, List.of(), List.of());
    }

    private Grid grid() {
        double size = wall.thickness() / GroundStrip.CELLS_IN_WALL;
        double outer = halfWidth + wall.thickness();
        GridLines columns = new GridLines(GroundStrip.GROWTH, groundDepth())
                .fine(halfWidth, outer, size)
                .at(0)
                .at(width());
        GridLines rows =
                new GridLines(GroundStrip.GROWTH, groundDepth()).at(0).at(top()).at(groundDepth() - wall.foundation());
        rows.fine(groundDepth() - size, groundDepth(), size)
                .fine(plane() - size, plane(), size)
                .at(plane());
        columns.fine(halfWidth - CORNER, halfWidth + CORNER, CORNER);
        rows.fine(plane() - CORNER, plane() + CORNER, CORNER);
        double level = plane();
        for (Solid layer : slab) {
            level -= layer.thickness();
            rows.at(level);
        }
        if (edge.isPresent()) {
            columns.fine(
                    halfWidth - edge.get().thickness(), halfWidth, edge.get().thickness() / 2);
            rows.at(plane() - edge.get().depth());
        }
        return new Grid(columns.lines(), rows.lines());
    }
}
