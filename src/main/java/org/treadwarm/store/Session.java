package org.treadwarm.store;

import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.time.Instant;

/**
 * One signed-in browser.
 *
 * @param token the secret the browser holds; the store keeps only its digest
 * @param csrfToken the secret each form of this session must carry; follows from the token and is not kept
 * @param expiresAt when the session ends unless it is used before
 */
public record Session(Person person, String token, String csrfToken, Instant createdAt, Instant expiresAt) {
    /** Whether a form carries this session's secret; takes equally long for every wrong answer of the same length. */
    public boolean acceptsForm(String submittedCsrfToken) {
        return MessageDigest.isEqual(
                csrfToken.getBytes(StandardCharsets.UTF_8), submittedCsrfToken.getBytes(StandardCharsets.UTF_8));
    }

    /** The {@link OpenSession#id} of this session. */
    public String id() {
        return Secrets.sha256(token).substring(0, OpenSession.ID_LENGTH);
    }

    /** Without the secrets, so that a log cannot give them away. */
    @Override
    public String toString() {
        return "Session of " + person.name() + " until " + expiresAt;
    }
}
