package org.treadwarm.survey;

import java.util.Locale;

/** Whether a space is held at a temperature or floats. */
public enum SpaceKind implements Word {
    HELD,
    UNHEATED;

    @Override
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }

    @Override
    public String label() {
        return this == HELD ? "held at a temperature (neighbour)" : "unheated (loft, garage, stair)";
    }
}
