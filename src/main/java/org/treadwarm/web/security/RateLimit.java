package org.treadwarm.web.security;

import io.javalin.http.Context;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.ConcurrentMap;
import java.util.function.LongSupplier;
import org.treadwarm.store.ApiKey;
import org.treadwarm.web.Problems;
import org.treadwarm.web.security.TokenBucket.Taken;

/**
 * At most so many requests a minute with one API key. Each server counts for itself. The headers RateLimit and
 * RateLimit-Policy are those of the IETF draft httpapi-ratelimit-headers, from memory.
 */
public final class RateLimit {
    private final int perMinute;
    private final LongSupplier nanoseconds;
    private final ConcurrentMap<String, TokenBucket> buckets = new ConcurrentHashMap<>();

    /**
     * A limit for every key.
     *
     * @param perMinute at least 1
     * @param nanoseconds a clock that only moves on
     */
    public RateLimit(int perMinute, LongSupplier nanoseconds) {
        this.perMinute = perMinute;
        this.nanoseconds = nanoseconds;
    }

    /** Lets a request with a key on to its route, or answers it. One without a key passes. */
    public void check(Context ctx) {
        KeyGuard.keyIfAny(ctx).ifPresent(key -> check(ctx, key));
    }

    private void check(Context ctx, ApiKey key) {
        Taken taken = buckets.computeIfAbsent(key.id(), id -> new TokenBucket(perMinute, nanoseconds))
                .take();
        ctx.header("RateLimit-Policy", "\"key\";q=" + perMinute + ";w=60");
        ctx.header("RateLimit", "\"key\";r=" + taken.left() + ";t=" + taken.secondsToFull());
        if (!taken.granted()) {
            ctx.header("Retry-After", Integer.toString(Math.max(1, taken.secondsToNext())));
            Problems.plain(
                    ctx,
                    429,
                    "rate-limit",
                    "Too many requests with this key",
                    "A key may send " + perMinute + " requests a minute; the next may come in "
                            + Math.max(1, taken.secondsToNext()) + " s.");
            ctx.skipRemainingHandlers();
        }
    }
}
