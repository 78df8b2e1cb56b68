package org.treadwarm.store;

import java.io.IOException;
import java.nio.channels.FileChannel;
import java.nio.channels.FileLock;
import java.nio.channels.OverlappingFileLockException;
import java.nio.file.Path;
import java.nio.file.StandardOpenOption;
import java.util.Optional;

/**
 * Says that a server keeps a data folder, or that the folder's file is being exchanged. The operating system ends the
 * lock with the process, however that ends. What only reads or adds, such as a backup or a new key, goes on beside it.
 */
public final class FolderLock implements AutoCloseable {
    private static final String NAME = "treadwarm-in-use.lock";

    private final FileChannel channel;

    private FolderLock(FileChannel channel) {
        this.channel = channel;
    }

    /**
     * Takes the lock of a folder, which is created as needed.
     *
     * @throws StoreUnavailable if another process has it, or the folder cannot be written
     */
    public static FolderLock take(Path folder) {
        DataFolder.create(folder);
        FileChannel channel = null;
        try {
            channel = FileChannel.open(folder.resolve(NAME), StandardOpenOption.CREATE, StandardOpenOption.WRITE);
            if (tryLock(channel).isPresent()) {
                return new FolderLock(channel);
            }
            channel.close();
        } catch (IOException problem) {
            close(channel, problem);
            throw DataFolder.notWritable(folder, problem);
        }
        throw new StoreUnavailable("The data folder " + folder
                + " is in use: a server runs on it. Stop that server first, or choose another folder with --data.");
    }

    private static Optional<FileLock> tryLock(FileChannel channel) throws IOException {
        try {
            return Optional.ofNullable(channel.tryLock());
        } catch (OverlappingFileLockException ofThisProcess) {
            return Optional.empty();
        }
    }

    private static void close(FileChannel channel, IOException problem) {
        if (channel != null) {
            try {
                channel.close();
            } catch (IOException another) {
                problem.addSuppressed(another);
            }
        }
    }

    @Override
    public void close() {
        try {
            channel.close();
        } catch (IOException problem) {
            throw new StoreUnavailable("The lock of the data folder cannot be given back: " + problem + ".", problem);
        }
    }
}
