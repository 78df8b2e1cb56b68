package org.treadwarm;

import java.util.List;
import java.util.stream.Stream;
import org.treadwarm.commands.BackupCommand;
import org.treadwarm.commands.CheckCommand;
import org.treadwarm.commands.HealthCommand;
import org.treadwarm.commands.KeyCommand;
import org.treadwarm.commands.MoveCommand;
import org.treadwarm.commands.OwnerLinkCommand;
import org.treadwarm.commands.RehearseCommand;
import org.treadwarm.commands.RestoreCommand;
import org.treadwarm.commands.ServeCommand;
import org.treadwarm.commands.SizeCommand;
import org.treadwarm.commands.StoreFaults;
import picocli.CommandLine;
import picocli.CommandLine.Command;

/** The program; without a command it serves. */
@Command(
        name = "treadwarm",
        description = "Sizes heated floors: what flux a floor must give, what it may give, and the margin between.",
        mixinStandardHelpOptions = true,
        version = "Treadwarm 1.0.0, method version 1",
        subcommands = {
            ServeCommand.class,
            SizeCommand.class,
            CheckCommand.class,
            KeyCommand.class,
            BackupCommand.class,
            RestoreCommand.class,
            MoveCommand.class,
            OwnerLinkCommand.class,
            HealthCommand.class,
            RehearseCommand.class
        })
public final class Treadwarm {
    private static final String SERVE = "serve";

    private Treadwarm() {}

    /** Runs a command and ends the process with its status. */
    public static void main(String[] args) {
        String[] named = withDefault(args);
        if (named[0].equals(SERVE)) {
            ServeCommand.prepare();
        }
        System.exit(new CommandLine(new Treadwarm())
                .setExecutionExceptionHandler(new StoreFaults())
                .execute(named));
    }

    /** The arguments with "serve" in front, unless they name a command or ask for help. */
    private static String[] withDefault(String[] args) {
        boolean named = args.length > 0
                && (!args[0].startsWith("-")
                        || List.of("-h", "--help", "-V", "--version").contains(args[0]));
        return named ? args : Stream.concat(Stream.of(SERVE), Stream.of(args)).toArray(String[]::new);
    }
}
