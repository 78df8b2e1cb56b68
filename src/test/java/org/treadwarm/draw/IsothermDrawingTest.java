package org.treadwarm.draw;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalDouble;
import java.util.Random;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class IsothermDrawingTest {
    @Test
    void namesSurfaceHeaterAndWhereHeatGoes() {
        assertThat(words(Sheet.wide("i"), SectionSamples.cable()))
                .contains("highest\n28.7 °C", "mean\n28.5 °C", "lowest\n28.3 °C", "limit\n31.0 °C")
                .contains("cable 6 mm\naxis at 40 mm", "spacing 150 mm", "heat up\n70.0 W/m²", "heat down\n11.8 W/m²")
                .contains("Lines of equal temperature every 1 K, from 24 to 32 °C.", "beneath: ground, 9.0 °C");
    }

    @Test
    void everyIsothermIsNumberedOnceOrSaidToHaveNoRoom() {
        for (Sheet sheet : List.of(Sheet.wide("i"), Sheet.narrow("i"))) {
            String words = words(sheet, SectionSamples.cable());
            for (int degrees = 24; degrees <= 31; degrees++) {
                assertThat(words.lines().filter((degrees + " °C")::equals).count()
                                + words.lines()
                                        .filter(Integer.toString(degrees)::equals)
                                        .count())
                        .as(degrees + " °C on " + sheet)
                        // The axis of the surface's chart has 28 and 30 too.
                        .isEqualTo(degrees == 28 || degrees == 30 ? 2 : 1);
            }
            assertThat(words).contains("No room for a number at: 32 °C.");
        }
    }

    @Test
    void drawsAFloorAtOneTemperatureWithoutALimit() {
        IsothermSection cable = SectionSamples.cable();
        TemperatureField even = new TemperatureField(
                new double[] {0, 0.075}, new double[] {0.01, 0.1}, new double[][] {{20, 20}, {20, 20}});
        String words = words(
                Sheet.wide("i"),
                new IsothermSection(
                        cable.name(),
                        cable.room(),
                        cable.layers(),
                        cable.heater(),
                        cable.spacing(),
                        even,
                        new SurfaceProfile(List.of(20.0, 20.0), 20, 20, 20, OptionalDouble.empty()),
                        cable.beneath(),
                        0,
                        0));
        assertThat(words)
                .contains("No isotherms: the temperatures hardly differ.", "mean\n20.0 °C")
                .doesNotContain("limit");
    }

    @Test
    void halfAndWholeWindowsAreDrawnAlike() {
        IsothermSection half = SectionSamples.pipe();
        IsothermSection whole =
                SectionSamples.section(half.name(), half.layers(), half.heater(), half.spacing(), half.spacing(), 55);
        assertThat(half.window()).isEqualTo(0.1);
        assertThat(whole.window()).isEqualTo(0.2);
        double[][] one = field(half).temperatures();
        double[][] other = field(whole).temperatures();
        for (int row = 0; row < one.length; row++) {
            assertThat(other[row]).containsExactly(one[row], within(1e-9));
        }
        assertThat(field(whole).columns()).containsExactly(field(half).columns(), within(1e-6));
    }

    @Test
    void mirrorsTheFieldAboutEachAxis() {
        MirroredField field = field(SectionSamples.pipe());
        double[] columns = field.columns();
        double[] surface = field.surface();
        for (int i = 0; i < columns.length; i++) {
            int mirrored = columns.length - 1 - i;
            assertThat(columns[i] + columns[mirrored]).isCloseTo(2 * 210, within(1e-9));
            assertThat(surface[i]).isEqualTo(surface[mirrored]);
        }
        assertThat(surface[columns.length / 2])
                .isEqualTo(SectionSamples.pipe().surface().highest());
    }

    @Test
    void drawsBandsForLayersKnownByTheirResistance() {
        SectionScale scale = SectionScale.fitting(SectionSamples.cable(), 10, 240, 175);
        assertThat(scale.scale()).isCloseTo(1000, within(1e-9));
        assertThat(scale.down(0, 0.05, false, false)).isCloseTo(50, within(1e-9));
        assertThat(scale.down(0, 0.075, true, false)).isCloseTo(75, within(1e-9));
        assertThat(scale.down(0, 0.075, false, true)).isCloseTo(89, within(1e-9));
        assertThat(scale.down(0, 0.175, false, false)).isCloseTo(scale.height(), within(1e-9));
    }

    @Test
    void seesThreeHeatersWhereOneWouldLeaveTheSheetEmpty() {
        assertThat(SectionScale.fitting(SectionSamples.cable(), 10, 240, 175).axes())
                .hasSize(1);
        SectionScale wide = SectionScale.fitting(SectionSamples.cable(), 10, 400, 175);
        assertThat(wide.axes()).hasSize(3);
        assertThat(wide.axes().get(1)).isCloseTo(wide.middle(), within(1e-9));
        assertThat(wide.width()).isCloseTo(400, within(1e-9));
    }

    @Test
    void choosesSixToTwelveRoundLevels() {
        Random random = new Random(7);
        for (int i = 0; i < 2000; i++) {
            double lowest = random.nextDouble() * 60 - 20;
            double highest = lowest + Math.pow(10, random.nextDouble() * 3 - 1);
            IsothermLevels levels = IsothermLevels.between(lowest, highest);
            assertThat(levels.values())
                    .hasSizeBetween(6, 12)
                    .allSatisfy(level -> assertThat(level).isGreaterThan(lowest).isLessThan(highest));
        }
        assertThat(IsothermLevels.between(20, 33.5).values()).containsExactly(22.0, 24.0, 26.0, 28.0, 30.0, 32.0);
        IsothermLevels between = IsothermLevels.between(0, 26.5);
        assertThat(between.text(between.step())).isEqualTo("2.5");
        assertThat(IsothermLevels.between(20, 20.01).values()).isEmpty();
    }

    @ParameterizedTest
    @MethodSource("org.treadwarm.draw.DrawingsTest#cases")
    void sectionsAreLegible(DrawingsTest.Case one) {
        Random random = one.random();
        List<Layer> layers = DrawingsTest.layers(random, 1).stream()
                .filter(layer -> layer.thickness().orElse(1) < 0.4)
                .toList();
        double depth = layers.stream()
                .mapToDouble(layer -> layer.thickness().orElse(0))
                .sum();
        if (depth < 0.001) {
            return;
        }
        double spacing = 0.05 + random.nextDouble() * 0.3;
        HeaterCut heater = new HeaterCut(
                DrawingsTest.name(random),
                depth * (0.05 + 0.9 * random.nextDouble()),
                spacing * 0.15 * random.nextDouble() + 1e-4);
        double window = random.nextBoolean() ? spacing : spacing / 2;
        double flux = random.nextDouble() * 200;
        words(one.sheet(), SectionSamples.section(DrawingsTest.name(random), layers, heater, spacing, window, flux));
    }

    @Test
    void refusesWhatDoesNotGoTogether() {
        double[] two = {0, 0.1};
        double[][] field = {{20, 21}, {22, 23}};
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new TemperatureField(new double[] {0.1, 0.1}, two, field))
                .withMessageContaining("must rise");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new TemperatureField(new double[] {0, 0.1, 0.2}, two, field))
                .withMessageContaining("3 columns");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new TemperatureField(two, two, new double[][] {{20, 5000}, {22, 23}}));
        assertThatIllegalArgumentException().isThrownBy(() -> new HeaterCut("cable", 0, 0.006));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new SurfaceProfile(List.of(20.0), 20, 21, 19, OptionalDouble.empty()));
        IsothermSection cable = SectionSamples.cable();
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new IsothermSection(
                        cable.name(),
                        cable.room(),
                        cable.layers(),
                        cable.heater(),
                        0.1,
                        cable.field(),
                        cable.surface(),
                        cable.beneath(),
                        70,
                        10))
                .withMessageContaining("Last column");
    }

    private static MirroredField field(IsothermSection section) {
        return new MirroredField(new SectionScale(section, 3, 700, 0));
    }

    private static String words(Sheet sheet, IsothermSection section) {
        return DrawingCheck.read(IsothermDrawing.draw(sheet, section)).holds().words();
    }
}
