package org.treadwarm.store;

import java.util.Locale;

/** What a key may be used for. Each scope includes the ones before it. */
public enum Scope {
    /** To size a survey that is sent along. */
    SIZE,
    /** To read kept jobs. */
    READ,
    /** To change kept jobs. */
    WRITE;

    /** Whether a key with this scope may do what needs the given one. */
    public boolean allows(Scope needed) {
        return compareTo(needed) >= 0;
    }

    /** The scope as it is written, in lower case. */
    public String text() {
        return name().toLowerCase(Locale.ROOT);
    }

    static Scope of(String text) {
        return valueOf(text.toUpperCase(Locale.ROOT));
    }
}
