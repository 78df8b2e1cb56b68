package org.treadwarm.store;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.LinkOption;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.SQLException;

/** Writes a data folder into one file while a server may run on it. */
public final class Backup {
    private Backup() {}

    /**
     * Writes what stands in the folder at this moment. The file has its name only when it is complete and checked.
     *
     * @throws StoreUnavailable if the file is there already or cannot be written, or the folder holds no data
     */
    public static BackupFile write(Path folder, Path file) {
        SqliteFile source = new SqliteFile(folder);
        if (!Files.exists(source.file())) {
            throw new StoreUnavailable("The data folder " + folder + " holds no " + SqliteFile.NAME + " to back up.");
        }
        if (Files.exists(file, LinkOption.NOFOLLOW_LINKS)) {
            throw alreadyThere(file);
        }
        Path unfinished = file.resolveSibling(file.getFileName() + ".unfinished");
        try {
            DataFolder.createOwnersFile(unfinished);
        } catch (FileAlreadyExistsException problem) {
            throw new StoreUnavailable(
                    "The file " + unfinished
                            + " is there already: another backup is being made, or was interrupted. Delete it if not.",
                    problem);
        } catch (IOException problem) {
            throw cannotBeWritten(file, DataFolder.reason(problem), problem);
        }
        return write(source, file, unfinished);
    }

    private static BackupFile write(SqliteFile source, Path file, Path unfinished) {
        try {
            copy(source, file, unfinished);
            BackupFile checked = BackupFile.checked(unfinished);
            toDisk(unfinished);
            Files.move(unfinished, file);
            toDisk(file.toAbsolutePath().getParent());
            return checked;
        } catch (FileAlreadyExistsException problem) {
            throw alreadyThere(file);
        } catch (IOException problem) {
            throw cannotBeWritten(file, DataFolder.reason(problem), problem);
        } finally {
            deleteIfThere(unfinished);
        }
    }

    // One read transaction: it sees one moment and keeps no writer waiting.
    private static void copy(SqliteFile source, Path file, Path unfinished) {
        try (Connection connection = source.connections().getConnection();
                PreparedStatement copy = connection.prepareStatement("vacuum into ?")) {
            copy.setString(1, unfinished.toString());
            copy.executeUpdate();
        } catch (SQLException problem) {
            throw cannotBeWritten(file, source.explain(problem).orElseGet(problem::getMessage), problem);
        }
    }

    /** Waits until a file, or the names in a folder, are on the disk. */
    static void toDisk(Path path) throws IOException {
        try (FileChannel channel = FileChannel.open(path, StandardOpenOption.READ)) {
            channel.force(true);
        }
    }

    private static void deleteIfThere(Path file) {
        try {
            Files.deleteIfExists(file);
        } catch (IOException problem) {
            throw cannotBeWritten(file, DataFolder.reason(problem), problem);
        }
    }

    private static StoreUnavailable alreadyThere(Path file) {
        return new StoreUnavailable("The file " + file + " is there already; name another for the backup.");
    }

    private static StoreUnavailable cannotBeWritten(Path file, String why, Exception problem) {
        return new StoreUnavailable("The backup " + file + " cannot be made: " + why + ".", problem);
    }
}
