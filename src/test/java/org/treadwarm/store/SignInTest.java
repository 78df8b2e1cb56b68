package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.treadwarm.store.PeopleTest.PASSWORD;

import java.nio.file.Path;
import java.time.Duration;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.Parameter;
import org.junit.jupiter.params.ParameterizedClass;
import org.junit.jupiter.params.provider.EnumSource;

@ParameterizedClass
@EnumSource(Kind.class)
class SignInTest {
    @Parameter
    Kind kind;

    private static final SignIn REFUSED = new SignIn.Refused();

    @TempDir
    Path folder;

    private final TestClock clock = new TestClock();
    private DataHome home;
    private Store store;
    private People people;
    private Person owner;

    @BeforeEach
    void open() {
        home = kind.emptyHome(folder);
        store = Store.open(home, clock);
        people = store.people();
        owner = PeopleTest.createOwner(store);
    }

    @AfterEach
    void close() {
        store.close();
    }

    private SignIn signIn(String name, String password) {
        return people.signIn(name, password, "192.0.2.1");
    }

    private static SignIn waiting(long seconds) {
        return new SignIn.Wait(Duration.ofSeconds(seconds));
    }

    private void fail(String name, int times) {
        for (int attempt = 0; attempt < times; attempt++) {
            assertThat(signIn(name, "wrong password")).isEqualTo(REFUSED);
        }
    }

    @Test
    void takesTheNameInAnyLetterCase() {
        assertThat(signIn("Anna Quill", PASSWORD)).isEqualTo(new SignIn.SignedIn(owner));
        assertThat(signIn(" aNNA qUILL ", PASSWORD)).isEqualTo(new SignIn.SignedIn(owner));
    }

    @Test
    void refusesWrongPasswordsAndUnknownNamesAlike() {
        assertThat(signIn("Anna Quill", PASSWORD + "x")).isEqualTo(REFUSED);
        assertThat(signIn("Anna Quill", "")).isEqualTo(REFUSED);
        assertThat(signIn("Anna Quill", "x".repeat(5000))).isEqualTo(REFUSED);
        assertThat(signIn("Nobody", PASSWORD)).isEqualTo(REFUSED);
        assertThat(signIn("", "")).isEqualTo(REFUSED);
        assertThat(signIn("Anna\0Quill", PASSWORD)).isEqualTo(REFUSED);
    }

    @Test
    void anAccentIsTheSameHoweverItWasTyped() {
        Passwords passwords = new Passwords();
        assertThat(passwords.matches("cafe\u0301 au lait", passwords.hash("caf\u00e9 au lait")))
                .isTrue();
    }

    @Test
    void makesOneNameWaitLongerAndLonger() {
        fail("Anna Quill", 5);
        assertThat(signIn("anna quill", PASSWORD)).isEqualTo(waiting(1));
        clock.pass(Duration.ofSeconds(1));
        fail("Anna Quill", 1);
        assertThat(signIn("Anna Quill", PASSWORD)).isEqualTo(waiting(2));

        clock.pass(Duration.ofMillis(500));
        assertThat(signIn("Anna Quill", PASSWORD)).isEqualTo(new SignIn.Wait(Duration.ofMillis(1500)));
        clock.pass(Duration.ofMillis(1500));
        assertThat(signIn("Anna Quill", PASSWORD)).isEqualTo(new SignIn.SignedIn(owner));
        fail("Anna Quill", 5);
    }

    @Test
    void makesUnknownNamesWaitTooAndNoOthers() {
        fail("Nobody", 5);

        assertThat(signIn("Nobody", PASSWORD)).isEqualTo(waiting(1));
        assertThat(signIn("Anna Quill", PASSWORD)).isEqualTo(new SignIn.SignedIn(owner));
    }

    @Test
    void forgetsFailuresAfterAQuietQuarterOfAnHour() {
        fail("Anna Quill", 5);
        clock.pass(Duration.ofMinutes(15).plusMillis(1));
        fail("Anna Quill", 5);
    }

    @Test
    void neverWaitsLongerThanAMinute() {
        assertThat(SignInThrottle.waitAfter(4)).isZero();
        assertThat(SignInThrottle.waitAfter(10)).isEqualTo(Duration.ofSeconds(32));
        assertThat(SignInThrottle.waitAfter(11)).isEqualTo(Duration.ofSeconds(60));
        assertThat(SignInThrottle.waitAfter(Integer.MAX_VALUE)).isEqualTo(Duration.ofSeconds(60));
    }

    @Test
    void aClockSetBackLocksNobodyOut() {
        fail("Anna Quill", 5);
        clock.pass(Duration.ofDays(-1));

        assertThat(signIn("Anna Quill", PASSWORD)).isEqualTo(new SignIn.SignedIn(owner));
    }

    @Test
    void keepsNoNamesThatWereTyped() {
        signIn("hunter2 typed into the wrong field", "wrong password");

        assertThat(new DataFile(home).text("select name_sha256 from sign_in_try where name_sha256 <> ''"))
                .matches("[0-9a-f]{64}");
    }
}
