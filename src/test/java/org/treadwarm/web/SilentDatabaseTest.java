package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse.BodyHandlers;
import java.time.Duration;
import org.junit.jupiter.api.Test;
import org.treadwarm.store.DataHome;
import org.treadwarm.store.TestPostgres;

/** A database that takes every question and answers none: the server says that it is not well, and soon. */
class SilentDatabaseTest {
    // Longer than the two seconds of the look, shorter than the minute after which a connection is given up.
    private static final Duration PATIENCE = Duration.ofSeconds(40);

    private static final int MOST_TRIES = 60;

    private final HttpClient client = HttpClient.newHttpClient();

    private int health(RunningServer server) throws IOException, InterruptedException {
        HttpRequest request = HttpRequest.newBuilder(URI.create(server.origin() + "/api/v1/health"))
                .timeout(PATIENCE)
                .build();
        return client.send(request, BodyHandlers.discarding()).statusCode();
    }

    @Test
    void isUnwellUntilTheDatabaseSpeaksAgain() throws Exception {
        URI direct = URI.create(TestPostgres.emptyHome().url().substring("jdbc:".length()));
        try (Relay relay = new Relay(direct.getPort())) {
            String url =
                    "jdbc:postgresql://127.0.0.1:" + relay.port() + direct.getRawPath() + "?" + direct.getRawQuery();
            try (RunningServer server = RunningServer.over((DataHome.Postgresql) DataHome.database(url))) {
                assertThat(health(server)).isEqualTo(200);

                relay.silence();
                assertThat(health(server)).isEqualTo(503);
                assertThat(health(server)).isEqualTo(503);

                relay.speak();
                int status = 503;
                for (int i = 0; i < MOST_TRIES && status == 503; i++) {
                    status = health(server);
                }
                assertThat(status).isEqualTo(200);
            }
        }
    }
}
