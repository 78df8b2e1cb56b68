package org.treadwarm.store;

/**
 * What keeps the data cannot be used as it is: full disk, no right to write, a damaged or foreign file, a newer schema, a
 * database that does not answer. The message is written for the person who runs the program. A change that ends with
 * this exception was not made, unless its reason is {@link Reason#BROKEN_COMMIT}.
 */
public final class StoreUnavailable extends RuntimeException {
    private final Reason reason;

    /** What those who only use the program are told. */
    public enum Reason {
        /** It cannot be used; nothing was changed. */
        OUT_OF_REACH,
        /** The disk is full; nothing was changed. */
        NO_ROOM,
        /** The connection broke in the moment of the commit: the change may have been made or not. */
        BROKEN_COMMIT
    }

    StoreUnavailable(String message) {
        super(message);
        this.reason = Reason.OUT_OF_REACH;
    }

    StoreUnavailable(String message, Throwable cause) {
        this(message, cause, Reason.OUT_OF_REACH);
    }

    private StoreUnavailable(String message, Throwable cause, Reason reason) {
        super(message, cause);
        this.reason = reason;
    }

    static StoreUnavailable of(Engine engine, String meaning, Throwable cause) {
        boolean full = Failures.all(cause).anyMatch(engine::isFull);
        return new StoreUnavailable(
                "The " + engine.name() + " cannot be used: " + meaning + ".",
                cause,
                full ? Reason.NO_ROOM : Reason.OUT_OF_REACH);
    }

    static StoreUnavailable whileCommitting(Engine engine, Throwable cause) {
        return new StoreUnavailable(
                "The connection to the " + engine.name() + " broke while a change was being committed; it may have been"
                        + " made or not.",
                cause,
                Reason.BROKEN_COMMIT);
    }

    /** Why, in so far as it concerns those who only use the program. */
    public Reason reason() {
        return reason;
    }
}
