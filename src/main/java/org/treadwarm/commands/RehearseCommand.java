package org.treadwarm.commands;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.net.HttpURLConnection;
import java.net.URI;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.Comparator;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.stream.Stream;
import org.treadwarm.store.Store;
import org.treadwarm.web.Server;
import org.treadwarm.web.Settings;
import picocli.CommandLine.Command;

/** Starts on an empty folder, answers a few requests and stops, so that the Java machine can archive the classes that takes. */
@Command(
        name = "rehearse",
        description = "Start, answer a few requests and stop, for an archive of loaded classes. Keeps nothing.",
        mixinStandardHelpOptions = true)
public final class RehearseCommand implements Callable<Integer> {
    @Override
    public Integer call() throws IOException {
        Path folder = Files.createTempDirectory("treadwarm-rehearsal");
        try (Store store = Store.open(folder, Clock.systemUTC());
                Server server = Server.start(new Settings("127.0.0.1", 0, List.of(), false, false), store)) {
            store.people().inviteOwner();
            for (String path : List.of("/api/v1/health", "/sign-in", "/static/treadwarm.css")) {
                int status = status(server.port(), path);
                if (status != 200) {
                    System.err.println(path + " answers " + status + ".");
                    return 1;
                }
            }
            return 0;
        } finally {
            delete(folder);
        }
    }

    private static int status(int port, String path) throws IOException {
        HttpURLConnection connection = (HttpURLConnection)
                URI.create("http://127.0.0.1:" + port + path).toURL().openConnection();
        try {
            return connection.getResponseCode();
        } finally {
            connection.disconnect();
        }
    }

    private static void delete(Path folder) throws IOException {
        try (Stream<Path> all = Files.walk(folder)) {
            all.sorted(Comparator.reverseOrder()).forEach(path -> {
                try {
                    Files.delete(path);
                } catch (IOException e) {
                    throw new UncheckedIOException(e);
                }
            });
        }
    }
}
