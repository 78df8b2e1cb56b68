package org.treadwarm.units;

/** A text that is no reading of the kind that was asked for; the message says why in a surveyor's words. */
public final class ReadingException extends Exception {
    private static final long serialVersionUID = 1L;

    ReadingException(String message) {
        super(message);
    }
}
