package org.treadwarm.store;

import java.time.Instant;

/**
 * A session as its person may see it.
 *
 * @param id tells the sessions of one person apart and gives nothing away
 * @param lastSeen to the minute
 */
public record OpenSession(String id, Instant begun, Instant lastSeen) {
    static final int ID_LENGTH = 16;
}
