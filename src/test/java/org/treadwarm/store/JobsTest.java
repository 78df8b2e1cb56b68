package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.tuple;
import static org.treadwarm.store.Samples.BY_ANNA;
import static org.treadwarm.store.Samples.job;
import static org.treadwarm.store.Samples.jobOf;

import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.Parameter;
import org.junit.jupiter.params.ParameterizedClass;
import org.junit.jupiter.params.provider.EnumSource;

@ParameterizedClass
@EnumSource(Kind.class)
class JobsTest {
    @Parameter
    Kind kind;

    @TempDir
    Path folder;

    private final TestClock clock = new TestClock();
    private DataHome home;
    private Store store;
    private Jobs jobs;

    @BeforeEach
    void open() {
        home = kind.emptyHome(folder);
        store = Store.open(home, clock);
        jobs = store.jobs();
    }

    @AfterEach
    void close() {
        store.close();
    }

    @Test
    void givesBackEveryRevisionAsItWasSaved() {
        JobContent first = job("Mill Lane", "kitchen", "bath with <ä€𝄞> \"quotes\"\n and lines");
        JobContent second = new JobContent("Mill Lane 2", true, List.of(new Piece("room", "b", "bath")));
        RevisionHeader created = jobs.create(first, new Change("Anna", "from paper"));
        String id = created.jobId();
        clock.pass(Duration.ofMillis(1500));

        assertThat(jobs.save(id, 1, second, Change.by("Ben"))).isEqualTo(new SaveResult.Saved(2));

        RevisionHeader saved = new RevisionHeader(id, 2, "Mill Lane 2", true, clock.instant(), "Ben", "");
        assertThat(id).matches("[a-z2-9]{12}");
        assertThat(created.savedAt()).isEqualTo(clock.instant().minusMillis(1500));
        assertThat(jobs.revision(id, 1)).contains(new JobRevision(created, first));
        assertThat(jobs.revision(id, 2)).contains(new JobRevision(saved, second));
        assertThat(jobs.current(id)).contains(new JobRevision(saved, second));
        assertThat(jobs.revisions(id)).containsExactly(saved, created);
    }

    @Test
    void findsNothingThatWasNeverSaved() {
        String id = jobs.create(job("Mill Lane"), BY_ANNA).jobId();

        assertThat(jobs.current("nosuchjob222")).isEmpty();
        assertThat(jobs.revision(id, 2)).isEmpty();
        assertThat(jobs.revision(id, 0)).isEmpty();
        assertThat(jobs.revisions("nosuchjob222")).isEmpty();
    }

    @Test
    void keepsAJobWithoutPieces() {
        JobContent empty = new JobContent("", true, List.of());

        String id = jobs.create(empty, BY_ANNA).jobId();

        assertThat(jobs.current(id).map(JobRevision::content)).contains(empty);
    }

    @Test
    void refusesASaveFromAnOldRevision() {
        String id = jobs.create(job("Mill Lane", "a"), BY_ANNA).jobId();
        jobs.save(id, 1, job("Mill Lane", "b"), BY_ANNA);

        assertThat(jobs.save(id, 1, job("Mill Lane", "c"), BY_ANNA)).isEqualTo(new SaveResult.Stale(2));
        assertThat(jobs.save(id, 9, job("Mill Lane", "b"), BY_ANNA)).isEqualTo(new SaveResult.Stale(2));
        assertThat(jobs.save("nosuchjob222", 1, job("Mill Lane"), BY_ANNA)).isEqualTo(new SaveResult.Missing());
        assertThat(jobs.revisions(id)).hasSize(2);
    }

    @Test
    void theSameContentAgainIsARevisionThatTakesNoNewRoom() {
        DataFile file = new DataFile(home);
        String id = jobs.create(job("Mill Lane", "a"), BY_ANNA).jobId();
        long pieces = file.count("piece");

        assertThat(jobs.save(id, 1, job("Mill Lane", "a"), Change.by("Ben"))).isEqualTo(new SaveResult.Saved(2));
        assertThat(jobs.save(id, 1, job("Mill Lane", "a"), BY_ANNA)).isEqualTo(new SaveResult.Stale(2));
        assertThat(jobs.revisions(id)).hasSize(2);
        assertThat(file.count("piece")).isEqualTo(pieces);
    }

    @Test
    void aChangeOfNameDraftOrOrderIsARevision() {
        Piece kitchen = new Piece("room", "k", "kitchen");
        Piece bath = new Piece("room", "b", "bath");
        String id = jobs.create(new JobContent("A", false, List.of(kitchen, bath)), BY_ANNA)
                .jobId();

        jobs.save(id, 1, new JobContent("B", false, List.of(kitchen, bath)), BY_ANNA);
        jobs.save(id, 2, new JobContent("B", true, List.of(kitchen, bath)), BY_ANNA);
        JobContent reordered = new JobContent("B", true, List.of(bath, kitchen));

        assertThat(jobs.save(id, 3, reordered, BY_ANNA)).isEqualTo(new SaveResult.Saved(4));
        assertThat(jobs.current(id).map(JobRevision::content)).contains(reordered);
    }

    @Test
    void oneRoomOfAThousandAddsOnePieceAndOnePageOfTheList() {
        DataFile file = new DataFile(home);
        String id = jobs.create(jobOf(1000, -1, ""), BY_ANNA).jobId();
        assertThat(file.count("piece")).isEqualTo(1000);
        assertThat(file.count("manifest")).isEqualTo(16 + 1);

        JobContent changed = jobOf(1000, 500, "warmer");
        jobs.save(id, 1, changed, BY_ANNA);

        assertThat(file.count("piece")).isEqualTo(1001);
        assertThat(file.count("manifest")).isEqualTo(17 + 2);
        assertThat(jobs.current(id).map(JobRevision::content)).contains(changed);
        assertThat(jobs.revision(id, 1).map(JobRevision::content)).contains(jobOf(1000, -1, ""));
    }

    @Test
    void equalJobsShareAllTheirPieces() {
        jobs.create(job("One", "same", "same"), BY_ANNA);
        jobs.create(job("Two", "same", "same"), BY_ANNA);

        assertThat(new DataFile(home).count("piece")).isEqualTo(2);
    }

    @Test
    void listsTheNewestRevisionOfEachJobLastChangedFirst() {
        String mill = jobs.create(job("Mill Lane"), BY_ANNA).jobId();
        clock.pass(Duration.ofSeconds(1));
        String barn = jobs.create(job("Barn"), BY_ANNA).jobId();
        clock.pass(Duration.ofMillis(1));
        jobs.save(mill, 1, job("Mill Lane 7"), Change.by("Ben"));

        assertThat(jobs.list())
                .extracting(RevisionHeader::jobId, RevisionHeader::revision, RevisionHeader::name)
                .containsExactly(tuple(mill, 2L, "Mill Lane 7"), tuple(barn, 1L, "Barn"));
    }

    @Test
    void saysWhenATextIsDamagedOrMissing() {
        String id = jobs.create(job("Mill Lane", "kitchen"), BY_ANNA).jobId();
        DataFile file = new DataFile(home);

        file.execute("update piece set body = 'kitten' where body = 'kitchen'");
        assertThatThrownBy(() -> jobs.current(id))
                .isInstanceOf(StoreUnavailable.class)
                .hasMessageContaining("has changed");

        file.execute("delete from piece where body = 'kitten'");
        assertThatThrownBy(() -> jobs.current(id))
                .isInstanceOf(StoreUnavailable.class)
                .hasMessageContaining("is missing");
    }
}
