package org.treadwarm.store;

import java.util.List;
import java.util.Optional;

/**
 * A page of jobs, the one changed last first.
 *
 * @param next where the next page begins; empty when this is the last one
 */
public record JobListings(List<JobListing> jobs, Optional<String> next) {}
