package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.equalTo;

import io.restassured.specification.RequestSpecification;
import java.time.Instant;
import java.util.Optional;
import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.treadwarm.store.ApiKey;
import org.treadwarm.store.Scope;

/** Keys of other programs, by forms, and what their ends mean to the API. */
class KeyPagesTest {
    private static RunningServer server;
    private static ApiClient api;
    private static Visitor owner;

    @BeforeAll
    static void start() {
        server = RunningServer.start();
        api = new ApiClient(server);
        owner = new Visitor(server, server.session(server.owner()));
    }

    @AfterAll
    static void stop() {
        server.close();
    }

    private static Page make(String name, String scope, String until) {
        return owner.send(owner.open("/keys")
                .form("scope")
                .type("name", name)
                .type("scope", scope)
                .type("until", until));
    }

    private static RequestSpecification with(String token) {
        return api.anyone().auth().none().header("Authorization", "Bearer " + token);
    }

    private static ApiKey named(String name) {
        return server.store().keys().list().stream()
                .filter(key -> key.name().equals(name))
                .findFirst()
                .orElseThrow();
    }

    @Test
    void aKeyIsShownOnceAndWorksUntilItIsRevoked() {
        Page made = make("quoting", "read", "2030-01-31");
        String token = made.all("code")
                .filter(code -> code.getAttribute("class").equals("secret"))
                .findFirst()
                .orElseThrow()
                .getTextContent();
        assertThat(owner.open("/keys").text()).doesNotContain(token).contains("quoting", "2030-01-31");
        assertThat(named("quoting").expiresAt()).contains(Instant.parse("2030-02-01T00:00:00Z"));

        String end = "/keys/" + named("quoting").id() + "/revoke";
        Page revoked = owner.send(owner.open("/keys").form("csrf").to(end));
        assertThat(owner.open(revoked.location()).text()).contains("The key was revoked");
        assertThat(owner.send(owner.open("/keys").form("csrf").to(end)).status())
                .isEqualTo(404);

        with(token).get("/jobs").then().statusCode(401).body("type", equalTo("urn:treadwarm:problem:key-revoked"));
    }

    @Test
    void anExpiredKeySaysSo() {
        Instant past = Instant.now().minusSeconds(60);
        String token = server.store()
                .keys()
                .create("last year", Scope.WRITE, Optional.of(past), "tests")
                .token();

        with(token)
                .get("/jobs")
                .then()
                .statusCode(401)
                .body("type", equalTo("urn:treadwarm:problem:key-expired"))
                .body("detail", containsString("It worked until"));
        with("tw_guess").get("/jobs").then().statusCode(401).body("type", equalTo("urn:treadwarm:problem:key"));
        assertThat(owner.open("/keys").text()).contains("expired");
    }

    @Test
    void whatIsWrongIsToldBesideWhatWasTyped() {
        for (String until : new String[] {"soon", "2020-01-01", "2999-01-01", "2030-02-30"}) {
            Page bad = make("drawings", "write", until);
            assertThat(bad.status()).as(until).isEqualTo(422);
            assertThat(bad.form("scope").value("name")).isEqualTo("drawings");
            assertThat(bad.form("scope").value("scope")).isEqualTo("write");
            assertThat(bad.form("scope").value("until")).isEqualTo(until);
            assertThat(bad.all("a").map(a -> a.getAttribute("href"))).contains("#until");
        }
        assertThat(make(" ", "size", "").all("a").map(a -> a.getAttribute("href")))
                .contains("#name");
        assertThat(make("drawings", "all", "").status()).isEqualTo(422);
        assertThat(server.store().keys().list()).noneMatch(key -> key.name().equals("drawings"));
    }
}
