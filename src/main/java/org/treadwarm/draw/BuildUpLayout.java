package org.treadwarm.draw;

import java.util.List;

/**
 * The bands of a build-up drawing.
 *
 * @param plane how along and across lie on the sheet
 * @param film length of the air on either side, along
 * @param layers length of the layers, along
 * @param chart depth of the temperature chart, across
 * @param labels depth of the row of temperatures, across
 * @param section depth of the section, across
 */
record BuildUpLayout(Plane plane, double film, double layers, double chart, double labels, double section) {
    static final double MARGIN = 12;
    private static final double AXIS = 48;
    private static final double NUMBERS = 44;
    private static final double DEW = 86;

    /** Upright as a wall, unless it lies flat or has more layers than the sheet has room to number. */
    static BuildUpLayout of(Sheet sheet, BuildUp buildUp, double top) {
        double right = buildUp.dewPoint().isPresent() ? DEW : MARGIN;
        double film = sheet.roomy() ? 52 : 30;
        double length = sheet.width() - AXIS - right - 2 * film;
        int count = buildUp.layers().size();
        if (buildUp.horizontal() || count * LayerNumbers.PITCH > length + 2 * film) {
            return stacked(sheet, count, top);
        }
        Plane plane = new Plane(false, new Point(AXIS, top + 8));
        return new BuildUpLayout(plane, film, length, sheet.roomy() ? 210 : 180, 58, sheet.roomy() ? 150 : 110);
    }

    private static BuildUpLayout stacked(Sheet sheet, int count, double top) {
        double labels = 84;
        double free = sheet.width() - NUMBERS - labels - 2 * MARGIN - 12;
        double section = free * (sheet.roomy() ? 0.4 : 0.36);
        Plane plane = new Plane(true, new Point(sheet.width() - MARGIN - 12, top + 46));
        double length = Math.max(240, (count + 1) * 24);
        return new BuildUpLayout(plane, 44, length, free - section, labels, section);
    }

    double end(List<LayerSpan> spans) {
        return spans.get(spans.size() - 1).end() + film;
    }

    double sectionNear() {
        return chart + labels;
    }

    double sectionFar() {
        return chart + labels + section;
    }
}
