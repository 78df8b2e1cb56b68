package org.treadwarm.physics.water;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import org.junit.jupiter.api.Test;

/** Mean overtemperature, supply and spread of the heating water invert one another. */
class HeatingWaterTest {
    private static final int DRAWS = 5000;

    @Test
    void supplyAndMeanInvertOneAnother() {
        SplittableRandom random = new SplittableRandom(7);
        for (int i = 0; i < DRAWS; i++) {
            double mean = Math.pow(10, random.nextDouble(-1, 2));
            double spread = mean * Math.pow(10, random.nextDouble(-7, 1.3));
            double supply = HeatingWater.supplyOvertemperature(mean, spread);
            String drawn = "mean %s, spread %s".formatted(mean, spread);
            // The spread is what is left of a difference, so it holds as many digits as that has.
            assertThat(HeatingWater.spread(mean, supply))
                    .as(drawn)
                    .isCloseTo(spread, within(1e-13 * supply + 1e-10 * spread));
            if (supply - spread > 1e-6 * supply) {
                double back = HeatingWater.meanOvertemperature(20 + supply, 20 + supply - spread, 20);
                assertThat(back).as(drawn).isCloseTo(mean, within(1e-7 * mean));
            }
        }
    }

    @Test
    void aSpreadOfNothingLeavesTheMean() {
        assertThat(HeatingWater.meanOvertemperature(35, 35, 20)).isEqualTo(15);
        assertThat(HeatingWater.supplyOvertemperature(15, 0)).isEqualTo(15);
        assertThat(HeatingWater.spread(15, 15)).isZero();
    }

    /** The rule leaves out the quadratic term up to sigma/dT_H = 0.5, where it is 0.25/12 = 2 % of dT_H. */
    @Test
    void theRuleStaysNearTheExactSupply() {
        for (double spread = 0.1; spread <= 12; spread += 0.1) {
            double exact = HeatingWater.supplyOvertemperature(10, spread);
            double rule = HeatingWater.supplyOvertemperatureByRule(10, spread);
            assertThat(rule).as("spread %s", spread).isCloseTo(exact, within(0.021 * 10));
        }
    }

    @Test
    void theFlowCarriesUpwardAndDownwardHeat() {
        double flow = HeatingWater.massFlow(20, 55, 5, 4190, 0.23009, 1.51, 20, 10);
        double downward = (0.23009 * 55 + 10) / 1.51;
        assertThat(flow * 4190 * 5).isCloseTo(20 * (55 + downward), within(1e-9));
    }

    @Test
    void refusesWaterThatDoesNotHeat() {
        assertThatIllegalArgumentException().isThrownBy(() -> HeatingWater.meanOvertemperature(30, 35, 20));
        assertThatIllegalArgumentException().isThrownBy(() -> HeatingWater.meanOvertemperature(30, 20, 20));
        assertThatIllegalArgumentException().isThrownBy(() -> HeatingWater.spread(10, 9));
        assertThatIllegalArgumentException().isThrownBy(() -> HeatingWater.massFlow(100, 0, 4190));
    }
}
