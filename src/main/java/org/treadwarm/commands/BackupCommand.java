package org.treadwarm.commands;

import java.nio.file.Path;
import java.util.concurrent.Callable;
import org.treadwarm.store.Backup;
import org.treadwarm.store.BackupFile;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Parameters;

/** Writes the data folder into one file, beside a running server. */
@Command(
        name = "backup",
        description =
                "Write everything in the data folder into one new file and check it. The server may run meanwhile.",
        mixinStandardHelpOptions = true)
public final class BackupCommand implements Callable<Integer> {
    @Mixin
    private HomeOptions data;

    @Parameters(paramLabel = "FILE", description = "the file to make; it must not be there yet")
    private Path file;

    @Override
    public Integer call() {
        BackupFile backup = Backup.write(data.folder("Back the database up with its own tools, such as pg_dump"), file);
        System.out.println("Backed up and checked: " + file + ", " + backup.bytes() + " bytes, " + backup.jobs()
                + " jobs with " + backup.revisions() + " revisions.");
        return 0;
    }
}
