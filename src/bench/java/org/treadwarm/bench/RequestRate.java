package org.treadwarm.bench;

import io.javalin.Javalin;
import java.io.IOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.treadwarm.store.Scope;
import org.treadwarm.store.Store;
import org.treadwarm.web.Server;
import org.treadwarm.web.Settings;
import org.treadwarm.wire.Json;

/**
 * The request rate of {@code POST /api/v1/sizings} beside that of a bare handler of the same framework that parses the same JSON
 * and echoes it, in one run, over loopback, with the same clients: turn about, several rounds, the median of each. With the
 * argument "hold" it only keeps the two servers up and writes a script for Debian's wrk, whose clients cost less.
 */
public final class RequestRate {
    private static final int CLIENTS = 8;
    private static final int ROUNDS = 5;
    private static final int WARM_UP_SECONDS = 8;
    private static final int SECONDS = 4;

    private RequestRate() {}

    public static void main(String[] arguments) throws Exception {
        byte[] body = Json.bytes(BenchSurveys.twelveSurfaces());
        Path folder = Files.createTempDirectory("treadwarm-rate");
        Javalin bare = BareServer.start(0);
        try (Store store = Store.open(folder, Clock.systemUTC());
                Server server = Server.start(new Settings("127.0.0.1", 0, List.of(), false, false), store)) {
            String key =
                    store.keys().create("rate", Scope.SIZE, "the benchmark").token();
            URI echo = URI.create("http://127.0.0.1:" + bare.port() + "/echo");
            URI size = URI.create("http://127.0.0.1:" + server.port() + "/api/v1/sizings");
            if (arguments.length > 0 && arguments[0].equals("hold")) {
                hold(folder, body, key, echo, size);
                return;
            }
            rate(echo, body, key, WARM_UP_SECONDS);
            rate(size, body, key, WARM_UP_SECONDS);
            List<Double> echoes = new ArrayList<>();
            List<Double> sizes = new ArrayList<>();
            for (int round = 0; round < ROUNDS; round++) {
                echoes.add(rate(echo, body, key, SECONDS));
                sizes.add(rate(size, body, key, SECONDS));
            }
            double bareRate = median(echoes);
            double sizingRate = median(sizes);
            System.out.printf(
                    Locale.ROOT,
                    "body %d bytes, %d clients: parse and echo %.0f/s, POST /api/v1/sizings %.0f/s, ratio %.2f%n",
                    body.length,
                    CLIENTS,
                    bareRate,
                    sizingRate,
                    sizingRate / bareRate);
        } finally {
            bare.stop();
        }
    }

    /** Keeps both servers up for a load generator of one's own, until standard input ends. */
    private static void hold(Path folder, byte[] body, String key, URI echo, URI size) throws IOException {
        Path script = folder.resolve("post.lua");
        Files.writeString(
                script,
                "wrk.method = 'POST'\nwrk.headers['Content-Type'] = 'application/json'\n"
                        + "wrk.headers['Authorization'] = 'Bearer " + key + "'\nlocal f = io.open('"
                        + Files.write(folder.resolve("body.json"), body) + "')\nwrk.body = f:read('*a')\n");
        System.out.println("script " + script);
        System.out.println("echo " + echo);
        System.out.println("size " + size);
        while (System.in.read() >= 0) {
            // Standard input is still open.
        }
    }

    private static double median(List<Double> rates) {
        return rates.stream().sorted().toList().get(rates.size() / 2);
    }

    private static double rate(URI uri, byte[] body, String key, int seconds)
            throws ExecutionException, InterruptedException {
        ExecutorService clients = Executors.newFixedThreadPool(CLIENTS);
        long end = System.nanoTime() + seconds * 1_000_000_000L;
        List<Future<Long>> counts = new ArrayList<>();
        for (int i = 0; i < CLIENTS; i++) {
            counts.add(clients.submit(() -> requests(uri, body, key, end)));
        }
        long sum = 0;
        for (Future<Long> count : counts) {
            sum += count.get();
        }
        clients.shutdown();
        return sum / (double) seconds;
    }

    private static long requests(URI uri, byte[] body, String key, long end) throws IOException, InterruptedException {
        HttpClient client =
                HttpClient.newBuilder().version(HttpClient.Version.HTTP_1_1).build();
        HttpRequest request = HttpRequest.newBuilder(uri)
                .header("Content-Type", "application/json")
                .header("Authorization", "Bearer " + key)
                .POST(HttpRequest.BodyPublishers.ofByteArray(body))
                .build();
        long count = 0;
        while (System.nanoTime() < end) {
            HttpResponse<byte[]> response = client.send(request, HttpResponse.BodyHandlers.ofByteArray());
            if (response.statusCode() != 200) {
                throw new IllegalStateException("status " + response.statusCode());
            }
            count++;
        }
        return count;
    }
}
