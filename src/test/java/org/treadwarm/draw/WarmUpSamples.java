package org.treadwarm.draw;

import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.IntStream;

/** Invented warm-ups and a power cut: exponentials that set out from one temperature. */
final class WarmUpSamples {
    private WarmUpSamples() {}

    static WarmUpCurve warmUp() {
        return curve(12, 24.5, OptionalDouble.of(8.0 / 3));
    }

    static WarmUpCurve tooWeak() {
        return curve(12, 18.8, OptionalDouble.empty());
    }

    private static WarmUpCurve curve(double end, double air, OptionalDouble reached) {
        List<Double> hours = hours(end);
        return new WarmUpCurve(
                WarmUpCurve.Event.WARM_UP,
                "Bathroom, Mill Lane",
                hours,
                List.of(
                        trace(Trace.Place.SURFACE, hours, 14, 29, 1.8),
                        trace(Trace.Place.AIR, hours, 14, air, 3.05),
                        trace(Trace.Place.HEATER, hours, 14, 36, 1.1)),
                List.of(new Threshold("setpoint", 20, Trace.Place.AIR, reached)));
    }

    /** Falls from 21 °C towards -5 °C with a time constant of 24 h: 23 h to +5 °C, 39.6 h to 0 °C. */
    static WarmUpCurve powerCut() {
        List<Double> hours = hours(44);
        return new WarmUpCurve(
                WarmUpCurve.Event.POWER_CUT,
                "Bathroom, Mill Lane",
                hours,
                List.of(trace(Trace.Place.SURFACE, hours, 27, -4, 20), trace(Trace.Place.AIR, hours, 21, -5, 24)),
                List.of(
                        new Threshold("cold", 5, Trace.Place.AIR, OptionalDouble.of(24 * Math.log(2.6))),
                        new Threshold("frost", 0, Trace.Place.AIR, OptionalDouble.of(24 * Math.log(5.2)))));
    }

    static List<Double> hours(double end) {
        return IntStream.rangeClosed(0, 120).mapToObj(i -> end * i / 120).toList();
    }

    static Trace trace(Trace.Place place, List<Double> hours, double from, double to, double constant) {
        return new Trace(
                place,
                hours.stream()
                        .map(hour -> to + (from - to) * Math.exp(-hour / constant))
                        .toList());
    }
}
