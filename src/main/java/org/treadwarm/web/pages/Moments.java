package org.treadwarm.web.pages;

import java.time.Instant;
import java.time.ZoneOffset;
import java.time.format.DateTimeFormatter;
import java.util.Locale;

/** Times as the pages show them. */
final class Moments {
    private static final DateTimeFormatter MINUTE =
            DateTimeFormatter.ofPattern("uuuu-MM-dd HH:mm 'UTC'", Locale.ROOT).withZone(ZoneOffset.UTC);

    private Moments() {}

    /** To the minute, in UTC. */
    static String minute(Instant moment) {
        return MINUTE.format(moment);
    }
}
