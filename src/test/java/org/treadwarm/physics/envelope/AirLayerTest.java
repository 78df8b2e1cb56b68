package org.treadwarm.physics.envelope;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.treadwarm.tables.AirGaps;
import org.treadwarm.tables.Films;

/** Air layers and films by formula against the tables that the standard prints. */
class AirLayerTest {
    static List<AirGaps.Row> rows() {
        return AirGaps.all();
    }

    private static double ordinary(double millimetres, HeatFlow direction) {
        return AirLayer.resistance(millimetres / 1000, direction, 0.9, 0.9, AirLayer.MEAN_TEMPERATURE);
    }

    @ParameterizedTest
    @MethodSource("rows")
    void theFormulaMakesThePrintedTable(AirGaps.Row row) {
        assertThat(ordinary(row.thickness(), HeatFlow.UP)).isCloseTo(row.up(), within(0.0051));
        assertThat(ordinary(row.thickness(), HeatFlow.HORIZONTAL)).isCloseTo(row.horizontal(), within(0.0051));
        assertThat(ordinary(row.thickness(), HeatFlow.DOWN)).isCloseTo(row.down(), within(0.0051));
    }

    @ParameterizedTest
    @EnumSource(HeatFlow.class)
    void theFilmFormulaMakesThePrintedFilm(HeatFlow direction) {
        assertThat(SurfaceFilm.inside(direction, 0.9, 20)).isCloseTo(Films.inside(direction.word()), within(0.0051));
    }

    @Test
    void theOutsideFilmIsThatOfFourMetresASecond() {
        assertThat(SurfaceFilm.outside(4, 0.9, 10)).isCloseTo(Films.outside("horizontal"), within(0.0051));
    }

    @ParameterizedTest
    @EnumSource(HeatFlow.class)
    void foilInsulates(HeatFlow direction) {
        double foil = AirLayer.resistance(0.025, direction, 0.05, 0.9, 10);
        assertThat(foil).isGreaterThan(2 * ordinary(25, direction));
        assertThat(AirLayer.resistance(0.025, direction, 0.9, 0.05, 10)).isCloseTo(foil, within(1e-15));
    }

    @Test
    void blackBodyCoefficientIsThePrintedOne() {
        assertThat(AirLayer.blackBodyCoefficient(10)).isCloseTo(5.1, within(0.05));
        assertThat(AirLayer.blackBodyCoefficient(20)).isCloseTo(5.7, within(0.05));
    }
}
