package org.treadwarm.units;

import java.util.Locale;

/** How a reading was come by. */
public enum Basis {
    TAPED,
    DRAWING,
    TOLD,
    ASSUMED,
    /** Computed by this program from other readings. */
    SOLVED;

    /** The word in the survey document. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
