package org.treadwarm.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Clock;
import java.time.Duration;
import java.time.Instant;
import java.util.List;
import java.util.Optional;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.statement.StatementContext;

/** The keys other programs use. Uses are noted to the minute. */
public final class ApiKeys {
    private static final String COLUMNS = "id, name, scope, created_at, last_used_at, expires_at, revoked_at";
    private static final Duration NOTED_EVERY = Duration.ofMinutes(1);

    private final Database database;
    private final Audit audit;
    private final Clock clock;

    ApiKeys(Database database, Audit audit, Clock clock) {
        this.database = database;
        this.audit = audit;
        this.clock = clock;
    }

    /** Makes a key that works until it is revoked, see {@link #create(String, Scope, Optional, String)}. */
    public NewApiKey create(String name, Scope scope, String who) {
        return create(name, scope, Optional.empty(), who);
    }

    /**
     * Makes a key.
     *
     * @param expiresAt from when on it no longer works, if it shall end by itself
     * @param who the person who makes it, for the audit list
     * @throws IllegalArgumentException if the name has a NUL or half a character
     */
    public NewApiKey create(String name, Scope scope, Optional<Instant> expiresAt, String who) {
        ApiKey key = new ApiKey(
                Secrets.id(),
                Texts.storable("name of the key", name),
                scope,
                Times.now(clock),
                Optional.empty(),
                expiresAt,
                Optional.empty());
        String token = "tw_" + Secrets.token();
        return database.change(handle -> {
            insert(handle, key, Secrets.sha256(token));
            audit.append(handle, who, "created key", key.id() + " " + name + " (" + scope.text() + ")");
            return new NewApiKey(key, token);
        });
    }

    /** The key with this token, which counts as a use of it; empty if there is none, it was revoked or has expired. */
    public Optional<ApiKey> find(String token) {
        Instant now = Times.now(clock);
        return known(token).filter(key -> key.works(now)).map(key -> used(key, now));
    }

    /** The key with this token, whether it works or no longer does. */
    public Optional<ApiKey> known(String token) {
        return database.read(handle -> handle.createQuery("select " + COLUMNS + " from api_key where sha256 = :sha256")
                .bind("sha256", Secrets.sha256(token))
                .map(ApiKeys::key)
                .findOne());
    }

    private ApiKey used(ApiKey key, Instant now) {
        if (key.lastUsed().isPresent() && now.isBefore(key.lastUsed().get().plus(NOTED_EVERY))) {
            return key;
        }
        database.changeIfPossible(handle -> handle.createUpdate("update api_key set last_used_at = :now where id = :id")
                .bind("now", Times.text(now))
                .bind("id", key.id())
                .execute());
        return key.usedAt(now);
    }

    /** All keys that were not revoked, the newest first. */
    public List<ApiKey> list() {
        return database.read(handle -> handle.createQuery(
                        "select " + COLUMNS + " from api_key where revoked_at is null order by created_at desc, id")
                .map(ApiKeys::key)
                .list());
    }

    /** Ends a key at once. Returns whether there was one with this id. */
    public boolean revoke(String id, String who) {
        return database.change(handle -> {
            Optional<String> name = handle.createQuery("select name from api_key where id = :id and revoked_at is null")
                    .bind("id", id)
                    .mapTo(String.class)
                    .findOne();
            name.ifPresent(known -> {
                handle.createUpdate("update api_key set revoked_at = :now where id = :id")
                        .bind("now", Times.text(Times.now(clock)))
                        .bind("id", id)
                        .execute();
                audit.append(handle, who, "revoked key", id + " " + known);
            });
            return name.isPresent();
        });
    }

    private static void insert(Handle handle, ApiKey key, String sha256) {
        handle.createUpdate("insert into api_key (id, name, scope, sha256, created_at, expires_at)"
                        + " values (:id, :name, :scope, :sha256, :createdAt, :expiresAt)")
                .bind("id", key.id())
                .bind("name", key.name())
                .bind("scope", key.scope().text())
                .bind("sha256", sha256)
                .bind("createdAt", Times.text(key.createdAt()))
                .bind("expiresAt", key.expiresAt().map(Times::text).orElse(null))
                .execute();
    }

    private static ApiKey key(ResultSet row, StatementContext context) throws SQLException {
        return new ApiKey(
                row.getString("id"),
                row.getString("name"),
                Scope.of(row.getString("scope")),
                Times.instant(row.getString("created_at")),
                time(row, "last_used_at"),
                time(row, "expires_at"),
                time(row, "revoked_at"));
    }

    private static Optional<Instant> time(ResultSet row, String column) throws SQLException {
        return Optional.ofNullable(row.getString(column)).map(Times::instant);
    }
}
