package org.treadwarm.physics.section;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.physics.floor.HeatedFloor;
import org.treadwarm.physics.section.Condition.BasicCharacteristic;
import org.treadwarm.physics.section.Condition.Film;
import org.treadwarm.physics.section.FloorHeater.HeatingCable;
import org.treadwarm.physics.section.FloorHeater.WaterPipe;
import org.treadwarm.physics.section.FloorLayer.Resisting;
import org.treadwarm.physics.section.FloorLayer.Solid;

/** Heated floors: what any section must show. The published numbers are among the checks. */
class FloorSectionTest {
    @ParameterizedTest
    @ValueSource(doubles = {0.05, 0.15, 0.3})
    void whatGoesInComesOut(double spacing) {
        for (FloorSection floor : List.of(Floors.wet(spacing, 0.1), Floors.electric(spacing, 0.006, 0, 120))) {
            FloorTemperatures got = floor.solve();
            assertThat(got.upwardFlux() + got.downwardFlux())
                    .isCloseTo(got.heatInput(), within(1e-10 * got.heatInput()));
            assertThat(got.surfaceMean()).isCloseTo(20 + got.upwardFlux() / 10.8, within(1e-9));
            assertThat(got.accuracy().relativeError()).isLessThanOrEqualTo(FloorSection.ERROR_GOAL);
            assertThat(got.accuracy().residual()).isLessThan(1e-10);
        }
    }

    @Test
    void closeCablesHeatLikeAPlane() {
        FloorTemperatures got = Floors.electric(0.005, 0.002, 0.05, 120).solve();
        double up = 1 / 10.8 + 0.05 + 0.03 / 1.2;
        double down = 0.02 / 1.2 + 0.05 / 0.04 + 0.17;
        double plane = (120 + 20 / up + 10 / down) / (1 / up + 1 / down);
        assertThat(got.upwardFlux()).isCloseTo((plane - 20) / up, within(0.01 * got.upwardFlux()));
        assertThat(got.surfaceMaximum() - got.surfaceMinimum()).isLessThan(0.001);
        assertThat(got.heaterTemperature() - 20).isCloseTo(plane - 20, within(0.01 * (plane - 20)));
    }

    @Test
    void aThickCoveringEvensTheSurface() {
        double last = Double.MAX_VALUE;
        for (double covering : new double[] {0, 0.05, 0.1, 0.15}) {
            FloorTemperatures got = Floors.wet(0.3, covering).solve();
            double unevenness = (got.surfaceMaximum() - got.surfaceMinimum()) / (got.surfaceMean() - 20);
            assertThat(unevenness).isBetween(0.01, last);
            last = unevenness;
        }
    }

    @Test
    void facesGetWarmerTowardsTheHeater() {
        FloorTemperatures got = Floors.wet(0.2, 0.1).solve();
        assertThat(got.warmFaces()).hasSize(3);
        assertThat(got.warmFaces().get(0)).isBetween(got.surfaceMaximum(), got.heaterTemperature());
        assertThat(got.warmFaces().get(1)).isEqualTo(got.heaterTemperature());
        assertThat(got.warmFaces().get(2)).isBetween(got.heaterTemperature(), 40.0);
        // In the covering heat flows straight up, through the film as through the covering.
        double atHeater = got.surfaceMaximum() + (got.surfaceMaximum() - 20) * 10.8 * 0.1;
        assertThat(got.warmFaces().get(0)).isCloseTo(atHeater, within(1e-9));
    }

    @ParameterizedTest
    @CsvSource({"0.1, 0", "0.2, 0.1", "0.3, 0.05"})
    void theBasicCharacteristicTakenLocallyIsCloseToThatOfTheMean(double spacing, double covering) {
        FloorSection floor = Floors.with(Floors.wet(spacing, covering), new BasicCharacteristic(20));
        FloorTemperatures got = floor.solve();
        double ofMean = HeatedFloor.flux(got.surfaceMean() - 20);
        assertThat(got.upwardFlux()).isCloseTo(ofMean, within(0.01 * ofMean)).isGreaterThan(ofMean * (1 - 1e-9));
    }

    @Test
    void bothSubjectsKnowTheSameBasicCharacteristic() {
        for (double over : new double[] {0.01, 1, 9, 20}) {
            double flux = BasicCharacteristic.coefficient(over) * over;
            assertThat(flux).isCloseTo(HeatedFloor.flux(over), within(1e-12 * flux));
            assertThat(BasicCharacteristic.overtemperature(flux)).isCloseTo(over, within(1e-12));
        }
    }

    @Test
    void theMapShowsTheField() {
        FloorTemperatures got = Floors.wet(0.2, 0).solve();
        TemperatureMap map = got.map(21, 31);
        assertThat(map.x()[20]).isEqualTo(0.1);
        assertThat(map.y()[30]).isCloseTo(0.095, within(1e-15));
        assertThat(map.temperature()[30][0]).isCloseTo(got.surfaceMaximum(), within(0.01));
        assertThat(map.temperature()[30][20]).isCloseTo(got.surfaceMinimum(), within(0.01));
        // The axis lies 0.04 m high, in the water.
        assertThat(got.field().temperature(0, 0.04)).isEqualTo(40);
    }

    @Test
    void saysWhatIsWrongWithAGeometry() {
        List<FloorLayer> layers = List.of(new Resisting("carpet", 0.1), new Solid("screed", 0.05, 1.2));
        refused(0.1, layers, new HeatingCable(0, 0.01, 0.006, 10), "carpet has no thickness");
        refused(0.1, layers, new HeatingCable(2, 0.01, 0.006, 10), "the layers are 0 to 1");
        refused(0.1, layers, new HeatingCable(1, 0.002, 0.006, 10), "does not lie within screed");
        refused(0.1, layers, new HeatingCable(1, 0.049, 0.006, 10), "does not lie within screed");
        refused(0.005, layers, new HeatingCable(1, 0.02, 0.006, 10), "cannot lie every 0.005 m");
        refused(0, layers, new HeatingCable(1, 0.02, 0.006, 10), "spacing");
        assertThatThrownBy(() -> new WaterPipe(1, 0.02, 0.016, 0.008, 0.35, 2000, 40))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("does not fit");
        assertThatThrownBy(() -> new Solid("screed", 0.05, 0))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining("conductivity of screed");
    }

    private static void refused(double spacing, List<FloorLayer> layers, FloorHeater heater, String why) {
        assertThatThrownBy(() -> new FloorSection(spacing, layers, heater, new Film(20, 10.8), new Film(20, 6)))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessageContaining(why);
    }
}
