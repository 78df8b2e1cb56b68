package org.treadwarm.survey;

import java.util.Locale;

/** Zone of use of a heated floor (EN 1264-2). */
public enum Zone implements Word {
    OCCUPIED("occupied area"),
    PERIPHERAL("peripheral area"),
    BATHROOM("bathroom");

    private final String label;

    Zone(String label) {
        this.label = label;
    }

    @Override
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }

    @Override
    public String label() {
        return label;
    }
}
