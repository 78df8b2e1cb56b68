package org.treadwarm.bench.load;

import java.io.IOException;
import java.net.ServerSocket;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse.BodyHandlers;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;

/** The packaged program, serving in a process of its own. */
final class ServedProgram implements AutoCloseable {
    private static final long LONGEST_START = 60_000_000_000L;

    private final Process process;
    private final Path log;
    private final int port;
    private final double startSeconds;

    private ServedProgram(Process process, Path log, int port, double startSeconds) {
        this.process = process;
        this.log = log;
        this.port = port;
        this.startSeconds = startSeconds;
    }

    /** Starts it and waits for its first answer. */
    static ServedProgram start(Path jar, Path data, List<String> options) throws IOException, InterruptedException {
        int port = freePort();
        Path log = Files.createTempFile("treadwarm-load", ".log");
        List<String> command = new ArrayList<>(List.of("java"));
        command.add("-XX:SharedArchiveFile=" + jar.resolveSibling("treadwarm.jsa"));
        command.addAll(options);
        command.addAll(
                List.of("-jar", jar.toString(), "serve", "--demo", "--port", "" + port, "--data", data.toString()));
        long begin = System.nanoTime();
        Process process = new ProcessBuilder(command)
                .redirectErrorStream(true)
                .redirectOutput(log.toFile())
                .start();
        HttpClient client = HttpClient.newHttpClient();
        HttpRequest health = HttpRequest.newBuilder(URI.create("http://127.0.0.1:" + port + "/api/v1/health"))
                .build();
        while (process.isAlive() && System.nanoTime() - begin < LONGEST_START) {
            try {
                if (client.send(health, BodyHandlers.discarding()).statusCode() == 200) {
                    return new ServedProgram(process, log, port, (System.nanoTime() - begin) / 1e9);
                }
            } catch (IOException e) {
                TimeUnit.MILLISECONDS.sleep(5);
            }
        }
        process.destroyForcibly();
        throw new IOException("no start: " + Files.readString(log));
    }

    /** From the command to the first answer, seconds. */
    double startSeconds() {
        return startSeconds;
    }

    URI at(String path) {
        return URI.create("http://127.0.0.1:" + port + path);
    }

    /** What it has printed so far. */
    String printed() throws IOException {
        return Files.readString(log);
    }

    boolean isAlive() {
        return process.isAlive();
    }

    /** Bytes of the objects that live, after a whole collection. */
    long liveBytes() throws IOException, InterruptedException {
        Process histogram = new ProcessBuilder("jcmd", "" + process.pid(), "GC.class_histogram").start();
        String last = "";
        for (String line : new String(histogram.getInputStream().readAllBytes()).split("\n")) {
            last = line.isBlank() ? last : line;
        }
        histogram.waitFor();
        return Long.parseLong(last.strip().split("\\s+")[2]);
    }

    /** Bytes of memory that the process holds, as Linux counts them. */
    long residentBytes() throws IOException {
        for (String line : Files.readAllLines(Path.of("/proc/" + process.pid() + "/status"))) {
            if (line.startsWith("VmRSS:")) {
                return 1024 * Long.parseLong(line.replaceAll("[^0-9]", ""));
            }
        }
        return 0;
    }

    @Override
    public void close() throws InterruptedException {
        process.destroy();
        if (!process.waitFor(10, TimeUnit.SECONDS)) {
            process.destroyForcibly().waitFor();
        }
    }

    static int freePort() throws IOException {
        try (ServerSocket socket = new ServerSocket(0)) {
            return socket.getLocalPort();
        }
    }
}
