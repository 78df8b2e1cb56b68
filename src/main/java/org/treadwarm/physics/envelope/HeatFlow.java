package org.treadwarm.physics.envelope;

import java.util.Locale;

/** Direction of the heat flow through an element, which decides its surface films and air gaps. */
public enum HeatFlow {
    UP,
    HORIZONTAL,
    DOWN;

    /** The word in documents and tables. */
    public String word() {
        return name().toLowerCase(Locale.ROOT);
    }
}
