package org.treadwarm.meter;

import java.util.List;
import java.util.concurrent.atomic.LongAdder;
import java.util.stream.Stream;

/** How long something took, each time it was done: how often within which bounds, and the sum. */
public final class Durations {
    private static final long[] BOUNDS_MICROSECONDS = {
        500,
        1_000,
        2_500,
        5_000,
        10_000,
        25_000,
        50_000,
        100_000,
        250_000,
        500_000,
        1_000_000,
        2_500_000,
        5_000_000,
        10_000_000
    };

    private final LongAdder[] counts = Stream.generate(LongAdder::new)
            .limit(BOUNDS_MICROSECONDS.length + 1L)
            .toArray(LongAdder[]::new);
    private final LongAdder nanoseconds = new LongAdder();

    /** So many were at most so long, those of the shorter bounds included. */
    public record Bucket(double seconds, long count) {}

    /**
     * All of it at one time.
     *
     * @param buckets from the shortest bound to the longest
     * @param count all, those beyond the longest bound included
     * @param seconds their sum
     */
    public record Reading(List<Bucket> buckets, long count, double seconds) {}

    /** Adds one. */
    public void add(long lasted) {
        int place = 0;
        while (place < BOUNDS_MICROSECONDS.length && lasted > BOUNDS_MICROSECONDS[place] * 1000) {
            place++;
        }
        counts[place].increment();
        nanoseconds.add(Math.max(0, lasted));
    }

    /** What was added so far. */
    public Reading read() {
        Bucket[] buckets = new Bucket[BOUNDS_MICROSECONDS.length];
        long sum = 0;
        for (int i = 0; i < buckets.length; i++) {
            sum += counts[i].sum();
            buckets[i] = new Bucket(BOUNDS_MICROSECONDS[i] / 1e6, sum);
        }
        return new Reading(List.of(buckets), sum + counts[buckets.length].sum(), nanoseconds.sum() / 1e9);
    }
}
