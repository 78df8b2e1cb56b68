package org.treadwarm.web;

import java.security.SecureRandom;
import java.time.Duration;
import java.util.ArrayList;
import java.util.Base64;
import java.util.Iterator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ArrayBlockingQueue;
import java.util.concurrent.RejectedExecutionException;
import java.util.concurrent.ThreadPoolExecutor;
import java.util.concurrent.TimeUnit;
import java.util.function.LongSupplier;
import java.util.function.UnaryOperator;

/** The computations that pages wait for: few at once, each bounded in time, found again by their ids, forgotten after minutes. */
public final class Computations implements AutoCloseable {
    /** So long a page waits before it shows how far the computation is; half of what nobody minds, as a page takes time too. */
    public static final Duration PATIENCE = Duration.ofMillis(250);

    static final int AT_ONCE = 2;
    static final int MOST_WAITING = 16;
    static final Duration LONGEST = Duration.ofSeconds(120);
    static final Duration KEPT = Duration.ofMinutes(10);
    private static final int MOST_KEPT = 200;
    private static final SecureRandom RANDOM = new SecureRandom();

    /** A computation and when it was begun. */
    private record Entry(Computation computation, long nanos) {}

    private final Map<String, Entry> entries = new LinkedHashMap<>();
    private final ThreadPoolExecutor threads;
    private final LongSupplier clock;

    public Computations() {
        this(System::nanoTime);
    }

    /**
     * @param clock nanoseconds from any start
     */
    Computations(LongSupplier clock) {
        this.clock = clock;
        this.threads = new ThreadPoolExecutor(
                AT_ONCE, AT_ONCE, 30, TimeUnit.SECONDS, new ArrayBlockingQueue<>(MOST_WAITING), Computations::thread);
        threads.allowCoreThreadTimeOut(true);
    }

    private static Thread thread(Runnable work) {
        Thread thread = new Thread(work, "computation");
        thread.setDaemon(true);
        return thread;
    }

    /**
     * Begins one; empty when too many are waiting already.
     *
     * @param title what is computed, in a few words
     * @param then address of the page that shows the result, from the computation's id
     * @param back address of the page that it was asked for on
     */
    public Optional<Computation> begin(String title, UnaryOperator<String> then, String back, Computation.Work work) {
        byte[] bytes = new byte[16];
        RANDOM.nextBytes(bytes);
        String id = Base64.getUrlEncoder().withoutPadding().encodeToString(bytes);
        Computation computation = new Computation(id, title, then.apply(id), back, LONGEST, work);
        synchronized (entries) {
            forget();
            entries.put(id, new Entry(computation, clock.getAsLong()));
        }
        try {
            threads.execute(computation::run);
            return Optional.of(computation);
        } catch (RejectedExecutionException full) {
            synchronized (entries) {
                entries.remove(id);
            }
            return Optional.empty();
        }
    }

    /** The computation of an id; empty when there is none, or none any more. */
    public Optional<Computation> find(String id) {
        synchronized (entries) {
            forget();
            return Optional.ofNullable(entries.get(id)).map(Entry::computation);
        }
    }

    /** The result of a computation, when it is done and is of this kind. */
    public <T> Optional<T> result(String id, Class<T> kind) {
        return find(id).map(Computation::state)
                .filter(state -> state instanceof Computation.State.Done)
                .map(state -> ((Computation.State.Done) state).result())
                .filter(kind::isInstance)
                .map(kind::cast);
    }

    /** Takes out what is too old, and the oldest where there are too many; what still runs then is stopped. */
    private void forget() {
        long now = clock.getAsLong();
        for (Iterator<Entry> all = entries.values().iterator(); all.hasNext(); ) {
            Entry eldest = all.next();
            if (now - eldest.nanos() < KEPT.toNanos() && entries.size() < MOST_KEPT) {
                return;
            }
            eldest.computation().cancel();
            all.remove();
        }
    }

    /** Stops all of them. */
    @Override
    public void close() {
        synchronized (entries) {
            List<Entry> all = new ArrayList<>(entries.values());
            all.forEach(entry -> entry.computation().cancel());
        }
        threads.shutdown();
    }
}
