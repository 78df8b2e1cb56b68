package org.treadwarm.program;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.OutputStream;
import java.net.Socket;
import java.net.URI;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.time.Clock;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.treadwarm.store.Scope;
import org.treadwarm.store.Store;

/** A server that is asked to stop while a save is on its way finishes that save. */
class StoppingServerTest {
    private static final String BODY = "{\"name\": \"saved at the last moment\", \"survey\": {\"count\": 1}}";
    private static final int PATIENCE_MILLISECONDS = 60_000;

    @TempDir
    Path folder;

    @Test
    void finishesWhatHasBegun() throws IOException {
        String key;
        try (Store store = Store.open(folder, Clock.systemUTC())) {
            key = store.keys().create("tests", Scope.WRITE, "tests").token();
        }
        try (Program server = Program.start("serve", "--port", "0", "--data", folder.toString())) {
            URI address = URI.create(server.address());
            try (Socket socket = new Socket(address.getHost(), address.getPort())) {
                socket.setSoTimeout(PATIENCE_MILLISECONDS);
                OutputStream out = socket.getOutputStream();
                out.write(("POST /api/v1/jobs HTTP/1.1\r\nHost: 127.0.0.1\r\nAuthorization: Bearer " + key
                                + "\r\nContent-Type: application/json\r\nExpect: 100-continue\r\nContent-Length: "
                                + BODY.length() + "\r\nConnection: close\r\n\r\n")
                        .getBytes(StandardCharsets.US_ASCII));
                out.flush();
                // "Continue" says that the request is being handled and its body waited for.
                byte[] goOn = socket.getInputStream().readNBytes(25);
                assertThat(new String(goOn, StandardCharsets.US_ASCII)).startsWith("HTTP/1.1 100 ");

                server.askToStop();
                out.write(BODY.getBytes(StandardCharsets.US_ASCII));
                out.flush();

                String answer = new String(socket.getInputStream().readAllBytes(), StandardCharsets.UTF_8);
                assertThat(answer).contains("HTTP/1.1 201 ");
            }
            assertThat(server.stop()).isTrue();
        }
        try (Store store = Store.open(folder, Clock.systemUTC())) {
            assertThat(store.jobs().list()).hasSize(1);
        }
    }
}
