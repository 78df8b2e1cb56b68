package org.treadwarm.store;

import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import org.jdbi.v3.core.Handle;

/**
 * Slows down the guessing of passwords, for each name by itself and for names nobody has too. Five tries are free; after
 * each further one the name must wait 1, 2, 4 ... seconds, at most 60. Tries during the wait do not lengthen it, and
 * after 15 quiet minutes the count starts anew, so nobody can lock a person out for good. The numbers are common
 * practice, no source.
 *
 * <p>A try counts as failed from its beginning, until it is known to be good; otherwise many tries sent at once would
 * all pass before the first has failed. Names are kept as digests, because people type passwords into the wrong field.
 */
final class SignInThrottle {
    private static final int FREE_TRIES = 5;
    private static final Duration LONGEST_WAIT = Duration.ofSeconds(60);
    private static final Duration FORGET_AFTER = Duration.ofMinutes(15);

    private SignInThrottle() {}

    private record Failures(int count, Instant notBefore) {}

    /** Counts a try; the time to wait if there must be none now. */
    static Optional<Duration> begin(Handle handle, String nameKey, Instant now) {
        handle.createUpdate("delete from sign_in_failure where last_at < :forget")
                .bind("forget", Times.text(now.minus(FORGET_AFTER)))
                .execute();
        String name = Secrets.sha256(nameKey);
        Failures failures = find(handle, name).orElseGet(() -> new Failures(0, now));
        Duration wait = Duration.between(now, failures.notBefore());
        // A longer wait than the longest means that the computer's clock was set back since.
        if (wait.compareTo(Duration.ZERO) > 0 && wait.compareTo(LONGEST_WAIT) <= 0) {
            return Optional.of(wait);
        }
        int count = failures.count() + 1;
        write(handle, name, new Failures(count, now.plus(waitAfter(count))), now);
        return Optional.empty();
    }

    /** Forgets the tries under the name, after a good one. */
    static void clear(Handle handle, String nameKey) {
        handle.createUpdate("delete from sign_in_failure where name_sha256 = :name")
                .bind("name", Secrets.sha256(nameKey))
                .execute();
    }

    static Duration waitAfter(int tries) {
        if (tries < FREE_TRIES) {
            return Duration.ZERO;
        }
        int doublings = Math.min(tries - FREE_TRIES, 30);
        Duration wait = Duration.ofSeconds(1L << doublings);
        return wait.compareTo(LONGEST_WAIT) < 0 ? wait : LONGEST_WAIT;
    }

    private static Optional<Failures> find(Handle handle, String name) {
        return handle.createQuery("select failures, not_before from sign_in_failure where name_sha256 = :name")
                .bind("name", name)
                .map((row, context) -> new Failures(row.getInt("failures"), Times.instant(row.getString("not_before"))))
                .findOne();
    }

    private static void write(Handle handle, String name, Failures failures, Instant now) {
        handle.createUpdate("insert into sign_in_failure (name_sha256, failures, not_before, last_at)"
                        + " values (:name, :failures, :notBefore, :lastAt) on conflict (name_sha256) do update"
                        + " set failures = :failures, not_before = :notBefore, last_at = :lastAt")
                .bind("name", name)
                .bind("failures", failures.count())
                .bind("notBefore", Times.text(failures.notBefore()))
                .bind("lastAt", Times.text(now))
                .execute();
    }
}
