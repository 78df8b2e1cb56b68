package org.treadwarm.store;

import java.time.Instant;

/**
 * A link that works once, without its secret.
 *
 * @param forWhom whom its maker made it for
 */
public record Link(String id, String forWhom, Purpose purpose, String madeBy, Instant madeAt, Instant expiresAt) {
    /** What the link is for. */
    public sealed interface Purpose {}

    /** Makes an account with this role. */
    public record Join(Role role) implements Purpose {}

    /** Gives the account of this person a new password. */
    public record NewPassword(String personId) implements Purpose {}
}
