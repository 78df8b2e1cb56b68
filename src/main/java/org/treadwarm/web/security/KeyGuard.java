package org.treadwarm.web.security;

import io.javalin.http.Context;
import java.time.Duration;
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

    private final ApiKeys keys;
    private final ConcurrentMap<String, Known> known = new ConcurrentHashMap<>();

    private record Known(ApiKey key, long since) {}

    public KeyGuard(ApiKeys keys) {
        this.keys = keys;
    }

    /**
     * The key of a request that may do what needs a scope.
     *
     * @return empty when the refusal has been written already
     */
    public Optional<ApiKey> admit(Context ctx, Scope needed) {
        String header = ctx.header("Authorization");
        if (header == null || !header.regionMatches(true, 0, "Bearer ", 0, 7)) {
            refuse(ctx, "An API key is needed: send it as \"Authorization: Bearer tw_...\".");
            return Optional.empty();
        }
        Optional<ApiKey> key = find(header.substring(7).strip());
        if (key.isEmpty()) {
            refuse(ctx, "This API key is not known here, or was revoked.");
        } else if (!key.get().scope().allows(needed)) {
            Problems.plain(
                    ctx,
                    403,
                    "scope",
                    "The key's scope does not reach so far",
                    "This needs the scope " + needed.name().toLowerCase(java.util.Locale.ROOT) + "; the key has "
                            + key.get().scope().name().toLowerCase(java.util.Locale.ROOT) + ".");
            return Optional.empty();
        }
        return key;
    }

    private static void refuse(Context ctx, String detail) {
        ctx.header("WWW-Authenticate", "Bearer realm=\"treadwarm\"");
        Problems.plain(ctx, 401, "key", "An API key is needed", detail);
    }

    private Optional<ApiKey> find(String token) {
        long now = System.nanoTime();
        Known remembered = known.get(token);
        if (remembered != null && now - remembered.since() < REMEMBERED) {
            return Optional.of(remembered.key());
        }
        Optional<ApiKey> found = token.length() > 200 ? Optional.empty() : keys.find(token);
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
