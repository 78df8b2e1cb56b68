package org.treadwarm.bench.load;

import java.io.IOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpRequest.BodyPublishers;
import java.net.http.HttpResponse.BodyHandlers;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Set;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.TimeUnit;
import java.util.function.Supplier;
import java.util.stream.IntStream;
import org.treadwarm.bench.BareServer;
import org.treadwarm.bench.BenchSurveys;
import org.treadwarm.wire.Json;

/**
 * The packaged program under an office's load: how soon it answers after a start, which rate it holds with 99 of 100 answers
 * within 50 ms, beside a bare server of the same framework, whether its memory stays flat over an hour's worth of requests, and
 * how little heap it needs. Arguments name parts: start, bare, office, heap, or hour for the memory alone over an hour that is not
 * shortened.
 *
 * <p>Client and server share the machine's processors, so the rates are lower than a client elsewhere would see.
 */
public final class Load {
    private static final double SOON_ENOUGH = 50;
    private static final int STARTS = 5;
    private static final int WARM_UP_SECONDS = 30;
    private static final int STEP_SECONDS = 6;

    /** An office of ten and its quoting system in a busy hour, requests a second; invented. */
    private static final double OFFICE_RATE = 2;

    private static final double WARM_UP_RATE = 20;

    /** Soon enough where only the heap is asked about. */
    private static final double NOT_STUCK = 500;

    private static final int HOUR_SECONDS = 3600;
    private static final int QUARTERS = 4;
    private static final int HURRY = 20;
    private static final long MEBIBYTE = 1024 * 1024;

    private Load() {}

    public static void main(String[] arguments) throws Exception {
        Path jar = Path.of("target/treadwarm.jar");
        if (arguments.length == 2 && arguments[0].equals("serve")) {
            BareServer.start(Integer.parseInt(arguments[1]));
            return;
        }
        Set<String> parts = arguments.length == 0 ? Set.of("start", "bare", "office", "heap") : Set.of(arguments);
        if (parts.contains("start")) {
            starts(jar, Files.createTempDirectory("treadwarm-load"));
        }
        if (parts.contains("bare")) {
            bareRate();
        }
        if (parts.contains("office")) {
            office(jar, false);
        }
        if (parts.contains("hour")) {
            office(jar, true);
        }
        if (parts.contains("heap")) {
            heapFloor(jar);
        }
    }

    private static void office(Path jar, boolean wholeHour) throws IOException, InterruptedException {
        Path data = Files.createTempDirectory("treadwarm-load");
        try (ServedProgram program = ServedProgram.start(jar, data, List.of())) {
            OfficeDay office = new OfficeDay(program, jar, data);
            OpenLoop.run(WARM_UP_RATE, WARM_UP_SECONDS, office::next);
            if (!wholeHour) {
                held("the office's mix", 10, office::next);
                held("POST /api/v1/sizings alone", 100, office::sizing);
                held("pages alone", 5, office::page);
            }
            hour(program, office, wholeHour);
        }
    }

    private static void starts(Path jar, Path data) throws IOException, InterruptedException {
        double[] seconds = new double[STARTS];
        for (int i = 0; i < STARTS; i++) {
            try (ServedProgram program = ServedProgram.start(jar, data, List.of())) {
                seconds[i] = program.startSeconds();
            }
        }
        say("start to first answer: %.2f s on an empty folder, then %s s", seconds[0], list(seconds, 1));
    }

    private static String list(double[] numbers, int from) {
        return IntStream.range(from, numbers.length)
                .mapToObj(i -> String.format(Locale.ROOT, "%.2f", numbers[i]))
                .reduce((a, b) -> a + ", " + b)
                .orElse("");
    }

    /** Raises the rate by steps until it is no longer held. */
    private static void held(String what, double first, Supplier<CompletableFuture<Boolean>> request)
            throws InterruptedException {
        OpenLoop.Result best = new OpenLoop.Result(0, 0, 0, 0, 0, 0);
        for (double rate = first; rate < 20_000; rate = Math.rint(1.4 * rate)) {
            OpenLoop.Result result = OpenLoop.run(rate, STEP_SECONDS, request);
            say(
                    "  %s at %.0f/s: median %.1f, p99 %.1f, longest %.0f ms, %d failed",
                    what, rate, result.median(), result.p99(), result.longest(), result.failed());
            if (!result.held(SOON_ENOUGH)) {
                break;
            }
            best = result;
        }
        say("%s: %.0f/s held, median %.1f ms, p99 %.1f ms", what, best.rate(), best.median(), best.p99());
    }

