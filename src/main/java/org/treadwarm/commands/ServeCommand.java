package org.treadwarm.commands;

import io.javalin.util.JavalinBindException;
import java.time.Clock;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;
import java.util.concurrent.Callable;
import java.util.concurrent.CountDownLatch;
import org.treadwarm.jobs.Demo;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.store.Store;
import org.treadwarm.web.Server;
import org.treadwarm.web.Settings;
import org.treadwarm.web.WarmUp;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Option;

/** Starts the server. */
@Command(
        name = "serve",
        description = "Start the server. This is what the program does when no command is named.",
        mixinStandardHelpOptions = true)
public final class ServeCommand implements Callable<Integer> {
    private static final int MOST_PER_MINUTE = 1_000_000;

    @Option(
            names = "--port",
            defaultValue = "8080",
            description = "port to listen on, 0 for any free one (${DEFAULT-VALUE})")
    private int port;

    @Option(names = "--bind", defaultValue = "127.0.0.1", description = "address to listen on (${DEFAULT-VALUE})")
    private String bind;

    @Mixin
    private HomeOptions data;

    @Option(names = "--demo", description = "add the invented demo job, unless it is there already")
    private boolean demo;

    @Option(
            names = "--host",
            description = "a further name that browsers and clients may call this server by; may be repeated")
    private List<String> hosts = List.of();

    @Option(names = "--behind-tls", description = "a reverse proxy in front speaks TLS: mark cookies Secure")
    private boolean behindTls;

    @Option(
            names = "--behind-proxy",
            description = "one reverse proxy in front appends to X-Forwarded-For where requests come from: believe it")
    private boolean behindProxy;

    @Option(
            names = "--rate-limit",
            description =
                    "at most so many requests a minute with one API key, 1 to 1000000; each server counts for itself"
                            + " (no limit unless named)")
    private Optional<Integer> rateLimit = Optional.empty();

    @Option(
            names = "--log",
            defaultValue = "plain",
            description =
                    "plain: warnings and faults, a line each; json: the same and a line for each request, as JSON;"
                            + " on the error stream (${DEFAULT-VALUE})")
    private String log;

    /** Begins to load the server, on another thread, while the command line is read and the store opened. */
    public static void prepare() {
        WarmUp.begin();
    }

    @Override
    public Integer call() throws InterruptedException {
        if (port < 0 || port > 65535) {
            System.err.println("The port is 0 to 65535, not " + port + ".");
            return 2;
        }
        if (rateLimit.isPresent() && (rateLimit.get() < 1 || rateLimit.get() > MOST_PER_MINUTE)) {
            System.err.println(
                    "The rate limit is 1 to " + MOST_PER_MINUTE + " requests a minute, not " + rateLimit.get() + ".");
            return 2;
        }
        if (!log.equals("plain") && !log.equals("json")) {
            System.err.println("The log is plain or json, not " + log + ".");
            return 2;
        }
        if (log.equals("json")) {
            LogSetup.writeJson();
        }
        try (Store store = Store.openToServe(data.home(), Clock.systemUTC())) {
            Server server = Server.start(settings(), store);
            if (demo) {
                Demo.addTo(new JobDesk(store.jobs()));
            }
            announce(server.port(), store.people().inviteOwner());
            CountDownLatch stopped = new CountDownLatch(1);
            Runtime.getRuntime().addShutdownHook(new Thread(() -> {
                server.close();
                store.close();
                stopped.countDown();
            }));
            stopped.await();
            return 0;
        } catch (JavalinBindException e) {
            System.err.println("The server cannot listen on " + bind + " port " + port
                    + ": it is in use already, or not allowed. Choose another with --port or --bind.");
            return 1;
        }
    }

    private Settings settings() {
        OptionalInt limit = rateLimit.map(OptionalInt::of).orElseGet(OptionalInt::empty);
        return new Settings(bind, port, hosts, behindTls, behindProxy, limit);
    }

    /** Told on the console only: the link makes its visitor the owner, so it stands in no log. */
    private void announce(int listening, Optional<String> invitation) {
        String host = bind.equals("0.0.0.0") || bind.equals("::") ? "127.0.0.1" : bind;
        String address = "http://" + (host.contains(":") ? "[" + host + "]" : host) + ":" + listening;
        System.out.println("Treadwarm is at " + address + "/");
        invitation.ifPresent(token ->
                System.out.println("Become its owner, once, within 24 hours, at " + address + "/owner/" + token));
        System.out.flush();
    }
}
