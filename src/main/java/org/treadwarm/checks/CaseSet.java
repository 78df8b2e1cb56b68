package org.treadwarm.checks;

import java.util.List;
import java.util.Locale;

/** The sets of cases, in the order in which they are shown. */
public enum CaseSet {
    /** Envelope, ground, rooms, moisture and units. */
    ENVELOPE,
    /** Heated floors. */
    FLOOR,
    /** Warming up and cooling down. */
    WARMUP,
    /** Conduction through sections. */
    SECTION,
    /** Rows of the program's own tables, and a few more values. */
    TABLES;

    /** The names of its files. */
    List<String> files() {
        return this == FLOOR ? List.of(word(), "floor-heaters") : List.of(word());
    }

    /** The name of its first file, and of its part of the cases that are left out. */
    String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
