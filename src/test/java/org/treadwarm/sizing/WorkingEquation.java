package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.TreeSet;
import java.util.function.DoubleBinaryOperator;
import java.util.function.DoubleUnaryOperator;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.DoubleStream;

/**
 * Both sides of an equation of the formula language, for given values of its symbols. Every value is a list of numbers;
 * arithmetic on a list and one number uses the one number throughout.
 */
final class WorkingEquation {
    private static final Pattern TOKEN =
            Pattern.compile("\\s*(?:(\\d+(?:\\.\\d+)?(?:e[+-]?\\d+)?)|([A-Za-z]\\w*#?)|(.))");

    private final List<String> tokens = new ArrayList<>();
    private final Map<String, double[]> values;
    private final Set<String> used = new TreeSet<>();
    private int next;

    /** The two sides, and the symbols that were read. */
    record Sides(double left, double right, Set<String> used) {
        /** Whether they agree to 1e-9, relative and absolute. */
        boolean agree() {
            return left == right || Math.abs(left - right) <= 1e-9 + 1e-9 * Math.max(Math.abs(left), Math.abs(right));
        }
    }

    private WorkingEquation(String text, Map<String, double[]> values) {
        this.values = values;
        Matcher matcher = TOKEN.matcher(text.strip());
        while (matcher.lookingAt()) {
            tokens.add(matcher.group().strip());
            matcher.region(matcher.end(), matcher.regionEnd());
        }
    }

    /** Computes both sides; IllegalArgumentException for a text that is no equation or has an unknown symbol. */
    static Sides sides(String text, Map<String, double[]> values) {
        WorkingEquation equation = new WorkingEquation(text, values);
        double left = one(equation.sum());
        equation.expect("=");
        double right = one(equation.sum());
        if (equation.next < equation.tokens.size()) {
            throw new IllegalArgumentException("unexpected " + equation.peek() + " in " + text);
        }
        return new Sides(left, right, equation.used);
    }

    private String peek() {
        return next < tokens.size() ? tokens.get(next) : "the end";
    }

    private boolean take(String token) {
        boolean there = peek().equals(token);
        next += there ? 1 : 0;
        return there;
    }

    private void expect(String token) {
        if (!take(token)) {
            throw new IllegalArgumentException("expected " + token + ", got " + peek());
        }
    }

    private double[] sum() {
        double[] value = product();
        while (true) {
            if (take("+")) {
                value = each(value, product(), Double::sum);
            } else if (take("-")) {
                value = each(value, product(), (a, b) -> a - b);
            } else {
                return value;
            }
        }
    }

    private double[] product() {
        double[] value = signed();
        while (true) {
            if (take("*")) {
                value = each(value, signed(), (a, b) -> a * b);
            } else if (take("/")) {
                value = each(value, signed(), (a, b) -> a / b);
            } else {
                return value;
            }
        }
    }

    private double[] signed() {
        return take("-") ? each(signed(), a -> -a) : power();
    }

    private double[] power() {
        double[] base = atom();
        return take("^") ? each(base, signed(), Math::pow) : base;
    }

    private double[] atom() {
        if (take("(")) {
            double[] inner = sum();
            expect(")");
            return inner;
        }
        String token = peek();
        next++;
        if (Character.isDigit(token.charAt(0))) {
            return new double[] {Double.parseDouble(token)};
        }
        if (take("(")) {
            return function(token);
        }
        if (token.equals("pi")) {
            return new double[] {Math.PI};
        }
        return symbol(token);
    }

    private double[] symbol(String name) {
        double[] value = values.get(name);
        if (value == null) {
            throw new IllegalArgumentException("unknown symbol " + name);
        }
        used.add(name);
        return value;
    }

    private double[] function(String name) {
        if (name.equals("paths")) {
            return paths();
        }
        if (name.equals("imbalance")) {
            return imbalance();
        }
        double[] first = sum();
        double[] value = take(";") ? pair(name, first, sum()) : alone(name, first);
        expect(")");
        return value;
    }

    private static double[] pair(String name, double[] first, double[] second) {
        if (!name.equals("max")) {
            throw new IllegalArgumentException(name + " of two");
        }
        return each(first, second, Math::max);
    }

    private static double[] alone(String name, double[] value) {
        return switch (name) {
            case "sum" -> new double[] {DoubleStream.of(value).sum()};
            case "count" -> new double[] {value.length};
            case "min" -> new double[] {DoubleStream.of(value).min().orElseThrow()};
            case "max" -> new double[] {DoubleStream.of(value).max().orElseThrow()};
            case "ln" -> each(value, Math::log);
            case "exp" -> each(value, Math::exp);
            // A number read off a solved field is what it is; SectionSizingTest holds it to a solution of its own.
            case "solved" -> value;
            default -> throw new IllegalArgumentException("unknown function " + name);
        };
    }

    /** Goes through the combinations of frames from the last frame to the first. */
    private double[] paths() {
        double common = one(sum());
        List<String> rows = new ArrayList<>();
        while (take(";")) {
            rows.add(row());
        }
        expect(")");
        if (rows.size() != 3) {
            throw new IllegalArgumentException("paths takes shares, layers and framing");
        }
        return new double[] {paths(common, rows, length(rows.get(0)))};
    }

    private double paths(double resistance, List<String> rows, int frame) {
        if (frame == 0) {
            return 1 / resistance;
        }
        double share = one(symbol(rows.get(0) + frame));
        double beside = DoubleStream.of(symbol(rows.get(1) + frame)).sum();
        double along = DoubleStream.of(symbol(rows.get(2) + frame)).sum();
        return (1 - share) * paths(resistance + beside, rows, frame - 1)
                + share * paths(resistance + along, rows, frame - 1);
    }

    private double[] imbalance() {
        String row = row();
        expect(")");
        double worst = 0;
        for (int i = 1; i <= length(row); i++) {
            worst = Math.max(worst, Math.abs(DoubleStream.of(symbol(row + i)).sum()));
        }
        return new double[] {worst};
    }

    private String row() {
        String token = peek();
        next++;
        if (!token.endsWith("#")) {
            throw new IllegalArgumentException("expected a row of symbols, got " + token);
        }
        return token.substring(0, token.length() - 1);
    }

    private int length(String row) {
        int length = 0;
        while (values.containsKey(row + (length + 1))) {
            length++;
        }
        return length;
    }

    private static double one(double[] value) {
        if (value.length != 1) {
            throw new IllegalArgumentException(value.length + " numbers where one belongs");
        }
        return value[0];
    }

    private static double[] each(double[] value, DoubleUnaryOperator operator) {
        return DoubleStream.of(value).map(operator).toArray();
    }

    private static double[] each(double[] left, double[] right, DoubleBinaryOperator operator) {
        if (left.length != right.length && left.length != 1 && right.length != 1) {
            throw new IllegalArgumentException(left.length + " numbers against " + right.length);
        }
        int length = left.length == 1 ? right.length : left.length;
        double[] result = new double[length];
        for (int i = 0; i < length; i++) {
            result[i] = operator.applyAsDouble(left[left.length == 1 ? 0 : i], right[right.length == 1 ? 0 : i]);
        }
        return result;
    }
}
