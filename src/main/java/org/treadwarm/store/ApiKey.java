package org.treadwarm.store;

import java.time.Instant;
import java.util.Optional;

/**
 * A key for other programs.
 *
 * @param name what its maker calls it; need not be unique
 * @param lastUsed to the minute; empty if it was never used
 * @param expiresAt from when on it no longer works; empty if it works until it is revoked
 * @param revokedAt empty unless it was
 */
public record ApiKey(
        String id,
        String name,
        Scope scope,
        Instant createdAt,
        Optional<Instant> lastUsed,
        Optional<Instant> expiresAt,
        Optional<Instant> revokedAt) {
    /** Whether it still works at this time. */
    public boolean works(Instant now) {
        return revokedAt.isEmpty() && expiresAt.map(now::isBefore).orElse(true);
    }

    ApiKey usedAt(Instant now) {
        return new ApiKey(id, name, scope, createdAt, Optional.of(now), expiresAt, revokedAt);
    }
}
