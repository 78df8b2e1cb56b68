package org.treadwarm.web.pages;

import io.javalin.http.Context;
import java.nio.charset.StandardCharsets;
import java.util.Locale;
import java.util.Optional;
import org.treadwarm.web.Multipart;
import org.treadwarm.web.csv.TableFile;

/**
 * The table that a form brings: the file that was chosen, or else what was pasted.
 *
 * @param text the table; what was pasted when there is no table
 * @param field the field that is wrong; empty for none
 * @param error what is wrong with it
 */
record SentTable(String text, String field, String error) {
    private static final String PASTED = "table";
    private static final String FILE = "file";

    static SentTable of(Context ctx) {
        String pasted = EntryPages.text(ctx, PASTED);
        Optional<byte[]> file = Multipart.isSent(ctx) ? Multipart.file(ctx, FILE) : Optional.empty();
        return file.map(bytes -> ofFile(bytes, pasted)).orElseGet(() -> ofPasted(pasted));
    }

    /** A form that was too large to be read at all. */
    static SentTable unread() {
        return new SentTable("", FILE, "This file is too large. At most " + TableFile.LARGEST_IN_WORDS + " are read.");
    }

    private static SentTable ofFile(byte[] bytes, String pasted) {
        if (bytes.length == 0) {
            return new SentTable(pasted, FILE, "This file is empty. Choose the one that holds the table.");
        }
        if (bytes.length > TableFile.LARGEST) {
            return new SentTable(pasted, FILE, "This file is too large. " + tooLarge(bytes.length));
        }
        return TableFile.text(bytes)
                .map(text -> new SentTable(text, "", ""))
                .orElseGet(
                        () -> new SentTable(pasted, FILE, "This file is no text in UTF-8. " + TableFile.HOW_TO_SAVE));
    }

    private static SentTable ofPasted(String pasted) {
        int bytes = pasted.getBytes(StandardCharsets.UTF_8).length;
        if (bytes > TableFile.LARGEST) {
            return new SentTable(pasted, PASTED, "This table is too large. " + tooLarge(bytes));
        }
        return pasted.isBlank()
                ? new SentTable("", PASTED, "Paste a table, or choose a file.")
                : new SentTable(pasted, "", "");
    }

    private static String tooLarge(int bytes) {
        double size = bytes / (1024.0 * 1024.0);
        return String.format(Locale.ROOT, "It has %.2f MiB; at most %s are read.", size, TableFile.LARGEST_IN_WORDS);
    }
}
