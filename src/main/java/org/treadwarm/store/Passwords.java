package org.treadwarm.store;

import com.password4j.Argon2Function;
import com.password4j.types.Argon2;
import java.nio.charset.StandardCharsets;
import java.text.Normalizer;
import java.util.Base64;
import java.util.concurrent.Semaphore;
import java.util.function.Supplier;

/**
 * Hashes passwords with Argon2id: 19 MiB, two passes, one lane, salt of 16 bytes, hash of 32. At most two at a time, so
 * that a crowd of sign-ins cannot take all memory and processors. Cost as in the OWASP password storage advice (from
 * memory).
 */
final class Passwords {
    private static final int SALT_BYTES = 16;
    private static final int HASHINGS_AT_ONCE = 2;
    private static final int HASH_BYTES = 32;
    private static final Argon2Function FUNCTION = Argon2Function.getInstance(19 * 1024, 2, 1, HASH_BYTES, Argon2.ID);

    private final Semaphore places = new Semaphore(HASHINGS_AT_ONCE, true);
    private final String hashOfNothing =
            "$argon2id$v=19$m=19456,t=2,p=1$" + random(SALT_BYTES) + "$" + random(HASH_BYTES);

    /** The hash with its salt and cost in one text, in the usual "$argon2id$..." form. */
    String hash(String password) {
        return inTurn(
                () -> FUNCTION.hash(bytes(password), Secrets.bytes(SALT_BYTES)).getResult());
    }

    /** Whether the hash was made from the password. */
    boolean matches(String password, String hash) {
        return inTurn(() ->
                Argon2Function.getInstanceFromHash(hash).check(bytes(password), hash.getBytes(StandardCharsets.UTF_8)));
    }

    private static String random(int bytes) {
        return Base64.getEncoder().withoutPadding().encodeToString(Secrets.bytes(bytes));
    }

    /** A hash no known password has, made up and not computed; trying one against it takes as long as against a real hash. */
    String hashOfNothing() {
        return hashOfNothing;
    }

    private <T> T inTurn(Supplier<T> work) {
        places.acquireUninterruptibly();
        try {
            return work.get();
        } finally {
            places.release();
        }
    }

    // One keyboard composes an accented letter, another sends letter and accent; both mean the same password.
    private static byte[] bytes(String password) {
        return Normalizer.normalize(password, Normalizer.Form.NFC).getBytes(StandardCharsets.UTF_8);
    }
}
