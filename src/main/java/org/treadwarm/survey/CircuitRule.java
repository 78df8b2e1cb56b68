package org.treadwarm.survey;

import java.util.Locale;

/** Whose breakers an electric heater hangs on; the local code decides. Common practice, no source. */
public enum CircuitRule implements Word {
    EUROPEAN("European ratings, used whole"),
    US("US ratings, used to 80 % for loads that last for hours");

    private final String label;

    CircuitRule(String label) {
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
