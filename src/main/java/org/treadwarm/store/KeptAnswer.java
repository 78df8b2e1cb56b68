package org.treadwarm.store;

/**
 * What a request that created something was answered.
 *
 * @param status the HTTP status
 * @param location where the new thing is
 * @param etag its version, as the answer's ETag; empty for a thing that never changes
 * @param body the answer's text
 */
public record KeptAnswer(int status, String location, String etag, String body) {}
