package org.treadwarm.bench.load;

import java.util.Arrays;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.LongAdder;
import java.util.concurrent.locks.LockSupport;
import java.util.function.Supplier;

/**
 * Sends requests at times set beforehand, whether earlier ones are answered or not, and counts each from the time it was due:
 * people and systems do not wait for each other's answers before they ask.
 */
final class OpenLoop {
    private static final long SECOND = 1_000_000_000;

    /** How long the last answers are waited for. */
    private static final int PATIENCE_SECONDS = 30;

    private OpenLoop() {}

    /** What came of it; times in milliseconds from when a request was due to its answer. */
    record Result(double rate, int sent, long failed, double median, double p99, double longest) {
        /** Whether the rate was held: nothing failed and 99 of 100 answers came within so many milliseconds. */
        boolean held(double milliseconds) {
            return failed == 0 && p99 < milliseconds;
        }
    }

    /**
     * Sends for so many seconds.
     *
     * @param request sends one and completes with whether the answer was right
     */
    static Result run(double rate, int seconds, Supplier<CompletableFuture<Boolean>> request)
            throws InterruptedException {
        int count = (int) (rate * seconds);
        long[] lasted = new long[count];
        LongAdder failed = new LongAdder();
        CountDownLatch answers = new CountDownLatch(count);
        long begin = System.nanoTime();
        for (int i = 0; i < count; i++) {
            long due = begin + (long) (i * (SECOND / rate));
            while (System.nanoTime() < due) {
                LockSupport.parkNanos(due - System.nanoTime());
            }
            int index = i;
            request.get().whenComplete((right, fault) -> {
                lasted[index] = System.nanoTime() - due;
                if (fault != null || !right) {
                    failed.increment();
                }
                answers.countDown();
            });
        }
        boolean all = answers.await(PATIENCE_SECONDS, TimeUnit.SECONDS);
        long[] sorted = lasted.clone();
        Arrays.sort(sorted);
        return new Result(
                rate,
                count,
                failed.sum() + (all ? 0 : answers.getCount()),
                sorted[count / 2] / 1e6,
                sorted[(int) (0.99 * (count - 1))] / 1e6,
                sorted[count - 1] / 1e6);
    }
}
