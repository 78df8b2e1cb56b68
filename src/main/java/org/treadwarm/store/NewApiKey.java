package org.treadwarm.store;

/**
 * A key just made.
 *
 * @param token the secret, "tw_" and 43 characters; it is not kept, so this is the only time it can be shown
 */
public record NewApiKey(ApiKey key, String token) {
    /** Without the secret, so that a log cannot give it away. */
    @Override
    public String toString() {
        return "New " + key;
    }
}
