package org.treadwarm.physics;

import java.util.Arrays;
import java.util.Collection;
import java.util.Map;
import java.util.TreeMap;

/** A function known at some arguments, taken as straight between neighbours and as unknown outside. */
public final class LinearTable {
    private final String name;
    private final double[] arguments;
    private final double[] values;

    private LinearTable(String name, double[] arguments, double[] values) {
        this.name = name;
        this.arguments = arguments;
        this.values = values;
    }

    /**
     * A table from its values by their arguments.
     *
     * @param name what the argument is, as an error shall call it
     * @throws IllegalArgumentException when there is no value, or one that is no finite number
     */
    public static LinearTable of(String name, Map<Double, Double> values) {
        TreeMap<Double, Double> sorted = new TreeMap<>(values);
        double[] arguments = numbers(sorted.keySet());
        double[] results = numbers(sorted.values());
        if (arguments.length == 0
                || !Arrays.stream(arguments).allMatch(Double::isFinite)
                || !Arrays.stream(results).allMatch(Double::isFinite)) {
            throw new IllegalArgumentException("a table over the " + name + " needs finite numbers, not " + values);
        }
        return new LinearTable(name, arguments, results);
    }

    private static double[] numbers(Collection<Double> boxed) {
        return boxed.stream().mapToDouble(Double::doubleValue).toArray();
    }

    /** The smallest argument. */
    public double first() {
        return arguments[0];
    }

    /** The largest argument. */
    public double last() {
        return arguments[arguments.length - 1];
    }

    /**
     * The value at an argument.
     *
     * @throws IllegalArgumentException outside the table
     */
    public double at(double argument) {
        if (!(argument >= first() && argument <= last())) {
            throw new IllegalArgumentException(
                    "the " + name + " is " + argument + ", allowed is " + first() + " to " + last());
        }
        int found = Arrays.binarySearch(arguments, argument);
        if (found >= 0) {
            return values[found];
        }
        int above = -found - 1;
        double share = (argument - arguments[above - 1]) / (arguments[above] - arguments[above - 1]);
        return values[above - 1] + share * (values[above] - values[above - 1]);
    }
}
