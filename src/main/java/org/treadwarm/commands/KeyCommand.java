package org.treadwarm.commands;

import java.time.Clock;
import java.time.Instant;
import java.util.Locale;
import java.util.Optional;
import java.util.concurrent.Callable;
import org.treadwarm.store.KeyTerm;
import org.treadwarm.store.Scope;
import org.treadwarm.store.Store;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** Keys for other programs. */
@Command(
        name = "key",
        description = "Keys for other programs.",
        mixinStandardHelpOptions = true,
        subcommands = KeyCommand.Create.class)
public final class KeyCommand {
    /** Makes a key and prints it, alone on the last line; works beside a running server. */
    @Command(
            name = "create",
            description = "Make an API key and print it, alone on the last line. It is shown only this once.",
            mixinStandardHelpOptions = true)
    public static final class Create implements Callable<Integer> {
        @Option(names = "--name", required = true, description = "what the key is for")
        private String name;

        @Option(names = "--scope", required = true, description = "size, read or write; each includes the ones before")
        private String scope;

        @Option(names = "--expires", description = "the last day it works, to its end in UTC, such as 2027-03-31")
        private Optional<String> expires;

        @Mixin
        private HomeOptions data;

        @Override
        public Integer call() {
            Scope wanted;
            try {
                wanted = Scope.valueOf(scope.toUpperCase(Locale.ROOT));
            } catch (IllegalArgumentException e) {
                System.err.println("The scope \"" + scope + "\" is not known: size, read or write.");
                return 2;
            }
            if (name.isBlank() || name.length() > 100) {
                System.err.println("The name has 1 to 100 characters.");
                return 2;
            }
            Optional<Instant> end = expires.flatMap(day -> KeyTerm.endOf(day, Instant.now()));
            if (expires.isPresent() && end.isEmpty()) {
                System.err.println("--expires is " + KeyTerm.ALLOWED + ", not \"" + expires.get() + "\".");
                return 2;
            }
            try (Store store = Store.open(data.home(), Clock.systemUTC())) {
                String token = store.keys()
                        .create(name.strip(), wanted, end, "the command line")
                        .token();
                System.out.println("The key \"" + name.strip() + "\" (" + scope.toLowerCase(Locale.ROOT)
                        + ") is shown only this once:");
                System.out.println(token);
                return 0;
            } catch (IllegalArgumentException e) {
                System.err.println(e.getMessage());
                return 1;
            }
        }
    }
}
