package org.treadwarm.web;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;
import java.util.concurrent.CancellationException;
import java.util.function.Function;
import java.util.stream.Stream;
import org.treadwarm.intake.Document;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.store.Change;
import org.treadwarm.store.DataHome;
import org.treadwarm.store.Kind;
import org.treadwarm.store.LinkUse;
import org.treadwarm.store.OwnerCreation;
import org.treadwarm.store.Person;
import org.treadwarm.store.Role;
import org.treadwarm.store.Scope;
import org.treadwarm.store.Session;
import org.treadwarm.store.Store;

/** A server over a store of its own in a new folder, with a key of every scope and, when asked for, an owner. */
public final class RunningServer implements AutoCloseable {
    /** The owner's name; invented. */
    public static final String OWNER = "Ottilie of Quillfen Floors";

    /** The owner's password. */
    public static final String PASSWORD = "a floor that holds the room";

    private final Path folder;
    private final Store store;
    private final Server server;
    private final Map<Scope, String> keys = new EnumMap<>(Scope.class);

    private RunningServer(Path folder, DataHome home, Settings settings) {
        this.folder = folder;
        this.store = Store.open(home, Clock.systemUTC());
        this.server = Server.start(settings, store);
        for (Scope scope : Scope.values()) {
            keys.put(scope, store.keys().create("tests", scope, "tests").token());
        }
    }

    /** Starts one on any free port. */
    public static RunningServer start() {
        return start(Kind.SQLITE);
    }

    /** Starts one on any free port, over a database of this kind. */
    public static RunningServer start(Kind kind) {
        return start(kind, settings(false, OptionalInt.empty()));
    }

    /** Starts one that believes a proxy in front of it. */
    static RunningServer behindProxy() {
        return start(Kind.SQLITE, settings(true, OptionalInt.empty()));
    }

    /** Starts one that lets a key send so many requests a minute. */
    static RunningServer limited(int perMinute) {
        return start(Kind.SQLITE, settings(false, OptionalInt.of(perMinute)));
    }

    private static Settings settings(boolean behindProxy, OptionalInt rateLimit) {
        return new Settings("127.0.0.1", 0, List.of(), false, behindProxy, rateLimit);
    }

    /** Starts one on any free port, over this database. */
    static RunningServer over(DataHome.Postgresql home) {
        return start(folder -> home, settings(false, OptionalInt.empty()));
    }

    private static RunningServer start(Kind kind, Settings settings) {
        return start(kind::emptyHome, settings);
    }

    private static RunningServer start(Function<Path, DataHome> home, Settings settings) {
        try {
            Path folder = Files.createTempDirectory("treadwarm-test");
            return new RunningServer(folder, home.apply(folder), settings);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** Its address without a path. */
    public String origin() {
        return "http://127.0.0.1:" + server.port();
    }

    /** The port it listens on. */
    public int port() {
        return server.port();
    }

    /** A key of this scope. */
    public String key(Scope scope) {
        return keys.get(scope);
    }

    /** What it keeps. */
    public Store store() {
        return store;
    }

    /** Its jobs. */
    public JobDesk desk() {
        return new JobDesk(store.jobs());
    }

    /** Makes the owner. */
    public Person owner() {
        String token = store.people().inviteOwner().orElseThrow();
        return ((OwnerCreation.Created) store.people().createOwner(token, OWNER, PASSWORD)).owner();
    }

    /** Makes the account of somebody invited, with the owner's password. */
    public Person member(String name, Role role) {
        String token = store.links().invite(name, role, OWNER).token();
        return ((LinkUse.Done) store.links().join(token, name, PASSWORD)).person();
    }

    /**
     * Keeps the computations of its pages busy, so that whatever a page begins waits; what it returns ends that.
     */
    public Runnable busy() {
        List<Computation> all = new ArrayList<>();
        for (int i = 0; i < Computations.AT_ONCE; i++) {
            all.add(server.computations()
                    .begin("busy", id -> "/jobs", "/jobs", (stopped, progress) -> {
                        while (!stopped.getAsBoolean()) {
                            Thread.onSpinWait();
                        }
                        throw new CancellationException("no longer busy");
                    })
                    .orElseThrow());
        }
        return () -> all.forEach(Computation::cancel);
    }

    /** Every route it serves. */
    List<ServedRoute> routes() {
        return server.routes();
    }

    /** A new session of somebody. */
    public Session session(Person person) {
        return store.sessions().start(person);
    }

    /** Starts a job with this survey. */
    public Job job(String name, JsonNode survey) {
        return desk().create(name, survey, Change.by("tests"));
    }

    /** The job as it is now. */
    public Job now(Job job) {
        return desk().current(job.id()).orElseThrow();
    }

    /** The invented survey of nearly every feature. */
    public static ObjectNode studio() {
        try (InputStream in = RunningServer.class.getResourceAsStream("/surveys/studio.json")) {
            return (ObjectNode) Document.mapper().readTree(in);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    @Override
    public void close() {
        server.close();
        store.close();
        try (Stream<Path> files = Files.walk(folder)) {
            files.sorted(Comparator.reverseOrder())
                    .forEach(file -> file.toFile().delete());
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
