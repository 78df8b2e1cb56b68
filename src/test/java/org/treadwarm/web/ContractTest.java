package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse.BodyHandlers;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;

/** The contract that the other tests lean on fails when it should. */
class ContractTest {
    private static final String HEALTHY = "{\"status\": \"ok\", \"method\": \"1\"}";

    private static Contract contract;

    @BeforeAll
    static void read() throws IOException, InterruptedException {
        try (RunningServer server = RunningServer.start()) {
            HttpRequest request = HttpRequest.newBuilder(URI.create(server.origin() + "/api/v1/openapi.json"))
                    .build();
            contract = new Contract(HttpClient.newHttpClient()
                    .send(request, BodyHandlers.ofByteArray())
                    .body());
        }
    }

    private static void check(int status, String type, String body) {
        contract.check("GET", "/api/v1/health", status, type, body);
    }

    @Test
    void letsTheListedAnswerPass() {
        assertThatCode(() -> check(200, "application/json; charset=utf-8", HEALTHY))
                .doesNotThrowAnyException();
    }

    @Test
    void refusesAnotherBody() {
        assertThatThrownBy(() -> check(200, "application/json", "{\"status\": 5, \"method\": \"1\"}"))
                .isInstanceOf(AssertionError.class)
                .hasMessageContaining("breaks the contract");
        assertThatThrownBy(() -> check(200, "application/json", "{\"status\": \"ok\"}"))
                .isInstanceOf(AssertionError.class);
        assertThatThrownBy(() -> check(200, "application/json", "{\"status\": \"ok\", \"method\": \"1\", \"more\": 1}"))
                .isInstanceOf(AssertionError.class);
    }

    @Test
    void refusesAnotherTypeOrStatus() {
        assertThatThrownBy(() -> check(200, "text/html", HEALTHY)).isInstanceOf(AssertionError.class);
        assertThatThrownBy(() -> check(202, "application/json", HEALTHY)).isInstanceOf(AssertionError.class);
    }

    @Test
    void refusesAnAnswerWhereNothingIsListed() {
        assertThatThrownBy(() -> contract.check("GET", "/api/v1/nothing", 200, "application/json", HEALTHY))
                .isInstanceOf(AssertionError.class);
        assertThatThrownBy(() -> contract.check("PATCH", "/api/v1/health", 200, "application/json", HEALTHY))
                .isInstanceOf(AssertionError.class);
    }

    @Test
    void knowsTheRoutes() {
        assertThat(contract.operations())
                .containsKeys(
                        "/api/v1/health",
                        "/api/v1/sizings",
                        "/api/v1/assemblies/evaluations",
                        "/api/v1/warmups",
                        "/api/v1/materials",
                        "/api/v1/jobs",
                        "/api/v1/jobs/{id}",
                        "/api/v1/jobs/{id}/sizing",
                        "/api/v1/jobs/{id}/revisions",
                        "/api/v1/jobs/{id}/revisions/{n}");
    }
}
