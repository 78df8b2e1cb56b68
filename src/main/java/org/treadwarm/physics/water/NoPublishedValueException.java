package org.treadwarm.physics.water;

/** A property that no source known to this program gives, so that none is made up. */
public final class NoPublishedValueException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    NoPublishedValueException(String message) {
        super(message);
    }
}
