package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.endsWith;
import static org.hamcrest.Matchers.equalTo;
import static org.hamcrest.Matchers.nullValue;

import io.restassured.response.Response;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.concurrent.CyclicBarrier;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.store.Scope;

/** A request that creates a job, sent again. */
class RepeatsApiTest {
    private RunningServer server;
    private ApiClient api;

    @BeforeEach
    void start() {
        server = RunningServer.start();
        api = new ApiClient(server);
    }

    @AfterEach
    void stop() {
        server.close();
    }

    private Response create(String key, String name) {
        String body = "{\"name\": \"" + name + "\", \"survey\": {}}";
        return api.json(Scope.WRITE, body).header("Idempotency-Key", key).post("/jobs");
    }

    @Test
    void isAnsweredAsBefore() {
        Response first = create("order 1".replace(' ', '-'), "yard");
        Response again = create("order-1", "yard");

        first.then().statusCode(201).header("Idempotency-Replayed", nullValue());
        again.then().statusCode(201).header("Idempotency-Replayed", "true");
        assertThat(again.asString()).isEqualTo(first.asString());
        for (String header : List.of("Location", "ETag", "Content-Type")) {
            assertThat(again.header(header)).isNotNull().isEqualTo(first.header(header));
        }
        assertThat(server.desk().list()).hasSize(1);
    }

    @Test
    void withAnotherBodyIsRefused() {
        create("order-1", "yard");

        create("order-1", "barn").then().statusCode(422).body("type", endsWith("idempotency-key"));
        assertThat(server.desk().list()).hasSize(1);
    }

    @Test
    void withoutAKeyCreatesEachTime() {
        for (int i = 0; i < 2; i++) {
            api.json(Scope.WRITE, "{\"name\": \"yard\", \"survey\": {}}")
                    .post("/jobs")
                    .then()
                    .statusCode(201);
        }
        assertThat(server.desk().list()).hasSize(2);
    }

    @Test
    void aRefusalIsNotKept() {
        create("order-1", "").then().statusCode(422);
        create("order-1", "yard").then().statusCode(201);
    }

    @ParameterizedTest
    @ValueSource(strings = {"", "two words", "\u00fc", "\t"})
    void aKeyThatCannotBeUsedIsRefused(String key) {
        create(key, "yard")
                .then()
                .statusCode(400)
                .body("detail", equalTo("It is sent once, as 1 to 255 visible characters of ASCII."));
    }

    @Test
    void aKeyMayHave255CharactersButNotMore() {
        create("k".repeat(255), "yard").then().statusCode(201);
        create("k".repeat(256), "yard").then().statusCode(400);
    }

    @Test
    void atTheSameTimeCreatesOneJob() throws Exception {
        int clients = 6;
        CyclicBarrier start = new CyclicBarrier(clients);
        ExecutorService threads = Executors.newFixedThreadPool(clients);
        List<Future<Response>> answers = new ArrayList<>();
        for (int i = 0; i < clients; i++) {
            answers.add(threads.submit(() -> {
                start.await(1, TimeUnit.MINUTES);
                return create("order-1", "yard");
            }));
        }
        Set<String> ids = new HashSet<>();
        for (Future<Response> each : answers) {
            Response answer = each.get(1, TimeUnit.MINUTES);
            assertThat(answer.statusCode()).isIn(201, 409);
            if (answer.statusCode() == 201) {
                ids.add(answer.path("id"));
            } else {
                assertThat(answer.header("Retry-After")).isEqualTo("1");
            }
        }
        threads.shutdownNow();
        assertThat(ids).hasSize(1);
        assertThat(server.desk().list()).hasSize(1);
    }
}
