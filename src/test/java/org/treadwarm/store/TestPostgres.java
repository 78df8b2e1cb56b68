package org.treadwarm.store;

import io.zonky.test.db.postgres.embedded.EmbeddedPostgres;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.sql.Connection;
import java.sql.SQLException;
import java.util.concurrent.atomic.AtomicInteger;

/** One PostgreSQL server for all tests of a Java machine; each test has a schema of its own. */
public final class TestPostgres {
    private static final AtomicInteger SCHEMAS = new AtomicInteger();

    private TestPostgres() {}

    /** The server; it ends with the Java machine. */
    private static final class Running {
        static final EmbeddedPostgres SERVER = start();

        private static EmbeddedPostgres start() {
            try {
                return EmbeddedPostgres.builder().start();
            } catch (IOException e) {
                throw new UncheckedIOException(e);
            }
        }
    }

    /** A new, empty place. */
    public static DataHome.Postgresql emptyHome() {
        String schema = "place_" + SCHEMAS.incrementAndGet();
        execute("create schema " + schema);
        return DataHome.database(address("postgres") + "&currentSchema=" + schema);
    }

    /** The address of a database of this server, there or not. */
    static String address(String database) {
        return Running.SERVER.getJdbcUrl("postgres", database);
    }

    static void execute(String sql) {
        try (Connection connection = Running.SERVER.getPostgresDatabase().getConnection()) {
            connection.createStatement().execute(sql);
        } catch (SQLException e) {
            throw new IllegalStateException(e);
        }
    }
}
