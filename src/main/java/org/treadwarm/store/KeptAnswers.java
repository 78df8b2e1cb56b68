package org.treadwarm.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import java.util.function.Supplier;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.StatementContext;

/** Answers to requests that created something, kept for a day so that the same request sent again creates nothing. */
public final class KeptAnswers {
    /** How long an answer is kept. */
    public static final Duration KEPT = Duration.ofHours(24);

    private final Database database;
    private final Clock clock;

    KeptAnswers(Database database, Clock clock) {
        this.database = database;
        this.clock = clock;
    }

    private record Row(String sha256, KeptAnswer answer) {
        static Row of(ResultSet row, StatementContext context) throws SQLException {
            KeptAnswer answer = new KeptAnswer(
                    row.getInt("status"), row.getString("location"), row.getString("etag"), row.getString("body"));
            return new Row(row.getString("request_sha256"), answer);
        }
    }

    /**
     * Creates something and keeps the answer, both in one transaction; or neither, when the request was answered within the
     * last 24 hours. The transaction is alone against all others, so of equal requests at the same time, be it to several
     * servers, one creates.
     *
     * @param creation changes the store by the methods of this package; empty when it created nothing, which is not kept;
     *     what it throws takes everything back
     */
    public Once once(NamedRequest request, Supplier<Optional<KeptAnswer>> creation) {
        return database.change(handle -> {
            Instant now = Times.now(clock);
            removeOld(handle, now);
            Optional<Row> known = find(handle, request);
            if (known.isPresent()) {
                boolean same = known.get().sha256().equals(request.sha256());
                return same ? new Once.Repeated(known.get().answer()) : new Once.Different();
            }
            Optional<KeptAnswer> answer = creation.get();
            answer.ifPresent(made -> insert(handle, request, made, now));
            return answer.<Once>map(Once.Made::new).orElseGet(Once.Nothing::new);
        });
    }

    private static void removeOld(Handle handle, Instant now) {
        handle.createUpdate("delete from kept_answer where made_at <= :end")
                .bind("end", Times.text(now.minus(KEPT)))
                .execute();
    }

    private static Optional<Row> find(Handle handle, NamedRequest request) {
        return handle.createQuery("select request_sha256, status, location, etag, body from kept_answer"
                        + " where key_id = :key and request_name = :name")
                .bind("key", request.keyId())
                .bind("name", request.name())
                .map(Row::of)
                .findOne();
    }

    private static void insert(Handle handle, NamedRequest request, KeptAnswer answer, Instant now) {
        handle.createUpdate("insert into kept_answer"
                        + " (key_id, request_name, request_sha256, status, location, etag, body, made_at)"
                        + " values (:key, :name, :sha256, :status, :location, :etag, :body, :now)")
                .bind("key", request.keyId())
                .bind("name", request.name())
                .bind("sha256", request.sha256())
                .bind("status", answer.status())
                .bind("location", answer.location())
                .bind("etag", answer.etag())
                .bind("body", answer.body())
                .bind("now", Times.text(now))
                .execute();
    }
}
