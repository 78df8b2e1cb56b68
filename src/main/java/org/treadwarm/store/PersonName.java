package org.treadwarm.store;

import java.text.Normalizer;
import java.util.Locale;
import java.util.regex.Pattern;

/** The rule for names of people, and the form in which names are compared. */
public final class PersonName {
    public static final int MAXIMUM_LENGTH = 80;

    private static final Pattern CONTROL = Pattern.compile("[\\p{Cc}\\p{Cs}\\p{Zl}\\p{Zp}]");

    private PersonName() {}

    /** Whether the name has 1 to 80 characters, apart from white space around it, none of them a control character or line break. */
    public static boolean accepts(String name) {
        String stripped = name.strip();
        return !stripped.isEmpty()
                && stripped.codePointCount(0, stripped.length()) <= MAXIMUM_LENGTH
                && !CONTROL.matcher(stripped).find();
    }

    /** Whether a name without rule may be asked for: some databases refuse U+0000 even in a question. */
    static boolean canBeKept(String name) {
        return name.indexOf('\0') < 0;
    }

    static String key(String name) {
        return Normalizer.normalize(name.strip(), Normalizer.Form.NFC).toLowerCase(Locale.ROOT);
    }
}
