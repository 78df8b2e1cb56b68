package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;

/**
 * Lettering of one or more lines that belongs to one thing in the drawing.
 *
 * @param lines the lines from the top
 */
record Label(List<Line> lines) {
    /** One line and how it is set; the anchor of the style is the label's affair. */
    record Line(String text, TextStyle style) {}

    Label {
        lines = List.copyOf(lines);
    }

    static Label empty() {
        return new Label(List.of());
    }

    /** Adds text, broken to the width. */
    Label and(String text, double width, TextStyle style) {
        List<Line> longer = new ArrayList<>(lines);
        Lettering.wrap(text, width, style.strong()).forEach(line -> longer.add(new Line(line, style)));
        return new Label(longer);
    }

    double height() {
        return lines.size() * TextStyle.LINE_HEIGHT;
    }

    double width() {
        return lines.stream()
                .mapToDouble(line -> Lettering.width(line.text(), line.style().strong()))
                .max()
                .orElse(0);
    }
}
