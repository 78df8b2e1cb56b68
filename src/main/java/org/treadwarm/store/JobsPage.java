package org.treadwarm.store;

import java.util.List;
import java.util.Optional;

/**
 * A part of the list of jobs.
 *
 * @param jobs the newest revision of each, the one changed last first
 * @param next where the list goes on; empty at its end
 */
public record JobsPage(List<RevisionHeader> jobs, Optional<JobCursor> next) {}
