package org.treadwarm.program;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.net.URI;
import java.net.http.HttpClient;
import java.net.http.HttpRequest;
import java.net.http.HttpResponse.BodyHandlers;
import java.time.Clock;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.treadwarm.program.JobClient.Counted;
import org.treadwarm.store.DataHome;
import org.treadwarm.store.OwnerCreation;
import org.treadwarm.store.Scope;
import org.treadwarm.store.Store;
import org.treadwarm.store.TestPostgres;

/** Two servers, each a process of its own, over one database. */
class TwoServersTest {
    private static final int SAVES_BEFORE_THE_KILL = 40;
    private static final int SAVES_OF_EACH = 40;

    private final DataHome.Postgresql home = TestPostgres.emptyHome();
    private final Map<Long, String> acknowledged = new ConcurrentHashMap<>();
    private final CountDownLatch enough = new CountDownLatch(SAVES_BEFORE_THE_KILL);

    private Program server() {
        return Program.start(Map.of("TREADWARM_DATABASE", home.url()), "serve", "--port", "0");
    }

    @Test
    void nothingIsLostBetweenThemAndNotWhenOneDies() throws Exception {
        ExecutorService threads = Executors.newFixedThreadPool(4);
        try (Store store = Store.open(home, Clock.systemUTC());
                Program left = server();
                Program right = server()) {
            String key = store.keys().create("tests", Scope.WRITE, "tests").token();
            JobClient atLeft = new JobClient(left.address(), key);
            JobClient atRight = new JobClient(right.address(), key);
            String id = atLeft.create();

            List<Future<Integer>> writers = new ArrayList<>();
            for (int i = 0; i < 2; i++) {
                int number = i;
                writers.add(threads.submit(() -> count(atLeft, id, "left " + number, SAVES_OF_EACH)));
                writers.add(threads.submit(() -> count(atRight, id, "right " + number, Integer.MAX_VALUE)));
            }
            assertThat(enough.await(2, TimeUnit.MINUTES)).isTrue();
            right.kill();
            int saved = 0;
            for (Future<Integer> writer : writers) {
                saved += writer.get();
            }

            Counted last = atLeft.get(id);
            assertThat(acknowledged).hasSize(saved);
            assertThat(acknowledged.values()).anyMatch(name -> name.startsWith("right"));
            // A save that was under way at the right when it died may have been made without being acknowledged.
            assertThat(last.count()).isBetween(saved, saved + 2).isEqualTo((int) last.revision() - 1);
            for (Map.Entry<Long, String> each : acknowledged.entrySet()) {
                assertThat(atLeft.get(id, each.getKey()).savedAs()).isEqualTo(each.getValue());
            }
        } finally {
            threads.shutdownNow();
        }
    }

    /** Raises the job's count by one, again and again, each time from what it is; how often that was acknowledged. */
    private int count(JobClient client, String id, String who, int most) throws InterruptedException {
        int saved = 0;
        try {
            while (saved < most) {
                Counted now = client.get(id);
                int status = client.save(id, now.revision(), who, now.count() + 1);
                if (status == 200) {
                    saved++;
                    acknowledged.put(now.revision() + 1, who);
                    enough.countDown();
                } else {
                    assertThat(status).isEqualTo(412);
                }
            }
        } catch (IOException killed) {
            assertThat(most).as("only the right server is killed").isEqualTo(Integer.MAX_VALUE);
        }
        return saved;
    }

    @Test
    void aSessionOfOneIsASessionOfTheOther() throws Exception {
        try (Store store = Store.open(home, Clock.systemUTC());
                Program left = server();
                Program right = server()) {
            String token = store.people().inviteOwner().orElseThrow();
            OwnerCreation.Created created = (OwnerCreation.Created)
                    store.people().createOwner(token, "Ottilie of Quillfen Floors", "a floor that holds the room");
            String session = store.sessions().start(created.owner()).token();
            String leftAddress = left.address();
            String rightAddress = right.address();

            assertThat(status(leftAddress + "/jobs", session)).isEqualTo(200);
            assertThat(status(rightAddress + "/jobs", session)).isEqualTo(200);
            store.sessions().end(session);
            assertThat(status(leftAddress + "/jobs", session)).isEqualTo(303);
            assertThat(status(rightAddress + "/jobs", session)).isEqualTo(303);
        }
    }

    private static int status(String url, String session) throws IOException, InterruptedException {
        HttpRequest request = HttpRequest.newBuilder(URI.create(url))
                .header("Cookie", "treadwarm-session=" + session)
                .build();
        return HttpClient.newHttpClient()
                .send(request, BodyHandlers.discarding())
                .statusCode();
    }
}
