package org.treadwarm.commands;

import java.nio.file.Path;
import java.time.Clock;
import java.util.concurrent.Callable;
import org.treadwarm.store.Restore;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;
import picocli.CommandLine.Parameters;

/** Puts a backup into the data folder. */
@Command(
        name = "restore",
        description = "Check a backup and put it into the data folder. The server must not run.",
        mixinStandardHelpOptions = true)
public final class RestoreCommand implements Callable<Integer> {
    @Mixin
    private HomeOptions data;

    @Parameters(paramLabel = "FILE", description = "the backup")
    private Path file;

    @Option(names = "--replace", description = "replace what the folder holds; it is kept aside in the folder")
    private boolean replace;

    @Override
    public Integer call() {
        Path folder = data.folder("Restore the database with its own tools, such as pg_restore");
        Restore.Restored restored = Restore.run(folder, file, replace, Clock.systemUTC());
        System.out.println("Restored into " + folder + ": " + restored.backup().jobs() + " jobs with "
                + restored.backup().revisions() + " revisions.");
        restored.keptAside().ifPresent(aside -> System.out.println("What it held before is kept in " + aside + "."));
        return 0;
    }
}
