package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The way in. */
class EntryPagesTest {
    private RunningServer server;

    @BeforeEach
    void start() {
        server = RunningServer.start();
    }

    @AfterEach
    void stop() {
        server.close();
    }

    private static Form filled(Form form, String name, String password) {
        return form.type("name", name).type("password", password);
    }

    private static Page signIn(Visitor visitor, String password) {
        return visitor.send(filled(visitor.open("/sign-in").form("password"), RunningServer.OWNER, password));
    }

    @Test
    void theRightPasswordOpensThePages() {
        server.owner();
        Visitor visitor = new Visitor(server);

        Page answer = signIn(visitor, RunningServer.PASSWORD);

        assertThat(answer.status()).isEqualTo(303);
        assertThat(answer.location()).isEqualTo("/jobs");
        assertThat(answer.response().headers().allValues("Set-Cookie"))
                .anyMatch(cookie -> cookie.startsWith("treadwarm-session=")
                        && cookie.contains("HttpOnly")
                        && cookie.contains("SameSite=Lax"));
        assertThat(visitor.open("/jobs").status()).isEqualTo(200);
    }

    @Test
    void aWrongPasswordIsRefusedAndTheNameShownAgain() {
        server.owner();
        Visitor visitor = new Visitor(server);

        Page answer = signIn(visitor, "not the password");

        assertThat(answer.status()).isEqualTo(422);
        assertThat(answer.value("name")).isEqualTo(RunningServer.OWNER);
        assertThat(answer.value("password")).isEmpty();
        assertThat(answer.text()).doesNotContain("not the password");
        assertThat(visitor.open("/jobs").status()).isEqualTo(303);
    }

    @Test
    void manyWrongPasswordsMustWaitEvenForTheRightOne() {
        server.owner();
        Visitor visitor = new Visitor(server);
        int tries = 0;
        Page answer = signIn(visitor, "not the password");
        while (answer.status() == 422 && tries < 20) {
            answer = signIn(visitor, "not the password");
            tries++;
        }

        assertThat(answer.status()).isEqualTo(429);
        assertThat(answer.response().headers().firstValue("Retry-After")).isPresent();
        assertThat(tries).isBetween(3, 10);
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "https://quillfen.example/",
                "//quillfen.example",
                "/\\quillfen.example",
                "javascript:alert(1)",
                "jobs",
                "/jobs\r\nX-Made-Up: 1"
            })
    void aSignInLeadsNowhereElse(String back) {
        server.owner();
        Visitor visitor = new Visitor(server);
        Form form = filled(visitor.open("/sign-in").form("password"), RunningServer.OWNER, RunningServer.PASSWORD);

        Page answer = visitor.send(form.type("back", back));

        assertThat(answer.response().headers().firstValue("X-Made-Up")).isEmpty();
        assertThat(answer.location()).startsWith("/jobs").doesNotContain("\n");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "/jobs",
                "/jobs/a",
                "/jobs/a/rooms/b",
                "/one-room",
                "/materials",
                "/reading-help",
                "/method",
            })
    void strangersAreLedToTheSignInAndBack(String path) {
        server.owner();
        Visitor visitor = new Visitor(server);

        Page answer = visitor.open(path);

        assertThat(answer.status()).isEqualTo(303);
        assertThat(answer.location()).startsWith("/sign-in");
        Page form = visitor.open(answer.location());
        assertThat(form.value("back")).isEqualTo(path);
    }

    @Test
    void signingOutEndsTheSession() {
        var session = server.session(server.owner());
        Visitor visitor = new Visitor(server, session);

        Page answer = visitor.send(visitor.open("/method").form("csrf"));

        assertThat(answer.location()).isEqualTo("/sign-in");
        assertThat(new Visitor(server, session).open("/jobs").status()).isEqualTo(303);
    }

    private static Form wouldBeOwner(Page page) {
        return page.form("again")
                .type("name", "Quill")
                .type("password", "ten letters")
                .type("again", "ten letters");
    }

    @Test
    void theOwnersLinkWorksOnce() {
        String link = "/owner/" + server.store().people().inviteOwner().orElseThrow();
        Visitor first = new Visitor(server);
        Visitor second = new Visitor(server);
        Form late = wouldBeOwner(second.open(link));

        assertThat(first.send(wouldBeOwner(first.open(link))).location()).isEqualTo("/jobs");
        assertThat(first.open("/jobs").status()).isEqualTo(200);
        assertThat(second.send(late).status()).isEqualTo(404);
        assertThat(second.open("/jobs").status()).isEqualTo(303);
        assertThat(new Visitor(server).open(link).has("password")).isFalse();
    }

    @Test
    void lookingAtTheOwnersLinkDoesNotSpendIt() {
        String link = "/owner/" + server.store().people().inviteOwner().orElseThrow();
        new Visitor(server).open(link);

        assertThat(new Visitor(server).open(link).status()).isEqualTo(200);
    }

    @Test
    void anOwnerNeedsAPasswordOfSomeLengthTypedTwice() {
        String link = "/owner/" + server.store().people().inviteOwner().orElseThrow();
        Visitor visitor = new Visitor(server);
        Form form = visitor.open(link).form("again").type("name", "Quill");

        Page different = visitor.send(form.type("password", "ten letters").type("again", "ten Letters"));
        assertThat(different.status()).isEqualTo(422);
        assertThat(different.value("name")).isEqualTo("Quill");
        assertThat(visitor.send(form.type("password", "short").type("again", "short"))
                        .status())
                .isEqualTo(422);
        assertThat(visitor.send(form.type("name", " ")
                                .type("password", "ten letters")
                                .type("again", "ten letters"))
                        .status())
                .isEqualTo(422);
        assertThat(server.store().people().hasOwner()).isFalse();
    }

    @Test
    void aWrongLinkMakesNobodyTheOwner() {
        String link = "/owner/" + server.store().people().inviteOwner().orElseThrow();
        Visitor visitor = new Visitor(server);

        Page answer = visitor.send(wouldBeOwner(visitor.open(link)).to("/owner/wrong"));

        assertThat(answer.status()).isEqualTo(404);
        assertThat(server.store().people().hasOwner()).isFalse();
        assertThat(visitor.open("/owner/wrong").status()).isEqualTo(404);
    }
}
