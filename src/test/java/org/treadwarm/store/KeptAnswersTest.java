package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.treadwarm.store.Samples.BY_ANNA;
import static org.treadwarm.store.Samples.job;

import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.CyclicBarrier;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.Parameter;
import org.junit.jupiter.params.ParameterizedClass;
import org.junit.jupiter.params.provider.EnumSource;

@ParameterizedClass
@EnumSource(Kind.class)
class KeptAnswersTest {
    private static final int ROUNDS = 10;

    @Parameter
    Kind kind;

    @TempDir
    Path folder;

    private final TestClock clock = new TestClock();
    private DataHome home;
    private Store store;
    private String key;

    @BeforeEach
    void open() {
        home = kind.emptyHome(folder);
        store = Store.open(home, clock);
        key = store.keys().create("quotes", Scope.WRITE, "tests").key().id();
    }

    @AfterEach
    void close() {
        store.close();
    }

    private NamedRequest request(String name) {
        return new NamedRequest(key, name, "a".repeat(64));
    }

    private static Optional<KeptAnswer> create(Store store) {
        String id = store.jobs().create(job("Mill Lane"), BY_ANNA).jobId();
        return Optional.of(new KeptAnswer(201, "/jobs/" + id, "\"1\"", "{\"id\": \"" + id + "\", \"ä\": \"𝄞\"}"));
    }

    @Test
    void theSameRequestIsAnsweredAsBefore() {
        Once first = store.keptAnswers().once(request("q-1"), () -> create(store));
        Once again = store.keptAnswers().once(request("q-1"), () -> create(store));

        assertThat(again).isEqualTo(new Once.Repeated(((Once.Made) first).answer()));
        assertThat(store.jobs().list()).hasSize(1);
    }

    @Test
    void anotherRequestOfTheSameNameCreatesNothing() {
        store.keptAnswers().once(request("q-1"), () -> create(store));

        assertThat(store.keptAnswers().once(new NamedRequest(key, "q-1", "b".repeat(64)), () -> create(store)))
                .isEqualTo(new Once.Different());
        assertThat(store.jobs().list()).hasSize(1);
    }

    @Test
    void namesOfDifferentKeysAreDifferent() {
        String other = store.keys().create("others", Scope.WRITE, "tests").key().id();
        store.keptAnswers().once(request("q-1"), () -> create(store));

        assertThat(store.keptAnswers().once(new NamedRequest(other, "q-1", "b".repeat(64)), () -> create(store)))
                .isInstanceOf(Once.Made.class);
    }

    @Test
    void isForgottenAfterADayAndTakesNoRoom() {
        store.keptAnswers().once(request("q-1"), () -> create(store));
        clock.pass(KeptAnswers.KEPT.minus(Duration.ofMillis(1)));
        assertThat(store.keptAnswers().once(request("q-1"), () -> create(store)))
                .isInstanceOf(Once.Repeated.class);
        clock.pass(Duration.ofMillis(1));
        assertThat(store.keptAnswers().once(request("q-2"), () -> create(store)))
                .isInstanceOf(Once.Made.class);

        assertThat(new DataFile(home).count("kept_answer")).isEqualTo(1);
        assertThat(store.keptAnswers().once(request("q-1"), () -> create(store)))
                .isInstanceOf(Once.Made.class);
    }

    @Test
    void aCreationThatFailsLeavesNeitherJobNorAnswer() {
        assertThatThrownBy(() -> store.keptAnswers().once(request("q-1"), () -> {
                    create(store);
                    throw new IllegalStateException("the power went off");
                }))
                .hasMessageContaining("the power went off");

        assertThat(store.jobs().list()).isEmpty();
        assertThat(store.audit().latest(10)).noneMatch(entry -> entry.toString().contains("created job"));
        assertThat(store.keptAnswers().once(request("q-1"), () -> create(store)))
                .isInstanceOf(Once.Made.class);
        assertThat(store.jobs().list()).hasSize(1);
    }

    @Test
    void aRefusalIsNotKept() {
        assertThat(store.keptAnswers().once(request("q-1"), Optional::empty)).isEqualTo(new Once.Nothing());
        assertThat(store.keptAnswers().once(request("q-1"), () -> create(store)))
                .isInstanceOf(Once.Made.class);
    }

    @Test
    void ofEqualRequestsToTwoServersOneCreates() throws Exception {
        try (Store other = Store.open(home, clock)) {
            CyclicBarrier start = new CyclicBarrier(4);
            ExecutorService threads = Executors.newFixedThreadPool(4);
            List<Future<List<Once>>> all = new ArrayList<>();
            for (Store each : List.of(store, other, store, other)) {
                all.add(threads.submit(() -> requests(each, start)));
            }
            List<List<Once>> outcomes = new ArrayList<>();
            for (Future<List<Once>> each : all) {
                outcomes.add(each.get(1, TimeUnit.MINUTES));
            }
            threads.shutdownNow();
            for (int round = 0; round < ROUNDS; round++) {
                int which = round;
                assertThat(outcomes.stream().map(each -> each.get(which)))
                        .filteredOn(Once.Made.class::isInstance)
                        .hasSize(1);
            }
            assertThat(store.jobs().list()).hasSize(ROUNDS);
        }
    }

    private List<Once> requests(Store store, CyclicBarrier start) throws Exception {
        List<Once> outcomes = new ArrayList<>();
        for (int round = 0; round < ROUNDS; round++) {
            start.await(1, TimeUnit.MINUTES);
            outcomes.add(store.keptAnswers().once(request("q-" + round), () -> create(store)));
        }
        return outcomes;
    }
}
