package org.treadwarm.store;

import java.time.Instant;
import java.util.Optional;

/**
 * Somebody on the firm's list of people.
 *
 * @param lastSeen to the minute; empty if never since this is noted
 * @param closed when the account was closed; empty while it is open
 */
public record Member(Person person, Optional<Instant> lastSeen, Optional<Instant> closed) {}
