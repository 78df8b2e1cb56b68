package org.treadwarm.draw;

import java.util.Arrays;
import java.util.TreeSet;

/** A temperature field mirrored over all the spacings that are seen, in pixels. */
final class MirroredField {
    private final TemperatureField field;
    private final SectionScale scale;
    private final double window;
    private final double[] places;

    MirroredField(SectionScale scale) {
        this.scale = scale;
        this.field = scale.section().field();
        this.window = scale.section().window();
        this.places = places();
    }

    /** Places of the columns in m from the axis of the middle heater, ends included. */
    private double[] places() {
        double end = scale.spacings() * scale.section().spacing() / 2;
        TreeSet<Double> sorted = new TreeSet<>();
        for (int image = 0; image * window < end; image++) {
            for (int column = 0; column < field.columns(); column++) {
                double x = image % 2 == 0 ? field.x(column) : window - field.x(column);
                sorted.add(image * window + x);
            }
        }
        double[] right = sorted.headSet(end * (1 - 1e-9)).stream()
                .mapToDouble(Double::doubleValue)
                .filter(place -> place > end * 1e-9)
                .toArray();
        int count = right.length;
        double[] all = new double[2 * count + 3];
        all[0] = -end;
        all[all.length - 1] = end;
        for (int i = 0; i < count; i++) {
            all[count - i] = -right[i];
            all[count + 2 + i] = right[i];
        }
        return all;
    }

    double[] columns() {
        return Arrays.stream(places)
                .map(x -> scale.middle() + x * scale.scale())
                .toArray();
    }

    /** The surface first, unless the field has it, then the rows of the field. */
    double[] rows(double top) {
        double[] rows = new double[field.rows() + first()];
        rows[0] = top;
        for (int row = 0; row < field.rows(); row++) {
            rows[row + first()] = scale.down(top, field.y(row), field.upperOfTwo(row), field.lowerOfTwo(row));
        }
        return rows;
    }

    double[][] temperatures() {
        double[][] all = new double[field.rows() + first()][];
        all[0] = surface();
        for (int row = 0; row < field.rows(); row++) {
            double[] given = new double[field.columns()];
            for (int column = 0; column < given.length; column++) {
                given[column] = field.at(row, column);
            }
            all[row + first()] = mirrored(given);
        }
        return all;
    }

    double[] surface() {
        return mirrored(scale.section().surface().temperatures().stream()
                .mapToDouble(Double::doubleValue)
                .toArray());
    }

    private int first() {
        return field.y(0) > 0 ? 1 : 0;
    }

    private double[] mirrored(double[] values) {
        return Arrays.stream(places).map(place -> at(values, place)).toArray();
    }

    /** Linear between the columns, level before the first and behind the last, as a plane of symmetry has it. */
    private double at(double[] values, double place) {
        double along = Math.abs(place) % (2 * window);
        double x = along > window ? 2 * window - along : along;
        int behind = 0;
        while (behind < values.length && field.x(behind) < x) {
            behind++;
        }
        if (behind == 0 || behind == values.length) {
            return values[Math.min(behind, values.length - 1)];
        }
        double share = (x - field.x(behind - 1)) / (field.x(behind) - field.x(behind - 1));
        // A column met but for rounding keeps its own value, so that a pipe is not widened by one column.
        if (share < 1e-6 || share > 1 - 1e-6) {
            return values[share < 0.5 ? behind - 1 : behind];
        }
        return values[behind - 1] + share * (values[behind] - values[behind - 1]);
    }
}
