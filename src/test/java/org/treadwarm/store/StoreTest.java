package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assumptions.assumeThat;
import static org.treadwarm.store.Samples.BY_ANNA;
import static org.treadwarm.store.Samples.job;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.time.Clock;
import java.util.Comparator;
import java.util.concurrent.CyclicBarrier;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class StoreTest {
    @TempDir
    Path place;

    private final Clock clock = new TestClock();

    private Store open(Path folder) {
        return Store.open(folder, clock);
    }

    @Test
    void makesTheFolderForItsOwnerAlone() throws IOException {
        assumeThat(Files.getFileStore(place).supportsFileAttributeView("posix")).isTrue();
        Path folder = place.resolve("new/data");

        open(folder).close();

        assertThat(PosixFilePermissions.toString(Files.getPosixFilePermissions(folder)))
                .isEqualTo("rwx------");
        assertThat(PosixFilePermissions.toString(Files.getPosixFilePermissions(folder.resolve("treadwarm.sqlite"))))
                .isEqualTo("rw-------");
    }

    @Test
    void namesTheNewestMigrationScriptAsItsVersion() throws Exception {
        Path scripts = Path.of(Schema.class
                .getResource("/db/migration/V1__jobs_people_keys.sql")
                .toURI());
        try (Stream<Path> all = Files.list(scripts.getParent())) {
            assertThat(all.map(script -> script.getFileName().toString())
                            .map(name -> name.substring(1, name.indexOf("__")))
                            .max(Comparator.comparingInt(Integer::parseInt)))
                    .contains(Schema.VERSION);
        }
    }

    @Test
    void hasEverythingAfterReopening() {
        String id;
        String key;
        String session;
        try (Store store = open(place)) {
            id = store.jobs().create(job("Mill Lane", "a"), BY_ANNA).jobId();
            key = store.keys().create("sheet", Scope.READ, "Anna").token();
            Person owner = PeopleTest.createOwner(store);
            session = store.sessions().start(owner).token();
        }
        try (Store store = open(place)) {
            assertThat(store.jobs().current(id).map(JobRevision::content)).contains(job("Mill Lane", "a"));
            assertThat(store.keys().find(key)).isPresent();
            assertThat(store.people().hasOwner()).isTrue();
            assertThat(store.sessions().find(session)).isPresent();
        }
    }

    @Test
    void opensBesideARunningStore() {
        try (Store running = open(place);
                Store second = open(place)) {
            String token = second.keys().create("sheet", Scope.SIZE, "Anna").token();
            assertThat(running.keys().find(token)).isPresent();

            String id = running.jobs().create(job("Mill Lane"), BY_ANNA).jobId();
            assertThat(second.jobs().current(id)).isPresent();
        }
    }

    @Test
    void twoFirstStartsAtOnceBothSucceed() throws Exception {
        CyclicBarrier start = new CyclicBarrier(2);
        ExecutorService threads = Executors.newFixedThreadPool(2);
        try {
            Future<Store> one = threads.submit(() -> {
                start.await();
                return open(place);
            });
            start.await();
            try (Store mine = open(place);
                    Store other = one.get()) {
                mine.jobs().create(job("Mill Lane"), BY_ANNA);
                assertThat(other.jobs().list()).hasSize(1);
            }
        } finally {
            threads.shutdownNow();
        }
    }

    @Test
    void writesAheadAndWaitsForTheDisk() {
        open(place).close();
        DataFile file = new DataFile(DataHome.folder(place));

        assertThat(file.text("pragma journal_mode")).isEqualTo("wal");
        assertThat(file.text("pragma synchronous")).isEqualTo("2");
        assertThat(file.text("pragma foreign_keys")).isEqualTo("1");
    }

    @Test
    void refusesTablesOfANewerProgram() {
        open(place).close();
        DataFile file = new DataFile(DataHome.folder(place));
        file.execute(
                "insert into flyway_schema_history select 99, '99', 'from the future', type, 'V99__future.sql', 1,"
                        + " installed_by, installed_on, execution_time, success from flyway_schema_history where installed_rank = 1");

        assertThatThrownBy(() -> open(place))
                .isInstanceOf(StoreUnavailable.class)
                .hasMessageContaining(
                        "newer Treadwarm (tables of version 99; this program knows up to " + Schema.VERSION + ")")
                .hasMessageContaining(place.toString());
    }

    @Test
    void refusesTablesOfAnotherProgram() {
        new DataFile(DataHome.folder(place)).execute("create table stamps (id integer)");

        assertThatThrownBy(() -> open(place)).isInstanceOf(StoreUnavailable.class);
    }

    @Test
    void refusesAFileThatIsNoDatabase() throws IOException {
        Files.writeString(place.resolve("treadwarm.sqlite"), "Dear diary, ".repeat(100));

        assertThatThrownBy(() -> open(place))
                .isInstanceOf(StoreUnavailable.class)
                .hasMessageContaining("treadwarm.sqlite in it is not a database")
                .hasMessageContaining(place.toString());
        assertThat(place.resolve("treadwarm.sqlite")).hasContent("Dear diary, ".repeat(100));
    }

    @Test
    void refusesAFolderThatIsAFile() throws IOException {
        Path file = Files.writeString(place.resolve("notes"), "");

        assertThatThrownBy(() -> open(file))
                .isInstanceOf(StoreUnavailable.class)
                .hasMessageContaining("is a file, not a folder");
        assertThatThrownBy(() -> open(file.resolve("data")))
                .isInstanceOf(StoreUnavailable.class)
                .hasMessageContaining("cannot be created");
    }

    @Test
    void refusesAFolderItMayNotWrite() throws IOException {
        Path folder = Files.createDirectory(
                place.resolve("locked"),
                PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString("r-x------")));
        assumeThat(Files.isWritable(folder)).isFalse();

        assertThatThrownBy(() -> open(folder))
                .isInstanceOf(StoreUnavailable.class)
                .hasMessageContaining("cannot be written");
    }
}
