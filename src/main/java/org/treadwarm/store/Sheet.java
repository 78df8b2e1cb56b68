package org.treadwarm.store;

/** An issued sizing: numbered, frozen and kept. */
public record Sheet(SheetHeader header, SheetContent content) {
    /** Whether the kept texts still have the fingerprint of the day of issue. */
    public boolean hasItsFingerprint() {
        return content.fingerprint().equals(header.fingerprint());
    }
}
