package org.treadwarm.survey;

import java.util.Locale;

/** How a floor meets the ground (ISO 13370). */
public enum GroundKind implements Word {
    SLAB,
    SUSPENDED;

    @Override
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }

    @Override
    public String label() {
        return this == SLAB ? "slab on ground" : "suspended over a void";
    }
}
