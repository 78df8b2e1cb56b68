package org.treadwarm.web.api;

import io.javalin.config.RoutesConfig;
import io.javalin.http.Context;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.web.security.KeyGuard;

/** The routes of the API. */
public final class Api {
    /** Where it stands. */
    public static final String ROOT = "/api/v1";

    private final SizingApi sizing;
    private final JobsApi jobs;
    private final byte[] description = OpenApi.document();

    public Api(KeyGuard keys, JobDesk desk) {
        this.sizing = new SizingApi(keys);
        this.jobs = new JobsApi(keys, desk);
    }

    /** What {@code GET /api/v1/health} says. */
    record Health(String status, String method) {}

    /** Adds the routes. */
    public void routes(RoutesConfig routes) {
        routes.get(ROOT + "/health", Api::health);
        routes.get(ROOT + "/openapi.json", this::description);
        routes.post(ROOT + "/sizings", sizing::size);
        routes.post(ROOT + "/assemblies/evaluations", sizing::evaluate);
        routes.get(ROOT + "/materials", sizing::materials);
        routes.get(ROOT + "/jobs", jobs::list);
        routes.post(ROOT + "/jobs", jobs::create);
        routes.get(ROOT + "/jobs/{id}", jobs::get);
        routes.put(ROOT + "/jobs/{id}", jobs::put);
        routes.get(ROOT + "/jobs/{id}/sizing", jobs::sizing);
        routes.get(ROOT + "/jobs/{id}/revisions", jobs::revisions);
        routes.get(ROOT + "/jobs/{id}/revisions/{n}", jobs::revision);
    }

    private static void health(Context ctx) {
        SizingApi.json(ctx, 200, new Health("ok", Sizing.METHOD_VERSION));
    }

    private void description(Context ctx) {
        ctx.contentType("application/json; charset=utf-8");
        ctx.result(description);
    }
}
