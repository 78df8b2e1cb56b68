package org.treadwarm.program;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.time.Clock;
import java.time.Duration;
import java.time.LocalDate;
import java.time.ZoneOffset;
import java.util.List;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.program.Program.Result;
import org.treadwarm.store.LinkUse;
import org.treadwarm.store.SignIn;
import org.treadwarm.store.Store;

/** The ways in that the command line gives: a new password for an owner, and keys that end. */
class CommandsTest {
    private static final String OWNER = "Ottilie of Quillfen Floors";
    private static final String FORGOTTEN = "a floor that holds the room";
    private static final String FRESH = "a room that holds the floor";

    @TempDir
    Path folder;

    @BeforeEach
    void makeAnOwner() {
        try (Store store = open(Duration.ZERO)) {
            store.people().createOwner(store.people().inviteOwner().orElseThrow(), OWNER, FORGOTTEN);
        }
    }

    private Store open(Duration later) {
        return Store.open(folder, Clock.offset(Clock.systemUTC(), later));
    }

    private Result run(String... arguments) {
        String[] all = java.util.Arrays.copyOf(arguments, arguments.length + 2);
        all[arguments.length] = "--data";
        all[arguments.length + 1] = folder.toString();
        return Program.run(all);
    }

    private String ownerLink() {
        Result result = run("owner-link", "--address", "https://floors.example/");
        assertThat(result.errors()).isEmpty();
        assertThat(result.status()).isZero();
        assertThat(result.lines()).first().isEqualTo("For " + OWNER + ", once, within 24 hours:");
        String address = result.lines().get(1);
        assertThat(address).startsWith("https://floors.example/link/");
        return address.substring("https://floors.example/link/".length());
    }

    @Test
    void anOwnerLinkGivesANewPasswordOnce() {
        String token = ownerLink();

        try (Store store = open(Duration.ZERO)) {
            assertThat(store.links().changePassword(token, FRESH)).isInstanceOf(LinkUse.Done.class);
            assertThat(store.links().changePassword(token, FORGOTTEN)).isNotInstanceOf(LinkUse.Done.class);
            assertThat(store.people().signIn(OWNER, FRESH, "192.0.2.7")).isInstanceOf(SignIn.SignedIn.class);
            assertThat(store.audit().latest(10)).anyMatch(entry -> entry.who().equals("the command line"));
        }
    }

    @Test
    void anOwnerLinkEndsAfterADay() {
        String token = ownerLink();

        try (Store store = open(Duration.ofHours(25))) {
            assertThat(store.links().find(token)).isEmpty();
            assertThat(store.links().changePassword(token, FRESH)).isNotInstanceOf(LinkUse.Done.class);
        }
        try (Store store = open(Duration.ofHours(23))) {
            assertThat(store.links().find(token)).isPresent();
        }
    }

    @Test
    void thereIsNoLinkForAnybodyElse() {
        Result result = run("owner-link", "--name", "Nobody");

        assertThat(result.status()).isEqualTo(2);
        assertThat(result.output()).isEmpty();
        assertThat(result.errors()).contains("No owner has the name \"Nobody\".");
    }

    @Test
    void aKeyWorksToTheEndOfItsLastDay() {
        LocalDate last = LocalDate.now(ZoneOffset.UTC).plusDays(30);

        Result result = run("key", "create", "--name", "quotes", "--scope", "read", "--expires", last.toString());

        assertThat(result.status()).isZero();
        List<String> lines = result.lines();
        assertThat(found(lines.get(lines.size() - 1), Duration.ofDays(29))).isTrue();
        assertThat(found(lines.get(lines.size() - 1), Duration.ofDays(32))).isFalse();
    }

    private boolean found(String key, Duration later) {
        try (Store store = open(later)) {
            return store.keys().find(key).isPresent();
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"2020-01-01", "tomorrow", "2999-01-01", ""})
    void aKeyWithoutAProperLastDayIsNotMade(String day) {
        Result result = run("key", "create", "--name", "quotes", "--scope", "read", "--expires", day);

        assertThat(result.status()).isEqualTo(2);
        assertThat(result.output()).isEmpty();
        assertThat(result.errors()).contains("--expires is a date such as", "not \"" + day + "\"");
        try (Store store = open(Duration.ZERO)) {
            assertThat(store.keys().list()).isEmpty();
        }
    }
}
