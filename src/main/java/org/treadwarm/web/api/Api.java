package org.treadwarm.web.api;

import io.javalin.config.RoutesConfig;
import io.javalin.http.Context;
import io.javalin.http.Handler;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.sheets.SheetDesk;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.store.Store;
import org.treadwarm.web.security.Access;
import org.treadwarm.wire.Json;

/** The routes of the API, each with the scope that a key needs for it. */
public final class Api {
    /** Where it stands. */
    public static final String ROOT = "/api/v1";

    private final Store store;
    private final SizingApi sizing;
    private final BatchApi batch;
    private final WarmUpApi warmUps;
    private final WallFootApi wallFeet;
    private final JobsApi jobs;
    private final SheetsApi sheets;
    private final RoomsApi rooms;
    private final HistoryApi history;
    private final TablesApi tables;

    public Api(JobDesk desk, SheetDesk sheetDesk, Store store) {
        this.store = store;
        this.sizing = new SizingApi();
        this.batch = new BatchApi();
        this.warmUps = new WarmUpApi();
        this.wallFeet = new WallFootApi();
        Repeats repeats = new Repeats(store.keptAnswers());
        this.jobs = new JobsApi(desk, repeats);
        this.sheets = new SheetsApi(sheetDesk, desk, repeats);
        this.rooms = new RoomsApi(desk, repeats);
        this.history = new HistoryApi(desk, repeats);
        this.tables = new TablesApi(desk, repeats);
    }

    /** The description of the API, made when it is first asked for. */
    private static final class Description {
        static final byte[] TEXT = OpenApi.document();
    }

    /** The description of the API: OpenAPI 3.1 as UTF-8 text. */
    public static byte[] description() {
        return Description.TEXT.clone();
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
        get(routes, ROOT + "/health", this::health, Access.ANYBODY);
        get(routes, ROOT + "/openapi.json", this::description, Access.ANYBODY);
        routes.post(ROOT + "/sizings", sizing::size, Access.SIZE);
        routes.post(ROOT + "/sizings/batch", batch::size, Access.SIZE);
        routes.post(ROOT + "/assemblies/evaluations", sizing::evaluate, Access.SIZE);
        routes.post(ROOT + "/sections", sizing::section, Access.SIZE);
        routes.post(ROOT + "/wall-feet", wallFeet::answer, Access.SIZE);
        routes.post(ROOT + "/warmups", warmUps::answer, Access.SIZE);
        get(routes, ROOT + "/materials", sizing::materials, Access.SIZE);
        get(routes, ROOT + "/jobs", jobs::list, Access.READ);
        routes.post(ROOT + "/jobs", jobs::create, Access.WRITE);
        get(routes, ROOT + "/jobs/{id}", jobs::get, Access.READ);
        routes.put(ROOT + "/jobs/{id}", jobs::put, Access.WRITE);
        routes.post(ROOT + "/jobs/{id}/rooms", rooms::add, Access.WRITE);
        get(routes, ROOT + "/jobs/{id}/rooms/{room}", rooms::get, Access.READ);
        routes.put(ROOT + "/jobs/{id}/rooms/{room}", rooms::put, Access.WRITE);
        routes.delete(ROOT + "/jobs/{id}/rooms/{room}", rooms::remove, Access.WRITE);
        get(routes, ROOT + "/jobs/{id}/sizing", jobs::sizing, Access.READ);
        get(routes, ROOT + "/jobs/{id}/tables/{table}", tables::get, Access.READ);
        routes.post(ROOT + "/jobs/{id}/tables/{table}", tables::read, Access.WRITE);
        routes.post(ROOT + "/jobs/{id}/sheets", sheets::issue, Access.WRITE);
        get(routes, ROOT + "/sheets", sheets::list, Access.READ);
        get(routes, ROOT + "/sheets/{number}", sheets::get, Access.READ);
        get(routes, ROOT + "/sheets/{number}/verification", sheets::verification, Access.READ);
        routes.post(ROOT + "/sheets/{number}/withdrawal", sheets::withdraw, Access.WRITE);
        get(routes, ROOT + "/jobs/{id}/revisions", history::revisions, Access.READ);
        get(routes, ROOT + "/jobs/{id}/revisions/{n}", history::revision, Access.READ);
        get(routes, ROOT + "/jobs/{id}/revisions/{n}/changes", history::changes, Access.READ);
        routes.post(ROOT + "/jobs/{id}/revisions/{n}/restore", history::restore, Access.WRITE);
        routes.post(ROOT + "/jobs/{id}/copy", history::copy, Access.WRITE);
        routes.post(ROOT + "/jobs/{id}/archive", history::archive, Access.WRITE);
        routes.post(ROOT + "/jobs/{id}/unarchive", history::bringBack, Access.WRITE);
    }

    /** HEAD answers as GET does, without the body. */
    private static void get(RoutesConfig routes, String path, Handler handler, Access access) {
        routes.get(path, handler, access);
        routes.head(path, handler, access);
    }

    private void health(Context ctx) {
        store.check();
        SizingApi.json(ctx, 200, HEALTH);
    }

    private void description(Context ctx) {
        ctx.contentType("application/json; charset=utf-8");
        ctx.result(Description.TEXT);
    }
}
