package org.treadwarm.draw;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.OptionalDouble;
import java.util.Random;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class WarmUpDrawingTest {
    @Test
    void namesItsLinesAtTheirEndsAndMarksTheMoment() {
        assertThat(words(Sheet.wide("w"), WarmUpSamples.warmUp()))
                .contains("heater plane\n36.0 °C", "floor surface\n29.0 °C", "air\n24.3 °C", "setpoint\n20.0 °C")
                .contains("reached after\n2 h 40 min");
    }

    @Test
    void tellsItsLinesApartWithoutColour() {
        assertThat(WarmUpDrawing.draw(Sheet.wide("w"), WarmUpSamples.warmUp()))
                .contains("stroke-width=\"2\" stroke-dasharray=\"9 5\"", "stroke-width=\"2\" stroke-dasharray=\"2 4\"")
                .contains("stroke-width=\"2\"/>");
    }

    @Test
    void saysHowNearItComesIfItIsNotReached() {
        assertThat(words(Sheet.wide("w"), WarmUpSamples.tooWeak()))
                .contains("setpoint 20.0 °C: not reached within 12 h: 18.7 °C")
                .doesNotContain("reached after");
    }

    @Test
    void marksHowFarACutPowerLetsItFall() {
        assertThat(words(Sheet.narrow("w"), WarmUpSamples.powerCut()))
                .contains("Power cut: Bathroom", "5.0 °C after\n22 h 56 min", "0.0 °C after\n39 h 34 min")
                .contains("hours after the power is cut");
    }

    @Test
    void writesHoursAndMinutes() {
        assertThat(Figures.duration(8.0 / 3)).isEqualTo("2\u00a0h\u00a040\u00a0min");
        assertThat(Figures.duration(0.999)).isEqualTo("1\u00a0h");
        assertThat(Figures.duration(0.25)).isEqualTo("15\u00a0min");
        assertThat(Figures.duration(60.4)).isEqualTo("60\u00a0h");
    }

    @ParameterizedTest
    @MethodSource("org.treadwarm.draw.DrawingsTest#cases")
    void curvesAreLegible(DrawingsTest.Case one) {
        Random random = one.random();
        double end = Math.pow(10, random.nextDouble() * 3 - 0.5);
        List<Double> hours = WarmUpSamples.hours(end);
        List<Trace.Place> places = new ArrayList<>(List.of(Trace.Place.values()));
        Collections.shuffle(places, random);
        List<Trace> traces = IntStream.rangeClosed(0, random.nextInt(3))
                .mapToObj(i -> WarmUpSamples.trace(
                        places.get(i), hours, degrees(random), degrees(random), end * (0.05 + random.nextDouble())))
                .toList();
        List<Threshold> thresholds = IntStream.range(0, random.nextInt(4))
                .mapToObj(i -> new Threshold(
                        DrawingsTest.name(random),
                        degrees(random),
                        places.get(0),
                        random.nextInt(4) == 0 ? OptionalDouble.empty() : OptionalDouble.of(end * random.nextDouble())))
                .toList();
        WarmUpCurve.Event event = WarmUpCurve.Event.values()[random.nextInt(2)];
        words(one.sheet(), new WarmUpCurve(event, DrawingsTest.name(random), hours, traces, thresholds));
    }

    @Test
    void refusesWhatDoesNotGoTogether() {
        List<Double> hours = List.of(0.0, 1.0);
        Trace air = new Trace(Trace.Place.AIR, List.of(10.0, 12.0));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> curve(List.of(0.0, 0.0), List.of(air), List.of()))
                .withMessageContaining("must rise");
        assertThatIllegalArgumentException().isThrownBy(() -> curve(List.of(1.0, 2.0), List.of(air), List.of()));
        assertThatIllegalArgumentException().isThrownBy(() -> curve(hours, List.of(air, air), List.of()));
        assertThatIllegalArgumentException().isThrownBy(() -> curve(hours, List.of(), List.of()));
        Threshold late = new Threshold("setpoint", 20, Trace.Place.AIR, OptionalDouble.of(1.5));
        assertThatIllegalArgumentException().isThrownBy(() -> curve(hours, List.of(air), List.of(late)));
        Threshold other = new Threshold("setpoint", 20, Trace.Place.SURFACE, OptionalDouble.empty());
        assertThatIllegalArgumentException()
                .isThrownBy(() -> curve(hours, List.of(air), List.of(other)))
                .withMessageContaining("No line is drawn");
    }

    private static WarmUpCurve curve(List<Double> hours, List<Trace> traces, List<Threshold> thresholds) {
        return new WarmUpCurve(WarmUpCurve.Event.WARM_UP, "Hall", hours, traces, thresholds);
    }

    private static double degrees(Random random) {
        return random.nextDouble() * 45 - 10;
    }

    private static String words(Sheet sheet, WarmUpCurve curve) {
        return DrawingCheck.read(WarmUpDrawing.draw(sheet, curve)).holds().words();
    }
}
