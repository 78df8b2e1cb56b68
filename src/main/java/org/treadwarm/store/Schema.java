package org.treadwarm.store;

import java.sql.Connection;
import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.util.Arrays;
import java.util.Map;
import java.util.Optional;
import javax.sql.DataSource;
import org.flywaydb.core.Flyway;
import org.flywaydb.core.api.FlywayException;
import org.flywaydb.core.api.MigrationInfo;
import org.flywaydb.core.api.MigrationVersion;

/** Brings the tables to the form this program knows. */
final class Schema {
    /** The version of the newest script in db/migration; a test holds it to that. */
    static final String VERSION = "7";

    private Schema() {}

    /** @throws StoreUnavailable if a newer program changed the tables, or they are not this program's */
    static void migrate(DataSource connections, Engine engine) {
        Optional<String> last = lastMigration(connections);
        if (last.equals(Optional.of(VERSION))) {
            return;
        }
        Flyway flyway = Flyway.configure()
                .dataSource(connections)
                .locations("classpath:db/migration")
                .placeholders(Map.of(
                        "keep_sheet", engine.keepRows("sheet"),
                        "keep_sheet_withdrawal", engine.keepRows("sheet_withdrawal")))
                .load();
        try {
            if (last.isPresent()) {
                refuseNewer(flyway, engine);
            }
            flyway.migrate();
        } catch (FlywayException problem) {
            throw Failures.explain(engine, problem)
                    .map(meaning -> StoreUnavailable.of(engine, meaning, problem))
                    .orElseGet(() -> new StoreUnavailable(
                            "The tables in the " + engine.name() + " cannot be used: " + problem.getMessage(),
                            problem));
        }
    }

    /**
     * The version of the last migration, as the migration library noted it; empty if there is none yet. When it is the
     * newest there is, nothing needs that library, which is slow to load.
     */
    private static Optional<String> lastMigration(DataSource connections) {
        try (Connection connection = connections.getConnection();
                Statement statement = connection.createStatement();
                ResultSet last = statement.executeQuery("SELECT version, success FROM flyway_schema_history"
                        + " ORDER BY installed_rank DESC LIMIT 1")) {
            return last.next() ? Optional.of(last.getBoolean(2) ? last.getString(1) : "failed") : Optional.empty();
        } catch (SQLException noSuchTable) {
            return Optional.empty();
        }
    }

    private static void refuseNewer(Flyway flyway, Engine engine) {
        MigrationInfo[] all = flyway.info().all();
        Optional<MigrationVersion> newest = newest(all, false);
        Optional<MigrationVersion> known = newest(all, true);
        if (newest.isPresent() && known.isPresent() && newest.get().compareTo(known.get()) > 0) {
            throw new StoreUnavailable(
                    "The " + engine.name() + " was last used by a newer Treadwarm (tables of version "
                            + newest.get() + "; this program knows up to " + known.get()
                            + "). Start the newer program, or restore a backup from before its first start.");
        }
    }

    private static Optional<MigrationVersion> newest(MigrationInfo[] all, boolean knownOnly) {
        return Arrays.stream(all)
                .filter(migration -> !knownOnly || migration.getState().isResolved())
                .map(MigrationInfo::getVersion)
                .max(MigrationVersion::compareTo);
    }
}
