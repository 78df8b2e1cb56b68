package org.treadwarm.store;

/**
 * A request that its client gave a name, so that it can be sent again without creating anything twice.
 *
 * @param keyId the API key it came with; names of different keys have nothing to do with each other
 * @param name 1 to 255 characters that the client chose
 * @param sha256 of everything that makes it the same request, as 64 lower-case hexadecimal digits
 */
public record NamedRequest(String keyId, String name, String sha256) {}
