package org.treadwarm.web.pages;

import io.javalin.config.RoutesConfig;
import io.javalin.http.Context;
import io.javalin.http.Handler;
import io.javalin.http.HttpStatus;
import java.net.URLEncoder;
import java.nio.charset.StandardCharsets;
import java.util.Map;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.store.Store;
import org.treadwarm.web.Computations;
import org.treadwarm.web.security.Visitors;

/** The routes of the pages. All but the way in need a session; every form carries its secret. */
public final class Pages {
    private final Visitors visitors;
    private final View view;
    private final EntryPages entry;
    private final JobPages jobs;
    private final PartPages parts;
    private final QuickPages quick;
    private final ComputationPages computing;
    private final WallFootPages wallFeet;
    private final MethodPage method;
    private final SolvingAhead ahead;
    private final TablePages tables = new TablePages();

    public Pages(Store store, JobDesk desk, Visitors visitors, Computations computations) {
        this.visitors = visitors;
        this.view = new View(visitors);
        this.entry = new EntryPages(store, visitors, view);
        this.jobs = new JobPages(desk, visitors, view);
        this.parts = new PartPages(desk, visitors, view);
        this.quick = new QuickPages(desk, visitors, view);
        this.computing = new ComputationPages(computations, view);
        this.method = new MethodPage(computations, view);
        this.ahead = new SolvingAhead(desk, computations);
        this.wallFeet = new WallFootPages(desk, visitors, view, computations, computing);
    }

    /** Adds the routes. */
    public void routes(RoutesConfig routes) {
        routes.get("/sign-in", entry::signInForm);
        routes.post("/sign-in", form(entry::signIn));
        routes.post("/sign-out", form(entry::signOut));
        routes.get("/owner/{token}", entry::ownerForm);
        routes.post("/owner/{token}", form(entry::becomeOwner));
        routes.get("/", ctx -> ctx.redirect("/jobs", HttpStatus.SEE_OTHER));
        routes.get("/jobs", member(jobs::list));
        routes.post("/jobs", member(form(jobs::create)));
        routes.get("/jobs/{job}", member(ahead.before(jobs::show)));
        routes.post("/jobs/{job}", member(form(jobs::change)));
        routes.get("/jobs/{job}/{part}/{name}", member(ahead.before(parts::show)));
        routes.post("/jobs/{job}/{part}/{name}", member(form(parts::save)));
        routes.post("/jobs/{job}/{part}/{name}/preview", member(form(parts::preview)));
        routes.get("/jobs/{job}/rooms/{name}/wall-foot/{junction}", member(wallFeet::show));
        routes.post("/jobs/{job}/rooms/{name}/wall-foot/{junction}", member(form(wallFeet::change)));
        routes.get("/jobs/{job}/rooms/{name}/wall-foot/{junction}/{id}", member(wallFeet::result));
        routes.post("/jobs/{job}/rooms/{name}/wall-foot/{junction}/{id}", member(form(wallFeet::store)));
        routes.get("/computations/{id}", member(computing::show));
        routes.post("/computations/{id}", member(form(computing::cancel)));
        routes.get("/one-room", member(quick::show));
        routes.post("/one-room", member(form(quick::change)));
        routes.post("/one-room/preview", member(form(quick::preview)));
        routes.get(
                "/materials",
                member(ctx -> view.show(ctx, 200, "materials", tables.materials(ctx.queryParam("find")))));
        routes.get("/reading-help", member(ctx -> view.show(ctx, 200, "reading-help", tables.readingHelp())));
        routes.get("/method", member(method::show));
        routes.post("/method", member(form(method::change)));
    }

    /** Shows a fault as a page. */
    public void fault(Context ctx, int status, String title) {
        view.show(ctx, status, "fault", Map.of("title", title, "status", status));
    }

    private Handler member(Handler handler) {
        return ctx -> {
            if (visitors.session(ctx).isEmpty()) {
                String back = ctx.method().toString().equals("GET") ? ctx.path() : "/jobs";
                ctx.redirect("/sign-in?back=" + URLEncoder.encode(back, StandardCharsets.UTF_8), HttpStatus.SEE_OTHER);
            } else {
                handler.handle(ctx);
            }
        };
    }

    private Handler form(Handler handler) {
        return ctx -> {
            if (visitors.acceptsForm(ctx)) {
                handler.handle(ctx);
            } else {
                fault(ctx, 403, "This form is not one of ours, or is too old; open the page again");
            }
        };
    }
}
