package org.treadwarm.store;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.treadwarm.store.Samples.BY_ANNA;
import static org.treadwarm.store.Samples.job;

import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.time.Duration;
import java.util.ArrayList;
import java.util.HexFormat;
import java.util.List;
import java.util.Optional;
import java.util.concurrent.ExecutorService;
import java.util.concurrent.Executors;
import java.util.concurrent.Future;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.Parameter;
import org.junit.jupiter.params.ParameterizedClass;
import org.junit.jupiter.params.provider.EnumSource;

@ParameterizedClass
@EnumSource(Kind.class)
class SheetsTest {
    private static final SheetContent CONTENT = new SheetContent("1", "{\"site\":\"Höhe\"}", "{\"rooms\":[]}");

    @Parameter
    Kind kind;

    @TempDir
    Path folder;

    private final TestClock clock = new TestClock();
    private DataHome home;
    private Store store;
    private Sheets sheets;
    private String jobId;

    @BeforeEach
    void open() {
        home = kind.emptyHome(folder);
        store = Store.open(home, clock);
        sheets = store.sheets();
        jobId = store.jobs().create(job("Mill Lane", "a"), BY_ANNA).jobId();
    }

    @AfterEach
    void close() {
        store.close();
    }

    private static SheetContent content(int variant) {
        return new SheetContent("1", "{}", "{\"variant\":" + variant + "}");
    }

    private SheetIssue issue(SheetContent content, Optional<String> replaces) {
        return sheets.issue(new SheetOrder(jobId, 1, content, replaces), "Anna");
    }

    private SheetHeader issued(SheetContent content) {
        return ((SheetIssue.Issued) issue(content, Optional.empty())).header();
    }

    private String last() {
        AuditEntry entry = store.audit().latest(1).get(0);
        return entry.who() + " " + entry.what() + " " + entry.subject();
    }

    @Test
    void keepsWhatIsIssued() {
        SheetHeader header = issued(CONTENT);

        assertThat(header.number()).isEqualTo("2026-0001");
        assertThat(header.issuedAt()).isEqualTo(clock.instant());
        assertThat(header.jobName()).isEqualTo("Mill Lane");
        assertThat(header.holds()).isTrue();
        assertThat(last()).isEqualTo("Anna issued sheet 2026-0001 of job " + jobId + " revision 1");
        Sheet kept = sheets.find("2026-0001").orElseThrow();
        assertThat(kept).isEqualTo(new Sheet(header, CONTENT));
        assertThat(kept.hasItsFingerprint()).isTrue();
        assertThat(sheets.header("2026-0001")).contains(header);
        assertThat(sheets.find("2026-0002")).isEmpty();
    }

    @Test
    void theFingerprintHasTheDocumentedBytes() throws Exception {
        String bytes = "treadwarm sheet 1\n1\n1\n16\n{\"site\":\"Höhe\"}\n12\n{\"rooms\":[]}\n";
        byte[] digest = MessageDigest.getInstance("SHA-256").digest(bytes.getBytes(StandardCharsets.UTF_8));

        assertThat(CONTENT.fingerprint()).isEqualTo(HexFormat.of().formatHex(digest));
        assertThat(new SheetContent("1", "ab", "c").fingerprint())
                .isNotEqualTo(new SheetContent("1", "a", "bc").fingerprint());
    }

    @Test
    void numbersRunOnInEachYear() {
        assertThat(issued(content(1)).number()).isEqualTo("2026-0001");
        assertThat(issued(content(2)).number()).isEqualTo("2026-0002");
        clock.pass(Duration.ofDays(365));
        assertThat(issued(content(3)).number()).isEqualTo("2027-0001");
        assertThat(sheets.list())
                .extracting(SheetHeader::number)
                .containsExactly("2027-0001", "2026-0002", "2026-0001");
        assertThat(sheets.ofJob(jobId)).hasSize(3);
        assertThat(sheets.ofJob("another")).isEmpty();
    }

    @Test
    void twoInstancesNeverGiveTheSameNumber() throws Exception {
        ExecutorService threads = Executors.newFixedThreadPool(4);
        try (Store other = Store.open(home, clock)) {
            List<Future<SheetIssue>> issues = new ArrayList<>();
            for (int i = 0; i < 20; i++) {
                SheetOrder order = new SheetOrder(jobId, 1, content(i), Optional.empty());
                Sheets one = i % 2 == 0 ? sheets : other.sheets();
                issues.add(threads.submit(() -> one.issue(order, "Anna")));
            }
            for (Future<SheetIssue> issue : issues) {
                assertThat(issue.get()).isInstanceOf(SheetIssue.Issued.class);
            }
        } finally {
            threads.shutdownNow();
        }
        assertThat(sheets.list()).hasSize(20);
        assertThat(sheets.list().get(0).number()).isEqualTo("2026-0020");
    }

