package org.treadwarm.store;

import java.util.Optional;
import java.util.regex.Pattern;

/**
 * Which jobs to list.
 *
 * @param text what their words must hold, in any case; empty for any
 * @param archived archived ones only, or those that are not; empty for both
 * @param after where the page begins, as {@link JobListings#next} says; empty for the first
 * @param limit how many at most, 1 to 200
 */
public record JobSearch(String text, Optional<Boolean> archived, Optional<String> after, int limit) {
    /** The most jobs on a page. */
    public static final int MOST = 200;

    private static final Pattern CURSOR = Pattern.compile("[0-9TZ:.-]{20,24}_[a-z2-9]{12}");

    /** @throws IllegalArgumentException if the place or the number is none, or the text has a NUL or half a character */
    public JobSearch {
        Texts.storable("text looked for", text);
        if (limit < 1 || limit > MOST || !after.map(JobSearch::isPlace).orElse(true)) {
            throw new IllegalArgumentException("Not a page of jobs: " + limit + " after " + after);
        }
    }

    /** Whether a text says where a page begins. */
    public static boolean isPlace(String text) {
        return CURSOR.matcher(text).matches();
    }

    static String place(RevisionHeader last) {
        return Times.text(last.savedAt()) + "_" + last.jobId();
    }

    Optional<String> afterTime() {
        return after.map(place -> place.substring(0, place.indexOf('_')));
    }

    Optional<String> afterJob() {
        return after.map(place -> place.substring(place.indexOf('_') + 1));
    }
}
