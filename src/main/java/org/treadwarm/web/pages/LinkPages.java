package org.treadwarm.web.pages;

import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.store.Link;
import org.treadwarm.store.LinkUse;
import org.treadwarm.store.Store;
import org.treadwarm.web.security.Visitors;

/** What links that work once lead to: a new account, or a new password. Looking at one does not spend it. */
final class LinkPages {
    private final Store store;
    private final Visitors visitors;
    private final View view;

    LinkPages(Store store, Visitors visitors, View view) {
        this.store = store;
        this.visitors = visitors;
        this.view = view;
    }

    void show(Context ctx) {
        Optional<Link> link = store.links().find(ctx.pathParam("token"));
        if (link.isEmpty()) {
            refused(ctx);
        } else {
            show(ctx, 200, link.get(), link.get().forWhom(), new FormErrors());
        }
    }

    private void refused(Context ctx) {
        Map<String, Object> model = new FormErrors()
                .add("content", "This link is spent, revoked or too old. Ask an owner for a new one.")
                .model();
        model.put("open", false);
        model.put("title", "A link that no longer works");
        view.show(ctx, 404, "link", model);
    }

    private void show(Context ctx, int status, Link link, String name, FormErrors errors) {
        Map<String, Object> model = errors.model();
        model.put("open", true);
        boolean joining = link.purpose() instanceof Link.Join;
        model.put("joining", joining);
        model.put("title", joining ? "Join" : "Choose a new password");
        model.put("role", link.purpose() instanceof Link.Join join ? join.role().text() : "");
        model.put("token", ctx.pathParam("token"));
        model.put("name", name);
        view.show(ctx, status, "link", model);
    }

    void use(Context ctx) {
        String token = ctx.pathParam("token");
        Optional<Link> link = store.links().find(token);
        if (link.isEmpty()) {
            refused(ctx);
            return;
        }
        boolean joining = link.get().purpose() instanceof Link.Join;
        String name = joining ? EntryPages.text(ctx, "name") : link.get().forWhom();
        String password = EntryPages.text(ctx, "password");
        FormErrors errors =
                new FormErrors().checkName("name", name).checkPassword(password, EntryPages.text(ctx, "again"));
        if (!errors.isEmpty()) {
            show(ctx, 422, link.get(), name, errors);
            return;
        }
        LinkUse use = joining
                ? store.links().join(token, name, password)
                : store.links().changePassword(token, password);
        if (use instanceof LinkUse.Done done) {
            visitors.begin(ctx, store.sessions().start(done.person()));
            ctx.redirect("/jobs", HttpStatus.SEE_OTHER);
        } else if (use instanceof LinkUse.NameTaken) {
            show(
                    ctx,
                    422,
                    link.get(),
                    name,
                    errors.add("name", "Somebody here has, or had, this name. Choose another."));
        } else {
            refused(ctx);
        }
    }
}
