package org.treadwarm.commands;

import java.time.Clock;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.treadwarm.store.DataHome;
import org.treadwarm.store.Move;
import picocli.CommandLine.Command;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.Spec;

/** Moves everything from the data folder into a PostgreSQL database. */
@Command(
        name = "move",
        description = "Move everything from the data folder into an empty PostgreSQL database. The server must not run;"
                + " the folder stays as it was.",
        mixinStandardHelpOptions = true)
public final class MoveCommand implements Callable<Integer> {
    @Spec
    private CommandSpec command;

    @Option(
            names = "--data",
            defaultValue = HomeOptions.FOLDER,
            description = "the data folder to move from (${DEFAULT-VALUE})")
    private java.nio.file.Path data;

    @Option(
            names = "--to",
            paramLabel = "URL",
            description = "the database: jdbc:postgresql://host:port/name?user=...; without it, the one that "
                    + HomeOptions.VARIABLE + " names in the environment")
    private Optional<String> to = Optional.empty();

    @Override
    public Integer call() {
        String url = to.or(HomeOptions::databaseOfEnvironment)
                .orElseThrow(() -> HomeOptions.refused(
                        command, "Name the database to move to, with --to or in " + HomeOptions.VARIABLE + "."));
        DataHome.Postgresql database = HomeOptions.databaseAt(command, url);
        List<Move.Moved> moved = Move.run(data, database, Clock.systemUTC());
        moved.forEach(table -> System.out.println(table.table() + ": " + table.rows()));
        System.out.println("Everything is in the " + database + " now, compared row by row. The folder " + data
                + " is as it was; serve the database from now on, not the folder.");
        return 0;
    }
}
