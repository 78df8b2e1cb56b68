package org.treadwarm.store;

import org.jdbi.v3.core.Jdbi;

/** Looks into and meddles with the tables behind the store's back. */
final class DataFile {
    private final Jdbi jdbi;

    DataFile(DataHome home) {
        jdbi = Jdbi.create(Engine.of(home).connections());
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
