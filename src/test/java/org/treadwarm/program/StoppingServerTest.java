package org.treadwarm.program;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.ObjectMapper;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.net.Socket;
import java.net.URI;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.Collections;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.treadwarm.store.Scope;
import org.treadwarm.store.Store;

/** A server that is asked to stop while a request is on its way answers that request, whole. */
class StoppingServerTest {
    private static final ObjectMapper MAPPER = new ObjectMapper();
    private static final String SURVEY = "src/test/resources/surveys/studio.json";
    private static final int SURVEYS = 100;
    private static final int PATIENCE_MILLISECONDS = 60_000;

    // 128 and the number of SIGTERM, as shells report a process that ended by it.
    private static final int ENDED_WHEN_ASKED = 143;

    @TempDir
    Path folder;

    @Test
    void finishesASaveThatHasBegun() throws IOException {
        String answer = answerWhileStopping(
                "/api/v1/jobs", "{\"name\": \"saved at the last moment\", \"survey\": {\"count\": 1}}");

        assertThat(answer).startsWith("HTTP/1.1 201 ");
        assertThat(body(answer).path("name").asText()).isEqualTo("saved at the last moment");
        try (Store store = Store.open(folder, Clock.systemUTC())) {
            assertThat(store.jobs().list()).hasSize(1);
        }
    }

    @Test
    void finishesABatchThatHasBegun() throws IOException {
        String surveys = String.join(",", Collections.nCopies(SURVEYS, Files.readString(Path.of(SURVEY))));

        String answer = answerWhileStopping("/api/v1/sizings/batch", "{\"surveys\": [" + surveys + "]}");

        assertThat(answer).startsWith("HTTP/1.1 200 ");
        assertThat(body(answer).path("answers")).hasSize(SURVEYS);
    }

    /** The answer's JSON, which cannot be read when its end is missing. */
    private static JsonNode body(String answer) throws IOException {
        return MAPPER.readTree(answer.split("\r\n\r\n", 2)[1]);
    }

    /** Sends a request whose body follows only when the server was asked to stop already. */
    private String answerWhileStopping(String path, String body) throws IOException {
        String key;
        try (Store store = Store.open(folder, Clock.systemUTC())) {
            key = store.keys().create("tests", Scope.WRITE, "tests").token();
        }
        byte[] bytes = body.getBytes(StandardCharsets.UTF_8);
        String head = "POST " + path + " HTTP/1.1\r\nHost: 127.0.0.1\r\nAuthorization: Bearer " + key
                + "\r\nContent-Type: application/json\r\nExpect: 100-continue\r\nContent-Length: " + bytes.length
                + "\r\nConnection: close\r\n\r\n";
        try (Program server = Program.start("serve", "--port", "0", "--data", folder.toString())) {
            URI address = URI.create(server.address());
            try (Socket socket = new Socket(address.getHost(), address.getPort())) {
                socket.setSoTimeout(PATIENCE_MILLISECONDS);
                OutputStream out = socket.getOutputStream();
                InputStream in = socket.getInputStream();
                out.write(head.getBytes(StandardCharsets.US_ASCII));
                out.flush();
                // "Continue" says that the request is being handled and its body waited for.
                assertThat(new String(in.readNBytes(25), StandardCharsets.US_ASCII))
                        .startsWith("HTTP/1.1 100 ");

                server.askToStop();
                out.write(bytes);
                out.flush();

                String answer = new String(in.readAllBytes(), StandardCharsets.UTF_8);
                assertThat(server.stop()).isTrue();
                assertThat(server.status()).isEqualTo(ENDED_WHEN_ASKED);
                return answer;
            }
        }
    }
}
