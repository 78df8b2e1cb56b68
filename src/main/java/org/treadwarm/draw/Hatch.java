package org.treadwarm.draw;

/**
 * Hatching of materials in section, in the manner of ISO 128-50 (from memory): strokes on a pale ground, one pattern per family,
 * told apart without colour.
 */
final class Hatch {
    private Hatch() {}

    static Svg pattern(MaterialFamily family, String id) {
        return switch (family) {
            case INSULATION ->
                tile(id, 16, 16, Palette.PAPER)
                        .add(stroke("M0 8 C0 -2 8 -2 8 8 S16 18 16 8"))
                        .add(stroke("M0 8 C0 18 8 18 8 8 S16 -2 16 8"));
            case CONCRETE_SCREED ->
                tile(id, 18, 18, Palette.PALE_NEUTRAL)
                        .add(stroke("M3 6 L6 2 L8 6 Z"))
                        .add(stroke("M11 15 L15 14 L13 11 Z"))
                        .add(dot(13, 4))
                        .add(dot(4, 12))
                        .add(dot(8, 10));
            case BRICK_BLOCK ->
                tile(id, 12, 12, Palette.PALE_ACCENT).add(stroke("M-2 14 L14 -2 M-2 2 L2 -2 M10 14 L14 10"));
            case TIMBER ->
                tile(id, 24, 10, Palette.PALE_ACCENT)
                        .add(stroke("M0 3 C6 1 10 5 16 3 S22 2 24 3"))
                        .add(stroke("M0 8 C5 9 9 6 14 8 S21 9 24 8"));
            case BOARD -> tile(id, 10, 10, Palette.PAPER).add(stroke("M2 1 V5 M7 6 V10"));
            case METAL -> tile(id, 5, 5, Palette.PALE_NEUTRAL).add(stroke("M-1 6 L6 -1 M-1 1 L1 -1 M4 6 L6 4"));
            case GLASS -> tile(id, 20, 20, Palette.PAPER).add(stroke("M3 13 L9 7 M7 15 L13 9 M11 17 L17 11"));
            case AIR -> tile(id, 16, 16, Palette.PAPER).add(dot(4, 4)).add(dot(12, 12));
            case GROUND ->
                tile(id, 28, 14, Palette.PALE_NEUTRAL)
                        .add(stroke("M1 13 L13 1 M1 7 L7 1 M7 13 L13 7 M15 1 L27 13 M15 7 L21 13 M21 1 L27 7"));
            case TILE -> tile(id, 8, 8, Palette.PALE_NEUTRAL).add(stroke("M0 0 H8 M0 0 V8"));
            case MEMBRANE -> tile(id, 14, 14, Palette.PAPER).add(block(0, 0)).add(block(7, 7));
            case OTHER -> tile(id, 14, 12, Palette.PAPER).add(stroke("M1 3 H7 M8 9 H13"));
        };
    }

    /** For heat that a room gains, so that it cannot be taken for heat it loses. */
    static Svg gain(String id) {
        return tile(id, 9, 9, Palette.PAPER).add(stroke("M-1 -1 L10 10 M-1 8 L1 10 M8 -1 L10 1"));
    }

    /** For what stands on a floor in plan. */
    static Svg unit(String id) {
        return tile(id, 8, 8, Palette.PAPER).add(stroke("M-1 9 L9 -1 M-1 1 L1 -1 M7 9 L9 7"));
    }

    private static Svg tile(String id, double width, double height, String ground) {
        return Svg.element("pattern")
                .with("id", id)
                .with("patternUnits", "userSpaceOnUse")
                .with("width", width)
                .with("height", height)
                .add(Svg.element("rect")
                        .with("width", width)
                        .with("height", height)
                        .with("fill", ground));
    }

    private static Svg stroke(String path) {
        return Svg.element("path")
                .with("d", path)
                .with("fill", Palette.NONE)
                .with("stroke", Palette.MUTED)
                .with("stroke-width", 1);
    }

    private static Svg dot(double x, double y) {
        return Svg.element("circle").with("cx", x).with("cy", y).with("r", 0.9).with("fill", Palette.MUTED);
    }

    private static Svg block(double x, double y) {
        return Svg.element("rect")
                .with("x", x)
                .with("y", y)
                .with("width", 7)
                .with("height", 7)
                .with("fill", Palette.INK);
    }
}
