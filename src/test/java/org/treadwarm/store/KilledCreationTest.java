package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;

import java.nio.file.Path;
import java.time.Clock;
import java.util.Optional;
import java.util.concurrent.TimeUnit;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class KilledCreationTest {
    @TempDir
    Path folder;

    @Test
    void aProcessKilledBetweenJobAndAnswerLeavesNeither() throws Exception {
        String key;
        try (Store store = Store.open(folder, Clock.systemUTC())) {
            key = store.keys().create("quotes", Scope.WRITE, "tests").key().id();
        }

        Process child = new ProcessBuilder(
                        Path.of(System.getProperty("java.home"), "bin", "java").toString(),
                        "-cp",
                        System.getProperty("java.class.path"),
                        CreatingChild.class.getName(),
                        folder.toString(),
                        key)
                .inheritIO()
                .start();
        assertThat(child.waitFor(1, TimeUnit.MINUTES)).isTrue();
        assertThat(child.exitValue()).isEqualTo(7);

        try (Store store = Store.open(folder, Clock.systemUTC())) {
            assertThat(store.jobs().list()).isEmpty();
            Once again = store.keptAnswers().once(new NamedRequest(key, "q-1", "a".repeat(64)), () -> {
                String id = store.jobs()
                        .create(Samples.job("Mill Lane"), Samples.BY_ANNA)
                        .jobId();
                return Optional.of(new KeptAnswer(201, id, "\"1\"", "{}"));
            });
            assertThat(again).isInstanceOf(Once.Made.class);
            assertThat(store.jobs().list()).hasSize(1);
        }
    }
}
