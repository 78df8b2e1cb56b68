package org.treadwarm.program;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.treadwarm.program.JobClient.Answer;
import org.treadwarm.store.CrampedStore;
import org.treadwarm.store.Scope;
import org.treadwarm.web.Server;
import org.treadwarm.web.Settings;

/** A server whose disk fills up while four clients save, and has room again later. */
class FullDiskServerTest {
    private static final int WRITERS = 4;

    @TempDir
    Path folder;

    @Test
    void saysSoLosesNothingAndGoesOnWhenThereIsRoom() throws Exception {
        ExecutorService threads = Executors.newFixedThreadPool(WRITERS);
        try (CrampedStore cramped = new CrampedStore(folder, 60);
                Server server = Server.start(new Settings("127.0.0.1", 0, List.of(), false, false), cramped.store())) {
            String key =
                    cramped.store().keys().create("tests", Scope.WRITE, "tests").token();
            JobClient client = new JobClient("http://127.0.0.1:" + server.port(), key);
            List<String> jobs = new ArrayList<>();
            List<Future<Long>> writers = new ArrayList<>();
            for (int i = 0; i < WRITERS; i++) {
                jobs.add(client.create());
            }
            for (String id : jobs) {
                writers.add(threads.submit(() -> saveUntilFull(client, id)));
            }
            for (int i = 0; i < WRITERS; i++) {
                long acknowledged = writers.get(i).get();
                assertThat(client.get(jobs.get(i)).revision()).isEqualTo(acknowledged);
                assertThat(client.get(jobs.get(i)).count()).isEqualTo((int) acknowledged - 1);
            }

            cramped.makeRoom();

            for (String id : jobs) {
                long revision = client.get(id).revision();
                assertThat(client.save(id, revision, "with room", 0)).isEqualTo(200);
                assertThat(client.get(id).revision()).isEqualTo(revision + 1);
            }
        } finally {
            threads.shutdownNow();
        }
    }

    /** The last acknowledged revision. */
    private static long saveUntilFull(JobClient client, String id) throws Exception {
        long revision = 1;
        Answer answer = client.put(id, revision, "x".repeat(180), 1);
        while (answer.status() == 200) {
            revision++;
            answer = client.put(id, revision, "x".repeat(180), (int) revision);
        }
        assertThat(answer.status()).isEqualTo(503);
        assertThat(answer.text())
                .contains("disk is full", "nothing was saved")
                .doesNotContain("treadwarm.sqlite", "/tmp");
        return revision;
    }
}
