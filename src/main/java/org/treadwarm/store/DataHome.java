package org.treadwarm.store;

import java.nio.file.Path;

/** Where everything is kept: a folder of this machine, or a PostgreSQL database that several servers may share. */
public sealed interface DataHome {
    /** What the address of a database begins with. */
    String ADDRESS = "jdbc:postgresql:";

    /** A folder with one SQLite file. */
    record Folder(Path path) implements DataHome {}

    /**
     * A PostgreSQL database.
     *
     * @param url its JDBC address, which may hold a password and so is never shown
     */
    record Postgresql(String url) implements DataHome {
        @Override
        public String toString() {
            return "database " + shown(url);
        }
    }

    /** The folder. */
    static DataHome folder(Path path) {
        return new Folder(path);
    }

    /**
     * The database at a JDBC address such as {@code jdbc:postgresql://host:5432/name?user=...&password=...}.
     *
     * @throws IllegalArgumentException if it is no address of a PostgreSQL database; the message does not repeat it
     */
    static Postgresql database(String url) {
        if (!url.startsWith(ADDRESS) || org.postgresql.Driver.parseURL(url, null) == null) {
            throw new IllegalArgumentException(
                    "The address of the database cannot be used (it is not repeated here, as it"
                            + " may hold a password). Allowed is " + ADDRESS
                            + "//host:port/name?user=...&password=...");
        }
        return new Postgresql(url);
    }

    /** The address without what may be secret. */
    private static String shown(String url) {
        return url.substring("jdbc:".length()).split("[?]", 2)[0].replaceAll("//[^/]*@", "//");
    }
}
