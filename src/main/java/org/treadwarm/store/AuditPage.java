package org.treadwarm.store;

import java.util.List;
import java.util.OptionalLong;

/**
 * Some entries of the audit list, the newest first.
 *
 * @param older what to ask for to get the next page; empty on the last one
 */
public record AuditPage(List<AuditEntry> entries, OptionalLong older) {
    public AuditPage {
        entries = List.copyOf(entries);
    }
}
