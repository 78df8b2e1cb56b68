package org.treadwarm.store;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.FileAttribute;
import java.nio.file.attribute.PosixFilePermissions;

/** The folder with the data file. What is created here can be read by the account that runs the program only. */
final class DataFolder {
    private static final Object ONE_PREPARATION_IN_THIS_PROCESS = new Object();

    private DataFolder() {}

    /**
     * Creates the folder and the data file as needed, then runs the preparation while no other process prepares the
     * same folder. Closing the file ends the lock.
     */
    static void prepare(Path folder, Runnable preparation) {
        synchronized (ONE_PREPARATION_IN_THIS_PROCESS) {
            create(folder);
            try (FileChannel channel = FileChannel.open(
                    folder.resolve("treadwarm.lock"), StandardOpenOption.CREATE, StandardOpenOption.WRITE)) {
                channel.lock();
                createFile(folder.resolve(SqliteFile.NAME));
                preparation.run();
            } catch (IOException problem) {
                throw notWritable(folder, problem);
            }
        }
    }

    private static void create(Path folder) {
        try {
            if (!Files.isDirectory(folder)) {
                Files.createDirectories(folder, ownerOnly("rwx------"));
            }
        } catch (FileAlreadyExistsException problem) {
            throw new StoreUnavailable("The data folder " + folder + " is a file, not a folder.", problem);
        } catch (IOException problem) {
            throw new StoreUnavailable(
                    "The data folder " + folder + " does not exist and cannot be created: " + problem + ".", problem);
        }
    }

    private static void createFile(Path file) throws IOException {
        if (!Files.exists(file)) {
            Files.createFile(file, ownerOnly("rw-------"));
        }
    }

    private static FileAttribute<?>[] ownerOnly(String permissions) {
        if (!FileSystems.getDefault().supportedFileAttributeViews().contains("posix")) {
            return new FileAttribute<?>[0];
        }
        return new FileAttribute<?>[] {
            PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString(permissions))
        };
    }

    private static StoreUnavailable notWritable(Path folder, IOException problem) {
        return new StoreUnavailable("The data folder " + folder + " cannot be written: " + problem + ".", problem);
    }
}
