package org.treadwarm.store;

import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.sql.Connection;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.Clock;
import java.util.List;
import java.util.Optional;

/** Puts a backup into a data folder. */
public final class Restore {
    private static final List<String> COMPANIONS = List.of("-wal", "-shm");

    private final Path folder;
    private final Path current;
    private final Path incoming;

    private Restore(Path folder) {
        this.folder = folder;
        this.current = folder.resolve(SqliteFile.NAME);
        this.incoming = folder.resolve(SqliteFile.NAME + ".incoming");
    }

    /**
     * What was restored.
     *
     * @param backup the backup
     * @param keptAside the folder with what was replaced; empty if nothing was
     */
    public record Restored(BackupFile backup, Optional<Path> keptAside) {}

    /**
     * Checks a backup and makes it the folder's data. Interrupted at any moment, the folder holds what it held or what was
     * restored.
     *
     * @param replace whether data that the folder holds may be replaced; it is kept aside in the folder
     * @throws StoreUnavailable if the backup cannot be used, a server runs on the folder, or it holds data that may not be
     *     replaced
     */
    public static Restored run(Path folder, Path file, boolean replace, Clock clock) {
        BackupFile backup = BackupFile.checked(file);
        try (FolderLock alone = FolderLock.take(folder)) {
            Restore restore = new Restore(folder);
            boolean holdsData = Files.exists(restore.current);
            if (holdsData && !replace) {
                throw new StoreUnavailable(
                        "The data folder " + folder + " holds data already. To replace it, add --replace;"
                                + " what it holds is then kept aside in the folder.");
            }
            Optional<Path> aside = holdsData
                    ? Optional.of(folder.resolve(
                            "replaced-" + Times.text(Times.now(clock)).replace(":", "-")))
                    : Optional.empty();
            DataFolder.whileNobodyPrepares(folder, () -> restore.exchange(file, aside));
            Store.open(folder, clock).close();
            return new Restored(backup, aside);
        }
    }

    private void exchange(Path file, Optional<Path> aside) throws IOException {
        Files.deleteIfExists(incoming);
        DataFolder.createOwnersFile(incoming);
        try (OutputStream out = Files.newOutputStream(incoming)) {
            Files.copy(file, out);
        }
        Backup.toDisk(incoming);
        BackupFile.checked(incoming);
        if (aside.isPresent()) {
            keepAside(aside.get());
        }
        for (String companion : COMPANIONS) {
            Files.deleteIfExists(companion(companion));
        }
        Files.move(incoming, current, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        Backup.toDisk(folder);
    }

    private void keepAside(Path aside) throws IOException {
        emptyLog();
        DataFolder.create(aside);
        Files.copy(current, aside.resolve(current.getFileName()), StandardCopyOption.COPY_ATTRIBUTES);
        Backup.toDisk(aside.resolve(current.getFileName()));
        for (String companion : COMPANIONS) {
            if (Files.exists(companion(companion))) {
                Path copy = aside.resolve(companion(companion).getFileName());
                Files.copy(companion(companion), copy, StandardCopyOption.COPY_ATTRIBUTES);
                Backup.toDisk(copy);
            }
        }
        Backup.toDisk(aside);
    }

    // With all of the log in the file, the file alone is complete while the log is taken away.
    private void emptyLog() {
        try (Connection connection = new SqliteFile(folder).connections().getConnection();
                Statement statement = connection.createStatement()) {
            statement.execute("pragma wal_checkpoint(truncate)");
        } catch (SQLException damaged) {
            // A damaged file is what restoring is for; it is kept aside as it is, with its log.
            return;
        }
    }

    private Path companion(String ending) {
        return folder.resolve(SqliteFile.NAME + ending);
    }
}
