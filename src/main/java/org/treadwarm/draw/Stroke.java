package org.treadwarm.draw;

/**
 * How a line is drawn.
 *
 * @param colour a colour of the palette or "none"
 * @param width width in pixels
 * @param dashes dash lengths as SVG writes them; empty for a full line
 */
record Stroke(String colour, double width, String dashes) {
    static final Stroke NONE = new Stroke(Palette.NONE, 0, "");
    static final Stroke OUTLINE = new Stroke(Palette.INK, 1.5, "");
    static final Stroke HEAVY = new Stroke(Palette.INK, 2, "");
    static final Stroke THIN = new Stroke(Palette.INK, 1, "");
    static final Stroke LEADER = new Stroke(Palette.MUTED, 1, "");
    static final Stroke GUIDE = new Stroke(Palette.MUTED, 1, "2 3");
    static final Stroke GRID = new Stroke(Palette.PALE_NEUTRAL, 1, "");
    static final Stroke ACCENT = new Stroke(Palette.ACCENT, 2, "");
    static final Stroke DASHED = new Stroke(Palette.ACCENT, 2, "7 4");

    /** Puts the stroke's presentation attributes on an element. */
    void onto(Svg element) {
        element.with("stroke", colour);
        if (!colour.equals(Palette.NONE)) {
            element.with("stroke-width", width);
            if (!dashes.isEmpty()) {
                element.with("stroke-dasharray", dashes);
            }
        }
    }
}
