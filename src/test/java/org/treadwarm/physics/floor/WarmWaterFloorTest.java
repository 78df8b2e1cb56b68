package org.treadwarm.physics.floor;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.physics.floor.Pipe.Sheath;
import org.treadwarm.physics.floor.PipesBelowScreed.Characteristic;
import org.treadwarm.sizing.FloorMethods;

/** The table method of warm-water floors beyond its check cases: joints, directions, refusals. */
class WarmWaterFloorTest {
    private static final Pipe PIPE = Pipe.reference(0.020);
    private final PipesInScreed method = FloorMethods.pipesInScreed();

    private static ScreedFloor floor(double spacing, double cover, double covering) {
        return new ScreedFloor(spacing, cover, 1.2, covering, PIPE);
    }

    /** The standard makes the exponents of cover and diameter zero at 45 mm and 20 mm, and that of spacing at 75 mm. */
    @Test
    void atTheReferenceFloorOnlyTheCoveringFactorIsLeft() {
        ScreedFloor reference = new ScreedFloor(0.075, 0.045, 1.0, 0, PIPE);
        assertThat(method.coefficient(reference)).isCloseTo(6.7, within(1e-12));
    }

    @ParameterizedTest
    @ValueSource(doubles = {0, 0.02, 0.05, 0.11, 0.15})
    void givesLessTheWiderTheSpacing(double covering) {
        double last = Double.POSITIVE_INFINITY;
        for (double spacing = 0.05; spacing <= 0.6; spacing += 0.005) {
            double coefficient = method.coefficient(floor(spacing, 0.045, covering));
            assertThat(coefficient).as("spacing %s", spacing).isPositive().isLessThan(last);
            last = coefficient;
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.1, 0.2, 0.21, 0.3, 0.375, 0.5})
    void givesLessTheThickerTheScreedAndTheCovering(double spacing) {
        double last = Double.POSITIVE_INFINITY;
        for (double cover = 0.01; cover <= 0.4; cover += 0.001) {
            double coefficient = method.coefficient(floor(spacing, cover, 0.05));
            assertThat(coefficient).as("cover %s", cover).isLessThan(last);
            last = coefficient;
        }
        assertThat(method.coefficient(floor(spacing, 0.045, 0.1)))
                .isLessThan(method.coefficient(floor(spacing, 0.045, 0.05)));
    }

    @ParameterizedTest
    @CsvSource({"0.2, 0.100", "0.3, 0.150"})
    void joinsAtTheThickScreed(double spacing, double thickest) {
        double below = method.coefficient(floor(spacing, thickest - 1e-9, 0.1));
        double above = method.coefficient(floor(spacing, thickest + 1e-9, 0.1));
        assertThat(above).isCloseTo(below, within(1e-6));
    }

    @Test
    void aWiderSpacingThanTheTableGivesInProportion() {
        double atTable = method.coefficient(floor(0.375, 0.045, 0.05));
        assertThat(method.coefficient(floor(0.75, 0.045, 0.05))).isCloseTo(atTable / 2, within(1e-12));
        assertThat(method.coefficient(floor(0.375 + 1e-12, 0.045, 0.05))).isCloseTo(atTable, within(1e-9));
    }

    @Test
    void aSheathOfTheWallsOwnMaterialIsAThickerWall() {
        Pipe thick = new Pipe(0.020, 0.004, 0.35, Optional.empty());
        Pipe sheathed = new Pipe(0.016, 0.002, 0.35, Optional.of(new Sheath(0.020, 0.35)));
        double one = method.coefficient(new ScreedFloor(0.15, 0.045, 1.2, 0.1, thick));
        double two = method.coefficient(new ScreedFloor(0.15, 0.045, 1.2, 0.1, sheathed));
        assertThat(two).isCloseTo(one, within(1e-12));
        assertThat(one).isLessThan(method.coefficient(floor(0.15, 0.045, 0.1)));
    }

