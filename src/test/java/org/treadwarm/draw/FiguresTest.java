package org.treadwarm.draw;

import static org.assertj.core.api.Assertions.assertThat;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.Locale;
import java.util.Random;
import org.junit.jupiter.api.Test;

class FiguresTest {
    @Test
    void roundsHalfUpAndKeepsTheUnitBeside() {
        assertThat(Figures.watts(339.5)).isEqualTo("340\u00a0W");
        assertThat(Figures.flux(12.35)).isEqualTo("12.4\u00a0W/m²");
        assertThat(Figures.celsius(-5)).isEqualTo("\u22125.0\u00a0°C");
        assertThat(Figures.resistance(0.125)).isEqualTo("R\u00a00.13\u00a0m²K/W");
        assertThat(Figures.thickness(0.0125)).isEqualTo("12.5\u00a0mm");
        assertThat(Figures.thickness(0.14)).isEqualTo("140\u00a0mm");
    }

    @Test
    void neverShowsAMinusBeforeNothing() {
        assertThat(Figures.watts(-0.4)).isEqualTo("0\u00a0W");
        assertThat(Figures.coordinate(-0.001)).isEqualTo("0");
    }

    @Test
    void writesCoordinatesAsTheirDecimalTextIsRounded() {
        Random random = new Random(7);
        for (int i = 0; i < 200_000; i++) {
            double value = i % 3 == 0
                    ? (random.nextInt(400_000) - 200_000) / 1000.0
                    : random.nextGaussian() * Math.pow(10, random.nextInt(9) - 4);
            BigDecimal rounded = BigDecimal.valueOf(value).setScale(2, RoundingMode.HALF_UP);
            assertThat(Figures.coordinate(value))
                    .isEqualTo(
                            rounded.signum() == 0
                                    ? "0"
                                    : rounded.stripTrailingZeros().toPlainString());
        }
    }

    @Test
    void saysThatASmallShareIsNotNothing() {
        assertThat(Figures.percent(0.004)).isEqualTo("under\u00a01\u00a0%");
        assertThat(Figures.percent(0)).isEqualTo("0\u00a0%");
        assertThat(Figures.percent(-0.06)).isEqualTo("\u22126\u00a0%");
    }

    @Test
    void doesNotDependOnTheLocale() {
        Locale before = Locale.getDefault();
        Locale.setDefault(Locale.GERMANY);
        try {
            assertThat(Figures.coordinate(1234.567)).isEqualTo("1234.57");
        } finally {
            Locale.setDefault(before);
        }
    }
}
