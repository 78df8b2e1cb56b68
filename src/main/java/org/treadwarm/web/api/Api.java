package org.treadwarm.web.api;

import io.javalin.config.RoutesConfig;
import io.javalin.http.Context;
import io.javalin.http.Handler;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.web.security.KeyGuard;
import org.treadwarm.wire.Json;

/** The routes of the API. */
public final class Api {
    /** Where it stands. */
    public static final String ROOT = "/api/v1";

    private final SizingApi sizing;
    private final WarmUpApi warmUps;
    private final WallFootApi wallFeet;
    private final JobsApi jobs;

    public Api(KeyGuard keys, JobDesk desk) {
        this.sizing = new SizingApi(keys);
        this.warmUps = new WarmUpApi(keys);
        this.wallFeet = new WallFootApi(keys);
        this.jobs = new JobsApi(keys, desk);
    }

    /** The description of the API, made when it is first asked for. */
    private static final class Description {
        static final byte[] TEXT = OpenApi.document();
    }

    /** What {@code GET /api/v1/health} says. */
    record Health(String status, String method) {}

    private static final Health HEALTH = new Health("ok", Sizing.METHOD_VERSION);

    /** Writes a first answer, to nobody, so that what writes answers is loaded. */
    public static void warmUp() {
        Json.bytes(HEALTH);
    }

    /** Adds the routes. */
    public void routes(RoutesConfig routes) {
        get(routes, ROOT + "/health", Api::health);
        get(routes, ROOT + "/openapi.json", this::description);
        routes.post(ROOT + "/sizings", sizing::size);
        routes.post(ROOT + "/assemblies/evaluations", sizing::evaluate);
        routes.post(ROOT + "/sections", sizing::section);
        routes.post(ROOT + "/wall-feet", wallFeet::answer);
        routes.post(ROOT + "/warmups", warmUps::answer);
        get(routes, ROOT + "/materials", sizing::materials);
        get(routes, ROOT + "/jobs", jobs::list);
        routes.post(ROOT + "/jobs", jobs::create);
        get(routes, ROOT + "/jobs/{id}", jobs::get);
        routes.put(ROOT + "/jobs/{id}", jobs::put);
        get(routes, ROOT + "/jobs/{id}/sizing", jobs::sizing);
        get(routes, ROOT + "/jobs/{id}/revisions", jobs::revisions);
        get(routes, ROOT + "/jobs/{id}/revisions/{n}", jobs::revision);
    }

    /** HEAD answers as GET does, without the body. */
    private static void get(RoutesConfig routes, String path, Handler handler) {
        routes.get(path, handler);
        routes.head(path, handler);
    }

    private static void health(Context ctx) {
        SizingApi.json(ctx, 200, HEALTH);
    }

    private void description(Context ctx) {
        ctx.contentType("application/json; charset=utf-8");
        ctx.result(Description.TEXT);
    }
}
