package org.treadwarm.store;

import java.util.Optional;

/**
 * Which jobs to list.
 *
 * @param text what their words must hold, in any case; empty for any
 * @param archived archived ones only, or those that are not; empty for both
 * @param after where the page begins, as {@link JobListings#next} says; empty for the first
 * @param limit how many at most, 1 to 200
 */
public record JobSearch(String text, Optional<Boolean> archived, Optional<JobPlace> after, int limit) {
    /** The most jobs on a page. */
    public static final int MOST = 200;

    /** @throws IllegalArgumentException if the number is none, or the text has a NUL or half a character */
    public JobSearch {
        Texts.storable("text looked for", text);
        if (limit < 1 || limit > MOST) {
            throw new IllegalArgumentException("Not a page of jobs: " + limit);
        }
    }
}
