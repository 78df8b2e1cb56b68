package org.treadwarm.web.pages;

import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.time.Duration;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.store.OwnerCreation;
import org.treadwarm.store.PasswordRule;
import org.treadwarm.store.PersonName;
import org.treadwarm.store.SignIn;
import org.treadwarm.store.Store;
import org.treadwarm.web.security.Visitors;

/** The way in: sign-in, sign-out, and the link that makes its visitor the owner. */
final class EntryPages {
    private final Store store;
    private final Visitors visitors;
    private final View view;

    EntryPages(Store store, Visitors visitors, View view) {
        this.store = store;
        this.visitors = visitors;
        this.view = view;
    }

    void signInForm(Context ctx) {
        signInForm(ctx, 200, "", "");
    }

    private void signInForm(Context ctx, int status, String name, String error) {
        String back = Optional.ofNullable(ctx.queryParam("back")).orElse("/jobs");
        view.show(
                ctx,
                status,
                "sign-in",
                Map.of(
                        "name",
                        name,
                        "error",
                        error,
                        "back",
                        isLocal(back) ? back : "/jobs",
                        "noOwner",
                        !store.people().hasOwner()));
    }

    void signIn(Context ctx) {
        String name = text(ctx, "name");
        SignIn result = store.people().signIn(name, text(ctx, "password"), visitors.address(ctx));
        if (result instanceof SignIn.SignedIn signedIn) {
            visitors.begin(ctx, store.sessions().start(signedIn.person()));
            String back = text(ctx, "back");
            ctx.redirect(isLocal(back) ? back : "/jobs", HttpStatus.SEE_OTHER);
        } else if (result instanceof SignIn.Wait wait) {
            signInForm(ctx, 429, name, wait(ctx, wait.remaining()));
        } else {
            signInForm(ctx, 422, name, "The name or the password is not right.");
        }
    }

    /** Tells the browser, and in words, how long to wait. */
    static String wait(Context ctx, Duration remaining) {
        long seconds = Math.max(1, remaining.plusMillis(999).toSeconds());
        ctx.header("Retry-After", Long.toString(seconds));
        return "Too many tries. Wait " + (seconds == 1 ? "a second" : seconds + " seconds") + ", then try again.";
    }

    void signOut(Context ctx) {
        visitors.end(ctx);
        ctx.redirect("/sign-in", HttpStatus.SEE_OTHER);
    }

    void ownerForm(Context ctx) {
        boolean open = store.people().invitationIsOpen(ctx.pathParam("token"));
        ownerForm(ctx, open ? 200 : 404, "", open, open ? List.of() : List.of(linkRefused()));
    }

    private void ownerForm(Context ctx, int status, String name, boolean open, List<ErrorView> errors) {
        Map<String, Object> model = new HashMap<>();
        model.put("token", ctx.pathParam("token"));
        model.put("name", name);
        model.put("errors", errors);
        errors.forEach(error -> model.put(error.target() + "Error", error.message()));
        model.put("open", open);
        view.show(ctx, status, "owner", model);
    }

    private static ErrorView linkRefused() {
        return new ErrorView(
                "content",
                "",
                "This link is spent or too old. Start the program again for a new one, if there is no owner yet.",
                "");
    }

    void becomeOwner(Context ctx) {
        String name = text(ctx, "name");
        String password = text(ctx, "password");
        List<ErrorView> errors = new ArrayList<>();
        if (!PersonName.accepts(name)) {
            errors.add(new ErrorView("name", "", "A name has 1 to 100 characters.", ""));
        }
        if (!PasswordRule.accepts(password)) {
            errors.add(new ErrorView("password", "", "A password has 10 to 200 characters.", ""));
        }
        if (!password.equals(text(ctx, "again"))) {
            errors.add(new ErrorView("again", "", "The two passwords are not the same.", ""));
        }
        if (!errors.isEmpty() && store.people().invitationIsOpen(ctx.pathParam("token"))) {
            ownerForm(ctx, 422, name, true, errors);
            return;
        }
        OwnerCreation result = store.people().createOwner(ctx.pathParam("token"), name, password);
        if (result instanceof OwnerCreation.Created created) {
            visitors.begin(ctx, store.sessions().start(created.owner()));
            ctx.redirect("/jobs", HttpStatus.SEE_OTHER);
        } else {
            ownerForm(ctx, 404, name, false, List.of(linkRefused()));
        }
    }

    /** A path of ours, so that a sign-in never leads elsewhere. */
    private static boolean isLocal(String path) {
        return path.startsWith("/") && !path.startsWith("//") && !path.contains("\\") && !path.contains(":");
    }

    static String text(Context ctx, String field) {
        return Optional.ofNullable(ctx.formParam(field)).orElse("");
    }
}
