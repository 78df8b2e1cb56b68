package org.treadwarm.web;

import io.javalin.http.Context;
import io.javalin.router.Endpoint;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.ConcurrentMap;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.concurrent.atomic.LongAdder;
import org.slf4j.Logger;
import org.slf4j.LoggerFactory;
import org.treadwarm.meter.Durations;
import org.treadwarm.meter.OpenMetrics;
import org.treadwarm.meter.OpenMetrics.Label;

/**
 * Follows each request from its beginning to its end: its id, its count, its duration and its line in the log. Of a request
 * only its route is noted, never its address, as that may hold names and secrets.
 */
final class RequestWatch {
    private static final Logger LOG = LoggerFactory.getLogger("org.treadwarm.requests");
    private static final String BEGUN = "begun";
    private static final String NO_ROUTE = "none";

    private final AtomicInteger inFlight = new AtomicInteger();
    private final ConcurrentMap<Answered, LongAdder> counts = new ConcurrentHashMap<>();
    private final ConcurrentMap<String, Durations> durations = new ConcurrentHashMap<>();

    private record Answered(String route, String status) {}

    /** Must be called first. */
    void begin(Context ctx) {
        RequestIds.begin(ctx);
        ctx.attribute(BEGUN, System.nanoTime());
        inFlight.incrementAndGet();
    }

    /** Must be called when the answer has been given. */
    void end(Context ctx) {
        Long begun = ctx.attribute(BEGUN);
        if (begun == null) {
            return;
        }
        long lasted = System.nanoTime() - begun;
        inFlight.decrementAndGet();
        String route = route(ctx);
        int status = ctx.statusCode();
        counts.computeIfAbsent(new Answered(route, status / 100 + "xx"), key -> new LongAdder())
                .increment();
        durations.computeIfAbsent(route, key -> new Durations()).add(lasted);
        LOG.atInfo()
                .addKeyValue("route", route)
                .addKeyValue("status", status)
                .addKeyValue("milliseconds", lasted / 1_000_000)
                .log("answered");
        RequestIds.end();
    }

    /** The route as it is declared, so that there are only as many as the server has. */
    private static String route(Context ctx) {
        Endpoint endpoint = ctx.endpoints().matchedHttpEndpoint();
        return endpoint == null ? NO_ROUTE : endpoint.method + " " + endpoint.path;
    }

    /** Writes what was seen so far. */
    void write(OpenMetrics metrics) {
        metrics.counters("treadwarm_requests", "Requests answered.");
        counts.forEach((answered, count) -> metrics.count(
                "treadwarm_requests",
                count.sum(),
                new Label("route", answered.route()),
                new Label("status", answered.status())));
        metrics.durations("treadwarm_request_duration_seconds", "From the first handler to the answer.");
        durations.forEach((route, lasted) ->
                metrics.duration("treadwarm_request_duration_seconds", lasted.read(), new Label("route", route)));
        metrics.gauge(
                "treadwarm_requests_in_flight", "", "Requests being answered, this one included.", inFlight.get());
    }
}
