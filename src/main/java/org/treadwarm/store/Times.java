package org.treadwarm.store;

import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.time.temporal.ChronoUnit;

/** Times as the store writes them: ISO-8601, UTC, always three decimals, so that text order is time order. */
final class Times {
    private static final DateTimeFormatter FORMAT =
            DateTimeFormatter.ofPattern("uuuu-MM-dd'T'HH:mm:ss.SSS'Z'").withZone(ZoneOffset.UTC);

    private Times() {}

    /** The present time without what the text form would lose. */
    static Instant now(Clock clock) {
        return clock.instant().truncatedTo(ChronoUnit.MILLIS);
    }

    static String text(Instant time) {
        return FORMAT.format(time);
    }

    static Instant instant(String text) {
        return Instant.parse(text);
    }
}
