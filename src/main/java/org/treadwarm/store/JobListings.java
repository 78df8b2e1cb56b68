package org.treadwarm.store;

import java.util.List;
import java.util.Optional;

/**
 * A page of jobs as they are now, the one that was saved last when the list began first.
 *
 * @param next where the next page begins; empty when this is the last one
 */
public record JobListings(List<JobListing> jobs, Optional<JobPlace> next) {}
