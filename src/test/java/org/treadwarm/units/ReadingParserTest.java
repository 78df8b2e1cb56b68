package org.treadwarm.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** What is read as a quantity, and as which. */
class ReadingParserTest {
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "LENGTH | 140 mm | 0.14",
                "LENGTH | 3,81 m | 3.81",
                "LENGTH | 3.81m | 3.81",
                "LENGTH | .5 m | 0.5",
                "LENGTH | ,5 m | 0.5",
                "LENGTH | 1e3 mm | 1",
                "LENGTH | 1.5E-2 m | 0.015",
                "LENGTH | +2 m | 2",
                "LENGTH | −430 m | -430",
                "LENGTH | 12' 6 1/2\" | 3.8227",
                "LENGTH | 12'6\" | 3.81",
                "LENGTH | 12'-6 1/2\" | 3.8227",
                "LENGTH | 12′ 6″ | 3.81",
                "LENGTH | 12’ 6” | 3.81",
                "LENGTH | 12’6 ½” | 3.8227",
                "LENGTH | 12' 6½\" | 3.8227",
                "LENGTH | 12 ft 6 in | 3.81",
                "LENGTH | 5 feet 11 inches | 1.8034",
                "LENGTH | -1' 6\" | -0.4572",
                "LENGTH | 12' | 3.6576",
                "LENGTH | 6 1/2 in | 0.1651",
                "LENGTH | 6-1/2\" | 0.1651",
                "LENGTH | 1 ½ in | 0.0381",
                "LENGTH | ½\" | 0.0127",
                "LENGTH | ¾ in | 0.01905",
                "LENGTH | 12'' | 0.3048",
                "LENGTH | 2 m + 30 cm | 2.3",
                "LENGTH | 2 + 3 m | 5",
                "LENGTH | 12' + 6\" | 3.81",
                "AREA | 4.10 x 3.20 + 1.2 x 0.8 m2 | 14.08",
                "AREA | 4,10 x 3,20 m | 13.12",
                "AREA | 4.10 m x 3.20 m | 13.12",
                "AREA | 4.1 X 3.2 m² | 13.12",
                "AREA | 4.1*3.2 m^2 | 13.12",
                "AREA | 4.1×3.2 sqm | 13.12",
                "AREA | 410 cm x 3.2 m | 13.12",
                "AREA | 100 x 200 mm | 0.02",
                "AREA | 4.1 x 3.2 m2 + 2 m2 | 15.12",
                "AREA | 4.1 x 3.2 + 2 m2 | 15.12",
                "AREA | 12' 6\" x 10' 2\" | 11.806428",
                "AREA | 12 x 10 ft2 | 11.1483648",
                "VOLUME | 4 x 3 x 2.5 m3 | 30",
                "VOLUME | 42 m2 x 2.5 m | 105",
                "VOLUME | 500 l | 0.5",
                "TEMPERATURE | -9 °C | -9",
                "TEMPERATURE | 14 °F | -10",
                "TEMPERATURE | 14 F | -10",
                "TEMPERATURE | 293.15 K | 20",
                "RESISTANCE | R 19 | 3.34609348996",
                "RESISTANCE | R19 | 3.34609348996",
                "RESISTANCE | R-19 | 3.34609348996",
                "RESISTANCE | 0.18 m2.K/W | 0.18",
                "RESISTANCE | 0,18 m²K/W | 0.18",
                "PRESSURE | 8 kPa | 8000",
                "PRESSURE | 80 mbar | 8000",
                "PRESSURE | 0.08 bar | 8000",
                "PRESSURE | 0.8 mH2O | 7845.32",
                "PRESSURE | 0,8 m H₂O | 7845.32",
                "PRESSURE | 0.8 mWC | 7845.32",
                "PRESSURE | 2.5 ftH2O | 7472.6673",
                "PRESSURE | 2.5 ft[H2O] | 7472.6673",
                "PRESSURE | 1 psi | 6894.757293168361",
                "DURATION | 3 h | 3",
                "DURATION | 90 min | 1.5",
                "DURATION | 2 days | 48",
                "AREAL_HEAT_CAPACITY | 9 kJ/(m²·K) | 9000",
                "AREAL_HEAT_CAPACITY | 2.5 Wh/m2K | 9000",
                "CHANGE_RATE | 0.5 1/h | 0.5",
                "CHANGE_RATE | 2 1/2 1/h | 2.5",
                "CHANGE_RATE | 0.5 h⁻¹ | 0.5",
                "CHANGE_RATE | 0.5/h | 0.5",
                "CHANGE_RATE | 0.5 ACH | 0.5",
                "CONDUCTIVITY | 0.037 W/(m.K) | 0.037",
                "CONDUCTIVITY | 0.037 W/mK | 0.037",
                "CONDUCTIVITY | 37 mW/(m·K) | 0.037",
                "CONDUCTIVITY | 0.037 W·m⁻¹·K⁻¹ | 0.037",
                "CONDUCTIVITY | 0.25 Btu·in/(h·ft²·°F) | 0.0360569722",
                "CONDUCTIVITY | 0.25 BTU in/(hr ft2 F) | 0.0360569722",
                "TRANSMITTANCE | 0.3 W/m2K | 0.3",
                "TRANSMITTANCE | 0.3 W/m²K | 0.3",
                "RATIO | 0.12 | 0.12",
                "RATIO | 12 % | 0.12",
                "RATIO | 12% | 0.12",
                "AIR_FLOW | 30 m3/h | 0.00833333333333",
                "AIR_FLOW | 30 cfm | 0.014158423296",
            })
    void readsWhatPeopleWrite(QuantityKind kind, String text, double expected) throws ReadingException {
        Reading reading = ReadingParser.parse(text, kind);
        assertThat(reading.value()).isCloseTo(expected, within(1e-9 * Math.abs(expected)));
        assertThat(reading.spread()).isZero();
        assertThat(reading.typed()).isEqualTo(text);
        assertThat(reading.basis()).isEmpty();
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "LENGTH | 140 ± 10 mm | 0.14 | 0.01",
                "LENGTH | 140 mm ± 10 mm | 0.14 | 0.01",
                "LENGTH | 140 mm ± 1 cm | 0.14 | 0.01",
                "LENGTH | 140 mm ± 10 | 0.14 | 0.01",
                "LENGTH | 140 +- 10 mm | 0.14 | 0.01",
                "LENGTH | 140+/-10 mm | 0.14 | 0.01",
                "LENGTH | 140 mm±10mm | 0.14 | 0.01",
                "LENGTH | 140 mm ± 5 % | 0.14 | 0.007",
                "LENGTH | 140 ± 5 % mm | 0.14 | 0.007",
                "LENGTH | -140 mm ± 5 % | -0.14 | 0.007",
                "LENGTH | 12' 6\" ± 1/2\" | 3.81 | 0.0127",
                "LENGTH | 12' ± 1\" | 3.6576 | 0.0254",
                "LENGTH | 5 ft ± 3 in | 1.524 | 0.0762",
                "LENGTH | 2 m + 30 ± 1 cm | 2.3 | 0.01",
                "AREA | 4.1 x 3.2 ± 0.5 m2 | 13.12 | 0.5",
                "AREA | 4.1 x 3.2 m2 ± 2 % | 13.12 | 0.2624",
                "AREA | 12' 6\" x 10' 2\" ± 1 ft2 | 11.806428 | 0.09290304",
                "TEMPERATURE | 68 ± 9 °F | 20 | 5",
                "TEMPERATURE | 68 °F ± 9 °F | 20 | 5",
                "TEMPERATURE | 20 °C ± 9 °F | 20 | 5",
                "TEMPERATURE | 20 °C ± 1 K | 20 | 1",
                "TEMPERATURE | 293.15 K ± 2 | 20 | 2",
                "RESISTANCE | R 19 ± 1 | 3.34609348996 | 0.17611018368",
                "RESISTANCE | R 19 ± 10 % | 3.34609348996 | 0.334609348996",
                "CHANGE_RATE | 0.5 1/h ± 30 % | 0.5 | 0.15",
                "CHANGE_RATE | 0.5 ± 0.1 1/h | 0.5 | 0.1",
                "RATIO | 12 ± 2 % | 0.12 | 0.02",
                "RATIO | 12 % ± 2 % | 0.12 | 0.02",
                "RATIO | 0.12 ± 0.02 | 0.12 | 0.02",
            })
    void readsSpreads(QuantityKind kind, String text, double value, double spread) throws ReadingException {
        Reading reading = ReadingParser.parse(text, kind);
        assertThat(reading.value()).isCloseTo(value, within(1e-9 * Math.abs(value)));
        assertThat(reading.spread()).isCloseTo(spread, within(1e-9 * spread));
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "LENGTH | `` | nothing is written",
                "LENGTH | `  ` | nothing is written",
                "LENGTH | 140 | unit is missing",
                "AREA | 4.1 x 3.2 | unit is missing",
                "LENGTH | 2 m + 3 | unit is missing",
                "TEMPERATURE | 20 | unit is missing",
                "DENSITY | 1,200.5 kg/m3 | no grouping",
                "DENSITY | 1.234.567 kg/m3 | no grouping",
                "AREA | 1,5 x 2.5 m | no grouping",
                "CHANGE_RATE | 0.5 1/h ± 0,1 | no grouping",
                "DENSITY | 1 200 kg/m3 | without gaps",
                "LENGTH | 5 K | measures a temperature",
                "AREA | 24 m | measures a length",
                "CONDUCTIVITY | 0.3 W/m2K | measures a U-value",
                "TRANSMITTANCE | R 19 | thermal resistance",
                "RESISTANCE | R 19 m2.K/W | already means",
                "LENGTH | 5 parsec | no unit of length",
                "LENGTH | 2 x 3 m | only for an area or a volume",
                "AREA | 2 x 3 x 4 m2 | product of 3 lengths",
                "VOLUME | 2 x 3 m3 | product of 2 lengths",
                "LENGTH | 5 ± -3 mm | must not be negative",
                "LENGTH | 5 mm ± −3 mm | must not be negative",
                "LENGTH | 5 ± 1 ± 2 mm | could not be read",
                "LENGTH | 5 mm ± | missing at the end",
                "LENGTH | 5 mm ± 3 K | but a length is asked for",
                "AREA | 2 x 3 m ± 0.1 | its own unit",
                "AREA | 2 x 3 m ± 0.1 m | its own unit",
                "LENGTH | 12' 6\" ± 1 | its own unit",
                "TEMPERATURE | 20 °C ± 5 % | no percentage",
                "TEMPERATURE | 20 + 5 °C | cannot be added",
                "RATIO | 0.12 ± 10 % | not clear",
                "RATIO | 12 m | pure ratio",
                "LENGTH | 12' 6 | inches are written",
                "LENGTH | 1/0 m | 0 below the bar",
                "LENGTH | 1e400 m | too large",
                "LENGTH | 1 m ± 1e400 m | too large",
                "LENGTH | NaN m | does not start with a number",
                "LENGTH | Infinity m | does not start with a number",
                "LENGTH | --5 m | does not start with a number",
                "LENGTH | ٣ m | does not start with a number",
                "LENGTH | ca. 5 m | does not start with a number",
                "AREA | 3 x -4 m2 | no unit of area",
                "AREA | 2 x (3 + 4) m2 | no unit of area",
            })
    void refusesWithAReason(QuantityKind kind, String text, String reason) {
        assertThatThrownBy(() -> ReadingParser.parse(text, kind))
                .isInstanceOf(ReadingException.class)
                .hasMessageContaining(reason);
    }

    @Test
    void readsUpToTwoHundredCharacters() throws ReadingException {
        String padded = " ".repeat(ReadingParser.LONGEST - 3) + "5 m";
        assertThat(ReadingParser.parse(padded, QuantityKind.LENGTH).value()).isEqualTo(5);
        assertThatThrownBy(() -> ReadingParser.parse(" " + padded, QuantityKind.LENGTH))
                .isInstanceOf(ReadingException.class)
                .hasMessageContaining("200 characters");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "3.81",
                "4.10 x 3.20 + 1.2 x 0.8",
                "4.1 X 3.2",
                "4×3",
                "1/2",
                "½",
                "140 ± 10",
                "5 +/- 1",
                "1e3",
                "-5"
            })
    void bareTextsTakeTheUnitOfTheForm(String text) {
        assertThat(ReadingParser.isBare(text)).isTrue();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "",
                " ",
                "m",
                "3.81 m",
                "12'",
                "12’",
                "6”",
                "6\"",
                "12 %",
                "R 19",
                "14 °F",
                "0.5 1/h",
                "0.5 /h",
                "5 [ft_i]",
                "x"
            })
    void textsWithAUnitOrWithoutANumberDoNot(String text) {
        assertThat(ReadingParser.isBare(text)).isFalse();
    }

    @Test
    void afterFeetThereAreLessThanTwelveInches() {
        org.assertj.core.api.Assertions.assertThatThrownBy(() -> ReadingParser.parse("12' 13\"", QuantityKind.LENGTH))
                .isInstanceOf(ReadingException.class)
                .hasMessageContaining("12 inches");
    }
}
