package org.treadwarm.store;

import java.util.Locale;

/** What a person may do. Each role may do what the ones after it may. */
public enum Role {
    /** Also people, keys and the audit list. */
    OWNER,
    /** Also starts jobs. */
    ESTIMATOR,
    /** Edits surveys. */
    SURVEYOR;

    /** Whether somebody with this role may do what needs the given one. */
    public boolean allows(Role needed) {
        return compareTo(needed) <= 0;
    }

    /** The role as it is written, in lower case. */
    public String text() {
        return name().toLowerCase(Locale.ROOT);
    }

    static Role of(String text) {
        return valueOf(text.toUpperCase(Locale.ROOT));
    }
}
