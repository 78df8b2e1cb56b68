package org.treadwarm.web;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;
import static org.hamcrest.Matchers.containsString;
import static org.hamcrest.Matchers.matchesPattern;

import ch.qos.logback.classic.Level;
import ch.qos.logback.classic.Logger;
import ch.qos.logback.classic.spi.ILoggingEvent;
import ch.qos.logback.core.read.ListAppender;
import io.restassured.response.Response;
import java.nio.file.Path;
import java.sql.Connection;
import java.sql.DriverManager;
import java.time.Clock;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.slf4j.LoggerFactory;
import org.treadwarm.store.Scope;
import org.treadwarm.store.Store;

/** What can be seen of requests from outside: ids, log, metrics, health. */
class SightTest {
    private static final String SECRET = "Ottilie of Quillfen Floors";

    @TempDir
    Path folder;

    @Test
    void theCallersIdStandsInTheAnswerAndTheProblem() {
        try (RunningServer server = RunningServer.start()) {
            ApiClient api = new ApiClient(server);
            api.anyone()
                    .header("X-Request-Id", "quote-2026-0001")
                    .get("/jobs")
                    .then()
                    .statusCode(401)
                    .header("X-Request-Id", "quote-2026-0001")
                    .body("requestId", containsString("quote-2026-0001"));
            api.anyone().get("/health").then().header("X-Request-Id", matchesPattern("[0-9a-f]{32}"));
        }
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "short",
                "with space in it",
                "<script>alert</script>",
                "tw_abcdefghijklmnop",
                "\u00fcmlaut-umlaut"
            })
    void anIdOfAnotherFormIsReplaced(String id) {
        try (RunningServer server = RunningServer.start()) {
            new ApiClient(server)
                    .anyone()
                    .header("X-Request-Id", id)
                    .get("/jobs")
                    .then()
                    .header("X-Request-Id", matchesPattern("[0-9a-f]{32}"))
                    .body("requestId", matchesPattern("[0-9a-f]{32}"));
        }
    }

    @Test
    void requestsThatNoRouteSeesHaveAnIdToo() throws Exception {
        try (RunningServer server = RunningServer.start()) {
            RawRequest request = RawRequest.get("/%zz", "none");
            try (var socket = new java.net.Socket("127.0.0.1", server.port())) {
                socket.getOutputStream().write(request.bytes());
                String answer =
                        new String(socket.getInputStream().readAllBytes(), java.nio.charset.StandardCharsets.UTF_8);
                assertThat(answer).startsWith("HTTP/1.1 400").contains("X-Request-Id: ", "\"requestId\":\"");
            }
        }
    }

    @Test
    void aFaultIsLoggedUnderItsIdAndTellsNobodyItsInside() throws Exception {
        ListAppender<ILoggingEvent> log = new ListAppender<>();
        Logger root = (Logger) LoggerFactory.getLogger("org.treadwarm");
        Logger requests = (Logger) LoggerFactory.getLogger("org.treadwarm.requests");
        log.start();
        root.addAppender(log);
        requests.setLevel(Level.INFO);
        try (Store store = Store.open(folder, Clock.systemUTC());
                Server server = Server.start(new Settings("127.0.0.1", 0, List.of(), false, false), store)) {
            String key = store.keys().create("tests", Scope.WRITE, "tests").token();
            try (Connection file = DriverManager.getConnection("jdbc:sqlite:" + folder.resolve("treadwarm.sqlite"))) {
                file.createStatement().execute("drop table kept_answer");
                file.createStatement().execute("alter table revision rename column note to remark");
            }
            Response answer = given().baseUri("http://127.0.0.1:" + server.port())
                    .header("Authorization", "Bearer " + key)
                    .header("X-Request-Id", "the-broken-one")
                    .contentType("application/json")
                    .body("{\"name\": \"" + SECRET + "\", \"survey\": {}}")
                    .post("/api/v1/jobs?name=" + "secret-query");
            assertThat(answer.statusCode()).isEqualTo(500);
            assertThat(answer.asString()).contains("the-broken-one");
            for (String inside : List.of("Exception", "org.treadwarm", ".java", "SQL", "remark", SECRET)) {
                assertThat(answer.asString()).doesNotContain(inside);
            }
            assertThat(log.list).isNotEmpty().allSatisfy(event -> {
                assertThat(event.getMDCPropertyMap()).containsEntry("request", "the-broken-one");
                String all = event.getFormattedMessage() + event.getKeyValuePairs();
                assertThat(all).doesNotContain(SECRET, "secret-query", key);
                assertThat(event.getThrowableProxy()).isNull();
            });
            assertThat(log.list).anyMatch(event -> event.getFormattedMessage().contains("IllegalStateException"));
        } finally {
            requests.setLevel(null);
            root.detachAppender(log);
        }
    }

    @Test
    void metricsAreTextThatEndsAndCountsByRoute() {
        try (RunningServer server = RunningServer.start()) {
            ApiClient api = new ApiClient(server);
            api.with(Scope.READ).get("/jobs/{id}", "nothinghere2").then().statusCode(404);
            Response metrics = given().baseUri(server.origin()).get("/metrics");

            assertThat(metrics.contentType()).startsWith("application/openmetrics-text; version=1.0.0");
            assertThat(metrics.asString())
                    .contains("treadwarm_requests_total{route=\"GET /api/v1/jobs/{id}\",status=\"4xx\"} 1\n")
                    .contains("treadwarm_store_duration_seconds_count{kind=\"change\"}")
                    .contains("treadwarm_sizings_total ", "treadwarm_heap_used_bytes ", "treadwarm_sections_kept ")
                    .contains("treadwarm_requests_in_flight 1\n")
                    .doesNotContain("nothinghere2")
                    .endsWith("# EOF\n");
            assertThat(metrics.asString().lines())
                    .allMatch(line -> line.matches("# (TYPE|UNIT|HELP|EOF).*|[a-z_]+(\\{.*\\})? [0-9.E+-]+"));
        }
    }

    @Test
    void metricsFromAfarNeedAKeyThatReads() {
        try (RunningServer server = RunningServer.behindProxy()) {
            given().baseUri(server.origin()).get("/metrics").then().statusCode(401);
            given().baseUri(server.origin())
                    .header("Authorization", "Bearer " + server.key(Scope.SIZE))
                    .get("/metrics")
                    .then()
                    .statusCode(403);
            given().baseUri(server.origin())
                    .header("Authorization", "Bearer " + server.key(Scope.READ))
                    .get("/metrics")
                    .then()
                    .statusCode(200);
        }
        try (RunningServer server = RunningServer.start()) {
            given().baseUri(server.origin())
                    .header("X-Forwarded-For", "203.0.113.7")
                    .get("/metrics")
                    .then()
                    .statusCode(401);
        }
    }

    @Test
    void healthSaysWhenTheStoreFails() {
        try (RunningServer server = RunningServer.start()) {
            ApiClient api = new ApiClient(server);
            api.anyone().get("/health").then().statusCode(200);
            server.store().close();
            api.anyone().get("/health").then().statusCode(503).body("title", containsString("store"));
        }
    }
}