    @Test
    void refusesWhatTheTablesDoNotHold() {
        assertThatIllegalArgumentException().isThrownBy(() -> method.coefficient(floor(0.04, 0.045, 0)));
        assertThatIllegalArgumentException().isThrownBy(() -> method.coefficient(floor(0.1, 0.009, 0)));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> method.coefficient(floor(0.1, 0.045, 0.16)))
                .withMessageContaining("0.0 to 0.15");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> method.coefficient(new ScreedFloor(0.1, 0.045, 1.2, 0, Pipe.reference(0.032))));
        assertThatIllegalArgumentException().isThrownBy(() -> new Pipe(0.016, 0.008, 0.35, Optional.empty()));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new Pipe(0.016, 0.002, 0.35, Optional.of(new Sheath(0.016, 0.2))));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> FloorMethods.limitCurves().of(floor(0.4, 0.045, 0)));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> FloorMethods.limitCurves().of(new ScreedFloor(0.375, 0.06, 0.7, 0, PIPE)));
    }

    @ParameterizedTest
    @CsvSource({"0.1, 0.045, 9", "0.15, 0.045, 15", "0.3, 0.065, 7", "0.2, 0.12, 9", "0.05, 0.2, 9"})
    void theLimitLiesOnBothCurvesAndBelowTheEvenFloor(double spacing, double cover, double overtemperature) {
        ScreedFloor floor = floor(spacing, cover, 0.05);
        LimitCurve curve = FloorMethods.limitCurves().of(floor);
        double coefficient = method.coefficient(floor);
        LimitCurve.Limit limit = curve.meets(coefficient, overtemperature);
        assertThat(limit.flux()).isCloseTo(coefficient * limit.waterOvertemperature(), within(1e-9));
        assertThat(curve.flux(limit.waterOvertemperature(), overtemperature)).isCloseTo(limit.flux(), within(1e-9));
        assertThat(limit.flux()).isLessThanOrEqualTo(HeatedFloor.flux(overtemperature) * 1.0001);
    }

    /** K_H of type B by hand at 0.2 m, s_u/lambda_E 0.03, R 0.05, sheet of 1 mm at 200 W/(m·K), a_WL 0.9. */
    @Test
    void typeBAnswersOnlyWithAConductingFactor() {
        ScreedFloor floor = new ScreedFloor(0.2, 0.036, 1.2, 0.05, Pipe.reference(0.016));
        PipesBelowScreed.Factors factors = FloorMethods.pipesBelowScreed().factors(floor, 0.001, 200);
        assertThat(factors.kWL()).isCloseTo((0.2 + 0.5 * 0.036 * 1.2) / 0.125, within(1e-12));
        assertThat(factors.characteristic(OptionalDouble.empty())).isInstanceOf(Characteristic.TableNotKnown.class);

        double aU = (1 / 10.8 + 0.045) / (1 / 10.8 + 0.03);
        double bare = 6.5 * Math.pow(1.097, 1 - 0.2 / 0.075) * aU * 0.9 * 0.92;
        double expected = bare / (1 + bare * 0.05 * (1 + 0.44 * Math.sqrt(0.2)));
        assertThat(factors.characteristic(OptionalDouble.of(0.9)))
                .isInstanceOfSatisfying(
                        Characteristic.Known.class,
                        known -> assertThat(known.coefficient()).isCloseTo(expected, within(1e-12)));
    }

    @Test
    void theZonesOfAFloorAddUp() {
        double occupied = ZoneSplit.occupiedFlux(20, 4, 120, 70);
        assertThat(4 * 120 + 16 * occupied).isCloseTo(20 * 70, within(1e-9));
        assertThat(ZoneSplit.occupiedFlux(20, 0, 120, 70)).isEqualTo(70);
        assertThatIllegalArgumentException().isThrownBy(() -> ZoneSplit.occupiedFlux(20, 20, 120, 70));
    }
}
