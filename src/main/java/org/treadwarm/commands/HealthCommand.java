package org.treadwarm.commands;

import java.io.IOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.time.Duration;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Option;

/** Asks a server on this machine whether it answers, for a container's health check. */
@Command(
        name = "health",
        description = "Ask the server on this machine whether it answers; exit status 1 if not.",
        mixinStandardHelpOptions = true)
public final class HealthCommand implements Callable<Integer> {
    private static final Duration PATIENCE = Duration.ofSeconds(4);

    @Option(names = "--port", defaultValue = "8080", description = "port it listens on (${DEFAULT-VALUE})")
    private int port;

    @Override
    public Integer call() throws InterruptedException {
        HttpRequest request = HttpRequest.newBuilder(URI.create("http://127.0.0.1:" + port + "/api/v1/health"))
                .timeout(PATIENCE)
                .build();
        try {
            HttpResponse<String> response = HttpClient.newBuilder()
                    .connectTimeout(PATIENCE)
                    .build()
                    .send(request, HttpResponse.BodyHandlers.ofString());
            System.out.println(response.body());
            return response.statusCode() == 200 ? 0 : 1;
        } catch (IOException e) {
            System.err.println("No server answers on port " + port + ".");
            return 1;
        }
    }
}
