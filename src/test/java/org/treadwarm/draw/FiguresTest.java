package org.treadwarm.draw;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.Locale;
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
