package org.treadwarm.store;

import com.zaxxer.hikari.HikariDataSource;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.SQLException;
import java.util.concurrent.locks.ReentrantLock;
import java.util.function.Consumer;
import java.util.function.Function;
import javax.sql.DataSource;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.Jdbi;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;

/** Runs reads and changes against the data file and turns its failures into {@link StoreUnavailable}. */
final class Database implements AutoCloseable {
    private static final Logger LOG = LoggerFactory.getLogger(Database.class);

    private final Path folder;
    private final HikariDataSource pool;
    private final Jdbi jdbi;

    // SQLite lets one writer in at a time and makes the others poll, in no order. Queueing them here is fair.
    private final ReentrantLock writing = new ReentrantLock(true);

    Database(Path folder, HikariDataSource pool) {
        this.folder = folder;
        this.pool = pool;
        this.jdbi = Jdbi.create(pool);
    }

    static Database open(Path folder) {
        DataSource connections = SqliteFile.connections(folder);
        DataFolder.prepare(folder, () -> {
            probe(connections, folder);
            Schema.migrate(connections, folder);
        });
        return new Database(folder, SqliteFile.pool(connections));
    }

    private static void probe(DataSource connections, Path folder) {
        try (Connection connection = connections.getConnection()) {
            connection.getMetaData().getTables(null, null, null, null).close();
        } catch (SQLException problem) {
            throw unavailable(folder, SqliteFile.explain(problem).orElseGet(problem::getMessage), problem);
        }
    }

    /** Each statement of a read sees the newest committed state; there is no transaction around them. */
    <T> T read(Function<Handle, T> question) {
        return guarded(() -> jdbi.withHandle(question::apply));
    }

    /** One transaction, alone against all other changes of this and of other processes. */
    <T> T change(Function<Handle, T> change) {
        writing.lock();
        try {
            return guarded(() -> jdbi.withHandle(handle -> {
                SqliteFile.beforeBegin(handle.getConnection());
                return handle.inTransaction(begun -> {
                    SqliteFile.afterBegin(begun.getConnection());
                    return change.apply(begun);
                });
            }));
        } finally {
            writing.unlock();
        }
    }

    /** For "last used" marks: with a full disk, people must still get in and read their jobs. */
    void changeIfPossible(Consumer<Handle> change) {
        try {
            change(handle -> {
                change.accept(handle);
                return true;
            });
        } catch (StoreUnavailable problem) {
            LOG.warn("A time of last use was not noted. {}", problem.getMessage());
        }
    }

    @Override
    public void close() {
        pool.close();
    }

    private interface Work<T> {
        T run() throws SQLException;
    }

    private <T> T guarded(Work<T> work) {
        try {
            return work.run();
        } catch (StoreUnavailable problem) {
            throw problem;
        } catch (SQLException | RuntimeException problem) {
            throw translated(problem);
        }
    }

    private RuntimeException translated(Exception problem) {
        for (Throwable cause = problem; cause != null; cause = cause.getCause()) {
            if (cause instanceof SQLException failure) {
                return SqliteFile.explain(failure)
                        .<RuntimeException>map(meaning -> unavailable(folder, meaning, problem))
                        .orElseGet(
                                () -> new IllegalStateException("The store failed: " + failure.getMessage(), problem));
            }
        }
        return problem instanceof RuntimeException fault ? fault : new IllegalStateException(problem);
    }

    private static StoreUnavailable unavailable(Path folder, String meaning, Exception problem) {
        return new StoreUnavailable("The data folder " + folder + " cannot be used: " + meaning + ".", problem);
    }
}
