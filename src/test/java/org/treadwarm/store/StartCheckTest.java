package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.treadwarm.store.Samples.BY_ANNA;
import static org.treadwarm.store.Samples.jobOf;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Duration;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class StartCheckTest {
    private static final Duration LONG = Duration.ofMinutes(10);

    @TempDir
    Path folder;

    private final Clock clock = new TestClock();

    private SqliteFile fill() {
        try (Store store = Store.open(folder, clock)) {
            store.jobs().create(jobOf(2000, -1, ""), BY_ANNA);
        }
        return new SqliteFile(folder);
    }

    private static void damage(SqliteFile engine) throws IOException {
        try (RandomAccessFile change = new RandomAccessFile(engine.file().toFile(), "rw")) {
            for (long at = 3 * 4096; at + 4096 <= change.length(); at += 4096) {
                change.seek(at);
                change.write(new byte[200]);
            }
        }
    }

    @Test
    void passesWhatIsWholeOrNotThereYet() {
        assertThat(StartCheck.run(new SqliteFile(folder), LONG)).isTrue();
        assertThat(StartCheck.run(fill(), LONG)).isTrue();
    }

    @Test
    void refusesADamagedFileAndGivesTheFolderBack() throws IOException {
        damage(fill());

        for (int i = 0; i < 2; i++) {
            assertThatThrownBy(() -> Store.openToServe(DataHome.folder(folder), clock))
                    .isInstanceOf(StoreUnavailable.class)
                    .hasMessageContaining("is damaged")
                    .hasMessageContaining("restore a backup");
        }
    }

    @Test
    void endsWhenItsTimeIsUp() {
        assertThat(StartCheck.run(fill(), Duration.ZERO)).isFalse();
    }

    @Test
    void aFolderHasOneServer() {
        try (Store serving = Store.openToServe(DataHome.folder(folder), clock)) {
            assertThatThrownBy(() -> Store.openToServe(DataHome.folder(folder), clock))
                    .isInstanceOf(StoreUnavailable.class)
                    .hasMessageContaining("is in use");
            assertThat(serving.jobs().list()).isEmpty();
        }
        Store.openToServe(DataHome.folder(folder), clock).close();
    }

    @Test
    void aDatabaseMayHaveSeveralServers() {
        DataHome home = TestPostgres.emptyHome();
        try (Store one = Store.openToServe(home, clock);
                Store two = Store.openToServe(home, clock)) {
            String id = one.jobs().create(jobOf(1, -1, ""), BY_ANNA).jobId();
            assertThat(two.jobs().current(id)).isPresent();
        }
    }
}
