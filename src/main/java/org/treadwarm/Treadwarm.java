package org.treadwarm;

import java.util.Arrays;
import org.treadwarm.commands.CheckCommand;
import org.treadwarm.commands.HealthCommand;
import org.treadwarm.commands.KeyCommand;
import org.treadwarm.commands.ServeCommand;
import org.treadwarm.commands.SizeCommand;
import picocli.CommandLine;
import picocli.CommandLine.Command;

/** The program; without a command it serves. */
@Command(
        name = "treadwarm",
        description = "Sizes heated floors: what flux a floor must give, what it may give, and the margin between.",
        mixinStandardHelpOptions = true,
        version = "Treadwarm 1.0.0, method version 1",
        subcommands = {ServeCommand.class, SizeCommand.class, CheckCommand.class, KeyCommand.class, HealthCommand.class
        })
public final class Treadwarm {
    private Treadwarm() {}

    /** Runs a command and ends the process with its status. */
    public static void main(String[] args) {
        CommandLine program = new CommandLine(new Treadwarm());
        System.exit(program.execute(withDefault(program, args)));
    }

    /** The arguments with "serve" in front, unless they name a command or ask for help. */
    private static String[] withDefault(CommandLine program, String[] args) {
        boolean named = args.length > 0
                && (program.getSubcommands().containsKey(args[0])
                        || Arrays.asList("-h", "--help", "-V", "--version").contains(args[0])
                        || !args[0].startsWith("-"));
        if (named) {
            return args;
        }
        String[] more = new String[args.length + 1];
        more[0] = "serve";
        System.arraycopy(args, 0, more, 1, args.length);
        return more;
    }
}
