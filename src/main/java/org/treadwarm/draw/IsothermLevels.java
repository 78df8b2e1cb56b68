package org.treadwarm.draw;

import java.util.List;
import java.util.stream.LongStream;

/**
 * Round temperatures at which isotherms are drawn.
 *
 * @param step distance of two levels in K
 * @param values the levels in °C, rising; empty if the temperatures hardly differ
 */
record IsothermLevels(double step, List<Double> values) {
    private static final int FEWEST = 6;
    private static final int MOST = 12;
    /** In K; less than this between lowest and highest is no field worth drawing. */
    private static final double LEVEL = 0.05;
    /** Mantissas in tenths; 2.5 only where the others do not give a fitting number of lines. */
    private static final int[] MANTISSAS = {10, 20, 50, 25};

    /** 6 to 12 levels between a lowest and a highest temperature. */
    static IsothermLevels between(double lowest, double highest) {
        if (!(highest - lowest >= LEVEL)) {
            return new IsothermLevels(1, List.of());
        }
        int power = (int) Math.floor(Math.log10((highest - lowest) / MOST));
        for (int mantissa : MANTISSAS) {
            for (int higher = 0; higher < 2; higher++) {
                double step = mantissa * Math.pow(10, power - 1.0 + higher);
                List<Double> values = multiples(step, lowest, highest);
                if (values.size() >= FEWEST && values.size() <= MOST) {
                    return new IsothermLevels(step, values);
                }
            }
        }
        throw new IllegalStateException("No round step between " + lowest + " and " + highest);
    }

    private static List<Double> multiples(double step, double lowest, double highest) {
        long first = (long) Math.floor(lowest / step + 1e-9) + 1;
        long last = (long) Math.ceil(highest / step - 1e-9) - 1;
        return LongStream.rangeClosed(first, last).mapToObj(i -> i * step).toList();
    }

    /** A level with as many decimals as the step needs. */
    String text(double level) {
        int decimals = 0;
        while (decimals < 4
                && Math.abs(Math.rint(step * Math.pow(10, decimals)) / Math.pow(10, decimals) - step) > 1e-9) {
            decimals++;
        }
        return Figures.rounded(level, decimals);
    }
}
