package org.treadwarm.store;

/** What became of an attempt to create the owner's account. */
public sealed interface OwnerCreation {
    /** The account exists and the link is spent. */
    record Created(Person owner) implements OwnerCreation {}

    /** The link is unknown, replaced by a newer one, spent or too old. */
    record LinkRefused() implements OwnerCreation {}

    /** The name breaks the rule of {@link PersonName}; the link is not spent. */
    record NameRefused() implements OwnerCreation {}

    /** The password breaks the rule of {@link PasswordRule}; the link is not spent. */
    record PasswordRefused() implements OwnerCreation {}
}
