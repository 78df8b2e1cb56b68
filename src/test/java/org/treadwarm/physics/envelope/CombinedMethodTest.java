package org.treadwarm.physics.envelope;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The combined method against the textbook's two paths and its own bounds. */
class CombinedMethodTest {
    private static final double[] NONE = new double[CombinedMethod.MOST_FRAMES];

    @Test
    void oneFrameIsTheTextbooksTwoPaths() {
        double films = 0.17;
        double boards = 0.15;
        double wool = 0.14 / 0.037;
        double stud = 0.14 / 0.13;
        double upper = 1 / (0.88 / (films + boards + wool) + 0.12 / (films + boards + stud));
        double lower = films + boards + 1 / (0.88 / wool + 0.12 / stud);
        assertThat(upper(films + boards, 1, new double[] {0.12}, new double[] {wool}, new double[] {stud}))
                .isCloseTo(upper, within(1e-14));
        assertThat(films + boards + CombinedMethod.sideBySide(0.12, wool, stud)).isCloseTo(lower, within(1e-14));
        assertThat(CombinedMethod.total(upper, lower)).isEqualTo((upper + lower) / 2);
        assertThat(CombinedMethod.largestRelativeError(upper, lower))
                .isCloseTo((upper - lower) / (2 * CombinedMethod.total(upper, lower)), within(1e-15));
    }

    @Test
    void noFrameIsASum() {
        assertThat(upper(2.5, 0, NONE, NONE, NONE)).isEqualTo(2.5);
    }

    @Test
    void twoFramesCrossInFourPaths() {
        double[] share = {0.1, 0.2};
        double[] between = {3, 1};
        double[] through = {1, 0.4};
        double conductance = 0.9 * 0.8 / 4.2 + 0.1 * 0.8 / 2.2 + 0.9 * 0.2 / 3.6 + 0.1 * 0.2 / 1.6;
        assertThat(upper(0.2, 2, share, between, through)).isCloseTo(1 / conductance, within(1e-14));
    }

    @Test
    void framingLikeItsLayerChangesNothing() {
        assertThat(upper(0.3, 1, new double[] {0.25}, new double[] {2}, new double[] {2}))
                .isCloseTo(2.3, within(1e-14));
        assertThat(CombinedMethod.sideBySide(0.25, 2, 2)).isCloseTo(2, within(1e-14));
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5})
    void theUpperLimitIsNeverBelowTheLower(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        for (int draw = 0; draw < 300; draw++) {
            int frames = random.nextInt(0, 7);
            double constant = random.nextDouble(0, 3);
            double lower = constant;
            double[] share = new double[frames];
            double[] between = new double[frames];
            double[] through = new double[frames];
            for (int frame = 0; frame < frames; frame++) {
                share[frame] = random.nextDouble(0.001, 0.999);
                between[frame] = random.nextDouble(0.001, 9);
                through[frame] = random.nextDouble(0.001, 9);
                lower += CombinedMethod.sideBySide(share[frame], between[frame], through[frame]);
            }
            double upper = upper(constant, frames, share, between, through);
            assertThat(upper).as("seed %d, draw %d", seed, draw).isGreaterThanOrEqualTo(lower * (1 - 1e-12));
        }
    }

    private static double upper(double constant, int frames, double[] share, double[] between, double[] through) {
        return CombinedMethod.upperLimit(constant, frames, share, between, through);
    }
}
