package org.treadwarm.physics.section;

import java.util.concurrent.ForkJoinTask;

/**
 * Runs work on stretches of a range, on two threads where it pays. A stretch never looks at what another one writes, so the
 * results do not depend on how the range is cut.
 */
final class Workers {
    /** Below this many cells, handing half of the work over takes longer than the work. */
    static final int SMALLEST_SHARED = 100_000;

    private Workers() {}

    /** Work on the indices from..to, the last one excluded. */
    @FunctionalInterface
    interface Stretch {
        void over(int from, int to);
    }

    /** Runs the work over 0..size. */
    static void run(int size, int cells, Stretch work) {
        if (cells < SMALLEST_SHARED || size < 2) {
            work.over(0, size);
            return;
        }
        int half = size / 2;
        ForkJoinTask<?> other = ForkJoinTask.adapt(() -> work.over(half, size)).fork();
        work.over(0, half);
        other.join();
    }
}
