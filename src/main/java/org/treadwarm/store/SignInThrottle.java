package org.treadwarm.store;

import java.time.Duration;
import java.time.Instant;
import java.util.Optional;
import org.jdbi.v3.core.Handle;

/**
 * Slows down the guessing of passwords. For each name from each address, names nobody has included, five tries are free;
 * after each further one the pair must wait 1, 2, 4 ... seconds, at most 60. So nobody can keep a colleague out who comes
 * from another address. All names together from one address have 30 free tries, then waits of at most 10 seconds, so
 * that going through the names is slow too. Tries during a wait do not lengthen it, and after 15 quiet minutes the count
 * starts anew. The numbers are common practice, no source.
 *
 * <p>A try counts as failed from its beginning, until it is known to be good; otherwise many tries sent at once would
 * all pass before the first has failed. Names are kept as digests, because people type passwords into the wrong field.
 */
final class SignInThrottle {
    private static final Pace PAIR = new Pace(5, Duration.ofSeconds(60));
    private static final Pace ADDRESS = new Pace(30, Duration.ofSeconds(10));
    private static final Duration FORGET_AFTER = Duration.ofMinutes(15);
    private static final String ALL_NAMES = "";

    private SignInThrottle() {}

    /** How many tries are free, and how long the waits grow after them. */
    private record Pace(int freeTries, Duration longestWait) {
        Duration waitAfter(int tries) {
            if (tries < freeTries) {
                return Duration.ZERO;
            }
            Duration wait = Duration.ofSeconds(1L << Math.min(tries - freeTries, 30));
            return wait.compareTo(longestWait) < 0 ? wait : longestWait;
        }
    }

    private record Tries(int count, Instant notBefore) {
        Duration wait(Instant now, Pace pace) {
            Duration wait = Duration.between(now, notBefore);
            // A longer wait than the longest means that the computer's clock was set back since.
            boolean due = wait.isNegative() || wait.compareTo(pace.longestWait()) > 0;
            return due ? Duration.ZERO : wait;
        }
    }

    /** Counts a try; the time to wait if there must be none now. */
    static Optional<Duration> begin(Handle handle, String nameKey, String address, Instant now) {
        handle.createUpdate("delete from sign_in_try where last_at < :forget")
                .bind("forget", Times.text(now.minus(FORGET_AFTER)))
                .execute();
        String name = Secrets.sha256(nameKey);
        String from = Secrets.sha256(address);
        Tries pair = find(handle, name, from, now);
        Tries all = find(handle, ALL_NAMES, from, now);
        Duration wait = longer(pair.wait(now, PAIR), all.wait(now, ADDRESS));
        if (wait.compareTo(Duration.ZERO) > 0) {
            return Optional.of(wait);
        }
        count(handle, name, from, PAIR, pair, now);
        count(handle, ALL_NAMES, from, ADDRESS, all, now);
        return Optional.empty();
    }

    /** After a good try: forgets those of the name from there, and takes this one off those of the address. */
    static void clear(Handle handle, String nameKey, String address) {
        String from = Secrets.sha256(address);
        handle.execute(
                "delete from sign_in_try where name_sha256 = ? and address_sha256 = ?", Secrets.sha256(nameKey), from);
        handle.execute(
                "update sign_in_try set tries = tries - 1 where name_sha256 = ? and address_sha256 = ?",
                ALL_NAMES,
                from);
    }

    /** The wait for one name from one address, after so many tries. */
    static Duration waitAfter(int tries) {
        return PAIR.waitAfter(tries);
    }

    private static Duration longer(Duration one, Duration other) {
        return one.compareTo(other) > 0 ? one : other;
    }

    private static Tries find(Handle handle, String name, String from, Instant now) {
        return handle.createQuery("select tries, not_before from sign_in_try"
                        + " where name_sha256 = :name and address_sha256 = :from")
                .bind("name", name)
                .bind("from", from)
                .map((row, context) -> new Tries(row.getInt("tries"), Times.instant(row.getString("not_before"))))
                .findOne()
                .orElseGet(() -> new Tries(0, now));
    }

    private static void count(Handle handle, String name, String from, Pace pace, Tries before, Instant now) {
        int tries = before.count() + 1;
        handle.createUpdate("insert into sign_in_try (name_sha256, address_sha256, tries, not_before, last_at)"
                        + " values (:name, :from, :tries, :notBefore, :lastAt)"
                        + " on conflict (name_sha256, address_sha256) do update"
                        + " set tries = :tries, not_before = :notBefore, last_at = :lastAt")
                .bind("name", name)
                .bind("from", from)
                .bind("tries", tries)
                .bind("notBefore", Times.text(now.plus(pace.waitAfter(tries))))
                .bind("lastAt", Times.text(now))
                .execute();
    }
}
