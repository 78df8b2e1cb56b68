package org.treadwarm.store;

import java.time.Instant;

/**
 * Somebody who can sign in.
 *
 * @param name as typed when the account was made; no two people have names that differ in letter case only
 */
public record Person(String id, String name, Role role, Instant createdAt) {}
