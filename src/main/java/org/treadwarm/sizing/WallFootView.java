package org.treadwarm.sizing;

import java.util.Arrays;
import java.util.Optional;
import java.util.function.BooleanSupplier;
import org.treadwarm.physics.section.FootWindow;
import org.treadwarm.physics.section.TemperatureMap;
import org.treadwarm.physics.section.WallFoot;
import org.treadwarm.physics.section.WallFoot.EdgeInsulation;
import org.treadwarm.survey.WallFootQuestion;
import org.treadwarm.units.Reading;

/**
 * The junction of a solved wall foot, for drawing: as much of the section as shows the floor's layers, the foundation down to 1.5 m and
 * the edge insulation. The arrays belong to whoever asked.
 *
 * @param inward floor that is shown, m
 * @param outward ground outside that is shown, m
 * @param upward wall that is shown above the heated plane, m
 * @param downward what is shown below it, m
 * @param slabDepth of all layers below the heated plane, m
 * @param wallThickness m
 * @param wallResistance of the wall without films, m²·K/W
 * @param edge whether the edge insulation is in it
 * @param x places of the columns from the left end of what is shown, m
 * @param depth places of the rows from its upper end, m
 * @param share temperature by row, then by column, as share of the difference between inside, 1, and outdoors, 0; NaN in air
 */
@SuppressWarnings("ArrayRecordComponent")
public record WallFootView(
        double inward,
        double outward,
        double upward,
        double downward,
        double slabDepth,
        double wallThickness,
        double wallResistance,
        boolean edge,
        double[] x,
        double[] depth,
        double[][] share) {
    /** Of the foundation no more is shown, m. */
    public static final double DEEPEST_SHOWN = 1.5;

    /** Ground shown below whatever reaches deepest, m. */
    private static final double BELOW = 0.25;

    private static final double LEAST_BESIDE = 0.45;
    private static final double LEAST_ABOVE = 0.35;

    /** Least width of the window over its height. */
    private static final double SHAPE = 0.8;

    /**
     * Solves the junction once more, on one grid.
     *
     * @param question one that intake accepted
     * @param edge whether with its edge insulation
     * @param stopped asked now and then whether to give up
     * @throws IllegalArgumentException when the section cannot be built
     * @throws IllegalStateException when it cannot be solved
     * @throws java.util.concurrent.CancellationException when asked to give up
     */
    public static WallFootView of(WallFootQuestion question, boolean edge, BooleanSupplier stopped) {
        Optional<EdgeInsulation> strip = edge ? WallFootEvaluation.strip(question) : Optional.empty();
        WallFoot foot = WallFootEvaluation.foot(question, strip);
        FootWindow window = window(question, foot);
        TemperatureMap map = foot.map(window, stopped);
        int rows = map.y().length;
        double[] depth = new double[rows];
        double[][] share = new double[rows][];
        for (int row = 0; row < rows; row++) {
            depth[row] = Math.max(0, window.upward() - map.y()[rows - 1 - row]);
            share[row] = map.temperature()[rows - 1 - row];
        }
        return new WallFootView(
                window.inward(),
                window.outward(),
                window.upward(),
                window.downward(),
                slabDepth(foot),
                foot.wall().thickness(),
                foot.wall().thickness() / foot.wall().conductivity(),
                edge,
                Arrays.stream(map.x())
                        .map(place -> Math.max(0, place + window.inward()))
                        .toArray(),
                depth,
                share);
    }

    /** The same window with and without the edge insulation, so that both can be compared. */
    private static FootWindow window(WallFootQuestion question, WallFoot foot) {
        double half = foot.halfWidth();
        double strip = question.edgeDepth().map(Reading::value).orElse(0.0);
        double foundation = Math.min(DEEPEST_SHOWN, foot.wall().foundation());
        double deepest = Math.max(Math.max(slabDepth(foot), strip), foot.heatedPlane() + foundation);
        double downward = Math.min(deepest + BELOW, foot.heatedPlane() + foot.groundDepth());
        double upward =
                Math.min(foot.wall().height(), question.above().value() + Math.max(LEAST_ABOVE, 0.25 * downward));
        double thickness = foot.wall().thickness();
        double beside = Math.max(Math.max(LEAST_BESIDE, thickness), (SHAPE * (upward + downward) - thickness) / 2);
        return new FootWindow(Math.min(beside, half), Math.min(beside, foot.groundDepth()), upward, downward);
    }

    private static double slabDepth(WallFoot foot) {
        return foot.slab().stream().mapToDouble(layer -> layer.thickness()).sum();
    }
}
