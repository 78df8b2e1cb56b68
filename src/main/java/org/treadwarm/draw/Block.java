package org.treadwarm.draw;

import java.util.List;

/**
 * One block of a column of the heat balance.
 *
 * @param watts its height in W, not negative
 * @param look how it is drawn
 * @param name what it is; may be empty
 * @param figures its number; may be empty
 * @param share its share; may be empty
 * @param remark what else is to be said; may be empty
 */
record Block(double watts, Look look, String name, String figures, String share, String remark) {
    /** How a block is drawn. */
    enum Look {
        LOSS,
        GAIN,
        FLOOR,
        MISSING
    }

    /** Name, figures and remark under each other, those that are there. */
    Label label(double width) {
        boolean missing = look == Look.MISSING;
        Label label = line(Label.empty(), name, width, TextStyle.PLAIN);
        for (String number : numbers(width)) {
            label = line(label, number, width, missing ? TextStyle.WARM : TextStyle.STRONG);
        }
        return line(label, remark, width, missing ? TextStyle.PLAIN : TextStyle.QUIET);
    }

    private List<String> numbers(double width) {
        String joined = figures + " · " + share;
        boolean beside = !share.isEmpty() && Lettering.width(joined, true) <= width;
        return beside ? List.of(joined) : List.of(figures, share);
    }

    private static Label line(Label label, String text, double width, TextStyle style) {
        return text.isEmpty() ? label : label.and(text, width, style);
    }
}
