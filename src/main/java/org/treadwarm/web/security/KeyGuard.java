package org.treadwarm.web.security;

import io.javalin.http.Context;
import java.time.Duration;
import java.time.Instant;
import java.util.Objects;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.ConcurrentMap;
import org.treadwarm.store.ApiKey;
import org.treadwarm.store.ApiKeys;
import org.treadwarm.store.Scope;
import org.treadwarm.web.Problems;

/** Asks API clients for their key. A found key is remembered for a few seconds, since a client sends many requests. */
public final class KeyGuard {
    private static final long REMEMBERED = Duration.ofSeconds(3).toNanos();
    private static final int MOST_REMEMBERED = 1000;
    private static final int LONGEST_TOKEN = 200;
    private static final String KEY = "key";

    private final ApiKeys keys;
    private final ConcurrentMap<String, Known> known = new ConcurrentHashMap<>();

    private record Known(ApiKey key, long since) {}

    public KeyGuard(ApiKeys keys) {
        this.keys = keys;
    }

    /** Whether the request has a key that may do what needs a scope; if not, the refusal is written. */
    boolean admit(Context ctx, Scope needed) {
        String header = ctx.header("Authorization");
        if (header == null || !header.regionMatches(true, 0, "Bearer ", 0, 7)) {
            refuse(ctx, "key", "An API key is needed", "Send it as \"Authorization: Bearer tw_...\".");
            return false;
        }
        String token = header.substring(7).strip();
        Optional<ApiKey> key = find(token);
        if (key.isEmpty()) {
            refuse(ctx, token);
            return false;
        }
        if (!key.get().scope().allows(needed)) {
            Problems.plain(
                    ctx,
                    403,
                    "scope",
                    "The key's scope does not reach so far",
                    "This needs the scope " + needed.text() + "; the key has "
                            + key.get().scope().text() + ".");
            return false;
        }
        ctx.attribute(KEY, key.get());
        return true;
    }

    /** The key with which a request was let in; empty on routes that need none. */
    static Optional<ApiKey> keyIfAny(Context ctx) {
        return Optional.ofNullable(ctx.attribute(KEY));
    }

    /** The key with which a request was let in to a route that needs one. */
    public static ApiKey key(Context ctx) {
        return Objects.requireNonNull(ctx.attribute(KEY), "the route is open to requests without a key");
    }

    private void refuse(Context ctx, String token) {
        Optional<ApiKey> dead = token.length() > LONGEST_TOKEN ? Optional.empty() : keys.known(token);
        if (dead.isEmpty()) {
            refuse(ctx, "key", "An API key is needed", "This API key is not known here.");
        } else if (dead.get().revokedAt().isPresent()) {
            refuse(
                    ctx,
                    "key-revoked",
                    "The API key was revoked",
                    "It was revoked at " + dead.get().revokedAt().get() + ".");
        } else {
            String end = dead.get().expiresAt().map(Instant::toString).orElse("an unknown time");
            refuse(ctx, "key-expired", "The API key has expired", "It worked until " + end + ".");
        }
    }

    private static void refuse(Context ctx, String kind, String title, String detail) {
        ctx.header("WWW-Authenticate", "Bearer realm=\"treadwarm\"");
        Problems.plain(ctx, 401, kind, title, detail);
    }

    private Optional<ApiKey> find(String token) {
        long now = System.nanoTime();
        Known remembered = known.get(token);
        if (remembered != null && now - remembered.since() < REMEMBERED) {
            return Optional.of(remembered.key());
        }
        Optional<ApiKey> found = token.length() > LONGEST_TOKEN ? Optional.empty() : keys.find(token);
        if (found.isPresent()) {
            if (known.size() >= MOST_REMEMBERED) {
                known.clear();
            }
            known.put(token, new Known(found.get(), now));
        } else {
            known.remove(token);
        }
        return found;
    }
}
