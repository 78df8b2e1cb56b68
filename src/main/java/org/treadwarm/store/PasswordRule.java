package org.treadwarm.store;

/** The rule for passwords: length only, since rules about kinds of characters make people choose worse ones. */
public final class PasswordRule {
    public static final int MINIMUM_LENGTH = 10;
    public static final int MAXIMUM_LENGTH = 200;

    private PasswordRule() {}

    /** Whether the password has 10 to 200 characters. */
    public static boolean accepts(String password) {
        int length = password.codePointCount(0, password.length());
        return length >= MINIMUM_LENGTH && length <= MAXIMUM_LENGTH;
    }
}
