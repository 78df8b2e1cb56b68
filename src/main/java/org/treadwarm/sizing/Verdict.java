package org.treadwarm.sizing;

/** Whether a heated floor holds its room on the design day. */
public enum Verdict {
    CARRIES("carries"),
    CARRIES_WITH_SUPPLEMENT("carries with supplement"),
    NO_HEATED_FLOOR("no heated floor");

    private final String words;

    Verdict(String words) {
        this.words = words;
    }

    /** The words of the answer. */
    @Override
    public String toString() {
        return words;
    }
}
