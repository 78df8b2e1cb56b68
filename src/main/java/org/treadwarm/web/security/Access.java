package org.treadwarm.web.security;

import io.javalin.security.RouteRole;
import org.treadwarm.store.Role;
import org.treadwarm.store.Scope;

/** Who may use a route. It stands beside each route, and nothing is served without it. */
public sealed interface Access extends RouteRole {
    /** Whoever comes. */
    Access ANYBODY = new Anybody();

    /** Everybody who is signed in. */
    Access SURVEYOR = new Member(Role.SURVEYOR);

    /** Estimators and owners. */
    Access ESTIMATOR = new Member(Role.ESTIMATOR);

    /** Owners. */
    Access OWNER = new Member(Role.OWNER);

    /** Programs with any key. */
    Access SIZE = new Key(Scope.SIZE);

    /** Programs whose key reads jobs. */
    Access READ = new Key(Scope.READ);

    /** Programs whose key writes jobs. */
    Access WRITE = new Key(Scope.WRITE);

    /** Programs on this machine, and programs elsewhere whose key reads jobs. */
    Access WATCH = new Watcher(Scope.READ);

    /** Whoever comes. */
    record Anybody() implements Access {}

    /** Somebody signed in, with this role or one that may do more. */
    record Member(Role least) implements Access {}

    /** A program on this machine, or one with a key of this scope or one that reaches further. */
    record Watcher(Scope least) implements Access {}

    /** A program with a key of this scope or one that reaches further. */
    record Key(Scope least) implements Access {}
}
