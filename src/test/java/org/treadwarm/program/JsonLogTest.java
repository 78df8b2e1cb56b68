package org.treadwarm.program;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpRequest.BodyPublishers;
import java.net.http.HttpResponse.BodyHandlers;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.treadwarm.store.Scope;
import org.treadwarm.store.Store;

/** {@code serve --log json}: a line of JSON for each request, which tells nothing that was sent. */
class JsonLogTest {
    private static final ObjectMapper MAPPER = new ObjectMapper();

    @TempDir
    Path folder;

    private static void send(String address, String id, String key, String body)
            throws IOException, InterruptedException {
        HttpRequest request = HttpRequest.newBuilder(URI.create(address))
                .timeout(Duration.ofMinutes(1))
                .header("X-Request-Id", id)
                .header("Authorization", "Bearer " + key)
                .header("Content-Type", "application/json")
                .method(body.isEmpty() ? "GET" : "POST", BodyPublishers.ofString(body))
                .build();
        HttpClient.newHttpClient().send(request, BodyHandlers.discarding());
    }

    @Test
    void tellsOfEveryRequestAndOfNothingInIt() throws Exception {
        Path data = folder.resolve("data");
        Path errors = folder.resolve("errors");
        String key;
        try (Store store = Store.open(data, Clock.systemUTC())) {
            key = store.keys().create("tests", Scope.WRITE, "tests").token();
        }
        try (Program server =
                Program.startLogging(errors, "serve", "--log", "json", "--port", "0", "--data", data.toString())) {
            String api = server.address() + "/api/v1";
            send(api + "/jobs", "request-1", key, "{\"name\": \"Heron Croft\", \"survey\": {}}");
            send(api + "/jobs?find=Heron", "request-2", key, "");
            send(api + "/jobs", "request-3", "tw_heron-no-such-key", "");
            send(api + "/jobs", "request-4", key, "{\"name\": \"Heron");
            send(server.address() + "/link/heron-no-such-token", "request-5", key, "");
            send(api + "/nothing/heron", "request-6", key, "");
            assertThat(server.stop()).isTrue();
        }

        List<String> told = new ArrayList<>();
        for (String line : Files.readAllLines(errors)) {
            JsonNode event = MAPPER.readTree(line);
            if (event.path("loggerName").asText().equals("org.treadwarm.requests")) {
                told.add(event.at("/mdc/request").asText() + " "
                        + String.join("", event.path("kvpList").findValuesAsText("route"))
                        + " " + String.join("", event.path("kvpList").findValuesAsText("status")));
            }
        }
        assertThat(told)
                .contains(
                        "request-1 POST /api/v1/jobs 201",
                        "request-2 GET /api/v1/jobs 200",
                        "request-3 GET /api/v1/jobs 401",
                        "request-4 POST /api/v1/jobs 400",
                        "request-5 GET /link/{token} 404")
                .anyMatch(line -> line.startsWith("request-6 ") && line.endsWith(" 404"));
        assertThat(Files.readString(errors))
                .doesNotContainIgnoringCase("heron")
                .doesNotContain(key, "no-such", "Bearer", "tw_");
    }
}
