package org.treadwarm.store;

import com.zaxxer.hikari.HikariDataSource;
import java.sql.Connection;
import java.sql.SQLException;
import java.util.Optional;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.concurrent.locks.ReentrantLock;
import java.util.function.Consumer;
import java.util.function.Function;
import javax.sql.DataSource;
import org.jdbi.v3.core.Handle;
import org.jdbi.v3.core.Jdbi;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.treadwarm.meter.Durations;

/** Runs reads and changes against the database and turns its failures into {@link StoreUnavailable}. */
final class Database implements AutoCloseable {
    private static final Logger LOG = LoggerFactory.getLogger(Database.class);

    /** The state that PostgreSQL reports for text it cannot keep (SQLSTATE of its appendix A, from memory). */
    private static final String NOT_ENCODABLE = "22021";

    private final Engine engine;
    private final HikariDataSource pool;
    private final Jdbi jdbi;

    // One writer at a time is let in. SQLite makes the others poll, in no order; PostgreSQL makes each keep a
    // connection.
    // Queueing them here is fair and keeps the connections for readers.
    private final ReentrantLock writing = new ReentrantLock(true);

    // The transaction that this thread is in, so that changes made within a change belong to it.
    private final ThreadLocal<Optional<Handle>> begun = ThreadLocal.withInitial(Optional::empty);

    private final Durations reads = new Durations();
    private final Durations changes = new Durations();

    Database(Engine engine, HikariDataSource pool) {
        this.engine = engine;
        this.pool = pool;
        this.jdbi = Jdbi.create(pool);
    }

    static Database open(Engine engine) {
        DataSource connections = engine.connections();
        engine.prepare(() -> {
            probe(connections, engine);
            Schema.migrate(connections, engine);
        });
        return new Database(engine, engine.pool(connections));
    }

    private static void probe(DataSource connections, Engine engine) {
        try (Connection connection = connections.getConnection()) {
            connection.getMetaData().getTables(null, null, "job", null).close();
        } catch (SQLException problem) {
            throw StoreUnavailable.of(engine, engine.explain(problem).orElseGet(problem::getMessage), problem);
        }
    }

    /** Each statement of a read sees the newest committed state; there is no transaction around them. */
    <T> T read(Function<Handle, T> question) {
        if (begun.get().isPresent()) {
            return question.apply(begun.get().get());
        }
        long begin = System.nanoTime();
        try {
            return guarded(new AtomicBoolean(), () -> jdbi.withHandle(question::apply));
        } finally {
            reads.add(System.nanoTime() - begin);
        }
    }

    /**
     * One transaction, alone against all other changes of this and of other processes. A change made within another is part
     * of that one's transaction, and stands or falls with it.
     */
    <T> T change(Function<Handle, T> change) {
        if (begun.get().isPresent()) {
            return change.apply(begun.get().get());
        }
        AtomicBoolean committing = new AtomicBoolean();
        long begin = System.nanoTime();
        writing.lock();
        try {
            return guarded(
                    committing,
                    () -> jdbi.withHandle(handle -> {
                        engine.beforeBegin(handle.getConnection());
                        return handle.inTransaction(alone -> {
                            engine.afterBegin(alone.getConnection());
                            T result = within(alone, change);
                            committing.set(true);
                            return result;
                        });
                    }));
        } finally {
            writing.unlock();
            changes.add(System.nanoTime() - begin);
        }
    }

    Durations.Reading readsLasted() {
        return reads.read();
    }

    Durations.Reading changesLasted() {
        return changes.read();
    }

    private <T> T within(Handle handle, Function<Handle, T> change) {
        begun.set(Optional.of(handle));
        try {
            return change.apply(handle);
        } finally {
            begun.remove();
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

    private <T> T guarded(AtomicBoolean committing, Work<T> work) {
        try {
            return work.run();
        } catch (StoreUnavailable problem) {
            throw problem;
        } catch (SQLException | RuntimeException problem) {
            throw translated(problem, committing.get());
        }
    }

    private RuntimeException translated(Exception problem, boolean committing) {
        Optional<SQLException> failure = Failures.of(problem);
        if (failure.isEmpty()) {
            return problem instanceof RuntimeException fault ? fault : new IllegalStateException(problem);
        }
        if (NOT_ENCODABLE.equals(failure.get().getSQLState())) {
            return new IllegalArgumentException("A text holds a NUL or half a character", problem);
        }
        if (committing && engine.leavesCommitUnknown(failure.get())) {
            return StoreUnavailable.whileCommitting(engine, problem);
        }
        return Failures.explain(engine, problem)
                .<RuntimeException>map(meaning -> StoreUnavailable.of(engine, meaning, problem))
                .orElseGet(() -> new IllegalStateException(
                        "The store failed: " + failure.get().getMessage(), problem));
    }
}
