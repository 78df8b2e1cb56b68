package org.treadwarm.web;

import io.javalin.Javalin;
import io.javalin.config.JavalinConfig;
import io.javalin.http.Context;
import io.javalin.http.HttpResponseException;
import io.javalin.http.MethodNotAllowedResponse;
import java.time.Duration;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.eclipse.jetty.server.AbstractConnector;
import org.eclipse.jetty.server.Connector;
import org.eclipse.jetty.server.HttpConfiguration;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.sheets.SheetDesk;
import org.treadwarm.store.Store;
import org.treadwarm.store.StoreUnavailable;
import org.treadwarm.web.api.Api;
import org.treadwarm.web.pages.Pages;
import org.treadwarm.web.security.Gate;
import org.treadwarm.web.security.HostGuard;
import org.treadwarm.web.security.KeyGuard;
import org.treadwarm.web.security.RateLimit;
import org.treadwarm.web.security.SecureHeaders;
import org.treadwarm.web.security.Visitors;

/** The server: API and pages over one store. */
public final class Server implements AutoCloseable {
    private static final Logger LOG = LoggerFactory.getLogger(Server.class);
    private static final Duration IDLE = Duration.ofSeconds(30);

    /** The largest body of any request, bytes. */
    static final long LARGEST_BODY = 16L * 1024 * 1024;

    private final Javalin javalin;

    private final Computations computations;

    private Server(Javalin javalin, Computations computations) {
        this.javalin = javalin;
        this.computations = computations;
    }

    /**
     * Starts the server.
     *
     * @throws io.javalin.util.JavalinBindException when the address or port cannot be listened on
     */
    public static Server start(Settings settings, Store store) {
        return start(settings, store, IDLE);
    }

    /** Starts one that gives a connection up when nothing comes or goes on it for so long. */
    static Server start(Settings settings, Store store, Duration idle) {
        HostGuard hosts = new HostGuard(settings.allowedHosts());
        Visitors visitors = new Visitors(store.sessions(), settings.behindTls(), settings.behindProxy());
        JobDesk desk = new JobDesk(store.jobs());
        SheetDesk sheets = new SheetDesk(desk, store.sheets());
        Api api = new Api(desk, sheets, store);
        Computations computations = new Computations();
        Pages pages = new Pages(store, desk, sheets, visitors, computations);
        Gate gate = new Gate(visitors, new KeyGuard(store.keys()), pages::refuseRole);
        RequestWatch watch = new RequestWatch();
        Optional<RateLimit> limit = settings.rateLimit().stream()
                .mapToObj(perMinute -> new RateLimit(perMinute, System::nanoTime))
                .findFirst();
        Javalin javalin = Javalin.create(config -> {
            basics(config);
            config.jetty.modifyHttpConfiguration(http -> http.setIdleTimeout(idle.toMillis()));
            config.requestLogger.http((ctx, milliseconds) -> watch.end(ctx));
            config.routes.before(ctx -> {
                watch.begin(ctx);
                SecureHeaders.set(ctx);
                if (!hosts.admits(ctx)) {
                    answerPlainly(ctx, 421, "host", "This server does not answer to that name");
                    ctx.skipRemainingHandlers();
                }
            });
            config.routes.beforeMatched(gate::check);
            limit.ifPresent(each -> config.routes.beforeMatched(each::check));
            new Assets().routes(config.routes);
            new Metrics(store, watch).routes(config.routes);
            api.routes(config.routes);
            pages.routes(config.routes);
            faults(config, pages);
        });
        javalin.start(settings.bind(), settings.port());
        ServedRoute.of(javalin);
        for (Connector connector : javalin.jettyServer().server().getConnectors()) {
            ((AbstractConnector) connector).setIdleTimeout(idle.toMillis());
        }
        return new Server(javalin, computations);
    }

    /** The port it listens on. */
    public int port() {
        return javalin.port();
    }

    /** The computations that its pages wait for. */
    Computations computations() {
        return computations;
    }

    /** Every route it serves. */
    List<ServedRoute> routes() {
        return ServedRoute.of(javalin);
    }

