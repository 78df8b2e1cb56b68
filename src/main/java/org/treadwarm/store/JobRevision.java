package org.treadwarm.store;

/** One revision of a job with all its pieces. */
public record JobRevision(RevisionHeader header, JobContent content) {}
