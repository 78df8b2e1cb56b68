package org.treadwarm.store;

import java.time.Instant;
import java.util.Optional;

/**
 * A sheet without what it freezes.
 *
 * @param number the year of issue in UTC and a running number of at least four digits, such as 2026-0001
 * @param jobId the job it was issued from
 * @param revision the revision of that job
 * @param jobName the name of the job in that revision
 * @param fingerprint as {@link SheetContent#fingerprint} was when it was issued
 * @param replaces the sheet of the same job that it replaces, if any
 * @param replacedBy the sheet that replaces it, if any
 * @param withdrawal that it no longer holds, if so
 */
public record SheetHeader(
        String number,
        String jobId,
        long revision,
        String jobName,
        String methodVersion,
        String fingerprint,
        Instant issuedAt,
        String issuedBy,
        Optional<String> replaces,
        Optional<String> replacedBy,
        Optional<Withdrawal> withdrawal) {
    /** Whether it neither was withdrawn nor is replaced. */
    public boolean holds() {
        return replacedBy.isEmpty() && withdrawal.isEmpty();
    }
}
