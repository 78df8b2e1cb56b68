package org.treadwarm.store;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.file.AccessDeniedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.FileSystemException;
import java.nio.file.FileSystems;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.nio.file.attribute.FileAttribute;
import java.nio.file.attribute.PosixFilePermissions;

/** The folder with the data file. What is created here can be read by the account that runs the program only. */
final class DataFolder {
    private static final Object ONE_PREPARATION_IN_THIS_PROCESS = new Object();

    private DataFolder() {}

    /** What is done with a folder's files. */
    interface Work {
        void run() throws IOException;
    }

    /**
     * Creates the folder and the data file as needed, then runs the preparation while no other process prepares the
     * same folder.
     */
    static void prepare(Path folder, Runnable preparation) {
        whileNobodyPrepares(folder, () -> {
            createFile(folder.resolve(SqliteFile.NAME));
            preparation.run();
        });
    }

    /** Does something while no process opens the folder anew. Closing the file ends the lock. */
    static void whileNobodyPrepares(Path folder, Work work) {
        synchronized (ONE_PREPARATION_IN_THIS_PROCESS) {
            create(folder);
            try (FileChannel channel = FileChannel.open(
                    folder.resolve("treadwarm.lock"), StandardOpenOption.CREATE, StandardOpenOption.WRITE)) {
                channel.lock();
                work.run();
            } catch (IOException problem) {
                throw notWritable(folder, problem);
            }
        }
    }

    static void create(Path folder) {
        try {
            if (!Files.isDirectory(folder)) {
                Files.createDirectories(folder, ownerOnly("rwx------"));
            }
        } catch (FileAlreadyExistsException problem) {
            throw new StoreUnavailable("The data folder " + folder + " is a file, not a folder.", problem);
        } catch (IOException problem) {
            throw new StoreUnavailable(
                    "The data folder " + folder + " does not exist and cannot be created: " + reason(problem) + ".",
                    problem);
        }
    }

    private static void createFile(Path file) throws IOException {
        if (!Files.exists(file)) {
            createOwnersFile(file);
        }
    }

    /** A new file for its owner alone. */
    static void createOwnersFile(Path file) throws IOException {
        Files.createFile(file, ownerOnly("rw-------"));
    }

    private static FileAttribute<?>[] ownerOnly(String permissions) {
        if (!FileSystems.getDefault().supportedFileAttributeViews().contains("posix")) {
            return new FileAttribute<?>[0];
        }
        return new FileAttribute<?>[] {
            PosixFilePermissions.asFileAttribute(PosixFilePermissions.fromString(permissions))
        };
    }

    static StoreUnavailable notWritable(Path folder, IOException problem) {
        return new StoreUnavailable(
                "The data folder " + folder + " cannot be written: " + reason(problem) + ".", problem);
    }

    /** What went wrong with a file, for people. */
    static String reason(IOException problem) {
        String file =
                problem instanceof FileSystemException known && known.getFile() != null ? known.getFile() : "a file";
        if (problem instanceof AccessDeniedException) {
            return "there is no right to " + file;
        }
        if (problem instanceof NoSuchFileException) {
            return file + " cannot be made";
        }
        if (problem instanceof FileSystemException known && known.getReason() != null) {
            return file + ": " + known.getReason();
        }
        return file + ": " + problem.getMessage();
    }
}
