package org.treadwarm.survey;

import java.util.Locale;

/** The dimension system of the areas (ISO 13789): it must match the psi column in use. */
public enum Dimensions implements Word {
    INTERNAL,
    OVERALL_INTERNAL,
    EXTERNAL;

    @Override
    public String word() {
        return name().toLowerCase(Locale.ROOT).replace('_', ' ');
    }
}
