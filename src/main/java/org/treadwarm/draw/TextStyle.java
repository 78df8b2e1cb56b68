package org.treadwarm.draw;

/**
 * How lettering is set.
 *
 * @param strong whether it is set bold
 * @param colour a colour of the palette
 * @param anchor which point of the text stands at its x
 */
record TextStyle(boolean strong, String colour, Anchor anchor) {
    /** Size of all lettering in pixels; small enough for a drawing, large enough at arm's length. */
    static final double SIZE = 14;

    static final double LINE_HEIGHT = 19;
    static final TextStyle PLAIN = new TextStyle(false, Palette.INK, Anchor.START);
    static final TextStyle QUIET = new TextStyle(false, Palette.MUTED, Anchor.START);
    static final TextStyle STRONG = new TextStyle(true, Palette.INK, Anchor.START);
    static final TextStyle WARM = new TextStyle(true, Palette.ACCENT, Anchor.START);

    /** Where the text stands against its x. */
    enum Anchor {
        START("start"),
        MIDDLE("middle"),
        END("end");

        private final String word;

        Anchor(String word) {
            this.word = word;
        }

        String word() {
            return word;
        }
    }

    TextStyle at(Anchor other) {
        return new TextStyle(strong, colour, other);
    }
}
