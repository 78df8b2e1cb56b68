package org.treadwarm.store;

/**
 * What keeps the data cannot be used as it is: full disk, no right to write, a damaged or foreign file, a newer schema, a
 * database that does not answer. The message is written for the person who runs the program. A change that ends with
 * this exception was not made, unless {@link #changeMayBeMade} says that nobody knows.
 */
public final class StoreUnavailable extends RuntimeException {
    private final boolean changeMayBeMade;

    StoreUnavailable(String message) {
        super(message);
        this.changeMayBeMade = false;
    }

    StoreUnavailable(String message, Throwable cause) {
        this(message, cause, false);
    }

    private StoreUnavailable(String message, Throwable cause, boolean changeMayBeMade) {
        super(message, cause);
        this.changeMayBeMade = changeMayBeMade;
    }

    static StoreUnavailable of(Engine engine, String meaning, Throwable cause) {
        return new StoreUnavailable("The " + engine.name() + " cannot be used: " + meaning + ".", cause);
    }

    static StoreUnavailable whileCommitting(Engine engine, Throwable cause) {
        return new StoreUnavailable(
                "The connection to the " + engine.name() + " broke while a change was being committed; it may have been"
                        + " made or not.",
                cause,
                true);
    }

    /** Whether the connection broke in the moment of the commit, so that the change may have been made or not. */
    public boolean changeMayBeMade() {
        return changeMayBeMade;
    }
}
