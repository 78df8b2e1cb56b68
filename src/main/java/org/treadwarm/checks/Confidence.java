package org.treadwarm.checks;

import java.util.Locale;

/** How far an expected value can be trusted. */
public enum Confidence {
    /** It was on a public page that was read. */
    READ,
    /** A standard's or handbook's value that was recalled, not looked up. */
    MEMORY,
    /** Computed from formulas; the source gives the inputs or the equation. */
    DERIVED;

    /** The word in the case files. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
