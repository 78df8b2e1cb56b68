package org.treadwarm.store;

import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.jdbi.v3.core.Handle;

/** The signed-in browsers. A session ends 14 days after its last use; uses are noted to the minute. */
public final class Sessions {
    private static final Duration ENDS_AFTER = Duration.ofDays(14);
    private static final Duration NOTED_EVERY = Duration.ofMinutes(1);

    private final Database database;
    private final Audit audit;
    private final Clock clock;

    Sessions(Database database, Audit audit, Clock clock) {
        this.database = database;
        this.audit = audit;
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
            PersonRows.seen(handle, person.id(), now);
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
            Person person = found.get().person();
            database.changeIfPossible(handle -> {
                note(handle, token, now);
                PersonRows.seen(handle, person.id(), now);
            });
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

    /** The sessions of somebody that have not ended, the last used first. */
    public List<OpenSession> list(Person person) {
        return database.read(handle -> handle.createQuery("select substr(sha256, 1, 16) as id, created_at, last_seen_at"
                        + " from session where person_id = :person and last_seen_at > :oldest"
                        + " order by last_seen_at desc, sha256")
                .bind("person", person.id())
                .bind("oldest", Times.text(Times.now(clock).minus(ENDS_AFTER)))
                .map((row, context) -> new OpenSession(
                        row.getString("id"),
                        Times.instant(row.getString("created_at")),
                        Times.instant(row.getString("last_seen_at"))))
                .list());
    }

    /** Ends one of somebody's own sessions. Returns whether there was one with this id. */
    public boolean end(Person person, String id) {
        return database.change(handle -> {
            boolean existed =
                    handle.createUpdate("delete from session where person_id = :person and substr(sha256, 1, 16) = :id")
                                    .bind("person", person.id())
                                    .bind("id", id)
                                    .execute()
                            > 0;
            if (existed) {
                audit.append(handle, person.name(), "ended a session", person.name());
            }
            return existed;
        });
    }

    /** Ends all sessions of somebody. */
    public void endAll(Person person) {
        database.change(handle -> {
            handle.execute("delete from session where person_id = ?", person.id());
            return audit.append(handle, person.name(), "signed out everywhere", person.name());
        });
    }

    static void endAllBut(Handle handle, String personId, String token) {
        handle.execute("delete from session where person_id = ? and sha256 <> ?", personId, Secrets.sha256(token));
    }

    private record Found(Person person, Instant createdAt, Instant lastSeenAt) {}

    private static Session session(Person person, String token, Instant createdAt, Instant lastSeenAt) {
        return new Session(person, token, Secrets.hmac(token, "csrf"), createdAt, lastSeenAt.plus(ENDS_AFTER));
    }

    private static Optional<Found> find(Handle handle, String token) {
        return handle.createQuery("select person.id, person.name, person.role, person.created_at,"
                        + " session.created_at as started_at, session.last_seen_at"
                        + " from session join person on person.id = session.person_id"
                        + " where session.sha256 = :sha256 and person.closed_at is null")
                .bind("sha256", Secrets.sha256(token))
                .map((row, context) -> new Found(
                        PersonRows.person(row),
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
