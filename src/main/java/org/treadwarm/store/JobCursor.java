package org.treadwarm.store;

import java.time.Instant;

/**
 * Where the list of jobs goes on.
 *
 * @param asOf the list is of the jobs as they were then, so that it does not move while it is read
 * @param savedAt when the last job already listed was saved
 * @param jobId its id
 */
public record JobCursor(Instant asOf, Instant savedAt, String jobId) {}
