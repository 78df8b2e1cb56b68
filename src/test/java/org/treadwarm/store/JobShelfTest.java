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
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.Parameter;
import org.junit.jupiter.params.ParameterizedClass;
import org.junit.jupiter.params.provider.EnumSource;

@ParameterizedClass
@EnumSource(Kind.class)
class JobShelfTest {
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

    private String create(String name, String words) {
        clock.pass(Duration.ofMillis(1));
        return store.jobs().create(job(name), words, BY_ANNA).jobId();
    }

    private List<String> found(String text) {
        return names(new JobSearch(text, Optional.empty(), Optional.empty(), 10));
    }

    private List<String> names(JobSearch search) {
        return store.jobs().shelf().find(search).jobs().stream()
                .map(each -> each.newest().name())
                .toList();
    }

    @Test
    void findsByAnyPartOfTheWordsInAnyCase() {
        create("Mill Lane", "Mill Lane\nKüche\nSilvie");
        create("Barn", "Barn\nbath_1\n100% wool!");

        assertThat(found("")).containsExactly("Barn", "Mill Lane");
        assertThat(found("KÜCHE")).containsExactly("Mill Lane");
        assertThat(found(" lane ")).containsExactly("Mill Lane");
        assertThat(found("0%")).containsExactly("Barn");
        assertThat(found("%")).containsExactly("Barn");
        assertThat(found("h_1")).containsExactly("Barn");
        assertThat(found("h?1")).isEmpty();
        assertThat(found("wool!")).containsExactly("Barn");
        assertThat(found("' or 1=1 --")).isEmpty();
    }

    @Test
    void theNewestRevisionSaysWhatAJobIsFoundBy() {
        String id = create("Mill Lane", "Mill Lane");
        store.jobs().save(id, 1, job("Barn"), "Barn\nattic", BY_ANNA);

        assertThat(found("attic")).containsExactly("Barn");
        assertThat(found("mill")).isEmpty();
    }

    @Test
    void leafsThroughAllJobsEachOnce() {
        List<String> expected = new ArrayList<>();
        for (int i = 0; i < 7; i++) {
            expected.add(0, "job " + i);
            create("job " + i, "job");
        }
        List<String> seen = new ArrayList<>();
        Optional<String> after = Optional.empty();
        do {
            JobListings page = store.jobs().shelf().find(new JobSearch("job", Optional.of(false), after, 3));
            page.jobs().forEach(each -> seen.add(each.newest().name()));
            after = page.next();
        } while (after.isPresent());
        assertThat(seen).isEqualTo(expected);
    }

    @Test
    void leafsThroughJobsOfOneMoment() {
        for (int i = 0; i < 5; i++) {
            store.jobs().create(job("same"), BY_ANNA);
        }
        JobListings first = store.jobs().shelf().find(new JobSearch("", Optional.empty(), Optional.empty(), 3));
        JobListings second = store.jobs().shelf().find(new JobSearch("", Optional.empty(), first.next(), 3));
        assertThat(first.jobs()).hasSize(3).doesNotContainAnyElementsOf(second.jobs());
        assertThat(second.jobs()).hasSize(2);
        assertThat(second.next()).isEmpty();
    }

    @Test
    void anArchivedJobIsKeptAndFoundWhenAskedFor() {
        String id = create("Mill Lane", "x");
        create("Barn", "x");

        assertThat(store.jobs().shelf().archive(id, true, "Ben")).isTrue();
        assertThat(store.jobs().shelf().archive(id, true, "Ben")).isTrue();

        assertThat(names(new JobSearch("", Optional.of(false), Optional.empty(), 10)))
                .containsExactly("Barn");
        assertThat(names(new JobSearch("x", Optional.of(true), Optional.empty(), 10)))
                .containsExactly("Mill Lane");
        assertThat(found("")).containsExactly("Barn", "Mill Lane");
        assertThat(store.jobs().current(id)).isPresent();
        assertThat(store.jobs().shelf().isArchived(id)).contains(true);
        assertThat(store.audit().latest(1)).containsExactly(new AuditEntry(clock.instant(), "Ben", "archived job", id));

        store.jobs().shelf().archive(id, false, "Ben");
        assertThat(store.jobs().shelf().isArchived(id)).contains(false);
        assertThat(store.audit().latest(1))
                .containsExactly(new AuditEntry(clock.instant(), "Ben", "brought back job", id));
        assertThat(store.jobs().shelf().archive("nosuchjob222", true, "Ben")).isFalse();
        assertThat(store.jobs().shelf().isArchived("nosuchjob222")).isEmpty();
    }

    @Test
    void listsJobsThatAnOlderProgramSavedUntilTheyAreNoted() {
        String id = create("Mill Lane", "x");
        new DataFile(home).execute("update job set words = null");

        assertThat(store.jobs().shelf().withoutWords()).containsExactly(id);
        store.jobs().shelf().note(id, "Kitchen");
        assertThat(store.jobs().shelf().withoutWords()).isEmpty();
        assertThat(found("kitchen")).containsExactly("Mill Lane");
    }

    @Test
    void refusesAPlaceOrANumberThatIsNone() {
        for (int limit : new int[] {0, 201, -1}) {
            assertThatThrownBy(() -> new JobSearch("", Optional.empty(), Optional.empty(), limit))
                    .isInstanceOf(IllegalArgumentException.class);
        }
        assertThatThrownBy(() -> new JobSearch("", Optional.empty(), Optional.of("x"), 1))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
