package org.treadwarm.checks;

import java.util.List;
import java.util.Locale;

/** The sets of cases, in the order in which they are shown. */
public enum CaseSet {
    /** Envelope, ground, rooms, moisture and units. */
    ENVELOPE("envelope"),
    /** Heated floors. */
    FLOOR("floor", "floor-heaters"),
    /** Rows of the program's own tables, and a few more values. */
    TABLES("tables");

    private final List<String> files;

    CaseSet(String... files) {
        this.files = List.of(files);
    }

    /** The names of its files. */
    List<String> files() {
        return files;
    }

    /** The name of its part of the cases that are left out. */
    String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
