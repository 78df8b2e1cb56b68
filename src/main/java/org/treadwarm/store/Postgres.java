package org.treadwarm.store;

import com.zaxxer.hikari.HikariConfig;
import com.zaxxer.hikari.HikariDataSource;
import java.sql.Connection;
import java.sql.SQLException;
import java.sql.SQLTransientConnectionException;
import java.sql.Statement;
import java.util.Optional;
import java.util.Properties;
import javax.sql.DataSource;
import org.postgresql.Driver;
import org.postgresql.PGProperty;
import org.postgresql.ds.PGSimpleDataSource;

/**
 * All that is particular to PostgreSQL.
 *
 * <p>Every change first takes one lock, so changes come one after another as they do with SQLite: what a change reads
 * stays true until it commits, whichever server makes it. The isolation must be "read committed" for that; a stricter one
 * would show the change what was there before it waited.
 */
record Postgres(DataHome.Postgresql home) implements Engine {
    private static final int CONNECT_SECONDS = 5;
    private static final int SOCKET_SECONDS = 60;
    private static final int POOL_SIZE = 6;
    private static final int POOL_WAIT_MILLISECONDS = 6000;

    private static final String FULL = "53100";

    /** Any number will do that no other program on the same database takes. */
    private static final int LOCK = 0x74776172;

    // The second half of the lock is the table's own number, so that two sets of tables in one database do not wait for
    // each other.
    private static final String TAKE_LOCK =
            "select pg_advisory_xact_lock(" + LOCK + ", cast(cast('audit' as regclass) as oid)::int4)";

    // A server that dies or hangs in a change must not keep the lock, and "on disk" must be true.
    private static final String SESSION = "set lock_timeout = '5s'; set statement_timeout = '30s';"
            + " set idle_in_transaction_session_timeout = '30s';"
            + " select set_config('synchronous_commit', 'on', false) where current_setting('synchronous_commit') = 'off'";

    @Override
    public String name() {
        return home.toString();
    }

    @Override
    public DataSource connections() {
        PGSimpleDataSource source = new PGSimpleDataSource();
        source.setUrl(home.url());
        Properties given = Driver.parseURL(home.url(), null);
        try {
            byDefault(source, given, PGProperty.CONNECT_TIMEOUT, CONNECT_SECONDS);
            byDefault(source, given, PGProperty.SOCKET_TIMEOUT, SOCKET_SECONDS);
            byDefault(source, given, PGProperty.TCP_KEEP_ALIVE, true);
            byDefault(source, given, PGProperty.REWRITE_BATCHED_INSERTS, true);
            byDefault(source, given, PGProperty.APPLICATION_NAME, "treadwarm");
        } catch (SQLException problem) {
            throw StoreUnavailable.of(this, problem.getMessage(), problem);
        }
        return source;
    }

    private static void byDefault(PGSimpleDataSource source, Properties given, PGProperty property, Object value)
            throws SQLException {
        if (given == null || !given.containsKey(property.getName())) {
            source.setProperty(property, value.toString());
        }
    }

    @Override
    public HikariDataSource pool(DataSource connections) {
        HikariConfig config = new HikariConfig();
        config.setPoolName("store");
        config.setDataSource(connections);
        config.setMaximumPoolSize(POOL_SIZE);
        config.setMinimumIdle(1);
        config.setConnectionTimeout(POOL_WAIT_MILLISECONDS);
        config.setTransactionIsolation("TRANSACTION_READ_COMMITTED");
        config.setConnectionInitSql(SESSION);
        return new HikariDataSource(config);
    }

    /** The migration library takes a lock of its own, so servers that start at once wait for each other there. */
    @Override
    public void prepare(Runnable preparation) {
        preparation.run();
    }

    @Override
    public String keepRows(String table) {
        return "create function " + table + "_kept() returns trigger language plpgsql as $kept$"
                + " begin raise exception 'rows of " + table + " are kept as they are'; end $kept$;"
                + "\n\ncreate trigger " + table + "_kept before update or delete on " + table
                + " for each row execute function " + table + "_kept();";
    }

    @Override
    public void beforeBegin(Connection connection) {}

    @Override
    public void afterBegin(Connection connection) throws SQLException {
        try (Statement statement = connection.createStatement()) {
            statement.execute(TAKE_LOCK);
        }
    }

    @Override
    public Optional<String> explain(SQLException problem) {
        String state = problem.getSQLState() == null ? "" : problem.getSQLState();
        // Codes of PostgreSQL's appendix A, from memory.
        return switch (state) {
            case "28000", "28P01" -> Optional.of("it refuses this name or password");
            case "3D000" -> Optional.of("the server has no database of this name");
            case "3F000" -> Optional.of("it has no schema of this name, or none that this account may use");
            case "25006" -> Optional.of("it is read-only");
            case "42501" -> Optional.of("this account has not the right to make or change its tables");
            case FULL -> Optional.of("the disk of the database server is full; free some space and try again");
            case "53300" -> Optional.of("the database server takes no more connections; try again");
            case "55P03" -> Optional.of("another program keeps it locked; try again");
            case "57014" -> Optional.of("it took too long to answer; try again");
            case "57P01", "57P02", "57P03" -> Optional.of("the database server is stopping or starting; try again");
            case "40001", "40P01" -> Optional.of("another change came in between; try again");
            case "XX001", "XX002" -> Optional.of("it is damaged; restore a backup");
            default -> explainUnreachable(problem, state);
        };
    }

    private static Optional<String> explainUnreachable(SQLException problem, String state) {
        if (state.startsWith("08")) {
            return Optional.of("the database server does not answer; look whether it runs, and at host and port");
        }
        return problem instanceof SQLTransientConnectionException
                ? Optional.of("too many requests wait for a connection; try again")
                : Optional.empty();
    }

    @Override
    public boolean isFull(SQLException problem) {
        return FULL.equals(problem.getSQLState());
    }

    @Override
    public boolean leavesCommitUnknown(SQLException problem) {
        String state = problem.getSQLState() == null ? "" : problem.getSQLState();
        return state.startsWith("08") || state.startsWith("57P");
    }
}
