package org.treadwarm.program;

import java.io.BufferedReader;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;

/** The program in a process of its own, packaged when there is a jar to test. Every wait for it ends. */
final class Program implements AutoCloseable {
    private static final int PATIENCE_SECONDS = 90;

    private final Process process;
    private final BufferedReader output;

    private Program(Process process) {
        this.process = process;
        this.output = process.inputReader(StandardCharsets.UTF_8);
    }

    /** What a finished run left. */
    record Result(int status, String output, String errors) {
        List<String> lines() {
            return output.lines().toList();
        }
    }

    /** Starts it, to be waited for. */
    static Program start(String... arguments) {
        return start(Map.of(), arguments);
    }

    /** Starts it with additions to the environment. */
    static Program start(Map<String, String> environment, String... arguments) {
        return new Program(process(environment, arguments));
    }

    /** Starts it with its error stream going into a file. */
    static Program startLogging(Path errors, String... arguments) {
        return new Program(begun(builder(arguments).redirectError(errors.toFile())));
    }

    private static Process process(Map<String, String> environment, String... arguments) {
        ProcessBuilder builder = builder(arguments);
        builder.environment().putAll(environment);
        return begun(builder);
    }

    private static Process begun(ProcessBuilder builder) {
        try {
            return builder.start();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private static ProcessBuilder builder(String... arguments) {
        List<String> command = new ArrayList<>();
        command.add(Path.of(System.getProperty("java.home"), "bin", "java").toString());
        command.add("-Xmx512m");
        String jar = System.getProperty("treadwarm.jar");
        command.addAll(
                jar != null
                        ? List.of("-jar", jar)
                        : List.of("-cp", System.getProperty("java.class.path"), "org.treadwarm.Treadwarm"));
        command.addAll(List.of(arguments));
        return new ProcessBuilder(command);
    }

    /** Runs it to its end without input. */
    static Result run(String... arguments) {
        return runWith(new byte[0], arguments);
    }

    /** Runs it to its end with this input. */
    static Result runWith(byte[] input, String... arguments) {
        return finish(process(Map.of(), arguments), input);
    }

    /** Runs it to its end with additions to the environment. */
    static Result runIn(Map<String, String> environment, String... arguments) {
        return finish(process(environment, arguments), new byte[0]);
    }

    private static Result finish(Process process, byte[] input) {
        CompletableFuture<String> output = CompletableFuture.supplyAsync(() -> all(process.getInputStream()));
        CompletableFuture<String> errors = CompletableFuture.supplyAsync(() -> all(process.getErrorStream()));
        try (OutputStream in = process.getOutputStream()) {
            in.write(input);
            in.close();
            if (!process.waitFor(PATIENCE_SECONDS, TimeUnit.SECONDS)) {
                throw new AssertionError("the program does not end");
            }
            return new Result(process.exitValue(), output.join(), errors.join());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        } finally {
            process.destroyForcibly();
        }
    }

    private static String all(InputStream stream) {
        try {
            return new String(stream.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** The address it prints. */
    String address() {
        return line("http://").replaceAll(".*(http://[0-9.]+:[0-9]+).*", "$1");
    }

    /** The next line of its output that holds this text. */
    String line(String text) {
        try {
            return CompletableFuture.supplyAsync(() -> next(text)).get(PATIENCE_SECONDS, TimeUnit.SECONDS);
        } catch (ExecutionException | TimeoutException e) {
            throw new AssertionError("the program prints no line with " + text, e);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        }
    }

    private String next(String text) {
        try {
            for (String line = output.readLine(); line != null; line = output.readLine()) {
                if (line.contains(text)) {
                    return line;
                }
            }
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
        throw new IllegalStateException("the program ended");
    }

    /** Asks it to stop, as the system's SIGTERM does. */
    void askToStop() {
        process.destroy();
    }

    /** Asks it to stop; whether it did. */
    boolean stop() {
        askToStop();
        try {
            return process.waitFor(PATIENCE_SECONDS, TimeUnit.SECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        }
    }

    /** The exit status of a run that has ended. */
    int status() {
        return process.exitValue();
    }

    /** Ends it at once, as the system's kill -9 does. */
    void kill() {
        try {
            process.destroyForcibly().waitFor();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(e);
        }
    }

    @Override
    public void close() {
        if (!stop()) {
            process.destroyForcibly();
        }
    }
}
