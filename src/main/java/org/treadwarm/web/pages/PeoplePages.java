package org.treadwarm.web.pages;

import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.store.Link;
import org.treadwarm.store.Links;
import org.treadwarm.store.Member;
import org.treadwarm.store.NewLink;
import org.treadwarm.store.Person;
import org.treadwarm.store.Role;
import org.treadwarm.store.Store;
import org.treadwarm.store.TeamChange;
import org.treadwarm.web.security.Visitors;

/** The people of the firm, for its owners: invitations, roles, new passwords, closed accounts. */
final class PeoplePages {
    private static final Map<String, String> DONE = Map.of(
            "role", "The role was changed. It holds from the next page on.",
            "close", "The account is closed, and its sessions have ended.",
            "revoke", "The link no longer works.");

    private final Store store;
    private final Visitors visitors;
    private final View view;

    PeoplePages(Store store, Visitors visitors, View view) {
        this.store = store;
        this.visitors = visitors;
        this.view = view;
    }

    /** A person as a row. */
    public record Row(String id, String name, Role role, boolean self, String lastSeen, String closed) {
        static Row of(Member member, Person self) {
            return new Row(
                    member.person().id(),
                    member.person().name(),
                    member.person().role(),
                    member.person().id().equals(self.id()),
                    member.lastSeen().map(Moments::minute).orElse("not yet"),
                    member.closed().map(Moments::minute).orElse(""));
        }
    }

    /** A link as a row. */
    public record LinkRow(String id, String forWhom, String purpose, String madeBy, String expires) {
        static LinkRow of(Link link) {
            String purpose = link.purpose() instanceof Link.Join join
                    ? "to join as " + join.role().text()
                    : "to choose a new password";
            return new LinkRow(link.id(), link.forWhom(), purpose, link.madeBy(), Moments.minute(link.expiresAt()));
        }
    }

    void list(Context ctx) {
        show(ctx, 200, new FormErrors(), Optional.empty());
    }

    private void show(Context ctx, int status, FormErrors errors, Optional<NewLink> fresh) {
        Person self = visitors.session(ctx).orElseThrow().person();
        Map<String, Object> model = errors.model();
        List<Row> rows =
                store.team().list().stream().map(member -> Row.of(member, self)).toList();
        model.put("people", rows.stream().filter(row -> row.closed().isEmpty()).toList());
        model.put("closed", rows.stream().filter(row -> !row.closed().isEmpty()).toList());
        model.put("links", store.links().list().stream().map(LinkRow::of).toList());
        model.put("roles", Role.values());
        model.put("name", status == 422 ? EntryPages.text(ctx, "name") : "");
        model.put("role", status == 422 ? EntryPages.text(ctx, "role") : Role.SURVEYOR.text());
        model.put("fresh", fresh.isPresent());
        fresh.ifPresent(made -> {
            model.put("freshFor", made.link().forWhom());
            model.put("freshUntil", Moments.minute(made.link().expiresAt()));
            model.put("freshAddress", visitors.origin(ctx) + "/link/" + made.token());
        });
        model.put(
                "done",
                DONE.getOrDefault(Optional.ofNullable(ctx.queryParam("done")).orElse(""), ""));
        view.show(ctx, status, "people", model);
    }

    void invite(Context ctx) {
        String name = EntryPages.text(ctx, "name");
        Optional<Role> role = role(ctx);
        FormErrors errors = new FormErrors().checkName("name", name);
        if (role.isEmpty()) {
            errors.add("role", "The role is one of owner, estimator and surveyor.");
        }
        if (errors.isEmpty()) {
            show(ctx, 200, errors, Optional.of(store.links().invite(name, role.orElseThrow(), who(ctx))));
        } else {
            show(ctx, 422, errors, Optional.empty());
        }
    }

    void revoke(Context ctx) {
        if (store.links().revoke(ctx.pathParam("link"), who(ctx))) {
            done(ctx, "revoke");
        } else {
            JobPages.missing(ctx, view);
        }
    }

    void changeRole(Context ctx) {
        String id = ctx.pathParam("person");
        Optional<Role> role = role(ctx);
        if (role.isEmpty()) {
            FormErrors errors = new FormErrors();
            show(
                    ctx,
                    422,
                    errors.add("role-" + id, "The role is one of owner, estimator and surveyor."),
                    Optional.empty());
        } else {
            answer(ctx, store.team().changeRole(id, role.get(), who(ctx)), "role");
        }
    }

    void close(Context ctx) {
        answer(ctx, store.team().close(ctx.pathParam("person"), who(ctx)), "close");
    }

    private void answer(Context ctx, TeamChange change, String done) {
        if (change instanceof TeamChange.Done && ctx.pathParam("person").equals(selfId(ctx))) {
            // The page of people may be closed to somebody who has changed the own role.
            ctx.redirect("/account", HttpStatus.SEE_OTHER);
        } else if (change instanceof TeamChange.Done) {
            done(ctx, done);
        } else if (change instanceof TeamChange.LastOwner) {
            String field = "role-" + ctx.pathParam("person");
            String why = "This is the last owner. Make somebody else an owner first.";
            show(ctx, 422, new FormErrors().add(field, why), Optional.empty());
        } else {
            JobPages.missing(ctx, view);
        }
    }

    void resetPassword(Context ctx) {
        Optional<NewLink> made = store.links().resetPassword(ctx.pathParam("person"), who(ctx), Links.VALID_FOR);
        if (made.isEmpty()) {
            JobPages.missing(ctx, view);
        } else {
            show(ctx, 200, new FormErrors(), made);
        }
    }

    private static void done(Context ctx, String what) {
        ctx.redirect("/people?done=" + what, HttpStatus.SEE_OTHER);
    }

    private static Optional<Role> role(Context ctx) {
        String text = EntryPages.text(ctx, "role");
        return Arrays.stream(Role.values())
                .filter(role -> role.text().equals(text))
                .findFirst();
    }

    private String selfId(Context ctx) {
        return visitors.session(ctx).orElseThrow().person().id();
    }

    private String who(Context ctx) {
        return visitors.session(ctx).orElseThrow().person().name();
    }
}
