package org.treadwarm.store;

import java.time.Instant;

/**
 * A link that shows one sheet to whoever has it, until it is revoked.
 *
 * @param number the sheet
 * @param madeBy who made it
 */
public record SheetLink(String id, String number, Instant madeAt, String madeBy) {}
