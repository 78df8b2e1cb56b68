package org.treadwarm.web;

import io.javalin.config.RoutesConfig;
import io.javalin.http.Context;
import org.treadwarm.meter.OpenMetrics;
import org.treadwarm.meter.OpenMetrics.Label;
import org.treadwarm.sizing.SectionCache;
import org.treadwarm.sizing.Sizer;
import org.treadwarm.store.Store;
import org.treadwarm.web.security.Access;

/** {@code GET /metrics}: what the server did since it started, for a program that watches it. */
final class Metrics {
    private final Store store;
    private final RequestWatch requests;

    Metrics(Store store, RequestWatch requests) {
        this.store = store;
        this.requests = requests;
    }

    void routes(RoutesConfig routes) {
        routes.get("/metrics", this::give, Access.WATCH);
    }

    private void give(Context ctx) {
        OpenMetrics metrics = new OpenMetrics();
        requests.write(metrics);
        store(metrics);
        sizings(metrics);
        Runtime runtime = Runtime.getRuntime();
        metrics.gauge(
                "treadwarm_heap_used_bytes", "bytes", "Heap in use.", runtime.totalMemory() - runtime.freeMemory());
        metrics.gauge("treadwarm_heap_most_bytes", "bytes", "The most that the heap may grow to.", runtime.maxMemory());
        ctx.contentType(OpenMetrics.MEDIA_TYPE);
        ctx.result(metrics.end());
    }

    private void store(OpenMetrics metrics) {
        String name = "treadwarm_store_duration_seconds";
        metrics.durations(name, "Reads and changes of the store, with the wait for their turn.");
        metrics.duration(name, store.readsLasted(), new Label("kind", "read"));
        metrics.duration(name, store.changesLasted(), new Label("kind", "change"));
    }

    private static void sizings(OpenMetrics metrics) {
        metrics.counters("treadwarm_sizings", "Surveys sized.").count("treadwarm_sizings", Sizer.sized());
        SectionCache.Reading sections = SectionCache.read();
        metrics.gauge("treadwarm_sections_kept", "", "Solved sections remembered.", sections.kept());
        metrics.counters("treadwarm_section_requests", "Sections that sizings asked for.")
                .count("treadwarm_section_requests", sections.remembered(), new Label("outcome", "remembered"))
                .count("treadwarm_section_requests", sections.solved(), new Label("outcome", "solved"));
    }
}
