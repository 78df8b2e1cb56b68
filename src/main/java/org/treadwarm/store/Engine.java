package org.treadwarm.store;

import com.zaxxer.hikari.HikariDataSource;
import java.sql.Connection;
import java.sql.SQLException;
import java.util.Optional;
import javax.sql.DataSource;

/** What differs between the databases; the rest of the package speaks SQL that both know. */
sealed interface Engine permits SqliteFile, Postgres {
    static Engine of(DataHome home) {
        if (home instanceof DataHome.Folder folder) {
            return new SqliteFile(folder.path());
        }
        return new Postgres((DataHome.Postgresql) home);
    }

    /** What messages call it, such as "data folder /srv/floors". */
    String name();

    /** A new connection each time. */
    DataSource connections();

    /** The connections, kept open for many uses. */
    HikariDataSource pool(DataSource connections);

    /** Makes the place as needed, then runs what brings its tables up to date. */
    void prepare(Runnable preparation);

    /** Statements, each with its semicolon, after which the rows of a table can be neither changed nor removed. */
    String keepRows(String table);

    /** Must run before each transaction begins. */
    void beforeBegin(Connection connection) throws SQLException;

    /** Must run after each transaction has begun; then it is alone against all other changes, of other processes too. */
    void afterBegin(Connection connection) throws SQLException;

    /** What a failure means to the person who runs the program; empty if it is a fault of the program. */
    Optional<String> explain(SQLException problem);

    /** Whether a failure means that the disk is full. */
    boolean isFull(SQLException problem);

    /** Whether a commit that failed so may have been made all the same. */
    boolean leavesCommitUnknown(SQLException problem);
}
