package org.treadwarm.web.pages;

import io.javalin.config.RoutesConfig;
import io.javalin.http.Context;
import io.javalin.http.Handler;
import io.javalin.http.HttpStatus;
import java.time.Clock;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalInt;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.sheets.SheetDesk;
import org.treadwarm.store.Role;
import org.treadwarm.store.Store;
import org.treadwarm.web.Computations;
import org.treadwarm.web.Drain;
import org.treadwarm.web.Multipart;
import org.treadwarm.web.security.Access;
import org.treadwarm.web.security.Visitors;

/** The routes of the pages, each with who may use it; every form carries its secret. */
public final class Pages {
    private final Visitors visitors;
    private final LinkPages links;
    private final AccountPages account;
    private final PeoplePages people;
    private final KeyPages keys;
    private final AuditPages audit;
    private final IssuePages issuing;
    private final SheetPages sheets;
    private final SheetLinkPages sheetLinks;
    private final View view;
    private final EntryPages entry;
    private final JobPages jobs;
    private final PartPages parts;
    private final VersionPages versions;
    private final HistoryPages history;
    private final TransferPages files;
    private final QuickPages quick;
    private final ComputationPages computing;
    private final WallFootPages wallFeet;
    private final MethodPage method;
    private final SolvingAhead ahead;
    private final ContractPage contract;
    private final TablePages tables = new TablePages();

    public Pages(Store store, JobDesk desk, SheetDesk sheetDesk, Visitors visitors, Computations computations) {
        this.visitors = visitors;
        this.view = new View(visitors);
        this.entry = new EntryPages(store, visitors, view);
        this.versions = new VersionPages(desk, visitors, view);
        this.jobs = new JobPages(desk, sheetDesk, visitors, view, versions);
        this.files = new TransferPages(desk, visitors, view);
        this.history = new HistoryPages(desk, visitors, view);
        this.computing = new ComputationPages(computations, view);
        this.ahead = new SolvingAhead(desk, computations, computing);
        WrittenAnswers answers = new WrittenAnswers(view);
        this.parts = new PartPages(desk, visitors, view, versions, ahead, answers);
        this.links = new LinkPages(store, visitors, view);
        this.account = new AccountPages(store, visitors, view);
        this.people = new PeoplePages(store, visitors, view);
        this.keys = new KeyPages(store, visitors, view, Clock.systemUTC());
        this.audit = new AuditPages(store, view);
        this.issuing = new IssuePages(desk, sheetDesk, visitors, view);
        this.sheets = new SheetPages(sheetDesk, visitors, view);
        this.sheetLinks = new SheetLinkPages(store, visitors, view);
        this.quick = new QuickPages(desk, visitors, view, ahead, answers);
        this.method = new MethodPage(computations, view);
        this.contract = new ContractPage(visitors, view);
        this.wallFeet = new WallFootPages(desk, visitors, view, computations, computing);
    }

    /** Adds the routes. */
    public void routes(RoutesConfig routes) {
        routes.get("/sign-in", entry::signInForm, Access.ANYBODY);
        routes.post("/sign-in", form(entry::signIn), Access.ANYBODY);
        routes.post("/sign-out", form(entry::signOut), Access.ANYBODY);
        routes.get("/owner/{token}", entry::ownerForm, Access.ANYBODY);
        routes.post("/owner/{token}", form(entry::becomeOwner), Access.ANYBODY);
        routes.get("/link/{token}", links::show, Access.ANYBODY);
        routes.post("/link/{token}", form(links::use), Access.ANYBODY);
        routes.get("/", ctx -> ctx.redirect("/jobs", HttpStatus.SEE_OTHER), Access.ANYBODY);
        routes.get("/jobs", jobs::list, Access.SURVEYOR);
        routes.post("/jobs", form(jobs::create), Access.ESTIMATOR);
        routes.get("/jobs/{job}", ahead.before(jobs::show), Access.SURVEYOR);
        routes.post("/jobs/{job}", form(jobs::change), Access.SURVEYOR);
        routes.get("/jobs/{job}/history", history::list, Access.SURVEYOR);
        routes.get("/jobs/{job}/history/{n}", ahead.before(history::document, history::show, "/jobs"), Access.SURVEYOR);
        routes.post("/jobs/{job}/history/{n}/restore", form(history::restore), Access.SURVEYOR);
        routes.get("/jobs/{job}/files", files::show, Access.SURVEYOR);
        routes.get("/jobs/{job}/files/{file}", ahead.before(files::sized, files::download, "/jobs"), Access.SURVEYOR);
        routes.post("/jobs/{job}/files/{file}", withFile(files::read), Access.SURVEYOR);
        routes.post("/jobs/{job}/copy", form(jobs::copy), Access.ESTIMATOR);
        routes.post("/jobs/{job}/archive", form(jobs::archive), Access.ESTIMATOR);
        routes.post("/jobs/{job}/unarchive", form(jobs::bringBack), Access.ESTIMATOR);
        routes.get("/jobs/{job}/{part}/{name}", ahead.beforePart(parts::show), Access.SURVEYOR);
        routes.post("/jobs/{job}/{part}/{name}", form(parts::save), Access.SURVEYOR);
        routes.post("/jobs/{job}/{part}/{name}/versions", form(versions::settle), Access.SURVEYOR);
        routes.post("/jobs/{job}/{part}/{name}/preview", form(parts::preview), Access.SURVEYOR);
        routes.get("/jobs/{job}/rooms/{name}/wall-foot/{junction}", wallFeet::show, Access.SURVEYOR);
        routes.post("/jobs/{job}/rooms/{name}/wall-foot/{junction}", form(wallFeet::change), Access.SURVEYOR);
        routes.get("/jobs/{job}/rooms/{name}/wall-foot/{junction}/{id}", wallFeet::result, Access.SURVEYOR);
        routes.post("/jobs/{job}/rooms/{name}/wall-foot/{junction}/{id}", form(wallFeet::store), Access.SURVEYOR);
        routes.get("/computations/{id}", computing::show, Access.SURVEYOR);
        routes.post("/computations/{id}", form(computing::cancel), Access.SURVEYOR);
        Handler example = ahead.before(ctx -> Optional.of(QuickPages.start()), quick::show, "/jobs");
        routes.get("/one-room", example, Access.SURVEYOR);
        routes.get("/one-room/{id}", ahead.beforeTyped(quick::typed, quick::showTyped), Access.SURVEYOR);
        routes.post("/one-room", form(quick::change), Access.SURVEYOR);
        routes.post("/one-room/preview", form(quick::preview), Access.SURVEYOR);
        routes.post("/one-room/keep", form(quick::keep), Access.ESTIMATOR);
        routes.get(
                "/materials",
                ctx -> view.show(ctx, 200, "materials", tables.materials(ctx.queryParam("find"))),
                Access.SURVEYOR);
        routes.get("/reading-help", ctx -> view.show(ctx, 200, "reading-help", tables.readingHelp()), Access.SURVEYOR);
        routes.get("/api", contract::show, Access.SURVEYOR);
        routes.get("/method", method::show, Access.SURVEYOR);
        routes.post("/method", form(method::change), Access.SURVEYOR);
        sheets(routes);
        service(routes);
    }

