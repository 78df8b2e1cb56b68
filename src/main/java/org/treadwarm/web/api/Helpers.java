package org.treadwarm.web.api;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.Future;
import java.util.concurrent.RejectedExecutionException;
import java.util.concurrent.SynchronousQueue;
import java.util.concurrent.ThreadPoolExecutor;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.Function;
import org.slf4j.MDC;

/**
 * Threads that help a request with many equal pieces of work. There is one less than the machine has cores, and none waits
 * for its turn: a request that finds them busy does its work alone, so that no request takes them from another.
 */
final class Helpers {
    private final ThreadPoolExecutor threads;

    Helpers(int cores) {
        this.threads = new ThreadPoolExecutor(
                0, Math.max(1, cores - 1), 10, TimeUnit.SECONDS, new SynchronousQueue<>(), work -> {
                    Thread thread = new Thread(work, "batch");
                    thread.setDaemon(true);
                    return thread;
                });
    }

    /** What the work makes of each item, in the order of the items. */
    <A, B> List<B> all(List<A> items, Function<A, B> work) {
        AtomicInteger next = new AtomicInteger();
        Object[] made = new Object[items.size()];
        Runnable share = () -> {
            for (int i = next.getAndIncrement(); i < made.length; i = next.getAndIncrement()) {
                made[i] = work.apply(items.get(i));
            }
        };
        List<Future<?>> helping = helpers(items.size() - 1, inSameLog(share));
        share.run();
        helping.forEach(Helpers::await);
        @SuppressWarnings("unchecked")
        List<B> inOrder = (List<B>) List.of(made);
        return inOrder;
    }

    /** What helpers log belongs to the request that they help. */
    private static Runnable inSameLog(Runnable share) {
        Map<String, String> context =
                Optional.ofNullable(MDC.getCopyOfContextMap()).orElseGet(Map::of);
        return () -> {
            MDC.setContextMap(context);
            try {
                share.run();
            } finally {
                MDC.clear();
            }
        };
    }

    private List<Future<?>> helpers(int useful, Runnable share) {
        List<Future<?>> helping = new ArrayList<>();
        try {
            for (int i = 0; i < Math.min(useful, threads.getMaximumPoolSize()); i++) {
                helping.add(threads.submit(share));
            }
        } catch (RejectedExecutionException allBusy) {
            return helping;
        }
        return helping;
    }

    private static void await(Future<?> helper) {
        try {
            helper.get();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException("stopped while it waited for helpers", e);
        } catch (ExecutionException e) {
            throw new IllegalStateException("a helper failed", e.getCause());
        }
    }
}
