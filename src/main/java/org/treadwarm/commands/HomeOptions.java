package org.treadwarm.commands;

import java.nio.file.Path;
import java.util.Optional;
import org.treadwarm.store.DataHome;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Spec;

/** Where a command finds the data: a folder, or a database named on the command line or in the environment. */
final class HomeOptions {
    /** The data folder when nothing is named. */
    static final String FOLDER = "treadwarm-data";

    /** The environment variable with the address of the database, which keeps a password off the command line. */
    static final String VARIABLE = "TREADWARM_DATABASE";

    @Spec(Spec.Target.MIXEE)
    private CommandSpec command;

    @Option(names = "--data", description = "the data folder (" + FOLDER + ", unless a database is named)")
    private Optional<Path> folder = Optional.empty();

    @Option(
            names = "--database",
            paramLabel = "URL",
            description = "instead of a folder, a PostgreSQL database: jdbc:postgresql://host:port/name?user=...;"
                    + " with a password in it, set it in the environment as " + VARIABLE + " instead")
    private Optional<String> database = Optional.empty();

    /** @throws ParameterException if two places are named, or the address cannot be used */
    DataHome home() {
        Optional<String> fromEnvironment = databaseOfEnvironment();
        if (folder.isPresent() && (database.isPresent() || fromEnvironment.isPresent())) {
            throw refused(
                    command,
                    "A folder (--data) and a database (" + (database.isPresent() ? "--database" : VARIABLE)
                            + ") are both named; name one of them.");
        }
        Optional<String> url = database.or(() -> fromEnvironment);
        return url.isPresent() ? databaseAt(command, url.get()) : DataHome.folder(folder.orElse(Path.of(FOLDER)));
    }

    /**
     * The folder, for what is done with files only.
     *
     * @param otherwise what to do instead with a database
     * @throws ParameterException if a database is named
     */
    Path folder(String otherwise) {
        if (home() instanceof DataHome.Folder found) {
            return found.path();
        }
        throw refused(command, "This is for a data folder, and a database is named. " + otherwise + ".");
    }

    /** The database at an address that was typed. */
    static DataHome.Postgresql databaseAt(CommandSpec command, String url) {
        try {
            return DataHome.database(url);
        } catch (IllegalArgumentException e) {
            throw refused(command, e.getMessage());
        }
    }

    /** The address in the environment; empty if it is not set or blank. */
    static Optional<String> databaseOfEnvironment() {
        return Optional.ofNullable(System.getenv(VARIABLE)).filter(url -> !url.isBlank());
    }

    static ParameterException refused(CommandSpec command, String message) {
        return new ParameterException(command.commandLine(), message);
    }
}
