package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.treadwarm.store.Samples.BY_ANNA;
import static org.treadwarm.store.Samples.job;

import java.nio.file.Path;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.Parameter;
import org.junit.jupiter.params.ParameterizedClass;
import org.junit.jupiter.params.provider.EnumSource;

@ParameterizedClass
@EnumSource(Kind.class)
class AuditTest {
    @Parameter
    Kind kind;

    @TempDir
    Path folder;

    private final TestClock clock = new TestClock();
    private DataHome home;
    private Store store;

    @BeforeEach
    void open() {
        home = kind.emptyHome(folder);
        store = Store.open(home, clock);
    }

    @AfterEach
    void close() {
        store.close();
    }

    @Test
    void listsWhatWasDoneNewestFirst() {
        String id = store.jobs().create(job("Mill Lane"), BY_ANNA).jobId();
        store.jobs().save(id, 1, job("Mill Lane", "a"), Change.by("Ben"));
        store.audit().append("Ben", "exported job", id);

        assertThat(store.audit().latest(10))
                .containsExactly(
                        new AuditEntry(clock.instant(), "Ben", "exported job", id),
                        new AuditEntry(clock.instant(), "Ben", "saved job", id + " revision 2"),
                        new AuditEntry(clock.instant(), "Anna", "created job", id));
        assertThat(store.audit().latest(1)).hasSize(1);
    }

    @Test
    void aChangeThatCannotBeListedIsNotMade() {
        String id = store.jobs().create(job("Mill Lane"), BY_ANNA).jobId();
        new DataFile(home).execute("create unique index no_list on audit (who)");

        assertThatThrownBy(() -> store.jobs().save(id, 1, job("Barn"), BY_ANNA))
                .isInstanceOf(IllegalStateException.class);
        assertThatThrownBy(() -> store.keys().create("key", Scope.READ, "Anna"))
                .isInstanceOf(IllegalStateException.class);

        assertThat(store.jobs().revisions(id)).hasSize(1);
        assertThat(store.keys().list()).isEmpty();
    }
}
