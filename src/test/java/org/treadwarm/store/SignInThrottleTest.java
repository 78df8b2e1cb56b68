package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.treadwarm.store.PeopleTest.PASSWORD;

import java.nio.file.Path;
import java.time.Duration;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/** Guessing is slow from every address, and locks out nobody who comes from another. */
class SignInThrottleTest {
    private static final String ATTIC = "192.0.2.1";
    private static final String OFFICE = "198.51.100.2";

    @TempDir
    Path folder;

    private final TestClock clock = new TestClock();
    private Store store;
    private Person owner;

    @BeforeEach
    void open() {
        store = Store.open(folder, clock);
        owner = PeopleTest.createOwner(store);
    }

    @AfterEach
    void close() {
        store.close();
    }

    private SignIn signIn(String name, String password, String from) {
        return store.people().signIn(name, password, from);
    }

    private void fail(String name, String from) {
        assertThat(signIn(name, "wrong password", from)).isEqualTo(new SignIn.Refused());
    }

    @Test
    void failuresFromOneAddressDoNotDelayTheNameFromAnother() {
        for (int i = 0; i < 12; i++) {
            signIn("Anna Quill", "wrong password", ATTIC);
            clock.pass(Duration.ofSeconds(60));
        }
        fail("Anna Quill", ATTIC);

        assertThat(signIn("Anna Quill", PASSWORD, ATTIC)).isEqualTo(new SignIn.Wait(Duration.ofSeconds(60)));
        assertThat(signIn("Anna Quill", PASSWORD, OFFICE)).isEqualTo(new SignIn.SignedIn(owner));
    }

    @Test
    void manyNamesFromOneAddressAreSlowButNeverSlowerThanTenSeconds() {
        for (int i = 0; i < 30; i++) {
            fail("Nobody " + i, ATTIC);
        }
        assertThat(signIn("Anna Quill", PASSWORD, ATTIC)).isEqualTo(new SignIn.Wait(Duration.ofSeconds(1)));
        assertThat(signIn("Anna Quill", PASSWORD, OFFICE)).isEqualTo(new SignIn.SignedIn(owner));
        for (int i = 0; i < 8; i++) {
            clock.pass(Duration.ofSeconds(10));
            fail("Nobody else " + i, ATTIC);
        }
        assertThat(signIn("Anna Quill", PASSWORD, ATTIC)).isEqualTo(new SignIn.Wait(Duration.ofSeconds(10)));
        clock.pass(Duration.ofSeconds(10));
        assertThat(signIn("Anna Quill", PASSWORD, ATTIC)).isEqualTo(new SignIn.SignedIn(owner));
    }

    @Test
    void goodSignInsFromOneOfficeNeverSlowDown() {
        for (int i = 0; i < 40; i++) {
            assertThat(signIn("Anna Quill", PASSWORD, OFFICE)).isEqualTo(new SignIn.SignedIn(owner));
        }
    }

    @Test
    void forgetsAnAddressAfterAQuietQuarterOfAnHour() {
        for (int i = 0; i < 30; i++) {
            fail("Nobody " + i, ATTIC);
        }
        clock.pass(Duration.ofMinutes(15).plusMillis(1));
        fail("Nobody", ATTIC);
        assertThat(new DataFile(DataHome.folder(folder)).count("sign_in_try")).isEqualTo(2);
    }

    @Test
    void keepsNoAddressesInTheClear() {
        fail("Nobody", ATTIC);
        assertThat(new DataFile(DataHome.folder(folder)).text("select min(address_sha256) from sign_in_try"))
                .isEqualTo(Secrets.sha256(ATTIC));
    }
}
