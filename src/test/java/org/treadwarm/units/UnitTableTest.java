package org.treadwarm.units;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;

/** Every factor against an independent library of units, and every way there and back. */
class UnitTableTest {
    private static final List<Double> NUMBERS = List.of(1.0, 0.037, 19.0, -7.25, 1234.5);

    static List<Unit> units() {
        return UnitTable.all();
    }

    static Stream<Arguments> pairs() {
        return units().stream()
                .flatMap(from ->
                        units().stream().filter(to -> to.kind() == from.kind()).map(to -> Arguments.of(from, to)));
    }

    @ParameterizedTest
    @MethodSource("units")
    void agreesWithAnIndependentLibrary(Unit unit) {
        assertThat(UnitOracle.knows(unit)).isTrue();
        for (double number : NUMBERS) {
            double expected = UnitOracle.toSi(unit, number);
            assertThat(unit.toSi(number)).isCloseTo(expected, within(1e-13 * (Math.abs(expected) + 1e-3)));
        }
    }

    @ParameterizedTest
    @MethodSource("pairs")
    void comesBackTheSame(Unit from, Unit to) {
        for (double number : NUMBERS) {
            double there = to.fromSi(from.toSi(number));
            double back = from.fromSi(to.toSi(there));
            assertThat(back).isCloseTo(number, within(1e-12 * (Math.abs(number) + Math.abs(from.offset()))));
        }
    }

    @ParameterizedTest
    @MethodSource("units")
    void isReadBackFromEverySpelling(Unit unit) throws ReadingException {
        for (double number : NUMBERS) {
            for (String spelling : spellings(unit)) {
                Reading reading = ReadingParser.parse(number + " " + spelling, unit.kind());
                assertThat(reading.value()).as(spelling).isEqualTo(unit.toSi(number));
            }
        }
    }

    private static List<String> spellings(Unit unit) {
        return Stream.concat(Stream.of(unit.symbol()), unit.spellings().stream())
                .toList();
    }

    @ParameterizedTest
    @MethodSource("units")
    void printedInItsUnitIsReadAsTheSameNumber(Unit unit) throws ReadingException {
        for (double si : List.of(0.12, 21.5, 3.81, 1e-5, 98765.4321)) {
            Reading reading = ReadingParser.parse(unit.fromSi(si) + " " + unit.symbol(), unit.kind());
            assertThat(reading.value()).isCloseTo(si, within(1e-12 * (si + Math.abs(unit.offset()))));
        }
    }

    @ParameterizedTest
    @EnumSource(QuantityKind.class)
    void readsItsOwnSiUnitUnchanged(QuantityKind kind) throws ReadingException {
        assertThat(ReadingParser.parse("0.37 " + kind.siUnit(), kind).value()).isEqualTo(0.37);
    }

    @Test
    void namesASourceForEveryFactor() {
        assertThat(units()).allSatisfy(unit -> assertThat(unit.source()).isNotBlank());
    }

    @Test
    void keepsExactFactorsExact() throws ReadingException {
        assertThat(ReadingParser.parse("140 mm", QuantityKind.LENGTH).value()).isEqualTo(0.14);
        assertThat(ReadingParser.parse("12 %", QuantityKind.RATIO).value()).isEqualTo(0.12);
        assertThat(ReadingParser.parse("1 ft", QuantityKind.LENGTH).value()).isEqualTo(0.3048);
        assertThat(ReadingParser.parse("1 Btu/h", QuantityKind.POWER).value()).isEqualTo(1055.05585262 / 3600);
    }

    @Test
    void readsUcumCodes() throws ReadingException {
        assertThat(ReadingParser.parse("1 [ft_i]", QuantityKind.LENGTH).value()).isEqualTo(0.3048);
        assertThat(ReadingParser.parse("1 [sft_i]", QuantityKind.AREA).value()).isEqualTo(0.09290304);
        assertThat(ReadingParser.parse("68 [degF]", QuantityKind.TEMPERATURE).value())
                .isEqualTo(20);
        assertThat(ReadingParser.parse("20 Cel", QuantityKind.TEMPERATURE).value())
                .isEqualTo(20);
        assertThat(ReadingParser.parse("1 [Btu_IT]/(h.[sft_i].[degF])", QuantityKind.TRANSMITTANCE)
                        .value())
                .isCloseTo(5.678263341, within(1e-8));
    }
}
