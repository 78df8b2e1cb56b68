package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assumptions.assumeThat;
import static org.treadwarm.store.Samples.BY_ANNA;
import static org.treadwarm.store.Samples.job;
import static org.treadwarm.store.Samples.jobOf;

import java.io.IOException;
import java.io.RandomAccessFile;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.attribute.PosixFilePermissions;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.atomic.AtomicBoolean;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class BackupTest {
    @TempDir
    Path place;

    private final TestClock clock = new TestClock();
    private Path folder;
    private Path file;
    private Store store;
    private String id;

    @BeforeEach
    void fill() {
        folder = place.resolve("data of floors#1?");
        file = place.resolve("copy of floors#1?.sqlite");
        store = Store.open(folder, clock);
        id = store.jobs().create(job("Mill Lane", "kitchen"), BY_ANNA).jobId();
    }

    @AfterEach
    void close() {
        store.close();
    }

    @Test
    void whatWasBackedUpComesBack() {
        BackupFile backup = Backup.write(folder, file);
        store.jobs().save(id, 1, job("Mill Lane", "later"), BY_ANNA);
        Path other = place.resolve("other");

        Restore.Restored restored = Restore.run(other, file, false, clock);

        assertThat(backup.jobs()).isEqualTo(1);
        assertThat(backup.revisions()).isEqualTo(1);
        assertThat(restored.keptAside()).isEmpty();
        try (Store there = Store.open(other, clock)) {
            assertThat(there.jobs().current(id).map(JobRevision::content)).contains(job("Mill Lane", "kitchen"));
            assertThat(there.jobs().save(id, 1, job("Barn"), BY_ANNA)).isEqualTo(new SaveResult.Saved(2));
        }
    }

    @Test
    void isMadeWhileOthersSave() throws Exception {
        store.jobs().create(jobOf(1000, -1, ""), BY_ANNA);
        AtomicBoolean stop = new AtomicBoolean();
        ExecutorService thread = Executors.newSingleThreadExecutor();
        try {
            Future<Long> saved = thread.submit(() -> {
                long revision = 1;
                while (!stop.get()) {
                    store.jobs().save(id, revision, job("Mill Lane", "kitchen " + revision), BY_ANNA);
                    revision++;
                }
                return revision;
            });
            for (int i = 0; i < 5; i++) {
                Backup.write(folder, place.resolve("copy" + i));
            }
            stop.set(true);
            int newest = Math.toIntExact(saved.get());
            assertThat(store.jobs().revisions(id)).hasSize(newest);
        } finally {
            stop.set(true);
            thread.shutdownNow();
        }
    }

    @Test
    void isForItsOwnerAlone() throws IOException {
        assumeThat(Files.getFileStore(place).supportsFileAttributeView("posix")).isTrue();
        Backup.write(folder, file);
        assertThat(PosixFilePermissions.toString(Files.getPosixFilePermissions(file)))
                .isEqualTo("rw-------");

        Path other = place.resolve("other");
        Restore.run(other, file, false, clock);
        assertThat(PosixFilePermissions.toString(Files.getPosixFilePermissions(other.resolve(SqliteFile.NAME))))
                .isEqualTo("rw-------");
    }

    @Test
    void refusesAFileThatIsThereAndAFolderWithoutData() throws IOException {
        Files.writeString(file, "a diary");
        assertThatThrownBy(() -> Backup.write(folder, file)).hasMessageContaining("is there already");
        assertThat(file).hasContent("a diary");
        assertThatThrownBy(() -> Backup.write(place, place.resolve("new")))
                .isInstanceOf(StoreUnavailable.class)
                .hasMessageContaining("to back up");
        assertThatThrownBy(() -> Backup.write(folder, place.resolve("nowhere/copy")))
                .isInstanceOf(StoreUnavailable.class)
                .hasMessageContaining("cannot be made");
        assertThat(place).isDirectoryNotContaining("glob:**.unfinished");
    }

    @Test
    void leavesNothingWhenTheDataIsDamaged() {
        new DataFile(DataHome.folder(folder)).execute("update piece set body = 'kitten' where body = 'kitchen'");

        assertThatThrownBy(() -> Backup.write(folder, file))
                .isInstanceOf(StoreUnavailable.class)
                .hasMessageContaining("has changed");
        assertThat(file).doesNotExist();
        assertThat(place).isDirectoryNotContaining("glob:**.unfinished");
    }

    @Test
    void replacesOnlyWhenToldToAndKeepsWhatWasThere() {
        Backup.write(folder, file);
        store.jobs().save(id, 1, job("Mill Lane", "later"), BY_ANNA);
        assertThatThrownBy(() -> Restore.run(folder, file, false, clock))
                .isInstanceOf(StoreUnavailable.class)
                .hasMessageContaining("--replace");
        assertThat(store.jobs().revisions(id)).hasSize(2);
        store.close();

        Path aside = Restore.run(folder, file, true, clock).keptAside().orElseThrow();

        try (Store now = Store.open(folder, clock);
                Store before = Store.open(aside, clock)) {
            assertThat(now.jobs().revisions(id)).hasSize(1);
            assertThat(before.jobs().current(id).map(JobRevision::content)).contains(job("Mill Lane", "later"));
        }
    }

    @Test
    void replacesDamagedDataToo() throws IOException {
        Backup.write(folder, file);
        store.close();
        Files.writeString(folder.resolve(SqliteFile.NAME), "Dear diary, ".repeat(100));

        Path aside = Restore.run(folder, file, true, clock).keptAside().orElseThrow();

        assertThat(aside.resolve(SqliteFile.NAME)).hasContent("Dear diary, ".repeat(100));
        try (Store now = Store.open(folder, clock)) {
            assertThat(now.jobs().revisions(id)).hasSize(1);
        }
    }

    @Test
    void refusesToRestoreIntoAFolderThatIsServed() {
        Backup.write(folder, file);
        try (FolderLock server = FolderLock.take(folder)) {
            assertThatThrownBy(() -> Restore.run(folder, file, true, clock))
                    .isInstanceOf(StoreUnavailable.class)
                    .hasMessageContaining("is in use");
        }
        assertThat(store.jobs().revisions(id)).hasSize(1);
    }

    @Test
    void refusesWhatIsNoWholeBackup() throws IOException {
        Path other = place.resolve("other");
        Path diary = Files.writeString(place.resolve("diary"), "Dear diary, ".repeat(100));
        Backup.write(folder, file);
        Path cut = place.resolve("cut");
        Files.write(cut, java.util.Arrays.copyOf(Files.readAllBytes(file), 8192));
        Path newer = place.resolve("newer");
        Files.createDirectory(newer);
        Files.copy(file, newer.resolve(SqliteFile.NAME));
        new DataFile(DataHome.folder(newer)).execute("update flyway_schema_history set version = '77'");
        new DataFile(DataHome.folder(newer)).execute("pragma journal_mode = delete");

        for (Path bad : new Path[] {diary, cut, place, place.resolve("none"), newer.resolve(SqliteFile.NAME)}) {
            assertThatThrownBy(() -> Restore.run(other, bad, true, clock))
                    .as("%s", bad)
                    .isInstanceOf(StoreUnavailable.class);
        }
        assertThat(other).doesNotExist();
    }

    @Test
    void refusesABackupWithAByteChanged() throws IOException {
        Backup.write(folder, file);
        byte[] all = Files.readAllBytes(file);
        int at = new String(all, java.nio.charset.StandardCharsets.ISO_8859_1).indexOf("kitchen");
        try (RandomAccessFile change = new RandomAccessFile(file.toFile(), "rw")) {
            change.seek(at + 4);
            change.write('t');
        }
        assertThatThrownBy(() -> Restore.run(place.resolve("other"), file, false, clock))
                .isInstanceOf(StoreUnavailable.class)
                .hasMessageContaining("is damaged");
    }
}
