package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.Parameter;
import org.junit.jupiter.params.ParameterizedClass;
import org.junit.jupiter.params.provider.EnumSource;

@ParameterizedClass
@EnumSource(Kind.class)
class PeopleTest {
    @Parameter
    Kind kind;

    static final String PASSWORD = "long enough, invented";

    @TempDir
    Path folder;

    private final TestClock clock = new TestClock();
    private DataHome home;
    private Store store;
    private People people;

    @BeforeEach
    void open() {
        home = kind.emptyHome(folder);
        store = Store.open(home, clock);
        people = store.people();
    }

    @AfterEach
    void close() {
        store.close();
    }

    static Person createOwner(Store store) {
        String token = store.people().inviteOwner().orElseThrow();
        return ((OwnerCreation.Created) store.people().createOwner(token, "Anna Quill", PASSWORD)).owner();
    }

    @Test
    void theLinkMakesOneOwner() {
        assertThat(people.hasOwner()).isFalse();
        String token = people.inviteOwner().orElseThrow();
        assertThat(token).matches("[A-Za-z0-9_-]{43}");
        assertThat(people.invitationIsOpen(token)).isTrue();

        OwnerCreation created = people.createOwner(token, "  Anna Quill ", PASSWORD);

        assertThat(created).isInstanceOfSatisfying(OwnerCreation.Created.class, result -> {
            assertThat(result.owner().name()).isEqualTo("Anna Quill");
            assertThat(result.owner().role()).isEqualTo(Role.OWNER);
        });
        assertThat(people.hasOwner()).isTrue();
        assertThat(people.invitationIsOpen(token)).isFalse();
        assertThat(people.createOwner(token, "Ben", PASSWORD)).isEqualTo(new OwnerCreation.LinkRefused());
        assertThat(people.inviteOwner()).isEmpty();
        assertThat(new DataFile(home).count("person")).isEqualTo(1);
    }

    @Test
    void theLinkEndsAfterADay() {
        String token = people.inviteOwner().orElseThrow();
        clock.pass(Duration.ofHours(24).minusMillis(1));
        assertThat(people.invitationIsOpen(token)).isTrue();
        clock.pass(Duration.ofMillis(1));

        assertThat(people.invitationIsOpen(token)).isFalse();
        assertThat(people.createOwner(token, "Anna", PASSWORD)).isEqualTo(new OwnerCreation.LinkRefused());
        assertThat(people.hasOwner()).isFalse();
    }

    @Test
    void aNewLinkReplacesTheOld() {
        String old = people.inviteOwner().orElseThrow();
        String fresh = people.inviteOwner().orElseThrow();

        assertThat(people.createOwner(old, "Anna", PASSWORD)).isEqualTo(new OwnerCreation.LinkRefused());
        assertThat(people.createOwner(fresh, "Anna", PASSWORD)).isInstanceOf(OwnerCreation.Created.class);
    }

    @Test
    void aBadNameOrPasswordDoesNotSpendTheLink() {
        String token = people.inviteOwner().orElseThrow();

        assertThat(people.createOwner(token, "Anna", "short")).isEqualTo(new OwnerCreation.PasswordRefused());
        assertThat(people.createOwner(token, "Anna", "x".repeat(201))).isEqualTo(new OwnerCreation.PasswordRefused());
        assertThat(people.createOwner(token, "  ", PASSWORD)).isEqualTo(new OwnerCreation.NameRefused());
        assertThat(people.createOwner(token, "An\nna", PASSWORD)).isEqualTo(new OwnerCreation.NameRefused());
        assertThat(people.createOwner(token, "Anna", "ten chars!")).isInstanceOf(OwnerCreation.Created.class);
    }

    @Test
    void ofTwoWhoUseTheLinkAtOnceOneBecomesTheOwner() throws Exception {
        String token = people.inviteOwner().orElseThrow();
        ExecutorService threads = Executors.newFixedThreadPool(2);
        try (Store other = Store.open(home, clock)) {
            Future<OwnerCreation> one = threads.submit(() -> people.createOwner(token, "Anna", PASSWORD));
            Future<OwnerCreation> two = threads.submit(() -> other.people().createOwner(token, "Ben", PASSWORD));

            assertThat(List.of(one.get(), two.get())).containsOnlyOnce(new OwnerCreation.LinkRefused());
            assertThat(new DataFile(home).count("person")).isEqualTo(1);
        } finally {
            threads.shutdownNow();
        }
    }

    @Test
    void keepsNoSecretInTheClear() {
        String token = people.inviteOwner().orElseThrow();
        DataFile file = new DataFile(home);
        assertThat(file.text("select sha256 from owner_invitation")).isEqualTo(Secrets.sha256(token));

        people.createOwner(token, "Anna", PASSWORD);

        assertThat(file.text("select password_hash from person"))
                .startsWith("$argon2id$v=19$m=19456,t=2,p=1$")
                .doesNotContain(PASSWORD);
    }
}
