package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.time.Duration;
import java.time.Instant;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.Parameter;
import org.junit.jupiter.params.ParameterizedClass;
import org.junit.jupiter.params.provider.EnumSource;

@ParameterizedClass
@EnumSource(Kind.class)
class SessionsTest {
    @Parameter
    Kind kind;

    @TempDir
    Path folder;

    private final TestClock clock = new TestClock();
    private DataHome home;
    private Store store;
    private Sessions sessions;
    private Person owner;

    @BeforeEach
    void open() {
        home = kind.emptyHome(folder);
        store = Store.open(home, clock);
        sessions = store.sessions();
        owner = PeopleTest.createOwner(store);
    }

    @AfterEach
    void close() {
        store.close();
    }

    @Test
    void findsTheSessionByItsTokenAlone() {
        Session session = sessions.start(owner);

        assertThat(session.token()).matches("[A-Za-z0-9_-]{43}");
        assertThat(sessions.find(session.token())).contains(session);
        assertThat(session.person()).isEqualTo(owner);
        assertThat(sessions.find("")).isEmpty();
        assertThat(sessions.find(Secrets.sha256(session.token()))).isEmpty();
        assertThat(new DataFile(home).text("select sha256 from session")).isEqualTo(Secrets.sha256(session.token()));
        assertThat(session.toString()).doesNotContain(session.token()).doesNotContain(session.csrfToken());
    }

    @Test
    void endsFourteenDaysAfterTheLastUse() {
        String token = sessions.start(owner).token();
        clock.pass(Duration.ofDays(14).minusMillis(1));
        Instant end = clock.instant().plus(Duration.ofDays(14));

        assertThat(sessions.find(token)).map(Session::expiresAt).contains(end);

        clock.pass(Duration.ofDays(14).minusMillis(1));
        assertThat(sessions.find(token)).isPresent();
        clock.pass(Duration.ofDays(14));
        assertThat(sessions.find(token)).isEmpty();
    }

    @Test
    void notesUsesToTheMinute() {
        DataFile file = new DataFile(home);
        String token = sessions.start(owner).token();
        clock.pass(Duration.ofMillis(59_999));
        sessions.find(token);
        assertThat(file.text("select last_seen_at from session")).isEqualTo("2026-03-02T08:00:00.000Z");
        clock.pass(Duration.ofMillis(1));
        sessions.find(token);
        assertThat(file.text("select last_seen_at from session")).isEqualTo("2026-03-02T08:01:00.000Z");
    }

    @Test
    void forgetsEndedSessions() {
        String token = sessions.start(owner).token();
        sessions.end(token);
        sessions.end("never was");
        assertThat(sessions.find(token)).isEmpty();

        sessions.start(owner);
        clock.pass(Duration.ofDays(14));
        sessions.start(owner);
        assertThat(new DataFile(home).count("session")).isEqualTo(1);
    }

    @Test
    void formsCarryASecretOfTheirSession() {
        Session one = sessions.start(owner);
        Session other = sessions.start(owner);

        assertThat(one.acceptsForm(one.csrfToken())).isTrue();
        assertThat(one.acceptsForm(other.csrfToken())).isFalse();
        assertThat(one.acceptsForm("")).isFalse();
        assertThat(sessions.find(one.token())).map(Session::csrfToken).contains(one.csrfToken());
    }

    /** RFC 4231, test case 2 (from memory), in base64url instead of hexadecimal. */
    @Test
    void theFormSecretIsAnHmacSha256() {
        assertThat(Secrets.hmac("Jefe", "what do ya want for nothing?"))
                .isEqualTo("W9zBRr9gdU5qBCQmCJV1x1oAPwidJzmDnexYuWTsOEM");
    }
}
