package org.treadwarm.survey;

import java.util.Locale;

/** Electric or warm-water. */
public enum HeaterKind implements Word {
    ELECTRIC,
    WATER;

    @Override
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }

    @Override
    public String label() {
        return this == ELECTRIC ? "electric" : "warm water";
    }
}
