package org.treadwarm.physics.section;

import java.util.ArrayList;
import java.util.List;
import org.treadwarm.physics.section.FloorHeater.HeatingCable;
import org.treadwarm.physics.section.FloorHeater.WaterPipe;
import org.treadwarm.physics.section.FloorLayer.Resisting;
import org.treadwarm.physics.section.FloorLayer.Solid;
import org.treadwarm.physics.section.Section.Block;
import org.treadwarm.physics.section.Section.Cable;
import org.treadwarm.physics.section.Section.Edge;
import org.treadwarm.physics.section.Section.Sheet;
import org.treadwarm.physics.section.Section.Side;

/**
 * A floor as a section: half a spacing wide, from the plane through a heater's axis to the plane midway between two heaters, both
 * planes of symmetry.
 */
final class FloorLayout {
    /** Place of the upper edge among the section's edges. */
    static final int ABOVE = 0;

    /** Place of the lower edge. */
    static final int BELOW = 1;

    /** Cells grow by this much per metre of distance from the heater, on the first grid. */
    private static final double GROWTH = 0.25;

    /** Fewest cells over half a spacing far from the heater, on the first grid. */
    private static final int FEWEST = 6;

    private final double spacing;
    private final List<FloorLayer> layers;
    private final FloorHeater heater;
    private final double[] top;
    private final double height;

    FloorLayout(double spacing, List<FloorLayer> layers, FloorHeater heater) {
        this.spacing = spacing;
        this.layers = layers;
        this.heater = heater;
        this.top = new double[layers.size()];
        this.height = layers.stream().mapToDouble(FloorLayout::thickness).sum();
        double level = height;
        for (int i = 0; i < layers.size(); i++) {
            top[i] = level;
            level -= thickness(layers.get(i));
        }
        check();
    }

    private void check() {
        Require.positive("spacing of the heaters, m", spacing);
        Require.that(
                heater.layer() >= 0 && heater.layer() < layers.size(),
                "the heater lies in layer " + heater.layer() + ", but the layers are 0 to " + (layers.size() - 1));
        FloorLayer around = layers.get(heater.layer());
        if (!(around instanceof Solid solid)) {
            throw new IllegalArgumentException(around.name() + " has no thickness, so that no heater can lie in it");
        }
        double radius = heater.diameter() / 2;
        double slack = 1e-9 * solid.thickness();
        Require.that(
                heater.depth() >= radius - slack && heater.depth() + radius <= solid.thickness() + slack,
                "a heater " + heater.diameter() + " m thick with its axis " + heater.depth()
                        + " m deep does not lie within " + solid.name() + ", which is " + solid.thickness()
                        + " m thick");
        Require.that(
                heater.diameter() < spacing,
                "heaters " + heater.diameter() + " m thick cannot lie every " + spacing + " m");
    }

    static double thickness(FloorLayer layer) {
        return layer instanceof Solid solid ? solid.thickness() : 0;
    }

    double halfSpacing() {
        return spacing / 2;
    }

    double height() {
        return height;
    }

    List<FloorLayer> layers() {
        return layers;
    }

    FloorHeater heater() {
        return heater;
    }

    /** Height of the heater's axis, m. */
    double axis() {
        return top[heater.layer()] - heater.depth();
    }

    /** Height of a layer's top face, m. */
    double topOf(int layer) {
        return top[layer];
    }

    /** Height of a layer's bottom face, m. */
    double bottomOf(int layer) {
        return layer + 1 < top.length ? top[layer + 1] : 0;
    }

    /** The section with given conditions above and below and the heater as it is. */
    Section section(Condition above, Condition below) {
        List<Block> blocks = new ArrayList<>();
        List<Sheet> sheets = new ArrayList<>();
        for (int i = 0; i < layers.size(); i++) {
            if (layers.get(i) instanceof Solid solid) {
                blocks.add(new Block(0, halfSpacing(), bottomOf(i), topOf(i), solid.conductivity()));
            } else if (layers.get(i) instanceof Resisting sheet && sheet.resistance() > 0) {
                sheets.add(new Sheet(0, halfSpacing(), topOf(i), sheet.resistance()));
            }
        }
        List<Edge> edges =
                List.of(new Edge(Side.TOP, 0, halfSpacing(), above), new Edge(Side.BOTTOM, 0, halfSpacing(), below));
        double radius = heater.diameter() / 2;
        if (heater instanceof WaterPipe pipe) {
            return new Section(blocks, sheets, edges, List.of(), List.of(pipe.at(0, axis())), List.of());
        }
        Cable cable = new Cable(0, axis(), radius, ((HeatingCable) heater).heat());
        return new Section(blocks, sheets, edges, List.of(), List.of(), List.of(cable));
    }

    /** A grid with so many cells across the heater. */
    Grid grid(int across) {
        double radius = heater.diameter() / 2;
        double size = heater.diameter() / across;
        double coarsest = Math.max(size, halfSpacing() / FEWEST);
        double[] columns = new GridLines(GROWTH, coarsest)
                .fine(0, radius, size)
                .at(halfSpacing())
                .lines();
        GridLines rows = new GridLines(GROWTH, coarsest).fine(axis() - radius, axis() + radius, size);
        rows.at(0).at(height);
        for (double level : top) {
            rows.at(level);
        }
        return new Grid(columns, rows.lines());
    }
}
