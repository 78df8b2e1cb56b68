package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;

/**
 * How a wall's foot lies on the sheet, in pixels.
 *
 * @param section what is drawn
 * @param scale pixels per m
 * @param left left side
 * @param top upper side
 */
record FootScale(FootSection section, double scale, double left, double top) {
    static FootScale fitting(FootSection section, double left, double top, double width, double height) {
        return new FootScale(section, Math.min(width / section.width(), height / section.height()), left, top);
    }

    Box frame() {
        return new Box(left, top, section.width() * scale, section.height() * scale);
    }

    /** The wall's inner face. */
    double inner() {
        return left + section.inward() * scale;
    }

    /** The wall's outer face. */
    double outer() {
        return inner() + section.wallThickness() * scale;
    }

    /** The heated plane. */
    double plane() {
        return top + section.upward() * scale;
    }

    /** The ground outside. */
    double ground() {
        return plane() + section.heatedPlane() * scale;
    }

    /** The finished surface of the floor. */
    double surface() {
        return plane() - section.above() * scale;
    }

    /** The foundation's underside, or where the drawing ends. */
    double footing() {
        return Math.min(frame().bottom(), ground() + section.foundation() * scale);
    }

    Box inside() {
        return Box.between(new Point(left, top), new Point(inner(), plane()));
    }

    Box outside() {
        return Box.between(new Point(outer(), top), new Point(frame().right(), ground()));
    }

    Box wall() {
        return Box.between(new Point(inner(), top), new Point(outer(), plane()));
    }

    Box foundation() {
        return Box.between(new Point(inner(), plane()), new Point(outer(), footing()));
    }

    /** Ground under the floor and outside, as two boxes beside the foundation and one below it. */
    List<Box> soil() {
        Point corner = new Point(frame().right(), frame().bottom());
        return List.of(
                Box.between(new Point(left, plane()), new Point(inner(), footing())),
                Box.between(new Point(outer(), ground()), new Point(corner.x(), footing())),
                Box.between(new Point(left, footing()), corner));
    }

    List<LayerSpan> slab() {
        List<LayerSpan> spans = new ArrayList<>();
        double start = plane();
        for (Layer layer : section.slab()) {
            double end = start + layer.thickness().orElseThrow() * scale;
            spans.add(new LayerSpan(layer, start, end, LayerSpan.Drawn.TO_SCALE));
            start = end;
        }
        return spans;
    }

    List<Box> edge() {
        return section.edge().stream()
                .map(strip -> Box.between(
                        new Point(inner() - strip.layer().thickness().orElseThrow() * scale, plane()),
                        new Point(inner(), Math.min(frame().bottom(), plane() + strip.depth() * scale))))
                .toList();
    }

    double[] columns() {
        double[] columns = new double[section.field().columns()];
        for (int i = 0; i < columns.length; i++) {
            columns[i] = left + section.field().x(i) * scale;
        }
        return columns;
    }

    double[] rows() {
        double[] rows = new double[section.field().rows()];
        for (int i = 0; i < rows.length; i++) {
            rows[i] = top + section.field().y(i) * scale;
        }
        return rows;
    }

    double[][] values() {
        double[][] values = new double[section.field().rows()][section.field().columns()];
        for (int row = 0; row < values.length; row++) {
            for (int column = 0; column < values[row].length; column++) {
                values[row][column] = section.field().at(row, column);
            }
        }
        return values;
    }
}
