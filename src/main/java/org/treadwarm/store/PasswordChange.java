package org.treadwarm.store;

import java.time.Duration;

/** What became of an attempt to change one's own password. */
public sealed interface PasswordChange {
    /** The new password holds, and all other sessions of the person have ended. */
    record Changed() implements PasswordChange {}

    /** The present password was not right. */
    record WrongPassword() implements PasswordChange {}

    /** The new password breaks the rule of {@link PasswordRule}. */
    record PasswordRefused() implements PasswordChange {}

    /** Nothing was tried: after too many wrong passwords, the next try must wait this long. */
    record Wait(Duration remaining) implements PasswordChange {}
}
