package org.treadwarm.checks;

import java.util.Locale;

/** The files of cases, in the order in which they are shown. */
public enum CaseSet {
    /** Envelope, ground, rooms, moisture and units. */
    ENVELOPE,
    /** Heated floors. */
    FLOOR,
    /** Conduction through sections. */
    SECTION,
    /** Rows of the program's own tables, and a few more values. */
    TABLES;

    /** The name of its file, and of its part of the cases that are left out. */
    String file() {
        return name().toLowerCase(Locale.ROOT);
    }
}
