package org.treadwarm.draw;

/**
 * One block of a column of the heat balance.
 *
 * @param watts its height in W, not negative
 * @param look how it is drawn
 * @param name what it is; may be empty
 * @param figures its numbers
 * @param remark what else is to be said; may be empty
 */
record Block(double watts, Look look, String name, String figures, String remark) {
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
        label = line(label, figures, width, missing ? TextStyle.WARM : TextStyle.STRONG);
        return line(label, remark, width, missing ? TextStyle.PLAIN : TextStyle.QUIET);
    }

    private static Label line(Label label, String text, double width, TextStyle style) {
        return text.isEmpty() ? label : label.and(text, width, style);
    }
}
