package org.treadwarm.survey;

/** JSON Pointers (RFC 6901): the one address of every number. */
public final class Pointer {
    private Pointer() {}

    /** A pointer one key further down; {@code /} and {@code ~} in the key are escaped. */
    public static String to(String parent, String key) {
        return parent + "/" + escape(key);
    }

    /** A pointer to an item of a list. */
    public static String to(String parent, int index) {
        return parent + "/" + index;
    }

    private static String escape(String key) {
        if (key.indexOf('~') < 0 && key.indexOf('/') < 0) {
            return key;
        }
        return key.replace("~", "~0").replace("/", "~1");
    }
}
