package org.treadwarm.units;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Numbers as people read them. */
class NumbersTest {
    @ParameterizedTest
    @CsvSource({
        "2.345, 2, 2.35",
        "-2.345, 2, -2.35",
        "-0.001, 2, 0.00",
        "0, 1, 0.0",
        "1e-9, 3, 0.000",
        "1234.5, 0, 1235"
    })
    void roundsToDecimals(double number, int decimals, String expected) {
        assertThat(Numbers.fixed(number, decimals)).isEqualTo(expected);
    }

    @ParameterizedTest
    @CsvSource({
        "0, 3, 0",
        "0.0012345, 3, 0.00123",
        "1234.5, 2, 1200",
        "-0.05, 3, -0.05",
        "3.10, 4, 3.1",
        "1e-5, 6, 0.00001"
    })
    void roundsToSignificantDigits(double number, int digits, String expected) {
        assertThat(Numbers.significant(number, digits)).isEqualTo(expected);
    }

    @ParameterizedTest
    @CsvSource({"0, 0", "999, 999", "1000, 1 000", "1234567.5, 1 234 568", "-10000, -10 000", "-0.4, 0"})
    void groupsThousands(double number, String expected) {
        assertThat(Numbers.grouped(number)).isEqualTo(expected);
    }

    @Test
    void writesWhatHasNoEnd() {
        assertThat(Numbers.fixed(Double.POSITIVE_INFINITY, 2)).isEqualTo("∞");
        assertThat(Numbers.significant(Double.NEGATIVE_INFINITY, 3)).isEqualTo("-∞");
        assertThat(Numbers.grouped(Double.NEGATIVE_INFINITY)).isEqualTo("-∞");
    }
}
