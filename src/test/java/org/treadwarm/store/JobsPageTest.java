package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.treadwarm.store.Samples.BY_ANNA;
import static org.treadwarm.store.Samples.job;

import java.nio.file.Path;
import java.time.Duration;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.Parameter;
import org.junit.jupiter.params.ParameterizedClass;
import org.junit.jupiter.params.provider.EnumSource;

@ParameterizedClass
@EnumSource(Kind.class)
class JobsPageTest {
    @Parameter
    Kind kind;

    @TempDir
    Path folder;

    private final TestClock clock = new TestClock();

    @Test
    void theListHoldsStillWhileJobsArriveAndChange() {
        try (Store store = Store.open(kind.emptyHome(folder), clock)) {
            Jobs jobs = store.jobs();
            List<String> ids = new ArrayList<>();
            for (int i = 0; i < 11; i++) {
                ids.add(jobs.create(job("House " + i), BY_ANNA).jobId());
                // Some are saved in the same millisecond.
                clock.pass(Duration.ofMillis(i % 3));
            }
            List<RevisionHeader> before = jobs.list();
            clock.pass(Duration.ofMillis(5));

            List<RevisionHeader> seen = new ArrayList<>();
            Optional<JobCursor> next = Optional.empty();
            do {
                JobsPage page = jobs.page(3, next);
                seen.addAll(page.jobs());
                next = page.next();
                clock.pass(Duration.ofMillis(1));
                jobs.create(job("Late"), BY_ANNA);
                jobs.save(ids.get(0), jobs.revisions(ids.get(0)).size(), job("Changed"), BY_ANNA);
            } while (next.isPresent());

            assertThat(seen).isEqualTo(before);
            assertThat(jobs.page(200, Optional.empty()).jobs()).isEqualTo(jobs.list());
        }
    }

    @Test
    void anEmptyStoreHasAnEmptyList() {
        try (Store store = Store.open(kind.emptyHome(folder), clock)) {
            assertThat(store.jobs().page(1, Optional.empty())).isEqualTo(new JobsPage(List.of(), Optional.empty()));
        }
    }
}
