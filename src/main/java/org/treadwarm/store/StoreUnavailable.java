package org.treadwarm.store;

/**
 * The data folder cannot be used as it is: full disk, no right to write, a damaged or foreign file, a newer schema.
 * The message is written for the person who runs the program. A change that ends with this exception was not made.
 */
public final class StoreUnavailable extends RuntimeException {
    StoreUnavailable(String message) {
        super(message);
    }

    StoreUnavailable(String message, Throwable cause) {
        super(message, cause);
    }
}
