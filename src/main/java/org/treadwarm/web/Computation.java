package org.treadwarm.web;

import java.time.Duration;
import java.util.concurrent.CancellationException;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.TimeUnit;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;

/** A computation that may take longer than a page should, with how far it is. It is told apart by its id, which nobody can guess. */
public final class Computation {
    private final String id;
    private final String title;
    private final String then;
    private final String back;
    private final Work work;
    private final long longestNanos;
    private final CountDownLatch ended = new CountDownLatch(1);
    private volatile State state = new State.Running(0);
    private volatile boolean cancelled;
    private volatile boolean started;
    private volatile long begun;

    /** What is computed. */
    @FunctionalInterface
    public interface Work {
        /**
         * Computes it.
         *
         * @param stopped to be asked often whether to give up
         * @param progress to be told what share is done
         * @throws CancellationException when told to give up
         * @throws IllegalStateException or IllegalArgumentException with a sentence for people when there is no answer
         */
        Object run(BooleanSupplier stopped, DoubleConsumer progress);
    }

    /** How far it is. */
    public sealed interface State {
        /** Waiting or running; the share that is done, 0 to 1. */
        record Running(double done) implements State {}

        /** Done, with its result. */
        record Done(Object result) implements State {}

        /** Ended without a result, for a reason in words. */
        record Failed(String reason) implements State {}

        /** Cancelled by somebody. */
        record Cancelled() implements State {}
    }

    Computation(String id, String title, String then, String back, Duration longest, Work work) {
        this.id = id;
        this.title = title;
        this.then = then;
        this.back = back;
        this.longestNanos = longest.toNanos();
        this.work = work;
    }

    /** Runs it on the calling thread, unless it was cancelled before. */
    void run() {
        begun = System.nanoTime();
        started = true;
        try {
            if (cancelled) {
                throw new CancellationException("cancelled before it began");
            }
            end(new State.Done(work.run(this::mustStop, this::tell)));
        } catch (CancellationException e) {
            end(
                    cancelled
                            ? new State.Cancelled()
                            : new State.Failed("It was not done within " + TimeUnit.NANOSECONDS.toSeconds(longestNanos)
                                    + " seconds, so it was given up"));
        } catch (IllegalStateException | IllegalArgumentException e) {
            end(new State.Failed(e.getMessage()));
        } finally {
            // An error leaves no result; whoever waits must not wait for ever.
            end(new State.Failed("A fault of the program ended it"));
        }
    }

    private synchronized void end(State last) {
        if (state instanceof State.Running) {
            state = last;
        }
        ended.countDown();
    }

    private boolean mustStop() {
        return cancelled || System.nanoTime() - begun > longestNanos;
    }

    private synchronized void tell(double share) {
        if (state instanceof State.Running) {
            state = new State.Running(Math.max(0, Math.min(1, share)));
        }
    }

    /** Asks it to stop; it does so at its next step, or at once where it has not begun. */
    public void cancel() {
        cancelled = true;
        if (!started) {
            end(new State.Cancelled());
        }
    }

    /** Waits until it has ended, for so long at most, and says how far it is. */
    public State await(Duration most) {
        try {
            ended.await(most.toMillis(), TimeUnit.MILLISECONDS);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
        return state;
    }

    /** How far it is. */
    public State state() {
        return state;
    }

    /** Its id. */
    public String id() {
        return id;
    }

    /** What is computed, in a few words. */
    public String title() {
        return title;
    }

    /** Address of the page that shows the result. */
    public String then() {
        return then;
    }

    /** Address of the page that it was asked for on. */
    public String back() {
        return back;
    }
}
