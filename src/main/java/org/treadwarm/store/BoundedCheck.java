package org.treadwarm.store;

import java.time.Duration;
import java.util.concurrent.CompletableFuture;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.concurrent.atomic.AtomicReference;

/**
 * A look at something that may not answer, which is waited for so long and no longer. Looks that last longer go on by
 * themselves: whoever asks meanwhile waits for the same one, so at most one thread hangs.
 */
final class BoundedCheck {
    private final Runnable look;
    private final Duration longest;
    private final AtomicReference<CompletableFuture<Void>> running = new AtomicReference<>(done());

    /**
     * @param look throws {@link StoreUnavailable} when it finds something wrong
     * @param longest how long it is waited for
     */
    BoundedCheck(Runnable look, Duration longest) {
        this.look = look;
        this.longest = longest;
    }

    private static CompletableFuture<Void> done() {
        return CompletableFuture.completedFuture(null);
    }

    /** @throws StoreUnavailable if the look found something wrong, or has not ended in time */
    void run() {
        try {
            current().get(longest.toMillis(), TimeUnit.MILLISECONDS);
        } catch (TimeoutException problem) {
            throw new StoreUnavailable("The store did not answer within " + longest.toSeconds() + " seconds.", problem);
        } catch (InterruptedException problem) {
            Thread.currentThread().interrupt();
            throw new StoreUnavailable("The look at the store was interrupted.", problem);
        } catch (ExecutionException problem) {
            throw problem.getCause() instanceof StoreUnavailable known
                    ? known
                    : new StoreUnavailable("The store cannot be read.", problem.getCause());
        }
    }

    private CompletableFuture<Void> current() {
        CompletableFuture<Void> last = running.get();
        if (!last.isDone()) {
            return last;
        }
        CompletableFuture<Void> next = new CompletableFuture<>();
        if (!running.compareAndSet(last, next)) {
            return running.get();
        }
        Thread thread = new Thread(() -> look(next), "store-check");
        thread.setDaemon(true);
        thread.start();
        return next;
    }

    private void look(CompletableFuture<Void> outcome) {
        try {
            look.run();
            outcome.complete(null);
        } catch (Throwable problem) {
            outcome.completeExceptionally(problem);
        }
    }
}
