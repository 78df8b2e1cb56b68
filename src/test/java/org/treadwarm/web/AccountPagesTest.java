package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.net.URI;
import java.net.URLEncoder;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpRequest.BodyPublishers;
import java.net.http.HttpResponse.BodyHandlers;
import java.nio.charset.StandardCharsets;
import org.junit.jupiter.api.Test;
import org.treadwarm.store.Person;
import org.treadwarm.store.Session;

/** One's own account, and sign-ins that are slowed down by where they come from. */
class AccountPagesTest {
    private static Form passwords(Page page, String present, String fresh, String again) {
        return page.form("present")
                .type("present", present)
                .type("password", fresh)
                .type("again", again);
    }

    @Test
    void thePasswordChangesAndOtherSessionsEnd() {
        try (RunningServer server = RunningServer.start()) {
            Person person = server.owner();
            Visitor here = new Visitor(server, server.session(person));
            Visitor there = new Visitor(server, server.session(person));
            Page page = here.open("/account");

            Page wrong = here.send(passwords(page, "not this", "a new sentence", "a new sentence"));
            assertThat(wrong.status()).isEqualTo(422);
            assertThat(wrong.all("a").map(a -> a.getAttribute("href"))).contains("#present");
            Page unlike = here.send(passwords(page, RunningServer.PASSWORD, "a new sentence", "another"));
            assertThat(unlike.all("a").map(a -> a.getAttribute("href"))).contains("#again");
            assertThat(there.open("/jobs").status()).isEqualTo(200);

            Page done = here.send(passwords(page, RunningServer.PASSWORD, "a new sentence", "a new sentence"));
            assertThat(done.location()).isEqualTo("/account?done=password");
            assertThat(here.open(done.location()).text()).contains("The new password holds");
            assertThat(there.open("/jobs").location()).startsWith("/sign-in");
        }
    }

    @Test
    void sessionsEndOneByOneOrAll() {
        try (RunningServer server = RunningServer.start()) {
            Person person = server.owner();
            Session other = server.session(person);
            Visitor here = new Visitor(server, server.session(person));
            Visitor there = new Visitor(server, other);
            Form form = here.open("/account").form("csrf");

            assertThat(here.send(form.to("/account/sessions/" + other.id() + "/end"))
                            .location())
                    .isEqualTo("/account?done=session");
            assertThat(there.open("/jobs").location()).startsWith("/sign-in");
            assertThat(here.send(form.to("/account/sessions/" + other.id() + "/end"))
                            .status())
                    .isEqualTo(404);
            Visitor third = new Visitor(server, server.session(person));
            assertThat(here.send(form.to("/account/sessions/end")).location()).isEqualTo("/sign-in");
            assertThat(here.open("/jobs").location()).startsWith("/sign-in");
            assertThat(third.open("/jobs").location()).startsWith("/sign-in");
        }
    }

    private static int signIn(RunningServer server, String password, String forwarded) {
        String body = "csrf=a-secret-made-up-here&name="
                + URLEncoder.encode(RunningServer.OWNER, StandardCharsets.UTF_8) + "&password="
                + URLEncoder.encode(password, StandardCharsets.UTF_8);
        HttpRequest request = HttpRequest.newBuilder(URI.create(server.origin() + "/sign-in"))
                .header("Content-Type", "application/x-www-form-urlencoded")
                .header("Cookie", "treadwarm-form=a-secret-made-up-here")
                .header("X-Forwarded-For", forwarded)
                .POST(BodyPublishers.ofString(body))
                .build();
        try {
            return HttpClient.newHttpClient()
                    .send(request, BodyHandlers.discarding())
                    .statusCode();
        } catch (IOException e) {
            throw new IllegalStateException(e);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        }
    }

    private static int triesUntilWait(RunningServer server, String forwarded) {
        for (int tries = 0; tries < 20; tries++) {
            if (signIn(server, "not the password", forwarded.replace("#", Integer.toString(tries))) == 429) {
                return tries;
            }
        }
        return 20;
    }

    @Test
    void withoutAProxyForwardedHeadersAreIgnored() {
        try (RunningServer server = RunningServer.start()) {
            server.owner();
            assertThat(triesUntilWait(server, "192.0.2.#")).isBetween(5, 19);
        }
    }

    @Test
    void behindAProxyOnlyTheAddressItAppendedCounts() {
        try (RunningServer server = RunningServer.behindProxy()) {
            server.owner();
            assertThat(triesUntilWait(server, "192.0.2.#, 198.51.100.7")).isBetween(5, 19);
            assertThat(signIn(server, RunningServer.PASSWORD, "198.51.100.7, 203.0.113.5"))
                    .isEqualTo(303);
        }
    }
}
