package org.treadwarm.draw;

import java.util.regex.Pattern;

/**
 * The sheet a drawing is laid out on.
 *
 * <p>Lettering is 14 px on the sheet whatever its width, so a drawing for a telephone is laid out on a narrow sheet
 * and not shrunk from a wide one.
 *
 * @param idPrefix starts every id in the drawing; a letter, then letters, digits, '-' or '_'; unique within the page
 * @param width width in pixels, 340 to 2000
 */
public record Sheet(String idPrefix, int width) {
    private static final Pattern ID = Pattern.compile("[A-Za-z][A-Za-z0-9_-]*");
    private static final int WIDE = 720;
    private static final int NARROW = 360;
    private static final int ROOMY = 560;

    /** @throws IllegalArgumentException if the prefix is no id or the width is out of range */
    public Sheet {
        if (!ID.matcher(idPrefix).matches()) {
            throw new IllegalArgumentException("Not usable as an id: " + idPrefix);
        }
        if (width < 340 || width > 2000) {
            throw new IllegalArgumentException("A sheet is 340 to 2000 px wide, not " + width);
        }
    }

    /** A sheet for a desk screen or paper, 720 px wide. */
    public static Sheet wide(String idPrefix) {
        return new Sheet(idPrefix, WIDE);
    }

    /** A sheet for a telephone, 360 px wide. */
    public static Sheet narrow(String idPrefix) {
        return new Sheet(idPrefix, NARROW);
    }

    boolean roomy() {
        return width >= ROOMY;
    }
}
