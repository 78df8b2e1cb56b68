package org.treadwarm.sizing;

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
 * the edge insulation. The map belongs to whoever asked.
 *
 * @param window the part of the section
 * @param slabDepth of all layers below the heated plane, m
 * @param wallThickness m
 * @param wallResistance of the wall without films, m²·K/W
 * @param edge whether the edge insulation is in it
 * @param map temperatures as shares of the difference between inside, 1, and outside, 0
 */
public record WallFootView(
        FootWindow window,
        double slabDepth,
        double wallThickness,
        double wallResistance,
        boolean edge,
        TemperatureMap map) {
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
        return new WallFootView(
                window,
                slabDepth(foot),
                foot.wall().thickness(),
                foot.wall().thickness() / foot.wall().conductivity(),
                edge,
                foot.map(window, stopped));
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
