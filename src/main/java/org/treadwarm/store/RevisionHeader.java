package org.treadwarm.store;

import java.time.Instant;

/**
 * One revision of a job without its pieces.
 *
 * @param revision 1 for the first, rising by exactly one
 * @param draft whether the survey in it is not valid yet
 * @param savedAt to the millisecond
 * @param note a few words, or empty
 */
public record RevisionHeader(
        String jobId, long revision, String name, boolean draft, Instant savedAt, String savedBy, String note) {}
