package org.treadwarm.store;

/** A job in a list: its newest revision, and whether it is archived. */
public record JobListing(RevisionHeader newest, boolean archived) {}
