package org.treadwarm.store;

import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import org.jdbi.v3.core.Handle;

/** The signed-in browsers. A session ends 14 days after its last use; uses are noted to the minute. */
public final class Sessions {
    private static final Duration ENDS_AFTER = Duration.ofDays(14);
    private static final Duration NOTED_EVERY = Duration.ofMinutes(1);

    private final Database database;
    private final Clock clock;

    Sessions(Database database, Clock clock) {
        this.database = database;
        this.clock = clock;
    }

    /** Starts a session for somebody who has just signed in. */
    public Session start(Person person) {
        Instant now = Times.now(clock);
        String token = Secrets.token();
        return database.change(handle -> {
            deleteExpired(handle, now);
            handle.createUpdate("insert into session (sha256, person_id, created_at, last_seen_at)"
                            + " values (:sha256, :personId, :now, :now)")
                    .bind("sha256", Secrets.sha256(token))
                    .bind("personId", person.id())
                    .bind("now", Times.text(now))
                    .execute();
            return session(person, token, now, now);
        });
    }

    /** The session with this token, which counts as a use of it; empty if there is none or it has ended. */
    public Optional<Session> find(String token) {
        Instant now = Times.now(clock);
        Optional<Found> found = database.read(handle -> find(handle, token))
                .filter(session -> now.isBefore(session.lastSeenAt().plus(ENDS_AFTER)));
        if (found.isEmpty()) {
            return Optional.empty();
        }
        Instant lastSeenAt = found.get().lastSeenAt();
        if (!now.isBefore(lastSeenAt.plus(NOTED_EVERY))) {
            database.changeIfPossible(handle -> note(handle, token, now));
            lastSeenAt = now;
        }
        return Optional.of(session(found.get().person(), token, found.get().createdAt(), lastSeenAt));
    }

    /** Ends the session with this token, if there is one. */
    public void end(String token) {
        database.change(handle -> handle.createUpdate("delete from session where sha256 = :sha256")
                .bind("sha256", Secrets.sha256(token))
                .execute());
    }

    private record Found(Person person, Instant createdAt, Instant lastSeenAt) {}

    private static Session session(Person person, String token, Instant createdAt, Instant lastSeenAt) {
        return new Session(person, token, Secrets.hmac(token, "csrf"), createdAt, lastSeenAt.plus(ENDS_AFTER));
    }

    private static Optional<Found> find(Handle handle, String token) {
        return handle.createQuery("select person.id, person.name, person.role, person.created_at,"
                        + " session.created_at as started_at, session.last_seen_at"
                        + " from session join person on person.id = session.person_id where session.sha256 = :sha256")
                .bind("sha256", Secrets.sha256(token))
                .map((row, context) -> new Found(
                        People.person(row),
                        Times.instant(row.getString("started_at")),
                        Times.instant(row.getString("last_seen_at"))))
                .findOne();
    }

    private static void note(Handle handle, String token, Instant now) {
        handle.createUpdate("update session set last_seen_at = :now where sha256 = :sha256")
                .bind("now", Times.text(now))
                .bind("sha256", Secrets.sha256(token))
                .execute();
    }

    private static void deleteExpired(Handle handle, Instant now) {
        handle.createUpdate("delete from session where last_seen_at <= :oldest")
                .bind("oldest", Times.text(now.minus(ENDS_AFTER)))
                .execute();
    }
}
