package org.treadwarm.program;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.net.InetAddress;
import java.net.ServerSocket;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.net.http.HttpResponse.BodyHandlers;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The packaged program, run as people run it. */
class PackagedJarIT {
    private static final ObjectMapper MAPPER = new ObjectMapper();
    private static final String GOOD = "src/test/resources/surveys/studio.json";

    @TempDir
    Path folder;

    private String bad() throws IOException {
        return Files.writeString(folder.resolve("bad.json"), "{\"rooms\": [{\"name\": \"den\"}]}")
                .toString();
    }

    private String[] withData(String... arguments) {
        String[] all = java.util.Arrays.copyOf(arguments, arguments.length + 2);
        all[arguments.length] = "--data";
        all[arguments.length + 1] = folder.resolve("data").toString();
        return all;
    }

    private static HttpResponse<String> get(String url, String... headers) throws IOException, InterruptedException {
        HttpRequest.Builder request = HttpRequest.newBuilder(URI.create(url)).timeout(Duration.ofSeconds(30));
        if (headers.length > 0) {
            request.headers(headers);
        }
        return HttpClient.newHttpClient().send(request.build(), BodyHandlers.ofString());
    }

    @Test
    void sizesASurvey() throws IOException {
        Program.Result result = Program.run("size", GOOD);

        assertThat(result.status()).isZero();
        assertThat(result.errors()).isEmpty();
        assertThat(result.lines()).hasSize(1);
        JsonNode rooms = MAPPER.readTree(result.output()).path("rooms");
        assertThat(rooms).extracting(room -> room.path("name").asText()).containsExactly("studio", "shower room");
    }

    @Test
    void refusesASurveyOnTheErrorStreamAlone() throws IOException {
        Program.Result result = Program.run("size", bad());

        assertThat(result.status()).isEqualTo(2);
        assertThat(result.output()).isEmpty();
        JsonNode problem = MAPPER.readTree(result.errors());
        assertThat(problem.path("status").intValue()).isEqualTo(422);
        assertThat(problem.path("errors").findValuesAsText("pointer")).contains("/rooms/0/height");
    }

    @Test
    void refusesWhatIsNoJsonOrNoFile() throws IOException {
        Path text = Files.writeString(folder.resolve("text.json"), "a floor");

        for (Path file : List.of(text, folder.resolve("none.json"), folder)) {
            Program.Result result = Program.run("size", file.toString());
            assertThat(result.status()).as("%s", file).isEqualTo(2);
            assertThat(result.output()).as("%s", file).isEmpty();
            assertThat(MAPPER.readTree(result.errors()).path("title").asText()).isNotBlank();
        }
    }

    @Test
    void answersEveryFileOnItsOwnLine() throws IOException {
        Program.Result result = Program.run("size", GOOD, bad(), GOOD);

        assertThat(result.status()).isEqualTo(2);
        assertThat(result.errors()).isEmpty();
        assertThat(result.lines()).hasSize(3);
        assertThat(MAPPER.readTree(result.lines().get(0)).path("rooms")).hasSize(2);
        assertThat(MAPPER.readTree(result.lines().get(1)).path("errors")).isNotEmpty();
        assertThat(result.lines().get(2)).isEqualTo(result.lines().get(0));
    }

    @Test
    void readsStandardInput() throws IOException {
        Program.Result fromFile = Program.run("size", GOOD);

        Program.Result result = Program.runWith(Files.readAllBytes(Path.of(GOOD)), "size", "-");

        assertThat(result.status()).isZero();
        assertThat(result.output()).isEqualTo(fromFile.output());
    }

    @Test
    void printsAReadableSheet() {
        Program.Result result = Program.run("size", "--plain", GOOD);

        assertThat(result.status()).isZero();
        assertThat(result.errors()).isEmpty();
        assertThat(result.output()).contains("studio", "°C", "W/m").doesNotContain("{", "null", "NaN");
        assertThat(result.lines()).hasSizeGreaterThan(20);
    }

    @Test
    void passesEveryPublishedCheck() {
        Program.Result result = Program.run("check");

        assertThat(result.status()).isZero();
        assertThat(result.lines().stream().filter(line -> line.startsWith("pass")))
                .hasSizeGreaterThanOrEqualTo(80);
        assertThat(result.lines()).noneMatch(line -> line.startsWith("FAIL"));
    }

    @Test
    void servesPagesFilesAndTheApi() throws IOException, InterruptedException {
        try (Program server = Program.start(withData("serve", "--port", "0", "--demo"))) {
            String address = server.address();

            assertThat(get(address + "/api/v1/health").body()).contains("\"ok\"");
            HttpResponse<String> page = get(address + "/sign-in");
            assertThat(page.statusCode()).isEqualTo(200);
            assertThat(page.body()).contains("csrf", "/static/treadwarm.css");
            for (String file : List.of("treadwarm.css", "treadwarm.js", "mark.svg")) {
                assertThat(get(address + "/static/" + file).statusCode())
                        .as(file)
                        .isEqualTo(200);
            }
            String link = server.line("/owner/").replaceAll(".*(http://\\S+).*", "$1");
            assertThat(get(link).statusCode()).isEqualTo(200);
        }
    }

    @Test
    void aKeyMadeBesideTheServerWorksAtOnce() throws IOException, InterruptedException {
        try (Program server = Program.start(withData("serve", "--port", "0", "--demo"))) {
            String address = server.address();
            Program.Result made = Program.run(withData("key", "create", "--name", "quotes", "--scope", "read"));
            assertThat(made.status()).isZero();
            String key = made.lines().get(made.lines().size() - 1);
            assertThat(key).matches("tw_\\S{20,}");

            HttpResponse<String> jobs = get(address + "/api/v1/jobs", "Authorization", "Bearer " + key);

            assertThat(jobs.statusCode()).isEqualTo(200);
            assertThat(MAPPER.readTree(jobs.body()).path("jobs")).hasSize(1);
        }
    }

    @ParameterizedTest
    @ValueSource(strings = {"all", "", "READ WRITE"})
    void makesNoKeyOfAnUnknownScope(String scope) {
        Program.Result result = Program.run(withData("key", "create", "--name", "x", "--scope", scope));

        assertThat(result.status()).isEqualTo(2);
        assertThat(result.output()).isEmpty();
        assertThat(result.errors()).contains("scope");
    }

    @Test
    void saysThatThePortIsInUse() throws IOException {
        try (ServerSocket taken = new ServerSocket(0, 1, InetAddress.getByName("127.0.0.1"))) {
            String port = Integer.toString(taken.getLocalPort());

            Program.Result result = Program.run(withData("serve", "--port", port));

            assertThat(result.status()).isEqualTo(1);
            assertThat(result.errors()).contains(port, "in use");
            assertThat(result.output() + result.errors()).doesNotContain("Exception", "\tat ");
        }
    }

    @Test
    void saysThatTheFolderCannotBeUsed() throws IOException {
        String file = Files.writeString(folder.resolve("file"), "no folder").toString();

        Program.Result result = Program.run("serve", "--port", "0", "--data", file);

        assertThat(result.status()).isEqualTo(1);
        assertThat(result.errors()).isNotBlank();
        assertThat(result.output() + result.errors()).doesNotContain("Exception", "\tat ");
    }

    @Test
    void stopsWhenToldToAndStartsAgainOnTheSameData() {
        for (int i = 0; i < 2; i++) {
            try (Program server = Program.start(withData("serve", "--port", "0", "--demo"))) {
                server.address();

                assertThat(server.stop()).isTrue();
            }
        }
    }
}
