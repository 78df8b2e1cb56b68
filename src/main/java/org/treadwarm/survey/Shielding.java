package org.treadwarm.survey;

import java.util.Locale;

/** Wind shielding of the vents below a suspended floor (ISO 13370:2017, table 2, from memory). */
public enum Shielding implements Word {
    SHELTERED(0.02),
    AVERAGE(0.05),
    EXPOSED(0.10);

    private final double factor;

    Shielding(double factor) {
        this.factor = factor;
    }

    /** The wind shielding factor fw. */
    public double factor() {
        return factor;
    }

    @Override
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
