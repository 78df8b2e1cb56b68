package org.treadwarm.program;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.file.Path;
import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.store.Backup;
import org.treadwarm.store.DataHome;
import org.treadwarm.store.Scope;
import org.treadwarm.store.Store;

/**
 * A server that is killed at random moments while four clients save: whatever was acknowledged is there afterwards. The
 * system property {@code treadwarm.kills} says how often, 12 times without it.
 */
class KilledServerTest {
    private static final int KILLS = Integer.getInteger("treadwarm.kills", 12);
    private static final int WRITERS = 4;
    private static final int MOST_SAVES_BEFORE_A_KILL = 40;

    @TempDir
    Path folder;

    private final Map<String, Long> acknowledged = new ConcurrentHashMap<>();
    private final List<String> jobs = new ArrayList<>();

    @Test
    void everyAcknowledgedSaveOutlivesTheServer() throws Exception {
        long seed = System.nanoTime();
        SplittableRandom random = new SplittableRandom(seed);
        String key;
        try (Store store = Store.open(folder, Clock.systemUTC())) {
            key = store.keys().create("tests", Scope.WRITE, "tests").token();
        }
        for (int kill = 0; kill < KILLS; kill++) {
            killWhileSaving(key, random.nextInt(1, MOST_SAVES_BEFORE_A_KILL));
            checkAll(kill + ", seed " + seed);
        }
        assertThat(acknowledged).isNotEmpty();
    }

    private void killWhileSaving(String key, int savesBefore) throws Exception {
        ExecutorService threads = Executors.newFixedThreadPool(WRITERS);
        try (Program server = Program.start("serve", "--port", "0", "--data", folder.toString())) {
            JobClient client = new JobClient(server.address(), key);
            while (jobs.size() < WRITERS) {
                jobs.add(client.create());
            }
            CountDownLatch saves = new CountDownLatch(savesBefore);
            List<Future<?>> writers = new ArrayList<>();
            for (String id : jobs) {
                writers.add(threads.submit(() -> saveUntilKilled(client, id, saves)));
            }
            assertThat(saves.await(2, TimeUnit.MINUTES)).isTrue();
            server.kill();
            for (Future<?> writer : writers) {
                writer.get();
            }
        } finally {
            threads.shutdownNow();
        }
    }

    /** The count of a job's revision is its number, less one. */
    private void saveUntilKilled(JobClient client, String id, CountDownLatch saves) {
        try {
            long revision = client.get(id).revision();
            while (true) {
                assertThat(client.save(id, revision, "save", (int) revision)).isEqualTo(200);
                revision++;
                acknowledged.put(id, revision);
                saves.countDown();
            }
        } catch (IOException killed) {
            return;
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }

    private void checkAll(String when) {
        // A backup checks the whole file, and every text against its SHA-256.
        Path copy = folder.resolve("copy");
        Backup.write(folder, copy);
        assertThat(copy.toFile().delete()).isTrue();
        try (Store store = Store.openToServe(DataHome.folder(folder), Clock.systemUTC())) {
            for (String id : jobs) {
                Job job = new JobDesk(store.jobs()).current(id).orElseThrow();
                long newest = job.revision();
                long told = acknowledged.getOrDefault(id, 1L);
                // One more may have been made when the server died before it could say so.
                assertThat(newest).as("after kill %s", when).isBetween(told, told + 1);
                assertThat(job.document().path("count").longValue()).isEqualTo(newest - 1);
                assertThat(store.jobs().revisions(id)).hasSize((int) newest);
                acknowledged.put(id, newest);
            }
        }
    }
}
