package org.treadwarm.store;

import java.nio.charset.StandardCharsets;

/** What the store accepts as text. */
final class Texts {
    private Texts() {}

    /**
     * The text itself, if every database gives it back as it was.
     *
     * @throws IllegalArgumentException if it holds a NUL or half a surrogate pair
     */
    static String storable(String what, String text) {
        if (text.indexOf('\0') >= 0 || !StandardCharsets.UTF_8.newEncoder().canEncode(text)) {
            throw new IllegalArgumentException("The " + what + " holds a NUL or half a character");
        }
        return text;
    }
}
