package org.treadwarm.store;

/**
 * Who changes a job, and why.
 *
 * @param who the person or key, as the history shows it
 * @param note a few words for the history; may be empty
 */
public record Change(String who, String note) {
    /** @throws IllegalArgumentException if a text has a NUL or half a character */
    public Change {
        Texts.storable("person who changes", who);
        Texts.storable("note", note);
    }

    /** A change without a note. */
    public static Change by(String who) {
        return new Change(who, "");
    }
}
