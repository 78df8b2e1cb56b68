package org.treadwarm.web.pages;

import io.javalin.http.Context;
import io.javalin.http.HttpStatus;
import java.time.Clock;
import java.time.Instant;
import java.util.Arrays;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.store.ApiKey;
import org.treadwarm.store.KeyTerm;
import org.treadwarm.store.NewApiKey;
import org.treadwarm.store.Scope;
import org.treadwarm.store.Store;
import org.treadwarm.web.security.Visitors;

/** The keys of other programs, for owners: one for each system, so that each can be ended by itself. */
final class KeyPages {
    private static final int LONGEST_NAME = 100;

    private final Store store;
    private final Visitors visitors;
    private final View view;
    private final Clock clock;

    KeyPages(Store store, Visitors visitors, View view, Clock clock) {
        this.store = store;
        this.visitors = visitors;
        this.view = view;
        this.clock = clock;
    }

    /** A key as a row. */
    public record Row(String id, String name, String scope, String made, String lastUse, String until, boolean works) {
        static Row of(ApiKey key, Instant now) {
            return new Row(
                    key.id(),
                    key.name(),
                    key.scope().text(),
                    Moments.minute(key.createdAt()),
                    key.lastUsed().map(Moments::minute).orElse("never"),
                    key.expiresAt().map(KeyTerm::lastDay).map(Object::toString).orElse("no end"),
                    key.works(now));
        }
    }

    void list(Context ctx) {
        show(ctx, 200, new FormErrors(), Optional.empty());
    }

    private void show(Context ctx, int status, FormErrors errors, Optional<NewApiKey> fresh) {
        Map<String, Object> model = errors.model();
        model.put(
                "keys",
                store.keys().list().stream()
                        .map(key -> Row.of(key, clock.instant()))
                        .toList());
        model.put("scopes", Scope.values());
        boolean again = status == 422;
        model.put("name", again ? EntryPages.text(ctx, "name") : "");
        model.put("scope", again ? EntryPages.text(ctx, "scope") : Scope.SIZE.text());
        model.put("until", again ? EntryPages.text(ctx, "until") : "");
        model.put("fresh", fresh.isPresent());
        fresh.ifPresent(made -> {
            model.put("freshName", made.key().name());
            model.put("freshToken", made.token());
        });
        model.put("done", "revoke".equals(ctx.queryParam("done")) ? "The key was revoked." : "");
        view.show(ctx, status, "keys", model);
    }

    void create(Context ctx) {
        String name = EntryPages.text(ctx, "name").strip();
        String until = EntryPages.text(ctx, "until").strip();
        FormErrors errors = new FormErrors();
        if (name.isEmpty() || name.length() > LONGEST_NAME || name.chars().anyMatch(Character::isISOControl)) {
            errors.add("name", "The name of a system has 1 to " + LONGEST_NAME + " characters.");
        }
        Optional<Scope> scope = Arrays.stream(Scope.values())
                .filter(each -> each.text().equals(EntryPages.text(ctx, "scope")))
                .findFirst();
        if (scope.isEmpty()) {
            errors.add("scope", "The scope is one of size, read and write.");
        }
        Optional<Instant> end = until.isEmpty() ? Optional.empty() : KeyTerm.endOf(until, clock.instant());
        if (!until.isEmpty() && end.isEmpty()) {
            errors.add("until", "The last day is " + KeyTerm.ALLOWED + ".");
        }
        if (errors.isEmpty()) {
            NewApiKey made = store.keys().create(name, scope.orElseThrow(), end, who(ctx));
            show(ctx, 200, errors, Optional.of(made));
        } else {
            show(ctx, 422, errors, Optional.empty());
        }
    }

    void revoke(Context ctx) {
        if (store.keys().revoke(ctx.pathParam("key"), who(ctx))) {
            ctx.redirect("/keys?done=revoke", HttpStatus.SEE_OTHER);
        } else {
            JobPages.missing(ctx, view);
        }
    }

    private String who(Context ctx) {
        return visitors.session(ctx).orElseThrow().person().name();
    }
}
