package org.treadwarm.store;

/**
 * What a request that created something was answered.
 *
 * @param status the HTTP status
 * @param location where the new thing is
 * @param etag its revision, as the answer's ETag
 * @param body the answer's text
 */
public record KeptAnswer(int status, String location, String etag, String body) {}
