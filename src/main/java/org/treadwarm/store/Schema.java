package org.treadwarm.store;

import java.nio.file.Path;
import java.util.Arrays;
import java.util.Optional;
import javax.sql.DataSource;
import org.flywaydb.core.Flyway;
import org.flywaydb.core.api.FlywayException;
import org.flywaydb.core.api.MigrationInfo;
import org.flywaydb.core.api.MigrationVersion;

/** Brings the tables to the form this program knows. */
final class Schema {
    private Schema() {}

    /** @throws StoreUnavailable if a newer program changed the tables, or they are not this program's */
    static void migrate(DataSource connections, Path folder) {
        Flyway flyway = Flyway.configure()
                .dataSource(connections)
                .locations("classpath:db/migration")
                .load();
        try {
            refuseNewer(flyway, folder);
            flyway.migrate();
        } catch (FlywayException problem) {
            throw new StoreUnavailable(
                    "The tables in the data folder " + folder + " cannot be used: " + problem.getMessage(), problem);
        }
    }

    private static void refuseNewer(Flyway flyway, Path folder) {
        MigrationInfo[] all = flyway.info().all();
        Optional<MigrationVersion> newest = newest(all, false);
        Optional<MigrationVersion> known = newest(all, true);
        if (newest.isPresent() && known.isPresent() && newest.get().compareTo(known.get()) > 0) {
            throw new StoreUnavailable(
                    "The data folder " + folder + " was last used by a newer Treadwarm (tables of version "
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