    /** An hour's worth of requests, twenty times as fast as an hour unless asked otherwise. */
    private static void hour(ServedProgram program, OfficeDay office, boolean whole)
            throws IOException, InterruptedException {
        double rate = whole ? OFFICE_RATE : OFFICE_RATE * HURRY;
        int seconds = (whole ? HOUR_SECONDS : HOUR_SECONDS / HURRY) / QUARTERS;
        say("an hour's worth of requests, %.0f at %.0f/s", OFFICE_RATE * HOUR_SECONDS, rate);
        say(
                "  before: %d MiB live, %d MiB resident",
                program.liveBytes() / MEBIBYTE, program.residentBytes() / MEBIBYTE);
        for (int quarter = 1; quarter <= QUARTERS; quarter++) {
            OpenLoop.Result result = OpenLoop.run(rate, seconds, office::next);
            say(
                    "  after quarter %d: %d MiB live, %d MiB resident; p99 %.1f, longest %.0f ms, %d of %d failed",
                    quarter,
                    program.liveBytes() / MEBIBYTE,
                    program.residentBytes() / MEBIBYTE,
                    result.p99(),
                    result.longest(),
                    result.failed(),
                    result.sent());
        }
    }

    /** The least heap with which the office's busy hour is still served. */
    private static void heapFloor(Path jar) throws InterruptedException {
        for (int mebibytes : new int[] {256, 128, 96, 64, 48, 40, 32, 24}) {
            String outcome;
            try {
                Path data = Files.createTempDirectory("treadwarm-load");
                try (ServedProgram program = ServedProgram.start(jar, data, List.of("-Xmx" + mebibytes + "m"))) {
                    OfficeDay office = new OfficeDay(program, jar, data);
                    OpenLoop.run(WARM_UP_RATE / 2, STEP_SECONDS, office::next);
                    OpenLoop.Result result = OpenLoop.run(WARM_UP_RATE / 2, STEP_SECONDS, office::next);
                    outcome = result.held(NOT_STUCK) && program.isAlive()
                            ? String.format(Locale.ROOT, "served, p99 %.1f ms", result.p99())
                            : String.format(Locale.ROOT, "p99 %.1f ms, %d failed", result.p99(), result.failed());
                }
            } catch (IOException e) {
                outcome = "does not serve";
            }
            say("heap of %d MiB at %.0f/s: %s", mebibytes, WARM_UP_RATE / 2, outcome);
        }
    }

    /** A handler that parses and echoes, under the same client, in a process of its own. */
    private static void bareRate() throws IOException, InterruptedException {
        int port = ServedProgram.freePort();
        Process process = new ProcessBuilder(
                        "java", "-cp", System.getProperty("java.class.path"), Load.class.getName(), "serve", "" + port)
                .inheritIO()
                .start();
        try {
            HttpClient client =
                    HttpClient.newBuilder().version(HttpClient.Version.HTTP_1_1).build();
            HttpRequest echo = HttpRequest.newBuilder(URI.create("http://127.0.0.1:" + port + "/echo"))
                    .header("Content-Type", "application/json")
                    .POST(BodyPublishers.ofByteArray(Json.bytes(BenchSurveys.twelveSurfaces())))
                    .build();
            TimeUnit.SECONDS.sleep(3);
            Supplier<CompletableFuture<Boolean>> request = () ->
                    client.sendAsync(echo, BodyHandlers.ofByteArray()).thenApply(answer -> answer.statusCode() == 200);
            OpenLoop.run(200, WARM_UP_SECONDS, request);
            held("a bare handler that parses and echoes the same survey", 100, request);
        } finally {
            process.destroy();
        }
    }

    private static void say(String format, Object... values) {
        System.out.printf(Locale.ROOT, format + "%n", values);
    }
}
