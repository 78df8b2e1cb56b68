package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.treadwarm.store.PeopleTest.PASSWORD;

import java.nio.file.Path;
import java.time.Duration;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class LinksTest {
    private static final LinkUse REFUSED = new LinkUse.LinkRefused();

    @TempDir
    Path folder;

    private final TestClock clock = new TestClock();
    private Store store;
    private Links links;
    private Person owner;

    @BeforeEach
    void open() {
        store = Store.open(folder, clock);
        links = store.links();
        owner = PeopleTest.createOwner(store);
    }

    @AfterEach
    void close() {
        store.close();
    }

    @Test
    void anInvitationMakesOneAccount() {
        NewLink made = links.invite(" Ben ", Role.ESTIMATOR, "Anna Quill");
        assertThat(made.toString()).doesNotContain(made.token());
        assertThat(new DataFile(DataHome.folder(folder)).text("select sha256 from one_time_link"))
                .isEqualTo(Secrets.sha256(made.token()));
        assertThat(links.list()).containsExactly(made.link());
        assertThat(links.find(made.token())).contains(made.link());

        LinkUse use = links.join(made.token(), "Benno", PASSWORD);

        assertThat(use).isInstanceOfSatisfying(LinkUse.Done.class, done -> {
            assertThat(done.person().name()).isEqualTo("Benno");
            assertThat(done.person().role()).isEqualTo(Role.ESTIMATOR);
        });
        assertThat(links.join(made.token(), "Carla", PASSWORD)).isEqualTo(REFUSED);
        assertThat(links.list()).isEmpty();
        assertThat(store.audit().latest(2))
                .extracting(AuditEntry::who, AuditEntry::what)
                .containsExactly(
                        org.assertj.core.groups.Tuple.tuple("Benno", "joined"),
                        org.assertj.core.groups.Tuple.tuple("Anna Quill", "invited"));
    }

    @Test
    void anInvitationEndsAfterThreeDays() {
        String token = links.invite("Ben", Role.SURVEYOR, "Anna Quill").token();
        clock.pass(Duration.ofHours(72).minusMillis(1));
        assertThat(links.find(token)).isPresent();
        clock.pass(Duration.ofMillis(1));

        assertThat(links.find(token)).isEmpty();
        assertThat(links.list()).isEmpty();
        assertThat(links.join(token, "Ben", PASSWORD)).isEqualTo(REFUSED);
    }

    @Test
    void aRevokedLinkIsRefused() {
        NewLink made = links.invite("Ben", Role.SURVEYOR, "Anna Quill");

        assertThat(links.revoke(made.link().id(), "Anna Quill")).isTrue();
        assertThat(links.revoke(made.link().id(), "Anna Quill")).isFalse();

        assertThat(links.join(made.token(), "Ben", PASSWORD)).isEqualTo(REFUSED);
        assertThat(store.audit().latest(1).get(0).what()).isEqualTo("revoked link");
    }

    @Test
    void whatIsRefusedDoesNotSpendTheLink() {
        String token = links.invite("Ben", Role.SURVEYOR, "Anna Quill").token();

        assertThat(links.join(token, " ", PASSWORD)).isEqualTo(new LinkUse.NameRefused());
        assertThat(links.join(token, "Ben", "short")).isEqualTo(new LinkUse.PasswordRefused());
        assertThat(links.join(token, "ANNA quill", PASSWORD)).isEqualTo(new LinkUse.NameTaken());
        assertThat(links.changePassword(token, PASSWORD)).isEqualTo(REFUSED);
        assertThat(links.join("guess", "Ben", PASSWORD)).isEqualTo(REFUSED);
        assertThat(links.join(token, "Ben", PASSWORD)).isInstanceOf(LinkUse.Done.class);
        assertThatThrownBy(() -> links.invite("\n", Role.SURVEYOR, "Anna Quill"))
                .isInstanceOf(IllegalArgumentException.class);
    }

    @Test
    void aNewPasswordEndsAllSessions() {
        Session session = store.sessions().start(owner);
        String old = links.resetPassword(owner.id(), "the command line", Duration.ofHours(24))
                .orElseThrow()
                .token();
        String token = links.resetPassword(owner.id(), "the command line", Duration.ofHours(24))
                .orElseThrow()
                .token();

        assertThat(links.changePassword(old, "another long one")).isEqualTo(REFUSED);
        assertThat(links.changePassword(token, "short")).isEqualTo(new LinkUse.PasswordRefused());
        assertThat(links.join(token, "Mallory", PASSWORD)).isEqualTo(REFUSED);
        assertThat(links.changePassword(token, "another long one")).isEqualTo(new LinkUse.Done(owner));
        assertThat(links.changePassword(token, "another long two")).isEqualTo(REFUSED);

        assertThat(store.sessions().find(session.token())).isEmpty();
        People people = store.people();
        assertThat(people.signIn("Anna Quill", PASSWORD, "192.0.2.1")).isEqualTo(new SignIn.Refused());
        assertThat(people.signIn("Anna Quill", "another long one", "192.0.2.1")).isEqualTo(new SignIn.SignedIn(owner));
        assertThat(links.resetPassword("nobody", "Anna Quill", Links.VALID_FOR)).isEmpty();
    }
}
