package org.treadwarm.web;

import static org.assertj.core.api.Assertions.assertThat;

import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CancellationException;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.atomic.AtomicLong;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.treadwarm.web.Computation.State;

/** Computations that pages wait for. */
class ComputationsTest {
    private static final Duration LONG = Duration.ofSeconds(30);

    private final AtomicLong clock = new AtomicLong();
    private final Computations computations = new Computations(clock::get);

    @AfterEach
    void stop() {
        computations.close();
    }

    private Optional<Computation> begin(Computation.Work work) {
        return computations.begin("a sum", id -> "/sums/" + id, "/sums", work);
    }

    /** Works until it is told to stop, as a solver does that asks at every step. */
    private static Computation.Work untilStopped(CountDownLatch running) {
        return (stopped, progress) -> {
            progress.accept(0.4);
            running.countDown();
            while (!stopped.getAsBoolean()) {
                Thread.onSpinWait();
            }
            throw new CancellationException("stopped");
        };
    }

    @Test
    void aResultIsFoundByItsIdAndKind() {
        Computation sum = begin((stopped, progress) -> 4).orElseThrow();

        assertThat(sum.await(LONG)).isEqualTo(new State.Done(4));
        assertThat(computations.result(sum.id(), Integer.class)).contains(4);
        assertThat(computations.result(sum.id(), String.class)).isEmpty();
        assertThat(computations.result("no such id", Integer.class)).isEmpty();
        assertThat(sum.then()).isEqualTo("/sums/" + sum.id());
    }

    @Test
    void cancellingStopsTheWork() throws InterruptedException {
        CountDownLatch running = new CountDownLatch(1);
        Computation sum = begin(untilStopped(running)).orElseThrow();
        running.await();

        assertThat(sum.state()).isEqualTo(new State.Running(0.4));
        sum.cancel();

        assertThat(sum.await(LONG)).isInstanceOf(State.Cancelled.class);
    }

    @Test
    void whatCannotBeComputedSaysWhy() {
        Computation sum = begin((stopped, progress) -> {
                    throw new IllegalStateException("the sum has no end");
                })
                .orElseThrow();

        assertThat(sum.await(LONG)).isEqualTo(new State.Failed("the sum has no end"));
    }

    @Test
    void aFaultLeavesNobodyWaiting() {
        Computation sum = new Computation("1", "", "", "", LONG, (stopped, progress) -> {
            throw new UnsupportedOperationException("a fault");
        });
        try {
            sum.run();
        } catch (UnsupportedOperationException told) {
            assertThat(told).hasMessage("a fault");
        }

        assertThat(sum.await(LONG)).isInstanceOf(State.Failed.class);
    }

    @Test
    void noComputationTakesForEver() {
        Computation sum = new Computation("1", "", "", "", Duration.ZERO, untilStopped(new CountDownLatch(1)));

        sum.run();

        assertThat(sum.state()).isInstanceOf(State.Failed.class);
    }

    @Test
    void tooManyAreRefusedAndAWaitingOneIsCancelledAtOnce() {
        List<Computation> begun = new ArrayList<>();
        CountDownLatch running = new CountDownLatch(1);
        for (int i = 0; i < Computations.AT_ONCE + Computations.MOST_WAITING; i++) {
            begun.add(begin(untilStopped(running)).orElseThrow());
        }

        assertThat(begin(untilStopped(running))).isEmpty();
        Computation last = begun.get(begun.size() - 1);
        last.cancel();
        assertThat(last.state()).isInstanceOf(State.Cancelled.class);
    }

    @Test
    void oldOnesAreForgottenAndStopped() {
        Computation old = begin(untilStopped(new CountDownLatch(1))).orElseThrow();
        clock.addAndGet(Computations.KEPT.toNanos());

        assertThat(computations.find(old.id())).isEmpty();
        assertThat(old.await(LONG)).isInstanceOf(State.Cancelled.class);
    }
}
