package org.treadwarm.store;

import java.io.IOException;
import java.nio.file.Files;
import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.Duration;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.sqlite.ProgressHandler;

/**
 * Looks through the data file before a server starts on it. SQLite's quick check reads every page once, so its time grows
 * with the file; it stops after a while, says so in the log, and the start goes on.
 */
final class StartCheck {
    private static final Logger LOG = LoggerFactory.getLogger(StartCheck.class);
    private static final int INTERRUPTED = 9;
    private static final int STEPS_BETWEEN_LOOKS = 10_000;

    private StartCheck() {}

    /**
     * Looks through the file.
     *
     * @return whether it was looked through to its end
     * @throws StoreUnavailable if damage is found, or the file cannot be read
     */
    static boolean run(SqliteFile engine, Duration atMost) {
        if (isEmpty(engine)) {
            return true;
        }
        long end = System.nanoTime() + atMost.toNanos();
        try (Connection connection = engine.connections().getConnection();
                Statement statement = connection.createStatement()) {
            ProgressHandler.setHandler(connection, STEPS_BETWEEN_LOOKS, new ProgressHandler() {
                @Override
                protected int progress() {
                    return System.nanoTime() - end > 0 ? 1 : 0;
                }
            });
            try (ResultSet found = statement.executeQuery("pragma quick_check(1)")) {
                String all = found.next() ? found.getString(1) : "ok";
                if (!all.equals("ok")) {
                    throw StoreUnavailable.of(
                            engine,
                            "the data file is damaged (" + firstFinding(all) + "); restore a backup",
                            new SQLException(all));
                }
                return true;
            } finally {
                ProgressHandler.clearHandler(connection);
            }
        } catch (SQLException problem) {
            if ((problem.getErrorCode() & 0xff) == INTERRUPTED) {
                LOG.warn("The data file was looked through for {} only, not to its end.", atMost);
                return false;
            }
            throw StoreUnavailable.of(engine, engine.explain(problem).orElseGet(problem::getMessage), problem);
        }
    }

    /** The first line that is not the heading of a database's findings. */
    private static String firstFinding(String all) {
        return all.lines().filter(line -> !line.startsWith("***")).findFirst().orElse(all);
    }

    private static boolean isEmpty(SqliteFile engine) {
        try {
            return !Files.exists(engine.file()) || Files.size(engine.file()) == 0;
        } catch (IOException problem) {
            throw DataFolder.notWritable(engine.folder(), problem);
        }
    }
}
