package org.treadwarm.physics.water;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

/** Friction and pressure drop over the whole range. */
class PipeFrictionTest {
    private static final int DRAWS = 5000;

    @Test
    void colebrookHoldsToTheLastDigits() {
        SplittableRandom random = new SplittableRandom(11);
        for (int i = 0; i < DRAWS; i++) {
            double reynolds = Math.pow(10, random.nextDouble(3.362, 8));
            double roughness = random.nextInt(4) == 0 ? 0 : Math.pow(10, random.nextDouble(-7, -1.31));
            double root = 1 / Math.sqrt(PipeFriction.colebrook(reynolds, roughness));
            double right = -2 * Math.log10(roughness / 3.7 + 2.51 * root / reynolds);
            assertThat(root).as("Re %s, eps/d %s", reynolds, roughness).isCloseTo(right, within(2e-14 * root));
        }
    }

    @Test
    void isLaminarBelowTwentyThreeHundredAndJumpsUpThere() {
        assertThat(PipeFriction.factor(1000, 0.001)).isEqualTo(0.064);
        assertThat(PipeFriction.factor(Math.nextDown(2300.0), 0)).isCloseTo(64.0 / 2300, within(1e-12));
        assertThat(PipeFriction.factor(2300, 0)).isGreaterThan(1.5 * 64 / 2300);
    }

    @Test
    void pressureDropRisesWithTheFlow() {
        for (double diameter : new double[] {0.008, 0.012, 0.016, 0.025}) {
            double last = 0;
            for (double flow = 1e-4; flow < 0.3; flow *= 1.02) {
                double gradient = Tube.smooth(diameter)
                        .flow(flow, Water.atAtmosphere(), 35)
                        .pressureGradient();
                assertThat(gradient).as("diameter %s, flow %s", diameter, flow).isGreaterThan(last);
                last = gradient;
            }
        }
    }

    @Test
    void holdsItsContent() {
        assertThat(Tube.smooth(0.012).content(100)).isCloseTo(Math.PI * 0.006 * 0.006 * 100, within(1e-15));
    }

    @Test
    void refusesWhatIsNoPipeOrNoFlow() {
        assertThatIllegalArgumentException().isThrownBy(() -> PipeFriction.factor(0, 0));
        assertThatIllegalArgumentException().isThrownBy(() -> PipeFriction.colebrook(1e4, 0.06));
        assertThatIllegalArgumentException().isThrownBy(() -> new Tube(0, 0));
        assertThatIllegalArgumentException().isThrownBy(() -> Tube.smooth(0.012).flow(-1, Water.atAtmosphere(), 35));
    }
}
