package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.treadwarm.store.PeopleTest.PASSWORD;

import java.nio.file.Path;
import java.time.Duration;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** One's own password and sessions. */
class OwnAccountTest {
    private static final String FRESH = "another long one";
    private static final String HERE = "192.0.2.1";

    @TempDir
    Path folder;

    private final TestClock clock = new TestClock();
    private Store store;
    private Person owner;

    @BeforeEach
    void open() {
        store = Store.open(folder, clock);
        owner = PeopleTest.createOwner(store);
    }

    @AfterEach
    void close() {
        store.close();
    }

    @Test
    void aNewPasswordNeedsTheOldAndEndsTheOtherSessions() {
        Session here = store.sessions().start(owner);
        Session there = store.sessions().start(owner);
        People people = store.people();

        assertThat(people.changePassword(here, "not the old one", FRESH, HERE))
                .isEqualTo(new PasswordChange.WrongPassword());
        assertThat(people.changePassword(here, PASSWORD, "short", HERE))
                .isEqualTo(new PasswordChange.PasswordRefused());
        assertThat(store.sessions().find(there.token())).isPresent();
        assertThat(people.changePassword(here, PASSWORD, FRESH, HERE)).isEqualTo(new PasswordChange.Changed());

        assertThat(store.sessions().find(here.token())).isPresent();
        assertThat(store.sessions().find(there.token())).isEmpty();
        assertThat(people.signIn("Anna Quill", PASSWORD, HERE)).isEqualTo(new SignIn.Refused());
        assertThat(people.signIn("Anna Quill", FRESH, HERE)).isEqualTo(new SignIn.SignedIn(owner));
        assertThat(store.audit().latest(2).get(1).what()).isEqualTo("changed password");
    }

    @Test
    void guessingTheOldPasswordIsSlowToo() {
        Session here = store.sessions().start(owner);
        for (int i = 0; i < 5; i++) {
            store.people().changePassword(here, "not the old one", FRESH, HERE);
        }
        assertThat(store.people().changePassword(here, PASSWORD, FRESH, HERE))
                .isEqualTo(new PasswordChange.Wait(Duration.ofSeconds(1)));
        assertThat(store.people().signIn("Anna Quill", PASSWORD, HERE))
                .isEqualTo(new SignIn.Wait(Duration.ofSeconds(1)));
    }

    @Test
    void sessionsAreListedAndEndOneByOneOrAll() {
        Sessions sessions = store.sessions();
        Session first = sessions.start(owner);
        clock.pass(Duration.ofHours(1));
        Session second = sessions.start(owner);

        assertThat(sessions.list(owner))
                .containsExactly(
                        new OpenSession(second.id(), second.createdAt(), second.createdAt()),
                        new OpenSession(first.id(), first.createdAt(), first.createdAt()));
        assertThat(sessions.end(owner, first.id())).isTrue();
        assertThat(sessions.end(owner, first.id())).isFalse();
        assertThat(sessions.find(first.token())).isEmpty();
        assertThat(sessions.find(second.token())).isPresent();
        assertThat(store.audit().latest(1).get(0).what()).isEqualTo("ended a session");

        sessions.endAll(owner);
        assertThat(sessions.list(owner)).isEmpty();
        assertThat(sessions.find(second.token())).isEmpty();
        clock.pass(Duration.ofDays(14));
        sessions.start(owner);
        clock.pass(Duration.ofDays(14));
        assertThat(sessions.list(owner)).isEmpty();
    }

    @Test
    void nobodyEndsTheSessionsOfOthers() {
        Session session = store.sessions().start(owner);
        String token = store.links().invite("Ben", Role.OWNER, "Anna Quill").token();
        Person ben = ((LinkUse.Done) store.links().join(token, "Ben", PASSWORD)).person();

        assertThat(store.sessions().end(ben, session.id())).isFalse();
        store.sessions().endAll(ben);

        assertThat(store.sessions().find(session.token())).isPresent();
    }
}
