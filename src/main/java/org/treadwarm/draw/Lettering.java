package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;

/**
 * Estimates how wide text will be and breaks it into lines.
 *
 * <p>The browser's font is not known here, so the widths are those of a wide sans-serif face, rounded up: text may
 * come out narrower than reserved but not wider.
 */
final class Lettering {
    private static final double BOLD = 1.12;

    private Lettering() {}

    static double width(String text, boolean strong) {
        double ems = text.codePoints().mapToDouble(Lettering::ems).sum();
        return ems * TextStyle.SIZE * (strong ? BOLD : 1);
    }

    /** Breaks text into lines no wider than the given width; a word that is wider by itself is cut. */
    static List<String> wrap(String text, double width, boolean strong) {
        List<String> lines = new ArrayList<>();
        String line = "";
        for (String word : words(text, width, strong)) {
            String longer = line.isEmpty() ? word : line + " " + word;
            if (!line.isEmpty() && width(longer, strong) > width) {
                lines.add(line);
                line = word;
            } else {
                line = longer;
            }
        }
        lines.add(line);
        return lines;
    }

    private static List<String> words(String text, double width, boolean strong) {
        List<String> pieces = new ArrayList<>();
        for (String word : text.strip().split("\\s+")) {
            String rest = word;
            while (width(rest, strong) > width && rest.codePointCount(0, rest.length()) > 1) {
                int cut = fitting(rest, width, strong);
                pieces.add(rest.substring(0, cut));
                rest = rest.substring(cut);
            }
            pieces.add(rest);
        }
        return pieces;
    }

    private static int fitting(String word, double width, boolean strong) {
        int end = word.offsetByCodePoints(0, 1);
        while (width(word.substring(0, word.offsetByCodePoints(end, 1)), strong) <= width) {
            end = word.offsetByCodePoints(end, 1);
        }
        return end;
    }

    private static double ems(int point) {
        if ("iIjl.,:;'|!".indexOf(point) >= 0) {
            return 0.33;
        }
        if (" \u00a0()[]frt/-·".indexOf(point) >= 0) {
            return 0.41;
        }
        if ("mwMW%—−".indexOf(point) >= 0) {
            return 1.0;
        }
        if (Character.isUpperCase(point)) {
            return 0.79;
        }
        return point > 0x2E80 ? 1.0 : 0.645;
    }
}
