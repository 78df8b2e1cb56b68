package org.treadwarm.store;

import java.time.DateTimeException;
import java.time.Instant;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.Optional;

/** The last day on which a key works, to its end in UTC. */
public final class KeyTerm {
    /** What a last day may be, in words. */
    public static final String ALLOWED = "a date such as 2027-03-31, today (UTC) or later, at most 10 years ahead";

    private static final int MOST_YEARS = 10;

    private KeyTerm() {}

    /** The end of the day that a text names; empty if it names none, or one outside what is allowed. */
    public static Optional<Instant> endOf(String day, Instant now) {
        try {
            LocalDate last = LocalDate.parse(day);
            LocalDate today = LocalDate.ofInstant(now, ZoneOffset.UTC);
            boolean allowed = !last.isBefore(today) && !last.isAfter(today.plusYears(MOST_YEARS));
            return allowed
                    ? Optional.of(last.plusDays(1).atStartOfDay(ZoneOffset.UTC).toInstant())
                    : Optional.empty();
        } catch (DateTimeException noDate) {
            return Optional.empty();
        }
    }

    /** The last day of a key that ends at this instant. */
    public static LocalDate lastDay(Instant end) {
        return LocalDate.ofInstant(end.minusMillis(1), ZoneOffset.UTC);
    }
}
