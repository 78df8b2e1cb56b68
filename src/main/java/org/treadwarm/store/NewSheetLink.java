package org.treadwarm.store;

/**
 * A link that was just made.
 *
 * @param token the secret in the link; it is not kept, so this is the only time it can be shown
 */
public record NewSheetLink(SheetLink link, String token) {
    /** Without the secret, so that a log cannot give it away. */
    @Override
    public String toString() {
        return "New " + link;
    }
}
