package org.treadwarm.store;

/**
 * A link just made.
 *
 * @param token its secret, 43 characters; it is not kept, so this is the only time it can be shown
 */
public record NewLink(Link link, String token) {
    /** Without the secret, so that a log cannot give it away. */
    @Override
    public String toString() {
        return "New " + link;
    }
}
