package org.treadwarm.store;

import java.nio.charset.StandardCharsets;
import java.security.GeneralSecurityException;
import java.security.MessageDigest;
import java.security.SecureRandom;
import java.util.Base64;
import java.util.HexFormat;
import javax.crypto.Mac;
import javax.crypto.spec.SecretKeySpec;

/** Random identifiers and tokens, and the digests under which they are kept. */
final class Secrets {
    private static final SecureRandom RANDOM = new SecureRandom();
    private static final String ID_ALPHABET = "abcdefghijklmnopqrstuvwxyz23456789";
    private static final int ID_LENGTH = 12;
    private static final int TOKEN_BYTES = 32;

    private Secrets() {}

    /** 12 characters of a-z and 2-9. */
    static String id() {
        StringBuilder id = new StringBuilder(ID_LENGTH);
        for (int position = 0; position < ID_LENGTH; position++) {
            id.append(ID_ALPHABET.charAt(RANDOM.nextInt(ID_ALPHABET.length())));
        }
        return id.toString();
    }

    /** 32 random bytes in base64url without padding. */
    static String token() {
        return base64Url(bytes(TOKEN_BYTES));
    }

    static byte[] bytes(int count) {
        byte[] bytes = new byte[count];
        RANDOM.nextBytes(bytes);
        return bytes;
    }

    /** SHA-256 of the text in UTF-8, as 64 lower-case hexadecimal digits. */
    static String sha256(String text) {
        try {
            MessageDigest digest = MessageDigest.getInstance("SHA-256");
            return HexFormat.of().formatHex(digest.digest(text.getBytes(StandardCharsets.UTF_8)));
        } catch (GeneralSecurityException problem) {
            throw new IllegalStateException("Every Java runtime has SHA-256", problem);
        }
    }

    /** HMAC-SHA256 of the text under the key, in base64url without padding. */
    static String hmac(String key, String text) {
        try {
            Mac mac = Mac.getInstance("HmacSHA256");
            mac.init(new SecretKeySpec(key.getBytes(StandardCharsets.UTF_8), "HmacSHA256"));
            return base64Url(mac.doFinal(text.getBytes(StandardCharsets.UTF_8)));
        } catch (GeneralSecurityException problem) {
            throw new IllegalStateException("Every Java runtime has HMAC-SHA256", problem);
        }
    }

    private static String base64Url(byte[] bytes) {
        return Base64.getUrlEncoder().withoutPadding().encodeToString(bytes);
    }
}