    @Test
    void theDatabaseItselfRefusesChanges() {
        issued(CONTENT);
        sheets.withdraw("2026-0001", "wrong house", "Anna");
        DataFile behind = new DataFile(home);
        for (String meddling : new String[] {
            "update sheet set sizing = '{}'",
            "update sheet set issued_by = 'Ben'",
            "delete from sheet_withdrawal",
            "update sheet_withdrawal set reason = 'none'"
        }) {
            assertThatThrownBy(() -> behind.execute(meddling))
                    .as(meddling)
                    .hasMessageContaining("are kept as they are");
        }
        assertThatThrownBy(() -> behind.execute("delete from sheet")).isNotNull();
        assertThat(sheets.find("2026-0001").orElseThrow().content()).isEqualTo(CONTENT);
    }

    @Test
    void aChangedTextHasNotItsFingerprint() {
        SheetHeader header = issued(CONTENT);

        assertThat(new Sheet(header, content(1)).hasItsFingerprint()).isFalse();
    }

    @Test
    void aNewSheetNamesWhatItReplaces() {
        issued(content(1));

        SheetHeader second = ((SheetIssue.Issued) issue(content(2), Optional.of("2026-0001"))).header();

        assertThat(second.replaces()).contains("2026-0001");
        assertThat(last()).endsWith(", replacing 2026-0001");
        assertThat(sheets.header("2026-0001")).hasValueSatisfying(old -> {
            assertThat(old.replacedBy()).contains("2026-0002");
            assertThat(old.holds()).isFalse();
        });
        assertThat(issue(content(3), Optional.of("2026-0001")))
                .isEqualTo(new SheetIssue.ReplacedAlready("2026-0001", "2026-0002"));
        assertThat(issue(content(3), Optional.of("2026-0009"))).isEqualTo(new SheetIssue.NothingToReplace("2026-0009"));
    }

    @Test
    void aSheetReplacesNoneOfAnotherJob() {
        issued(content(1));
        String other = store.jobs().create(job("Weir Road", "a"), BY_ANNA).jobId();

        assertThat(sheets.issue(new SheetOrder(other, 1, content(2), Optional.of("2026-0001")), "Anna"))
                .isEqualTo(new SheetIssue.NothingToReplace("2026-0001"));
    }

    @Test
    void theSameIsIssuedOnceWhileItHolds() {
        issued(CONTENT);
        assertThat(issue(CONTENT, Optional.empty())).isEqualTo(new SheetIssue.SameHolds("2026-0001"));

        sheets.withdraw("2026-0001", "wrong house", "Anna");

        assertThat(issued(CONTENT).number()).isEqualTo("2026-0002");
    }

    @Test
    void nothingIsIssuedOfAnUnknownRevision() {
        assertThat(sheets.issue(new SheetOrder(jobId, 2, CONTENT, Optional.empty()), "Anna"))
                .isEqualTo(new SheetIssue.NoRevision());
        assertThat(sheets.issue(new SheetOrder("nothing", 1, CONTENT, Optional.empty()), "Anna"))
                .isEqualTo(new SheetIssue.NoRevision());
        assertThat(sheets.list()).isEmpty();
    }

    @Test
    void aWithdrawnSheetStaysReadableWithItsReason() {
        issued(CONTENT);
        clock.pass(Duration.ofHours(1));

        assertThat(sheets.withdraw("2026-0001", "wrong house", "Ben")).isInstanceOf(SheetWithdrawal.Done.class);

        assertThat(last()).isEqualTo("Ben withdrew sheet 2026-0001: wrong house");
        Sheet kept = sheets.find("2026-0001").orElseThrow();
        assertThat(kept.content()).isEqualTo(CONTENT);
        assertThat(kept.header().withdrawal()).contains(new Withdrawal(clock.instant(), "Ben", "wrong house"));
        assertThat(sheets.withdraw("2026-0001", "again", "Anna"))
                .isEqualTo(new SheetWithdrawal.DoneBefore(kept.header()));
        assertThat(sheets.withdraw("2026-0002", "none", "Anna")).isEqualTo(new SheetWithdrawal.Missing());
        assertThatThrownBy(() -> sheets.withdraw("2026-0001", " ", "Anna")).hasMessageContaining("1 to 1000");
    }

    @Test
    void aLinkShowsItsSheetUntilItIsRevoked() {
        issued(CONTENT);
        SheetLinks links = store.sheetLinks();

        NewSheetLink made = links.create("2026-0001", "Anna").orElseThrow();

        assertThat(made.token()).matches("[A-Za-z0-9_-]{43}");
        assertThat(made.toString()).doesNotContain(made.token());
        assertThat(last()).startsWith("Anna made a link to sheet 2026-0001");
        assertThat(new DataFile(home).text("select sha256 from sheet_link")).isEqualTo(Secrets.sha256(made.token()));
        assertThat(links.list("2026-0001")).containsExactly(made.link());
        assertThat(links.find(made.token())).map(Sheet::content).contains(CONTENT);
        assertThat(links.find("guess")).isEmpty();
        assertThat(links.create("2026-0002", "Anna")).isEmpty();

        assertThat(links.revoke("2026-0002", made.link().id(), "Anna")).isFalse();
        assertThat(links.revoke("2026-0001", made.link().id(), "Anna")).isTrue();
        assertThat(links.revoke("2026-0001", made.link().id(), "Anna")).isFalse();
        assertThat(last()).startsWith("Anna revoked a link to sheet 2026-0001");
        assertThat(links.find(made.token())).isEmpty();
        assertThat(links.list("2026-0001")).isEmpty();
    }
}