    /** Stops after answering what has begun. */
    @Override
    public void close() {
        computations.close();
        javalin.stop();
    }

    static void basics(JavalinConfig config) {
        config.startup.showJavalinBanner = false;
        config.startup.showOldJavalinVersionWarning = false;
        config.startup.startupWatcherEnabled = false;
        config.http.maxRequestSize = LARGEST_BODY;
        config.http.prefer405over404 = true;
        config.http.defaultContentType = "text/html; charset=utf-8";
        config.jetty.modifyServer(server -> {
            server.setStopTimeout(5000);
            server.setErrorHandler(new UnreadableRequests());
        });
        config.jetty.modifyHttpConfiguration((HttpConfiguration http) -> {
            http.setSendServerVersion(false);
        });
        // Else a table pasted beside the field for a file may have no more than 200 kB.
        config.jetty.modifyServletContextHandler(context -> context.setMaxFormContentSize((int) LARGEST_BODY));
    }

    private static void faults(JavalinConfig config, Pages pages) {
        config.routes.exception(HttpResponseException.class, (e, ctx) -> {
            if (e instanceof MethodNotAllowedResponse) {
                ctx.header("Allow", e.getDetails().getOrDefault("availableMethods", ""));
            }
            if (e.getStatus() == 413) {
                Drain.rest(ctx);
            }
            ctx.status(e.getStatus());
            ctx.result("");
            answer(ctx, pages, e.getStatus());
        });
        config.routes.exception(StoreUnavailable.class, (e, ctx) -> {
            LOG.error("the store cannot be reached: {}", e.getMessage());
            ctx.attribute("reason", e.reason());
            answer(ctx, pages, 503);
        });
        config.routes.exception(IllegalArgumentException.class, (e, ctx) -> {
            LOG.warn("a request was refused deep inside: {}", Traces.of(e));
            answer(ctx, pages, 422);
        });
        config.routes.exception(Exception.class, (e, ctx) -> {
            LOG.error("fault: {}", Traces.of(e));
            answer(ctx, pages, 500);
        });
        for (int status : new int[] {404, 405, 413}) {
            config.routes.error(status, ctx -> {
                if (!isAnswered(ctx)) {
                    answer(ctx, pages, status);
                }
            });
        }
    }

    private static boolean isAnswered(Context ctx) {
        String type = ctx.res().getContentType();
        return type != null
                && (type.startsWith("application/problem+json")
                        || type.startsWith("text/html") && ctx.attribute("answered") != null);
    }

    private static void answer(Context ctx, Pages pages, int status) {
        ctx.attribute("answered", true);
        ctx.status(status);
        if (isApi(ctx)) {
            answerPlainly(ctx, status, "http", title(ctx, status));
        } else {
            pages.fault(ctx, status, title(ctx, status));
        }
    }

    private static boolean isApi(Context ctx) {
        return ctx.path().startsWith("/api/") || ctx.path().equals("/metrics");
    }

    private static void answerPlainly(Context ctx, int status, String kind, String title) {
        Problems.plain(ctx, status, kind, title, title + ".");
    }

    private static String title(Context ctx, int status) {
        return switch (status) {
            case 404 -> "There is nothing here";
            case 405 -> "This method is not served here";
            case 413 -> "The body is too large";
            case 422 -> "This cannot be kept as it is: it holds characters that are no text";
            case 503 -> unavailable(ctx.attribute("reason"));
            case 500 ->
                "A fault of the program, noted under " + RequestIds.id(ctx).orElse("no id");
            default -> String.format(Locale.ROOT, "The request could not be answered (%d)", status);
        };
    }

    private static String unavailable(StoreUnavailable.Reason reason) {
        return switch (reason) {
            case OUT_OF_REACH -> "The store cannot be reached just now; nothing was saved";
            case NO_ROOM -> "The store's disk is full; nothing was saved";
            case BROKEN_COMMIT ->
                "The connection to the store broke while saving; look whether the change is there before"
                        + " saving it again";
        };
    }
}
