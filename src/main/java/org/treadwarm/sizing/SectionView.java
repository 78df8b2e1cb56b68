package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import org.treadwarm.physics.section.Condition.Film;
import org.treadwarm.physics.section.FloorLayer;
import org.treadwarm.physics.section.FloorLayer.Resisting;
import org.treadwarm.physics.section.FloorLayer.Solid;
import org.treadwarm.physics.section.FloorSection;
import org.treadwarm.physics.section.TemperatureMap;
import org.treadwarm.sizing.PartedFloor.Part;

/**
 * The temperatures of a solved floor at the flux it gives, for drawing: half a spacing from the axis of a heater, by rows from the
 * finished surface down. The arrays belong to whoever asked. Layers without a thickness are not seen in the rows; the surface is that
 * above all layers.
 *
 * @param spacing axis to axis, m
 * @param heaterDepth of the axis below the surface, layers without a thickness not counted, m
 * @param diameter of the cable or pipe, m
 * @param x of the columns, m
 * @param depth of the rows, m
 * @param temperature by row, then by column, degrees Celsius; NaN inside the heater
 * @param surface temperature of the finished surface by column, degrees Celsius
 * @param surfaceLimit what its warmest point may have, degrees Celsius
 */
@SuppressWarnings("ArrayRecordComponent")
public record SectionView(
        double spacing,
        double heaterDepth,
        double diameter,
        double[] x,
        double[] depth,
        double[][] temperature,
        double[] surface,
        double surfaceLimit) {
    private static final int COLUMNS = 61;

    /** About so far apart are the rows, m. */
    private static final double ROW = 0.002;

    private static final int MOST_ROWS = 200;

    /** As {@link SizedSurvey#sections}. */
    static List<SectionView> all(FloorEvaluation floor, double outdoor) {
        double flux = Math.min(floor.requiredFlux, floor.carryingFlux);
        if (!(flux > 0)) {
            return List.of();
        }
        if (floor.section != null) {
            return List.of(view(floor.section, floor.zoneMaximum(), floor.section.at(flux, outdoor)));
        }
        List<SectionView> views = new ArrayList<>();
        for (int i = 0; floor.parted != null && i < floor.parted.parts.size(); i++) {
            Part part = floor.parted.parts.get(i);
            SectionFloor.State state = floor.parted.at(flux, outdoor).get(i);
            if (!(state.flux() > 0)) {
                return List.of();
            }
            views.add(view(part.section(), Limits.zoneMaximum(part.zone(), floor.room), state));
        }
        return List.copyOf(views);
    }

    private static SectionView view(SectionFloor section, double zoneMaximum, SectionFloor.State solved) {
        FloorEvaluation floor = section.plane;
        SectionGeometry geometry = section.geometry;
        double flux = solved.flux();
        double coefficient = flux / (solved.mean() - floor.room);
        boolean water = geometry.isWater();
        double drive = water ? solved.water() : (flux + solved.downward()) * geometry.spacing();
        FloorSection cut = new FloorSection(
                geometry.spacing(),
                geometry.layers(),
                geometry.heater().driven(drive),
                new Film(floor.room, coefficient),
                new Film(solved.below(), geometry.coefficientBelow()));
        double height =
                geometry.layers().stream().mapToDouble(SectionView::thickness).sum();
        int rows = (int) Math.max(20, Math.min(MOST_ROWS, Math.ceil(height / ROW)));
        TemperatureMap map = cut.solve().map(COLUMNS, rows);
        double axis = axis(geometry);
        double radius = geometry.heater().diameter() / 2;
        double[] depth = new double[rows];
        double[][] temperature = new double[rows][];
        for (int row = 0; row < rows; row++) {
            depth[row] = Math.max(0, height - map.y()[rows - 1 - row]);
            temperature[row] = map.temperature()[rows - 1 - row];
            for (int column = 0; column < COLUMNS; column++) {
                if (Math.hypot(map.x()[column], depth[row] - axis) < radius) {
                    temperature[row][column] = Double.NaN;
                }
            }
        }
        double share = 1 / (1 + coefficient * covering(geometry));
        double[] surface = new double[COLUMNS];
        for (int column = 0; column < COLUMNS; column++) {
            surface[column] = floor.room + (temperature[0][column] - floor.room) * share;
        }
        int covering = floor.plan.maximumSurface();
        double limit = covering == Stack.NONE ? zoneMaximum : Math.min(zoneMaximum, floor.whole().in[covering]);
        return new SectionView(
                geometry.spacing(), axis, geometry.heater().diameter(), map.x(), depth, temperature, surface, limit);
    }

    private static double thickness(FloorLayer layer) {
        return layer instanceof Solid solid ? solid.thickness() : 0;
    }

    private static double axis(SectionGeometry geometry) {
        double above = geometry.layers().stream()
                .limit(geometry.heater().layer())
                .mapToDouble(SectionView::thickness)
                .sum();
        return above + geometry.heater().depth();
    }

    /** Resistance of the layers without thickness on top, m²·K/W. */
    private static double covering(SectionGeometry geometry) {
        return geometry.layers().stream()
                .takeWhile(layer -> layer instanceof Resisting)
                .mapToDouble(FloorLayer::resistance)
                .sum();
    }
}
