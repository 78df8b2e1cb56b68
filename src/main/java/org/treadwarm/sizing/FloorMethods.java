package org.treadwarm.sizing;

import java.util.Map;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.treadwarm.physics.BilinearTable;
import org.treadwarm.physics.LinearTable;
import org.treadwarm.physics.floor.LimitCurves;
import org.treadwarm.physics.floor.PipesBelowScreed;
import org.treadwarm.physics.floor.PipesInScreed;
import org.treadwarm.tables.FloorFactors;
import org.treadwarm.tables.FloorFactors.Grid;
import org.treadwarm.tables.FloorFactors.Line;

/** The table methods of warm-water floors, fitted out with the program's tables. */
public final class FloorMethods {
    private static final PipesInScreed PIPES_IN_SCREED = new PipesInScreed(
            line(FloorFactors.screedSpacing()), grid(FloorFactors.screedCover()), grid(FloorFactors.screedDiameter()));
    private static final PipesBelowScreed PIPES_BELOW_SCREED = new PipesBelowScreed(
            line(FloorFactors.sheetSpacing()),
            line(FloorFactors.sheetContact()),
            line(FloorFactors.sheetScreedShare()));
    private static final LimitCurves LIMIT_CURVES = new LimitCurves(
            grid(FloorFactors.limitCoefficient()),
            grid(FloorFactors.limitExponent()),
            line(FloorFactors.thickLimitCoefficient()),
            line(FloorFactors.thickLimitExponent()));

    private FloorMethods() {}

    /** K_H of types A and C. */
    public static PipesInScreed pipesInScreed() {
        return PIPES_IN_SCREED;
    }

    /** Type B, as far as its tables are known. */
    public static PipesBelowScreed pipesBelowScreed() {
        return PIPES_BELOW_SCREED;
    }

    /** Limit curves of types A and C. */
    public static LimitCurves limitCurves() {
        return LIMIT_CURVES;
    }

    private static LinearTable line(Line table) {
        return LinearTable.of(
                table.argument(),
                table.points().stream().collect(Collectors.toMap(Line.Point::argument, Line.Point::value)));
    }

    private static BilinearTable grid(Grid table) {
        Map<Double, Map<Double, Double>> rows = table.cells().stream()
                .collect(Collectors.groupingBy(
                        Grid.Cell::row, TreeMap::new, Collectors.toMap(Grid.Cell::column, Grid.Cell::value)));
        return BilinearTable.of(table.row(), table.column(), rows);
    }
}
