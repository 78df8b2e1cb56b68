package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.treadwarm.store.Samples.BY_ANNA;
import static org.treadwarm.store.Samples.job;

import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.Callable;
import java.util.concurrent.CyclicBarrier;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.Parameter;
import org.junit.jupiter.params.ParameterizedClass;
import org.junit.jupiter.params.provider.EnumSource;

@ParameterizedClass
@EnumSource(Kind.class)
class SavingTogetherTest {
    @Parameter
    Kind kind;

    private static final int ROUNDS = 25;

    @TempDir
    Path folder;

    @Test
    void ofTwoThreadsExactlyOneSavesEachRevision() throws Exception {
        DataHome home = kind.emptyHome(folder);
        try (Store store = Store.open(home, Clock.systemUTC())) {
            race(store, store);
        }
    }

    @Test
    void ofTwoStoresOnOneHomeExactlyOneSavesEachRevision() throws Exception {
        DataHome home = kind.emptyHome(folder);
        try (Store store = Store.open(home, Clock.systemUTC());
                Store other = Store.open(home, Clock.systemUTC())) {
            race(store, other);
        }
    }

    private static void race(Store left, Store right) throws Exception {
        String id = left.jobs().create(job("Start"), BY_ANNA).jobId();
        CyclicBarrier start = new CyclicBarrier(2);
        List<SaveResult> first;
        List<SaveResult> second;
        ExecutorService threads = Executors.newFixedThreadPool(2);
        try {
            Future<List<SaveResult>> one = threads.submit(saves(left.jobs(), id, "left", start));
            Future<List<SaveResult>> two = threads.submit(saves(right.jobs(), id, "right", start));
            first = one.get();
            second = two.get();
        } finally {
            threads.shutdownNow();
        }
        for (int round = 0; round < ROUNDS; round++) {
            assertThat(List.of(first.get(round), second.get(round)))
                    .containsExactlyInAnyOrder(new SaveResult.Saved(round + 2), new SaveResult.Stale(round + 2));
            String winner = first.get(round) instanceof SaveResult.Saved ? "left" : "right";
            assertThat(left.jobs().revision(id, round + 2).map(JobRevision::content))
                    .contains(job(winner, winner + round));
        }
        assertThat(left.jobs().revisions(id)).hasSize(ROUNDS + 1);
    }

    private static Callable<List<SaveResult>> saves(Jobs jobs, String id, String who, CyclicBarrier start) {
        return () -> {
            List<SaveResult> results = new ArrayList<>();
            for (int round = 0; round < ROUNDS; round++) {
                start.await(1, TimeUnit.MINUTES);
                results.add(jobs.save(id, round + 1, job(who, who + round), Change.by(who)));
            }
            return results;
        };
    }
}
