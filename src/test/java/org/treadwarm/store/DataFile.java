package org.treadwarm.store;

import java.nio.file.Path;
import org.jdbi.v3.core.Jdbi;

/** Looks into and meddles with the data file behind the store's back. */
final class DataFile {
    private final Jdbi jdbi;

    DataFile(Path folder) {
        jdbi = Jdbi.create(SqliteFile.connections(folder));
    }

    long count(String table) {
        return jdbi.withHandle(handle -> handle.createQuery("select count(*) from " + table)
                .mapTo(Long.class)
                .one());
    }

    String text(String query) {
        return jdbi.withHandle(
                handle -> handle.createQuery(query).mapTo(String.class).one());
    }

    void execute(String statement) {
        jdbi.useHandle(handle -> handle.execute(statement));
    }
}
