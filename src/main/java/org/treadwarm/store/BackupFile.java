package org.treadwarm.store;

import java.nio.file.Files;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import org.sqlite.SQLiteConfig;

/**
 * A backup, as it is looked at before it is trusted.
 *
 * @param bytes its size
 * @param jobs how many jobs are in it
 * @param revisions how many revisions they have together
 */
public record BackupFile(long bytes, long jobs, long revisions) {
    /**
     * Opens a backup for reading only and checks it whole: the structure of the file, and every text against the SHA-256
     * that it is kept under.
     *
     * @throws StoreUnavailable if it is missing, damaged, of another program or of a newer one
     */
    static BackupFile checked(Path file) {
        if (!Files.isRegularFile(file)) {
            throw new StoreUnavailable("The backup " + file + " is not there, or is no file.");
        }
        if (Files.exists(file.resolveSibling(file.getFileName() + "-wal"))) {
            throw new StoreUnavailable("The file " + file
                    + " has a write-ahead log beside it, so it is a copy of a live data file and not a backup.");
        }
        // Nothing is written beside a file that is opened as one that never changes.
        String url = "jdbc:sqlite:file:" + file.toAbsolutePath().toUri().getRawPath() + "?immutable=1";
        SQLiteConfig config = new SQLiteConfig();
        config.setReadOnly(true);
        try (Connection connection = config.createConnection(url);
                Statement statement = connection.createStatement()) {
            return checked(file, statement);
        } catch (SQLException problem) {
            throw new StoreUnavailable(
                    "The backup " + file + " is damaged or no data file of this program: " + problem.getMessage() + ".",
                    problem);
        }
    }

    private static BackupFile checked(Path file, Statement statement) throws SQLException {
        String integrity = text(statement, "pragma integrity_check(1)");
        if (!integrity.equals("ok")) {
            throw new StoreUnavailable("The backup " + file + " is damaged: " + integrity + ".");
        }
        String version =
                text(statement, "select version from flyway_schema_history order by installed_rank desc limit 1");
        if (Integer.parseInt(version) > Integer.parseInt(Schema.VERSION)) {
            throw new StoreUnavailable("The backup " + file + " was made by a newer Treadwarm (tables of version "
                    + version + "; this program knows up to " + Schema.VERSION + ").");
        }
        hashAnew(file, statement, "piece");
        hashAnew(file, statement, "manifest");
        return new BackupFile(
                file.toFile().length(),
                Long.parseLong(text(statement, "select count(*) from job")),
                Long.parseLong(text(statement, "select count(*) from revision")));
    }

    private static void hashAnew(Path file, Statement statement, String table) throws SQLException {
        try (ResultSet rows = statement.executeQuery("select sha256, body from " + table)) {
            while (rows.next()) {
                if (!Secrets.sha256(rows.getString(2)).equals(rows.getString(1))) {
                    throw new StoreUnavailable(
                            "The backup " + file + " is damaged: the text " + rows.getString(1) + " has changed.");
                }
            }
        }
    }

    private static String text(Statement statement, String query) throws SQLException {
        try (ResultSet rows = statement.executeQuery(query)) {
            if (!rows.next()) {
                throw new SQLException("it holds no tables of this program");
            }
            return rows.getString(1);
        }
    }
}
