package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.treadwarm.store.PeopleTest.PASSWORD;

import java.nio.file.Path;
import java.time.Duration;
import java.util.concurrent.Callable;
import java.util.concurrent.CyclicBarrier;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class TeamTest {
    @TempDir
    Path folder;

    private final TestClock clock = new TestClock();
    private Store store;
    private Team team;
    private Person owner;

    @BeforeEach
    void open() {
        store = Store.open(folder, clock);
        team = store.team();
        owner = PeopleTest.createOwner(store);
    }

    @AfterEach
    void close() {
        store.close();
    }

    private Person member(String name, Role role) {
        String token = store.links().invite(name, role, "Anna Quill").token();
        return ((LinkUse.Done) store.links().join(token, name, PASSWORD)).person();
    }

    private SignIn signIn(String name) {
        return store.people().signIn(name, PASSWORD, "192.0.2.7");
    }

    @Test
    void aRoleMayDoWhatTheLesserOnesMay() {
        assertThat(Role.OWNER.allows(Role.SURVEYOR)).isTrue();
        assertThat(Role.ESTIMATOR.allows(Role.ESTIMATOR)).isTrue();
        assertThat(Role.ESTIMATOR.allows(Role.OWNER)).isFalse();
        assertThat(Role.SURVEYOR.allows(Role.ESTIMATOR)).isFalse();
    }

    @Test
    void aNewRoleHoldsInSessionsThatAreOpen() {
        Person ben = member("Ben", Role.SURVEYOR);
        Session session = store.sessions().start(ben);

        assertThat(team.changeRole(ben.id(), Role.ESTIMATOR, "Anna Quill")).isInstanceOf(TeamChange.Done.class);

        assertThat(store.sessions().find(session.token()).orElseThrow().person().role())
                .isEqualTo(Role.ESTIMATOR);
        assertThat(store.audit().latest(1).get(0))
                .isEqualTo(new AuditEntry(
                        clock.instant(), "Anna Quill", "changed role", "Ben from surveyor to estimator"));
        team.changeRole(ben.id(), Role.ESTIMATOR, "Anna Quill");
        assertThat(store.audit().latest(2).get(0).subject()).contains("from surveyor");
    }

    @Test
    void theLastOwnerStaysOne() {
        Person ben = member("Ben", Role.OWNER);
        assertThat(team.close(ben.id(), "Anna Quill")).isInstanceOf(TeamChange.Done.class);

        assertThat(team.changeRole(owner.id(), Role.SURVEYOR, "Anna Quill")).isEqualTo(new TeamChange.LastOwner());
        assertThat(team.close(owner.id(), "Anna Quill")).isEqualTo(new TeamChange.LastOwner());
        assertThat(signIn("Anna Quill")).isEqualTo(new SignIn.SignedIn(owner));
    }

    @Test
    void twoOwnersCannotCloseOneAnotherAtOnce() throws Exception {
        Person ben = member("Ben", Role.OWNER);
        CyclicBarrier start = new CyclicBarrier(2);
        ExecutorService threads = Executors.newFixedThreadPool(2);
        try (Store second = Store.open(folder, clock)) {
            Future<TeamChange> one = threads.submit(closing(start, team, ben));
            Future<TeamChange> other = threads.submit(closing(start, second.team(), owner));
            assertThat(new TeamChange[] {one.get(), other.get()})
                    .hasAtLeastOneElementOfType(TeamChange.Done.class)
                    .hasAtLeastOneElementOfType(TeamChange.LastOwner.class);
        } finally {
            threads.shutdownNow();
        }
    }

    private static Callable<TeamChange> closing(CyclicBarrier start, Team team, Person person) {
        return () -> {
            start.await();
            return team.close(person.id(), "somebody");
        };
    }

    @Test
    void aClosedAccountIsShutAndItsHistoryStays() {
        Person ben = member("Ben", Role.ESTIMATOR);
        Session session = store.sessions().start(ben);
        String reset = store.links()
                .resetPassword(ben.id(), "Anna Quill", Links.VALID_FOR)
                .orElseThrow()
                .token();

        assertThat(team.close(ben.id(), "Anna Quill")).isEqualTo(new TeamChange.Done(ben));

        assertThat(store.sessions().find(session.token())).isEmpty();
        assertThat(store.links().find(reset)).isEmpty();
        assertThat(signIn("Ben")).isEqualTo(new SignIn.Refused());
        assertThat(team.close(ben.id(), "Anna Quill")).isEqualTo(new TeamChange.Missing());
        assertThat(team.changeRole(ben.id(), Role.OWNER, "Anna Quill")).isEqualTo(new TeamChange.Missing());
        assertThat(store.links().resetPassword(ben.id(), "Anna Quill", Links.VALID_FOR))
                .isEmpty();
        assertThat(team.list().get(1).closed()).contains(clock.instant());
        assertThat(store.audit().latest(1).get(0).what()).isEqualTo("closed account");
        assertThat(store.audit().latest(9)).anyMatch(entry -> entry.what().equals("joined"));
    }

    @Test
    void listsWhenSomebodyWasLastSeen() {
        Person ben = member("Ben", Role.SURVEYOR);
        assertThat(team.list()).extracting(Member::lastSeen).allMatch(java.util.Optional::isEmpty);
        String token = store.sessions().start(ben).token();
        clock.pass(Duration.ofMinutes(5));
        store.sessions().find(token);
        store.sessions().end(token);

        assertThat(team.list().get(1).lastSeen()).contains(clock.instant());
    }
}
