package org.treadwarm.store;

/** What became of an attempt to use a link. Unless it is done, the link is not spent. */
public sealed interface LinkUse {
    /** The account has its password, and the link is spent. */
    record Done(Person person) implements LinkUse {}

    /** The link is unknown, revoked, spent, too old, or for something else. */
    record LinkRefused() implements LinkUse {}

    /** The name breaks the rule of {@link PersonName}. */
    record NameRefused() implements LinkUse {}

    /** Somebody has this name, or had it until the account was closed. */
    record NameTaken() implements LinkUse {}

    /** The password breaks the rule of {@link PasswordRule}. */
    record PasswordRefused() implements LinkUse {}
}
