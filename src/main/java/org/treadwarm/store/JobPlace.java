package org.treadwarm.store;

import java.util.Optional;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * A place in a list of jobs, which goes by the saves that had been made when the list began.
 *
 * @param begin the number of the last save before the list began, 0 or more
 * @param last the number of the save by which the last job before this place was told, 1 or more
 */
public record JobPlace(long begin, long last) {
    private static final Pattern FORM = Pattern.compile("([0-9]{1,18})-([0-9]{1,18})");

    /** The place that a text names; empty if it names none. */
    public static Optional<JobPlace> of(String text) {
        Matcher parts = FORM.matcher(text);
        return parts.matches()
                ? Optional.of(new JobPlace(Long.parseLong(parts.group(1)), Long.parseLong(parts.group(2))))
                : Optional.empty();
    }

    /** The text that names it. */
    public String text() {
        return begin + "-" + last;
    }
}
