package org.treadwarm.store;

import java.time.Instant;

/**
 * One thing that was done.
 *
 * @param who the person or key that did it
 * @param what the act, such as "saved job"
 * @param subject what it was done to
 */
public record AuditEntry(Instant at, String who, String what, String subject) {}
