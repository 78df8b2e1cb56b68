package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.tuple;
import static org.treadwarm.store.Samples.BY_ANNA;
import static org.treadwarm.store.Samples.job;
import static org.treadwarm.store.Samples.jobOf;

import java.nio.file.Path;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class MoveTest {
    private static final SheetContent CONTENT = new SheetContent("1", "{\"site\":\"Höhe\"}", "{\"rooms\":[]}");

    @TempDir
    Path folder;

    private final TestClock clock = new TestClock();
    private final DataHome.Postgresql database = TestPostgres.emptyHome();
    private String id;
    private String key;
    private String session;

    @BeforeEach
    void fill() {
        try (Store store = Store.open(folder, clock)) {
            id = store.jobs()
                    .create(job("Mill Lane", "kitchen", "bath with <ä€𝄞> \"quotes\"\n and lines"), BY_ANNA)
                    .jobId();
            store.jobs().save(id, 1, jobOf(1200, 7, "warmer"), new Change("Ben", "all rooms"));
            key = store.keys().create("sheet", Scope.READ, "Anna").token();
            store.sheets().issue(new SheetOrder(id, 1, CONTENT, Optional.empty()), "Anna");
            session = store.sessions().start(PeopleTest.createOwner(store)).token();
        }
    }

    @Test
    void everythingArrives() {
        List<Move.Moved> moved = Move.run(folder, database, clock);

        assertThat(moved)
                .extracting(Move.Moved::table, Move.Moved::rows)
                .contains(tuple("job", 1L), tuple("revision", 2L), tuple("piece", 1203L), tuple("person", 1L));
        try (Store before = Store.open(folder, clock);
                Store after = Store.open(database, clock)) {
            assertThat(after.jobs().list()).isEqualTo(before.jobs().list());
            assertThat(after.jobs().revisions(id)).isEqualTo(before.jobs().revisions(id));
            for (long revision = 1; revision <= 2; revision++) {
                assertThat(after.jobs().revision(id, revision))
                        .isEqualTo(before.jobs().revision(id, revision));
            }
            assertThat(after.sheets().find("2026-0001"))
                    .isEqualTo(before.sheets().find("2026-0001"))
                    .hasValueSatisfying(
                            sheet -> assertThat(sheet.hasItsFingerprint()).isTrue());
            assertThat(after.audit().latest(100)).isEqualTo(before.audit().latest(100));
            assertThat(after.keys().find(key)).isPresent();
            assertThat(after.sessions().find(session)).isPresent();
            assertThat(after.people().signIn("Anna Quill", PeopleTest.PASSWORD, "192.0.2.7"))
                    .isInstanceOf(SignIn.SignedIn.class);
            assertThat(after.jobs().save(id, 2, job("Mill Lane"), BY_ANNA)).isEqualTo(new SaveResult.Saved(3));
        }
    }

    @Test
    void refusesADatabaseThatIsNotEmpty() {
        try (Store store = Store.open(database, clock)) {
            store.jobs().create(job("Barn"), BY_ANNA);
        }
        assertThatThrownBy(() -> Move.run(folder, database, clock))
                .isInstanceOf(StoreUnavailable.class)
                .hasMessageContaining("is not empty");
        assertThat(new DataFile(database).count("job")).isEqualTo(1);
    }

    @Test
    void movesNothingWhenATextIsDamaged() {
        new DataFile(DataHome.folder(folder)).execute("update piece set body = 'kitten' where body = 'kitchen'");

        assertThatThrownBy(() -> Move.run(folder, database, clock))
                .isInstanceOf(StoreUnavailable.class)
                .hasMessageContaining("Nothing was moved")
                .hasMessageContaining("SHA-256");
        assertThat(new DataFile(database).count("job")).isZero();
        assertThat(new DataFile(database).count("piece")).isZero();
    }

    @Test
    void movesNothingWhenASheetHasNotItsFingerprint() {
        DataFile file = new DataFile(DataHome.folder(folder));
        file.execute("drop trigger sheet_unchanged");
        file.execute("update sheet set sizing = '{\"rooms\":[1]}'");

        assertThatThrownBy(() -> Move.run(folder, database, clock))
                .isInstanceOf(StoreUnavailable.class)
                .hasMessageContaining("Nothing was moved: sheet 2026-0001 has not its fingerprint")
                .hasMessageContaining(CONTENT.fingerprint());
        assertThat(new DataFile(database).count("sheet")).isZero();
        assertThat(new DataFile(database).count("job")).isZero();
    }

    @Test
    void refusesAFolderThatIsServedOrEmpty(@TempDir Path empty) {
        try (FolderLock server = FolderLock.take(folder)) {
            assertThatThrownBy(() -> Move.run(folder, database, clock))
                    .isInstanceOf(StoreUnavailable.class)
                    .hasMessageContaining("is in use");
        }
        assertThatThrownBy(() -> Move.run(empty, database, clock))
                .isInstanceOf(StoreUnavailable.class)
                .hasMessageContaining("to move");
        assertThat(empty).isEmptyDirectory();
    }
}
