package org.treadwarm.draw;

import java.util.List;
import java.util.stream.LongStream;

/**
 * Rounded steps of an axis that contain a range.
 *
 * @param first number of the first tick, counted in steps from zero
 * @param last number of the last tick, counted in steps from zero
 * @param step distance of two ticks: 1, 2 or 5 times a power of ten
 */
record Ticks(long first, long last, double step) {
    /** Ticks from at or below the lowest to at or above the highest value, with at most so many steps and two more. */
    static Ticks around(double lowest, double highest, int steps) {
        double span = Math.max(highest - lowest, 1e-3);
        double step = roundedUp(span / steps);
        long first = (long) Math.floor(lowest / step + 1e-9);
        long last = (long) Math.ceil(highest / step - 1e-9);
        return new Ticks(first, Math.max(last, first + 1), step);
    }

    private static double roundedUp(double raw) {
        double power = Math.pow(10, Math.floor(Math.log10(raw)));
        double mantissa = raw / power;
        double rounded = mantissa <= 1 ? 1 : mantissa <= 2 ? 2 : mantissa <= 5 ? 5 : 10;
        return rounded * power;
    }

    List<Double> values() {
        return LongStream.rangeClosed(first, last).mapToObj(i -> i * step).toList();
    }

    double lowest() {
        return first * step;
    }

    double highest() {
        return last * step;
    }

    /** The tick's number with as many decimals as the step needs. */
    String text(double value) {
        int decimals = (int) Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
        return Figures.rounded(value, decimals);
    }
}
