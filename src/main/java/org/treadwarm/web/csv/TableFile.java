package org.treadwarm.web.csv;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.Optional;

/** The bytes of a table, however it comes in. */
public final class TableFile {
    /** The largest table, bytes of UTF-8. */
    public static final int LARGEST = 2 * 1024 * 1024;

    /** The largest table in words. */
    public static final String LARGEST_IN_WORDS = LARGEST / (1024 * 1024) + " MiB";

    /** How to save a table so that it is read, to end a message with. */
    public static final String HOW_TO_SAVE = "Save the table as CSV in UTF-8 and send it again.";

    private TableFile() {}

    /** The text that the bytes are in UTF-8; empty when they are none. A byte order mark is left where it is. */
    public static Optional<String> text(byte[] bytes) {
        try {
            return Optional.of(StandardCharsets.UTF_8
                    .newDecoder()
                    .decode(ByteBuffer.wrap(bytes))
                    .toString());
        } catch (CharacterCodingException e) {
            return Optional.empty();
        }
    }
}
