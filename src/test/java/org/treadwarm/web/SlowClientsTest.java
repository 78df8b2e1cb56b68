package org.treadwarm.web;

import static io.restassured.RestAssured.given;
import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.net.Socket;
import java.net.SocketException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.treadwarm.store.Scope;
import org.treadwarm.store.Store;

/** Clients that stop in the middle are given up, and meanwhile keep nobody waiting. */
class SlowClientsTest {
    private static final int OF_EACH = 40;
    private static final int PATIENCE_MILLISECONDS = 60_000;

    @TempDir
    Path folder;

    @Test
    void halfARequestIsGivenUpWhileOthersAreAnswered() throws IOException {
        List<Socket> sockets = new ArrayList<>();
        try (Store store = Store.open(folder, Clock.systemUTC());
                Server server = Server.start(
                        new Settings("127.0.0.1", 0, List.of(), false, false), store, Duration.ofSeconds(2))) {
            String key = store.keys().create("tests", Scope.WRITE, "tests").token();
            String head = "POST /api/v1/jobs HTTP/1.1\r\nHost: 127.0.0.1\r\nAuthorization: Bearer " + key
                    + "\r\nContent-Type: application/json\r\nContent-Length: 1000\r\n";
            for (String begun : new String[] {"", "GET /api/v1/hea", head, head + "\r\n{\"name\": \"half"}) {
                for (int i = 0; i < OF_EACH; i++) {
                    sockets.add(open(server.port(), begun));
                }
            }

            given().baseUri("http://127.0.0.1:" + server.port())
                    .get("/api/v1/health")
                    .then()
                    .statusCode(200);
            for (Socket socket : sockets) {
                assertThat(whatCame(socket)).doesNotContain("HTTP/1.1 2");
            }
            assertThat(store.jobs().list()).isEmpty();
        } finally {
            for (Socket socket : sockets) {
                socket.close();
            }
        }
    }

    private static Socket open(int port, String begun) throws IOException {
        Socket socket = new Socket("127.0.0.1", port);
        socket.setSoTimeout(PATIENCE_MILLISECONDS);
        socket.getOutputStream().write(begun.getBytes(StandardCharsets.US_ASCII));
        return socket;
    }

    /** Until the server closes the connection. */
    private static String whatCame(Socket socket) throws IOException {
        try {
            return new String(socket.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
        } catch (SocketException reset) {
            return "";
        }
    }
}
