package org.treadwarm.store;

import java.nio.charset.StandardCharsets;

/**
 * What a sheet freezes; the store does not look into the two documents.
 *
 * @param methodVersion the version of the method that made the sizing, 1 to 16 characters
 * @param survey the survey as it was typed, JSON
 * @param sizing its sizing, JSON
 */
public record SheetContent(String methodVersion, String survey, String sizing) {
    /** @throws IllegalArgumentException if a text has a NUL or half a character, or the version breaks its rule */
    public SheetContent {
        if (methodVersion.isEmpty() || methodVersion.length() > 16) {
            throw new IllegalArgumentException("Not a version of the method: '" + methodVersion + "'");
        }
        Texts.storable("version of the method", methodVersion);
        Texts.storable("survey of the sheet", survey);
        Texts.storable("sizing of the sheet", sizing);
    }

    /**
     * The SHA-256 of these texts, 64 hexadecimal digits. What is hashed is, in UTF-8: the line {@code treadwarm sheet 1}, then
     * the method version, the survey and the sizing in this order, each as its length in bytes in decimal digits, a line
     * feed, its bytes, and a line feed. Every line ends with a line feed.
     */
    public String fingerprint() {
        return Secrets.sha256("treadwarm sheet 1\n" + framed(methodVersion) + framed(survey) + framed(sizing));
    }

    private static String framed(String text) {
        return text.getBytes(StandardCharsets.UTF_8).length + "\n" + text + "\n";
    }
}
