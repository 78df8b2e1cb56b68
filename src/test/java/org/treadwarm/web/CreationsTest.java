package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.endsWith;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.nullValue;

import com.fasterxml.jackson.databind.JsonNode;
import io.restassured.response.Response;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.AfterParameterizedClassInvocation;
import org.junit.jupiter.params.BeforeParameterizedClassInvocation;
import org.junit.jupiter.params.Parameter;
import org.junit.jupiter.params.ParameterizedClass;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.treadwarm.intake.Document;
import org.treadwarm.jobs.Job;
import org.treadwarm.store.Change;
import org.treadwarm.store.Kind;
import org.treadwarm.store.RevisionHeader;
import org.treadwarm.store.Scope;

/** Whatever the API creates, it creates once when the request is sent again under the same name. */
@ParameterizedClass
@EnumSource(Kind.class)
class CreationsTest {
    private static RunningServer server;
    private static ApiClient api;

    @Parameter
    Kind kind;

    private Job job;

    /**
     * Something that creates.
     *
     * @param path where, as the contract writes it
     * @param body what is sent
     * @param other what is sent instead under the same name
     */
    private record Creation(String path, String body, String other) {
        @Override
        public String toString() {
            return path;
        }
    }

    static Stream<Creation> creations() {
        return Stream.of(
                new Creation("/jobs", "{\"name\": \"barn\", \"survey\": {}}", "{\"name\": \"shed\", \"survey\": {}}"),
                new Creation("/jobs/{id}/copy", "", "{}"),
                new Creation("/jobs/{id}/rooms", "{\"name\": \"attic\"}", "{\"name\": \"cellar\"}"),
                new Creation(
                        "/jobs/{id}/sheets", "{\"revision\": 1}", "{\"revision\": 1, \"replaces\": \"2020-0001\"}"));
    }

    @BeforeParameterizedClassInvocation
    static void start(Kind kind) {
        server = RunningServer.start(kind);
        api = new ApiClient(server);
    }

    @AfterParameterizedClassInvocation
    static void stop() {
        server.close();
    }

    @BeforeEach
    void fresh() {
        job = server.job("yard", RunningServer.studio());
    }

    private Response send(Creation creation, String body) {
        return api.json(Scope.WRITE, body)
                .header("Idempotency-Key", job.id() + creation.path())
                .post(creation.path().replace("{id}", job.id()));
    }

    private static List<Integer> kept() {
        List<RevisionHeader> jobs = server.desk().list();
        int revisions = jobs.stream()
                .mapToInt(each -> server.desk().revisions(each.jobId()).size())
                .sum();
        return List.of(jobs.size(), revisions, server.store().sheets().list().size());
    }

    @Test
    void everyOneOfTheContractIsTriedHere() throws Exception {
        JsonNode paths =
                Document.read(api.anyone().get("/openapi.json").asByteArray()).path("paths");
        List<String> creating = paths.properties().stream()
                .filter(each -> each.getValue().at("/post/responses").has("201"))
                .map(each -> each.getKey().substring("/api/v1".length()))
                .toList();

        assertThat(creations().map(Creation::path)).containsExactlyInAnyOrderElementsOf(creating);
        for (String path : creating) {
            JsonNode post = paths.path("/api/v1" + path).path("post");
            assertThat(post.path("parameters").findValuesAsText("name"))
                    .as(path)
                    .contains("Idempotency-Key");
            assertThat(post.at("/responses/201/headers").has("Idempotency-Replayed"))
                    .as(path)
                    .isTrue();
        }
    }

    @ParameterizedTest
    @MethodSource("creations")
    void isAnsweredAsBeforeAndCreatesNothing(Creation creation) {
        Response first = send(creation, creation.body());
        first.then().statusCode(201).header("Idempotency-Replayed", nullValue());
        List<Integer> before = kept();
        server.desk().save(job.id(), server.now(job).revision(), "yard", job.document(), Change.by("tests"));
        List<Integer> after = kept();

        Response again = send(creation, creation.body());

        again.then().statusCode(201).header("Idempotency-Replayed", equalTo("true"));
        assertThat(after).isNotEqualTo(before);
        assertThat(kept()).isEqualTo(after);
        isTheSame(again, first);
    }

    private static void isTheSame(Response again, Response first) {
        assertThat(again.asString()).isEqualTo(first.asString());
        for (String header : List.of("Location", "ETag", "Content-Type")) {
            assertThat(Optional.ofNullable(again.header(header)))
                    .as(header)
                    .isEqualTo(Optional.ofNullable(first.header(header)));
        }
    }

    @ParameterizedTest
    @MethodSource("creations")
    void isRefusedWithAnotherBody(Creation creation) {
        send(creation, creation.body()).then().statusCode(201);
        List<Integer> before = kept();

        send(creation, creation.other()).then().statusCode(422).body("type", endsWith("idempotency-key"));
        assertThat(kept()).isEqualTo(before);
    }

    @Test
    void anOldRevisionIsBroughtBackOnceEvenWhenOthersSavedMeanwhile() {
        server.desk().save(job.id(), 1, "yard", Document.mapper().createObjectNode(), Change.by("tests"));
        Response first = restore("\"2\"");
        first.then().statusCode(200).body("revision", equalTo(3));
        server.desk().save(job.id(), 3, "yard", Document.mapper().createObjectNode(), Change.by("tests"));

        Response again = restore("\"2\"");

        again.then().statusCode(200).header("Idempotency-Replayed", equalTo("true"));
        isTheSame(again, first);
        assertThat(server.now(job).revision()).isEqualTo(4);
        restore("\"4\"").then().statusCode(422).body("type", endsWith("idempotency-key"));
        assertThat(server.now(job).revision()).isEqualTo(4);
    }

    private Response restore(String match) {
        return api.with(Scope.WRITE)
                .header("If-Match", match)
                .header("Idempotency-Key", "back-" + job.id())
                .post("/jobs/{id}/revisions/1/restore", job.id());
    }
}
