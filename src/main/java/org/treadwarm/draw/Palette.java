package org.treadwarm.draw;

/** The few colours of every drawing. The accent is only ever a second cue beside a word, a hatch or a line. */
final class Palette {
    static final String INK = "#2b2620";
    static final String PAPER = "#fffdf8";
    static final String MUTED = "#6b6257";
    static final String ACCENT = "#a63d0f";
    static final String PALE_ACCENT = "#f3dccb";
    static final String PALE_NEUTRAL = "#ece6da";
    static final String NONE = "none";

    private Palette() {}
}
