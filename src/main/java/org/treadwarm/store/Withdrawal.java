package org.treadwarm.store;

import java.time.Instant;

/**
 * That a sheet no longer holds.
 *
 * @param by the person or key that withdrew it
 * @param reason why, in their words
 */
public record Withdrawal(Instant at, String by, String reason) {}
