package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.AfterAll;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.jobs.Job;
import org.treadwarm.store.Person;

/** A form without the visitor's own secret changes nothing. */
class FormSecretTest {
    private static RunningServer server;
    private static Person owner;
    private static Job job;

    @BeforeAll
    static void start() {
        server = RunningServer.start();
        owner = server.owner();
        job = server.job("yard", RunningServer.studio());
    }

    @AfterAll
    static void stop() {
        server.close();
    }

    private static Visitor visitor() {
        return new Visitor(server, server.session(owner));
    }

    private static String room() {
        return "/jobs/" + job.id() + "/rooms/studio-1";
    }

    private static void assertRefused(Page answer) {
        assertThat(answer.status()).isEqualTo(403);
        assertThat(server.now(job).revision()).isEqualTo(1);
        assertThat(server.desk().list()).hasSize(1);
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "x", "0000000000000000000000000000000000000000000"})
    void aWrongSecretSavesNothing(String secret) {
        Visitor visitor = visitor();

        assertRefused(visitor.send(visitor.open(room())
                .form("revision")
                .type("/rooms/0/height", "9 m")
                .type("csrf", secret)
                .press("save")));
        assertRefused(visitor.send(visitor.open("/jobs/" + job.id())
                .form("new-name")
                .type("new-name", "attic")
                .type("csrf", secret)
                .press("add-room")));
        assertRefused(visitor.send(
                visitor.open("/jobs").form("name").type("name", "more").type("csrf", secret)));
        assertRefused(visitor.send(
                visitor.open("/one-room").form("document").type("csrf", secret).to("/one-room/keep")));
    }

    @Test
    void aMissingSecretSavesNothing() {
        Visitor visitor = visitor();

        assertRefused(visitor.send(visitor.open(room())
                .form("revision")
                .type("/rooms/0/height", "9 m")
                .without("csrf")
                .press("save")));
    }

    @Test
    void anotherSessionsSecretSavesNothing() {
        Visitor one = visitor();
        Visitor other = visitor();
        String secret = other.open(room()).value("csrf");

        assertRefused(one.send(one.open(room())
                .form("revision")
                .type("/rooms/0/height", "9 m")
                .type("csrf", secret)
                .press("save")));
    }

    @Test
    void strangersSaveNothingWithTheSecretOfTheSignIn() {
        Visitor stranger = new Visitor(server);
        String secret = stranger.open("/sign-in").value("csrf");
        Form form = visitor().open(room()).form("revision");

        Page answer = stranger.send(
                form.type("/rooms/0/height", "9 m").type("csrf", secret).press("save"));

        assertThat(answer.status()).isEqualTo(303);
        assertThat(answer.location()).startsWith("/sign-in");
        assertThat(server.now(job).revision()).isEqualTo(1);
    }
}
