package org.treadwarm.store;

import java.time.Duration;

/** What became of an attempt to sign in. */
public sealed interface SignIn {
    /** Name and password belong to this person. */
    record SignedIn(Person person) implements SignIn {}

    /** The name is unknown or the password wrong; the difference is not told. */
    record Refused() implements SignIn {}

    /** The password was not tried: after too many failures under this name, the next try must wait this long. */
    record Wait(Duration remaining) implements SignIn {}
}
