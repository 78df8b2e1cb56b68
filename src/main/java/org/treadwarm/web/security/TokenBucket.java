package org.treadwarm.web.security;

import java.util.function.LongSupplier;

/** Lets so many through a minute, evenly, and after a pause up to a minute's worth at once. */
final class TokenBucket {
    private static final double NANOSECONDS_PER_MINUTE = 60e9;

    private final int perMinute;
    private final LongSupplier nanoseconds;
    private double tokens;
    private long last;

    /**
     * A full one.
     *
     * @param nanoseconds a clock that only moves on
     */
    TokenBucket(int perMinute, LongSupplier nanoseconds) {
        this.perMinute = perMinute;
        this.nanoseconds = nanoseconds;
        this.tokens = perMinute;
        this.last = nanoseconds.getAsLong();
    }

    /**
     * What one request got.
     *
     * @param granted whether it may pass
     * @param left how many more might pass now
     * @param secondsToNext in how many seconds, rounded up, one may pass; 0 for now
     * @param secondsToFull in how many seconds, rounded up, a minute's worth may pass at once
     */
    record Taken(boolean granted, int left, int secondsToNext, int secondsToFull) {}

    synchronized Taken take() {
        long now = nanoseconds.getAsLong();
        tokens = Math.min(perMinute, tokens + (now - last) / NANOSECONDS_PER_MINUTE * perMinute);
        last = now;
        boolean granted = tokens >= 1;
        tokens -= granted ? 1 : 0;
        return new Taken(granted, (int) tokens, seconds(1 - tokens), seconds(perMinute - tokens));
    }

    private int seconds(double missing) {
        // A thousandth of a second is less than rounding of the sum of tokens may come to.
        return (int) Math.ceil(Math.max(0, missing / perMinute * 60 - 1e-3));
    }
}
