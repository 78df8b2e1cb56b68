package org.treadwarm.program;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpRequest.BodyPublishers;
import java.net.http.HttpResponse;
import java.net.http.HttpResponse.BodyHandlers;
import java.time.Duration;

/** Saves and reads jobs that hold a count, over the API of a server. */
final class JobClient {
    private static final ObjectMapper MAPPER = new ObjectMapper();

    private final HttpClient client =
            HttpClient.newBuilder().version(HttpClient.Version.HTTP_1_1).build();
    private final String address;
    private final String key;

    JobClient(String address, String key) {
        this.address = address;
        this.key = key;
    }

    /** A job as the server tells it. */
    record Counted(long revision, int count, String savedAs) {}

    /** Starts a job whose count is nought; its id. */
    String create() throws IOException, InterruptedException {
        HttpResponse<String> answer = send("/jobs", "POST", body("start", 0), "*");
        expect(answer, 201);
        return MAPPER.readTree(answer.body()).path("id").textValue();
    }

    Counted get(String id) throws IOException, InterruptedException {
        return counted(send("/jobs/" + id, "GET", "", "*"));
    }

    Counted get(String id, long revision) throws IOException, InterruptedException {
        return counted(send("/jobs/" + id + "/revisions/" + revision, "GET", "", "*"));
    }

    /** What a server answers. */
    record Answer(int status, String text) {}

    /** Saves from a revision; the status. */
    int save(String id, long revision, String name, int count) throws IOException, InterruptedException {
        return put(id, revision, name, count).status();
    }

    /** Saves from a revision. */
    Answer put(String id, long revision, String name, int count) throws IOException, InterruptedException {
        HttpResponse<String> answer = send("/jobs/" + id, "PUT", body(name, count), "\"" + revision + "\"");
        return new Answer(answer.statusCode(), answer.body());
    }

    private static String body(String name, int count) {
        return "{\"name\": \"" + name + "\", \"survey\": {\"count\": " + count + "}}";
    }

    private static Counted counted(HttpResponse<String> answer) throws IOException {
        expect(answer, 200);
        JsonNode job = MAPPER.readTree(answer.body());
        return new Counted(
                job.path("revision").longValue(),
                job.at("/survey/count").intValue(),
                job.path("name").textValue());
    }

    private static void expect(HttpResponse<String> answer, int status) {
        if (answer.statusCode() != status) {
            throw new AssertionError(answer.statusCode() + " " + answer.body());
        }
    }

    private HttpResponse<String> send(String path, String method, String body, String match)
            throws IOException, InterruptedException {
        HttpRequest request = HttpRequest.newBuilder(URI.create(address + "/api/v1" + path))
                .timeout(Duration.ofSeconds(60))
                .header("Authorization", "Bearer " + key)
                .header("Content-Type", "application/json")
                .header("If-Match", match)
                .method(method, body.isEmpty() ? BodyPublishers.noBody() : BodyPublishers.ofString(body))
                .build();
        return client.send(request, BodyHandlers.ofString());
    }
}