    private void sheets(RoutesConfig routes) {
        routes.get("/jobs/{job}/issue", ahead.before(issuing::ask), Access.ESTIMATOR);
        routes.post("/jobs/{job}/issue", form(ahead.before(issuing::issue)), Access.ESTIMATOR);
        routes.get("/sheets", sheets::list, Access.SURVEYOR);
        routes.get("/sheets/{number}", ahead.before(sheets::survey, sheets::show, "/sheets"), Access.SURVEYOR);
        routes.get(
                "/sheets/{number}/verification",
                ahead.before(sheets::survey, sheets::verify, "/sheets"),
                Access.SURVEYOR);
        routes.get("/sheets/{number}/withdrawal", sheets::askWithdrawal, Access.ESTIMATOR);
        routes.post("/sheets/{number}/withdrawal", form(sheets::withdraw), Access.ESTIMATOR);
        routes.get("/sheets/{number}/links", sheetLinks::list, Access.ESTIMATOR);
        routes.post("/sheets/{number}/links", form(sheetLinks::create), Access.ESTIMATOR);
        routes.post("/sheets/{number}/links/{link}/revoke", form(sheetLinks::revoke), Access.ESTIMATOR);
        routes.get("/shared/{token}", sheetLinks::shared, Access.ANYBODY);
    }

    private void service(RoutesConfig routes) {
        routes.get("/account", account::show, Access.SURVEYOR);
        routes.post("/account/password", form(account::changePassword), Access.SURVEYOR);
        routes.post("/account/sessions/{session}/end", form(account::endSession), Access.SURVEYOR);
        routes.post("/account/sessions/end", form(account::endAllSessions), Access.SURVEYOR);
        routes.get("/people", people::list, Access.OWNER);
        routes.post("/people/invitations", form(people::invite), Access.OWNER);
        routes.post("/people/links/{link}/revoke", form(people::revoke), Access.OWNER);
        routes.post("/people/{person}/role", form(people::changeRole), Access.OWNER);
        routes.post("/people/{person}/password", form(people::resetPassword), Access.OWNER);
        routes.post("/people/{person}/close", form(people::close), Access.OWNER);
        routes.get("/keys", keys::list, Access.OWNER);
        routes.post("/keys", form(keys::create), Access.OWNER);
        routes.post("/keys/{key}/revoke", form(keys::revoke), Access.OWNER);
        routes.get("/audit", audit::list, Access.OWNER);
    }

    /** Shows a fault as a page. */
    public void fault(Context ctx, int status, String title) {
        view.show(ctx, status, "fault", Map.of("title", title, "status", status));
    }

    /** Tells somebody that this needs another role. */
    public void refuseRole(Context ctx, Role least) {
        String title = "This needs the role " + least.text();
        view.show(ctx, 403, "fault", Map.of("title", title, "status", 403, "role", true));
    }

    /** A form without files. */
    private Handler form(Handler handler) {
        return ctx -> {
            if (Multipart.isSent(ctx)) {
                fault(ctx, 415, "This form brings no files, so it is not sent as one that does");
            } else {
                ours(ctx, handler);
            }
        };
    }

    /** The form that may bring a table as a file. */
    private Handler withFile(Handler handler) {
        return ctx -> {
            OptionalInt refusal = Multipart.isSent(ctx) ? Multipart.refusal(ctx) : OptionalInt.empty();
            if (refusal.isEmpty()) {
                ours(ctx, handler);
                return;
            }
            Drain.rest(ctx);
            if (refusal.getAsInt() == 413) {
                files.refuseLarge(ctx);
            } else {
                fault(ctx, refusal.getAsInt(), "This form cannot be read; open the page again");
            }
        };
    }

    private void ours(Context ctx, Handler handler) throws Exception {
        if (visitors.acceptsForm(ctx)) {
            handler.handle(ctx);
        } else {
            fault(ctx, 403, "This form is not one of ours, or is too old; open the page again");
        }
    }
}
