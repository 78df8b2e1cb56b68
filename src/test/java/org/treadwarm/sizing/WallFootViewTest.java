package org.treadwarm.sizing;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.Arrays;
import org.junit.jupiter.api.Test;
import org.treadwarm.intake.Document;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.survey.WallFootQuestion;

class WallFootViewTest {
    private static final String QUESTION = """
            {"characteristicDimension": "6 m", "soilConductivity": "2 W/(m.K)", "wallThickness": "0.3 m",
             "below": [{"thickness": "100 mm", "conductivity": "0.036 W/(m.K)"}],
             "above": "65 mm", "wall": [{"thickness": "300 mm", "conductivity": "0.5 W/(m.K)"}],
             "heatedPlane": "0.15 m", "foundation": "0.6 m", "footConductivity": "1.3 W/(m.K)",
             "edgeThickness": "50 mm", "edgeConductivity": "0.035 W/(m.K)", "edgeDepth": "300 mm"}
            """;

    private static WallFootQuestion question(String text) {
        Outcome<WallFootQuestion> outcome;
        try {
            outcome = Intake.wallFoot((ObjectNode) Document.mapper().readTree(text));
        } catch (com.fasterxml.jackson.core.JsonProcessingException e) {
            throw new AssertionError(e);
        }
        return ((Outcome.Accepted<WallFootQuestion>) outcome).value();
    }

    @Test
    void showsTheJunctionFromInsideToOutdoors() {
        WallFootView view = WallFootView.of(question(QUESTION), true, () -> false);
        assertThat(view.slabDepth()).isEqualTo(0.1, within(1e-12));
        assertThat(view.wallResistance()).isEqualTo(0.6, within(1e-12));
        assertThat(at(view, -0.3, 0.2)).isNaN();
        assertThat(at(view, 0.5, 0.0)).isNaN();
        assertThat(at(view, -0.4, 0)).isEqualTo(1, within(1e-3));
        double films = 0.13 + 0.6 + 0.04;
        assertThat(at(view, 0, view.upward())).isEqualTo(1 - 0.13 / films, within(0.02));
        assertThat(Arrays.stream(view.share()).flatMapToDouble(Arrays::stream))
                .allMatch(share -> Double.isNaN(share) || share >= 0 && share <= 1 + 1e-9);
    }

    @Test
    void theInsulatedEdgeLeavesTheFoundationColder() {
        WallFootView with = WallFootView.of(question(QUESTION), true, () -> false);
        WallFootView without = WallFootView.of(question(QUESTION), false, () -> false);

        assertThat(at(with, 0.1, -0.05)).isLessThan(at(without, 0.1, -0.05) - 0.01);
    }

    @Test
    void aNarrowFloorAndADeepFoundationStayWithinTheSection() {
        WallFootView view = WallFootView.of(
                question(QUESTION.replace("\"6 m\"", "\"0.6 m\"").replace("\"0.6 m\", \"foot", "\"1.2 m\", \"foot")),
                false,
                () -> false);

        assertThat(view.inward()).isEqualTo(0.3, within(1e-12));
        assertThat(view.x()[0]).isZero();
    }

    /** The lattice point nearest to a place outward of the wall's inner face and above the heated plane. */
    private static double at(WallFootView view, double outward, double upward) {
        return view.share()[nearest(view.depth(), view.upward() - upward)][nearest(view.x(), outward + view.inward())];
    }

    private static int nearest(double[] places, double wanted) {
        int best = 0;
        for (int i = 1; i < places.length; i++) {
            if (Math.abs(places[i] - wanted) < Math.abs(places[best] - wanted)) {
                best = i;
            }
        }
        return best;
    }
}
