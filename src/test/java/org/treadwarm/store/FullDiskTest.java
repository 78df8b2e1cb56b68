package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.treadwarm.store.Samples.BY_ANNA;
import static org.treadwarm.store.Samples.job;

import java.nio.file.Path;
import java.time.Clock;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.sqlite.SQLiteDataSource;

/** A limit on the file's pages makes SQLite report what it reports when the disk is full. */
class FullDiskTest {
    @TempDir
    Path folder;

    private final Clock clock = new TestClock();

    @Test
    void aChangeThatDoesNotFitIsRefusedWhole() {
        Store.open(folder, clock).close();
        try (Database database = withoutRoom()) {
            Jobs jobs = new Jobs(database, new Audit(database, clock), clock);
            String id = jobs.create(job("Mill Lane", "small"), BY_ANNA).jobId();

            assertThatThrownBy(() -> jobs.save(id, 1, job("Mill Lane", "large".repeat(100_000)), BY_ANNA))
                    .isInstanceOf(StoreUnavailable.class)
                    .hasMessageContaining("disk is full")
                    .hasMessageContaining(folder.toString());

            assertThat(jobs.current(id).map(JobRevision::content)).contains(job("Mill Lane", "small"));
            assertThat(jobs.save(id, 1, job("Mill Lane", "smaller"), BY_ANNA)).isEqualTo(new SaveResult.Saved(2));
        }
    }

    @Test
    void aStartThatDoesNotFitSaysSo() {
        SqliteFile engine = new SqliteFile(folder);
        SQLiteDataSource connections = engine.connections();
        connections.getConfig().setMaxPageCount(2);

        assertThatThrownBy(() -> Schema.migrate(connections, engine))
                .isInstanceOfSatisfying(
                        StoreUnavailable.class,
                        problem -> assertThat(problem.reason()).isEqualTo(StoreUnavailable.Reason.NO_ROOM))
                .hasMessage("The data folder " + folder
                        + " cannot be used: the disk is full; free some space and try again.");
    }

    @Test
    void aMarkThatDoesNotFitIsLeftOut() {
        Store.open(folder, clock).close();
        try (Database database = withoutRoom()) {
            database.changeIfPossible(handle ->
                    handle.execute("insert into piece (sha256, body) values ('0', ?)", "large".repeat(100_000)));

            assertThat(new DataFile(DataHome.folder(folder)).count("piece")).isZero();
        }
    }

    private Database withoutRoom() {
        SqliteFile engine = new SqliteFile(folder);
        SQLiteDataSource connections = engine.connections();
        long pages = Long.parseLong(new DataFile(DataHome.folder(folder)).text("pragma page_count"));
        connections.getConfig().setMaxPageCount((int) pages + 20);
        return new Database(engine, engine.pool(connections));
    }
}
