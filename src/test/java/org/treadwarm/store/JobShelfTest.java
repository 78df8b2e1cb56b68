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
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;
import org.junit.jupiter.params.provider.ValueSource;

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
        Optional<JobPlace> after = Optional.empty();
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
        for (String text :
                List.of("", "x", "1", "1-", "-1-1", "1-1000000000000000000", "2026-12-02T09:00:00.000Z_aaaa")) {
            assertThat(JobPlace.of(text)).as(text).isEmpty();
        }
        JobPlace place = new JobPlace(12, 7);
        assertThat(JobPlace.of(place.text())).contains(place);
    }

    private JobListings page(Optional<JobPlace> after, int limit) {
        return store.jobs().shelf().find(new JobSearch("", Optional.empty(), after, limit));
    }

    /** Each time some that were told, some still to come and some new ones are saved, the clock standing still or going back. */
    @ParameterizedTest
    @ValueSource(ints = {0, -1000})
    void everyJobOfTheBeginningIsToldOnceWhateverIsSavedMeanwhile(int passing) {
        List<String> expected = new ArrayList<>();
        for (int i = 0; i < 20; i++) {
            expected.add(0, create("job " + i, "job"));
        }
        for (int i : new int[] {3, 11, 3}) {
            String id = expected.remove(i);
            long revision = store.jobs().revisions(id).get(0).revision();
            store.jobs().save(id, revision, job("job"), BY_ANNA);
            expected.add(0, id);
        }
        List<String> seen = new ArrayList<>();
        Optional<JobPlace> after = Optional.empty();
        do {
            JobListings part = page(after, 3);
            part.jobs().forEach(each -> seen.add(each.newest().jobId()));
            after = part.next();
            clock.pass(Duration.ofMillis(passing));
            store.jobs().create(job("new"), BY_ANNA);
            for (int i = seen.size() % 4; i < expected.size(); i += 4) {
                String id = expected.get(i);
                long revision = store.jobs().revisions(id).get(0).revision();
                store.jobs().save(id, revision, job("saved meanwhile"), BY_ANNA);
            }
        } while (after.isPresent());

        assertThat(seen).isEqualTo(expected);
        assertThat(page(Optional.empty(), 200).jobs()).hasSize(27);
    }

    @Test
    void aJobIsToldAsItIsNowAtThePlaceItHad() {
        String first = create("first", "x");
        create("second", "x");
        create("third", "x");
        JobListings begun = page(Optional.empty(), 1);
        store.jobs().save(first, 1, job("first, renamed"), BY_ANNA);

        JobListings rest = page(begun.next(), 10);

        assertThat(rest.jobs().stream().map(each -> each.newest().name())).containsExactly("second", "first, renamed");
        assertThat(rest.next()).isEmpty();
        assertThat(page(Optional.empty(), 1).jobs().get(0).newest().name()).isEqualTo("first, renamed");
    }

    @Test
    void savesOfAnOlderProgramAreNumberedInTheOrderOfTheirTimes() {
        String first = create("first", "x");
        String second = create("second", "x");
        clock.pass(Duration.ofMillis(1));
        store.jobs().save(first, 1, job("first"), BY_ANNA);
        store.close();
        DataFile tables = new DataFile(home);
        tables.execute("drop index revision_save_number");
        tables.execute("alter table revision drop column save_number");
        tables.execute("drop index job_last_save");
        tables.execute("alter table job drop column last_save");
        tables.execute("create index revision_saved_at on revision (saved_at, job_id)");
        tables.execute("delete from flyway_schema_history where version = '7'");

        store = Store.open(home, clock);

        assertThat(page(Optional.empty(), 10).jobs().stream()
                        .map(each -> each.newest().jobId()))
                .containsExactly(first, second);
        assertThat(tables.text("select max(save_number) from revision")).isEqualTo("3");
        clock.pass(Duration.ofMillis(1));
        create("third", "x");
        assertThat(tables.text("select max(save_number) from revision")).isEqualTo("4");
    }
}
