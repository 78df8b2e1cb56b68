package org.treadwarm.physics.warmup;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** The closed forms hold together; the published checks hold their numbers. */
class ClosedFormsTest {
    /** erfc(x) from Abramowitz and Stegun, table 7.1 (from memory). */
    @ParameterizedTest
    @CsvSource({"0, 1", "0.5, 0.4795001222", "1, 0.1572992071", "2, 0.004677734981", "3, 0.00002209049700"})
    void givesTheErrorFunction(double x, double expected) {
        assertThat(ErrorFunction.complement(x)).isCloseTo(expected, within(1e-10 * Math.max(1e-4, expected) * 10));
    }

    @Test
    void itsTwoFormsMeet() {
        double below = ErrorFunction.scaledComplement(Math.nextDown(2.0));
        double above = ErrorFunction.scaledComplement(2.0);
        assertThat(below).isCloseTo(above, within(1e-12));
    }

    /** erfcx(x) -> 1/(sqrt(pi) x). */
    @Test
    void doesNotOverflow() {
        assertThat(ErrorFunction.scaledComplement(1e8)).isCloseTo(1 / (Math.sqrt(Math.PI) * 1e8), within(1e-20));
        SemiInfiniteSolid solid = new SemiInfiniteSolid(1.4, 7e-7);
        assertThat(solid.shareBehindFilm(0.02, 3600, 1e9)).isCloseTo(solid.shareOfFace(0.02, 3600), within(1e-6));
    }

    @ParameterizedTest
    @ValueSource(ints = {0, 1, 5, 40})
    void rootsAreRoots(int n) {
        for (double biot : new double[] {1e-3, 1, 1e3}) {
            double root = new PlaneWall(biot).root(n);
            assertThat(root).isBetween(n * Math.PI, (n + 0.5) * Math.PI);
            assertThat(root * Math.tan(root) / biot).isCloseTo(1, within(1e-6));
        }
    }

    @Test
    void atFirstNothingIsGivenOff() {
        PlaneWall wall = new PlaneWall(5);
        assertThat(wall.share(0.3, 1e-4)).isCloseTo(1, within(1e-9));
        assertThat(wall.heatGivenOff(1e-4)).isBetween(0.0, 5e-4);
        assertThatExceptionOfType(ArithmeticException.class).isThrownBy(() -> wall.share(0, 1e-9));
        assertThatIllegalArgumentException().isThrownBy(() -> wall.share(0, 0));
    }
}
