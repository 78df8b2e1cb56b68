package org.treadwarm.store;

import com.zaxxer.hikari.HikariConfig;
import com.zaxxer.hikari.HikariDataSource;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.SQLException;
import java.sql.SQLTransientConnectionException;
import java.util.Optional;
import javax.sql.DataSource;
import org.sqlite.SQLiteConfig;
import org.sqlite.SQLiteConnection;
import org.sqlite.SQLiteDataSource;

/**
 * All that is particular to SQLite.
 *
 * <p>The file is in write-ahead mode with full synchronisation, so a committed change survives a killed process and a
 * power cut, and a second process can read and write beside the first. Transactions take the write lock when they
 * begin: one that reads first and asks for the lock later is refused by SQLite, without waiting, when another writer
 * came between.
 */
record SqliteFile(Path folder) implements Engine {
    static final String NAME = "treadwarm.sqlite";

    private static final int FULL = 13;
    private static final int BUSY_TIMEOUT_MILLISECONDS = 5000;
    private static final int POOL_SIZE = 6;

    @Override
    public String name() {
        return "data folder " + folder;
    }

    /** The data file. */
    Path file() {
        return folder.resolve(NAME);
    }

    @Override
    public SQLiteDataSource connections() {
        SQLiteConfig config = new SQLiteConfig();
        config.setJournalMode(SQLiteConfig.JournalMode.WAL);
        config.setSynchronous(SQLiteConfig.SynchronousMode.FULL);
        config.enforceForeignKeys(true);
        config.setBusyTimeout(BUSY_TIMEOUT_MILLISECONDS);
        config.setTransactionMode(SQLiteConfig.TransactionMode.IMMEDIATE);
        SQLiteDataSource source = new SQLiteDataSource(config);
        source.setUrl("jdbc:sqlite:" + file());
        return source;
    }

    @Override
    public HikariDataSource pool(DataSource connections) {
        HikariConfig config = new HikariConfig();
        config.setPoolName("store");
        config.setDataSource(connections);
        config.setMaximumPoolSize(POOL_SIZE);
        config.setMinimumIdle(1);
        return new HikariDataSource(config);
    }

    @Override
    public void prepare(Runnable preparation) {
        DataFolder.prepare(folder, preparation);
    }

    @Override
    public String keepRows(String table) {
        String refusal =
                " on " + table + " begin select raise(abort, 'rows of " + table + " are kept as they are'); end;";
        return "create trigger " + table + "_unchanged before update" + refusal + "\n\ncreate trigger " + table
                + "_kept before delete" + refusal;
    }

    /** It will take the write lock at once. */
    @Override
    public void beforeBegin(Connection connection) throws SQLException {
        mode(connection, SQLiteConfig.TransactionMode.IMMEDIATE);
    }

    /**
     * The driver begins another transaction inside its commit. If that one
     * took the write lock too, it could wait for another process and fail, and a commit that was made would be reported
     * as failed.
     */
    @Override
    public void afterBegin(Connection connection) throws SQLException {
        mode(connection, SQLiteConfig.TransactionMode.DEFERRED);
    }

    private static void mode(Connection connection, SQLiteConfig.TransactionMode mode) throws SQLException {
        connection.unwrap(SQLiteConnection.class).getConnectionConfig().setTransactionMode(mode);
    }

    @Override
    public Optional<String> explain(SQLException problem) {
        // The low byte is the primary result code of SQLite's C interface (sqlite.org/rescode.html, from memory).
        return switch (problem.getErrorCode() & 0xff) {
            case 5, 6 -> Optional.of("another program keeps the data file locked; try again");
            case 8 -> Optional.of("the data file cannot be written: it, or its folder, is read-only");
            case 10 -> Optional.of("the disk reported a fault while the data file was read or written");
            case 11 -> Optional.of("the data file is damaged; restore a backup");
            case FULL -> Optional.of("the disk is full; free some space and try again");
            case 14 -> Optional.of("the data file cannot be opened; look at the rights of the folder");
            case 26 -> Optional.of("the file " + NAME + " in it is not a database");
            default ->
                problem instanceof SQLTransientConnectionException
                        ? Optional.of("too many requests wait for the data file; try again")
                        : Optional.empty();
        };
    }

    @Override
    public boolean isFull(SQLException problem) {
        return (problem.getErrorCode() & 0xff) == FULL;
    }

    /** A commit that failed is rolled back when the file is next used. */
    @Override
    public boolean leavesCommitUnknown(SQLException problem) {
        return false;
    }
}
