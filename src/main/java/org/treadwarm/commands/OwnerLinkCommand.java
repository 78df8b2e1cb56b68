package org.treadwarm.commands;

import java.time.Clock;
import java.time.Duration;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.Callable;
import java.util.stream.Collectors;
import org.treadwarm.store.Member;
import org.treadwarm.store.NewLink;
import org.treadwarm.store.Person;
import org.treadwarm.store.Role;
import org.treadwarm.store.Store;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** Lets an owner who forgot the password back in; whoever can run this can read the data folder anyway. */
@Command(
        name = "owner-link",
        description = "Print a link, good once and for 24 hours, with which an owner chooses a new password."
                + " Works beside a running server.",
        mixinStandardHelpOptions = true)
public final class OwnerLinkCommand implements Callable<Integer> {
    private static final Duration VALID_FOR = Duration.ofHours(24);

    @Mixin
    private HomeOptions data;

    @Option(names = "--name", description = "which owner, where there are several")
    private Optional<String> name;

    @Option(
            names = "--address",
            defaultValue = "http://127.0.0.1:8080",
            description = "how browsers call the server (${DEFAULT-VALUE})")
    private String address;

    @Override
    public Integer call() {
        try (Store store = Store.open(data.home(), Clock.systemUTC())) {
            List<Person> owners = store.team().list().stream()
                    .filter(member -> member.closed().isEmpty())
                    .map(Member::person)
                    .filter(person -> person.role() == Role.OWNER)
                    .filter(person -> name.map(person.name()::equalsIgnoreCase).orElse(true))
                    .toList();
            if (owners.size() != 1) {
                System.err.println(refusal(owners));
                return 2;
            }
            NewLink made = store.links()
                    .resetPassword(owners.get(0).id(), "the command line", VALID_FOR)
                    .orElseThrow();
            System.out.println("For " + owners.get(0).name() + ", once, within 24 hours:");
            System.out.println(address.replaceAll("/+$", "") + "/link/" + made.token());
            return 0;
        }
    }

    private String refusal(List<Person> owners) {
        if (!owners.isEmpty()) {
            return "There are several owners; say which with --name: "
                    + owners.stream().map(Person::name).collect(Collectors.joining(", ")) + ".";
        }
        return name.isPresent()
                ? "No owner has the name \"" + name.get() + "\"."
                : "There is no owner yet; the server prints the link for the first one when it starts.";
    }
}
