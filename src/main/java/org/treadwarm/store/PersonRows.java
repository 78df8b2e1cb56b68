package org.treadwarm.store;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.time.Instant;
import java.util.Optional;
import org.jdbi.v3.core.Handle;

/** The rows of people, as the parts of the store that know about people share them. */
final class PersonRows {
    private static final String COLUMNS = "id, name, role, created_at, password_hash";

    private PersonRows() {}

    /** Somebody whose account is open, and the hash of the password. */
    record Account(Person person, String passwordHash) {}

    static Optional<Account> byName(Handle handle, String nameKey) {
        return one(handle, "name_key", nameKey);
    }

    static Optional<Account> byId(Handle handle, String id) {
        return one(handle, "id", id);
    }

    private static Optional<Account> one(Handle handle, String column, String value) {
        return handle.createQuery(
                        "select " + COLUMNS + " from person where closed_at is null and " + column + " = :value")
                .bind("value", value)
                .map((row, context) -> new Account(person(row), row.getString("password_hash")))
                .findOne();
    }

    static Person person(ResultSet row) throws SQLException {
        return new Person(
                row.getString("id"),
                row.getString("name"),
                Role.of(row.getString("role")),
                Times.instant(row.getString("created_at")));
    }

    /** Whether the name was free; if not, nothing was added. */
    static boolean insert(Handle handle, Person person, String hash) {
        return handle.createUpdate("insert into person (id, name, name_key, role, password_hash, created_at)"
                                + " values (:id, :name, :nameKey, :role, :hash, :createdAt)"
                                + " on conflict (name_key) do nothing")
                        .bind("id", person.id())
                        .bind("name", person.name())
                        .bind("nameKey", PersonName.key(person.name()))
                        .bind("role", person.role().text())
                        .bind("hash", hash)
                        .bind("createdAt", Times.text(person.createdAt()))
                        .execute()
                == 1;
    }

    static void setPassword(Handle handle, String id, String hash) {
        handle.createUpdate("update person set password_hash = :hash where id = :id")
                .bind("hash", hash)
                .bind("id", id)
                .execute();
    }

    static void seen(Handle handle, String id, Instant now) {
        handle.createUpdate("update person set last_seen_at = :now where id = :id")
                .bind("now", Times.text(now))
                .bind("id", id)
                .execute();
    }
}
