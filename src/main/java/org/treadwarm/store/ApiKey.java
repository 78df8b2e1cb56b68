package org.treadwarm.store;

import java.time.Instant;
import java.util.Optional;

/**
 * A key for other programs.
 *
 * @param name what its maker calls it; need not be unique
 * @param lastUsed to the minute; empty if it was never used
 */
public record ApiKey(String id, String name, Scope scope, Instant createdAt, Optional<Instant> lastUsed) {}
