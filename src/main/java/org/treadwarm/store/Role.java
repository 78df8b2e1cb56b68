package org.treadwarm.store;

import java.util.Locale;

/** What a person may do. Today every person is the owner. */
public enum Role {
    OWNER,
    ESTIMATOR,
    SURVEYOR;

    String text() {
        return name().toLowerCase(Locale.ROOT);
    }

    static Role of(String text) {
        return valueOf(text.toUpperCase(Locale.ROOT));
    }
}
