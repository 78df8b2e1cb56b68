package org.treadwarm.web.security;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.concurrent.atomic.AtomicLong;
import org.junit.jupiter.api.Test;
import org.treadwarm.web.security.TokenBucket.Taken;

class TokenBucketTest {
    private final AtomicLong now = new AtomicLong(Long.MAX_VALUE - 5_000_000_000L);
    private final TokenBucket bucket = new TokenBucket(6, now::get);

    private void pass(double seconds) {
        now.addAndGet((long) (seconds * 1e9));
    }

    @Test
    void aMinutesWorthPassesAtOnceAndThenOneEachTenSeconds() {
        for (int left = 5; left >= 0; left--) {
            assertThat(bucket.take()).isEqualTo(new Taken(true, left, left == 0 ? 10 : 0, (6 - left) * 10));
        }
        assertThat(bucket.take()).isEqualTo(new Taken(false, 0, 10, 60));
        // The clock runs over its end here.
        pass(9.5);
        assertThat(bucket.take()).isEqualTo(new Taken(false, 0, 1, 51));
        pass(0.6);
        assertThat(bucket.take().granted()).isTrue();
        assertThat(bucket.take().granted()).isFalse();
    }

    @Test
    void aLongPauseIsWorthNoMoreThanAMinute() {
        pass(3600);
        for (int i = 0; i < 6; i++) {
            assertThat(bucket.take().granted()).isTrue();
        }
        assertThat(bucket.take().granted()).isFalse();
    }
}
