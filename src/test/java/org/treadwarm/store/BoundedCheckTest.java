package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatCode;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.time.Duration;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.atomic.AtomicInteger;
import org.junit.jupiter.api.Test;

class BoundedCheckTest {
    @Test
    void passesWhatIsFound() {
        StoreUnavailable full = new StoreUnavailable("full");
        assertThatCode(() -> check(() -> {}).run()).doesNotThrowAnyException();
        assertThatThrownBy(() -> check(() -> {
                            throw full;
                        })
                        .run())
                .isSameAs(full);
        assertThatThrownBy(() -> check(() -> {
                            throw new IllegalStateException("odd");
                        })
                        .run())
                .isInstanceOf(StoreUnavailable.class)
                .hasRootCauseMessage("odd");
    }

    private static BoundedCheck check(Runnable look) {
        return new BoundedCheck(look, Duration.ofMinutes(1));
    }

    @Test
    void doesNotWaitForOneThatHangsAndNeverHangsTwice() {
        CountDownLatch answer = new CountDownLatch(1);
        AtomicInteger looks = new AtomicInteger();
        BoundedCheck check = new BoundedCheck(
                () -> {
                    looks.incrementAndGet();
                    await(answer);
                },
                Duration.ofMillis(1));

        for (int i = 0; i < 3; i++) {
            assertThatThrownBy(check::run)
                    .isInstanceOf(StoreUnavailable.class)
                    .hasMessageContaining("did not answer within");
        }
        answer.countDown();

        assertThat(looks).hasValueLessThanOrEqualTo(1);
    }

    private static void await(CountDownLatch answer) {
        try {
            answer.await();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }
}
