package org.treadwarm.sheets;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.file.Path;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import java.util.Optional;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.treadwarm.jobs.Demo;
import org.treadwarm.jobs.Job;
import org.treadwarm.jobs.JobDesk;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.store.Change;
import org.treadwarm.store.Sheet;
import org.treadwarm.store.SheetContent;
import org.treadwarm.store.SheetOrder;
import org.treadwarm.store.Store;
import org.treadwarm.wire.FrozenSizing;

class SheetDeskTest {
    private static final Change BY_ANNA = Change.by("Anna");

    @TempDir
    Path folder;

    private Store store;
    private JobDesk jobs;
    private SheetDesk desk;

    @BeforeEach
    void open() {
        store = Store.open(folder, Clock.fixed(Instant.parse("2026-12-01T09:00:00Z"), ZoneOffset.UTC));
        jobs = new JobDesk(store.jobs());
        desk = new SheetDesk(jobs, store.sheets());
    }

    @AfterEach
    void close() {
        store.close();
    }

    private Sheet issued(Job job) {
        Issuing result = desk.issue(job.id(), job.revision(), Optional.empty(), "Anna");
        return desk.find(((Issuing.Issued) result).sheet().number()).orElseThrow();
    }

    @Test
    void freezesSurveySizingAndMethod() {
        Job job = jobs.create("Sallowby house", Demo.survey(), BY_ANNA);

        Sheet sheet = issued(job);

        assertThat(sheet.header().number()).isEqualTo("2026-0001");
        assertThat(sheet.header().methodVersion()).isEqualTo(Sizing.METHOD_VERSION);
        assertThat(FrozenText.tree(sheet.content().survey())).isEqualTo(job.document());
        assertThat(FrozenSizing.read(sheet.content().sizing())).isEqualTo(job.sizing());
    }

    @Test
    void aSheetStaysWhenItsJobChanges() {
        Job job = jobs.create("Sallowby house", Demo.survey(), BY_ANNA);
        Sheet sheet = issued(job);
        ObjectNode changed = (ObjectNode) Demo.survey();
        ((ObjectNode) changed.get("site")).put("outdoorTemperature", "-20 °C");
        jobs.save(job.id(), 1, "Renamed", changed, BY_ANNA);

        assertThat(desk.find("2026-0001")).contains(sheet);
        assertThat(desk.verify("2026-0001")).hasValueSatisfying(verification -> {
            assertThat(verification.agrees()).isTrue();
            assertThat(verification.compared()).isGreaterThan(100);
            assertThat(verification.added()).isEmpty();
        });
    }

    @Test
    void aDraftIsNotIssued() {
        ObjectNode survey = (ObjectNode) Demo.survey();
        survey.remove("site");
        Job job = jobs.create("Sallowby house", survey, BY_ANNA);

        assertThat(desk.issue(job.id(), 1, Optional.empty(), "Anna")).isEqualTo(new Issuing.Draft(job.problems()));
        assertThat(desk.issue(job.id(), 2, Optional.empty(), "Anna")).isEqualTo(new Issuing.Missing());
        assertThat(desk.issue("nothing", 1, Optional.empty(), "Anna")).isEqualTo(new Issuing.Missing());
        assertThat(desk.list()).isEmpty();
    }

    @Test
    void tellsWhatTodaysMethodGivesOtherwise() {
        Job job = jobs.create("Sallowby house", Demo.survey(), BY_ANNA);
        SheetContent kept = issued(job).content();
        ObjectNode sizing = (ObjectNode) FrozenText.tree(kept.sizing());
        ((ObjectNode) sizing.get("total")).put("heatLoss", 1.5);
        SheetContent other = new SheetContent("0", kept.survey(), sizing.toString());
        store.sheets().issue(new SheetOrder(job.id(), 1, other, Optional.empty()), "Anna");

        assertThat(desk.verify("2026-0002")).hasValueSatisfying(verification -> {
            assertThat(verification.agrees()).isFalse();
            assertThat(verification.fingerprintHolds()).isTrue();
            assertThat(verification.methodVersion()).isEqualTo("0");
            assertThat(verification.differences()).singleElement().satisfies(difference -> {
                assertThat(difference.address()).isEqualTo("/total/heatLoss");
                assertThat(difference.issued()).isEqualTo("1.5");
            });
        });
        assertThat(desk.verify("2026-0003")).isEmpty();
    }

    @Test
    void aSurveyThatTodaysProgramRefusesIsToldWithItsProblems() {
        Job job = jobs.create("Sallowby house", Demo.survey(), BY_ANNA);
        SheetContent old =
                new SheetContent("0", "{\"cellar\":1}", issued(job).content().sizing());
        store.sheets().issue(new SheetOrder(job.id(), 1, old, Optional.empty()), "Anna");

        assertThat(desk.verify("2026-0002")).hasValueSatisfying(verification -> {
            assertThat(verification.agrees()).isFalse();
            assertThat(verification.problems()).isNotEmpty();
            assertThat(verification.compared()).isZero();
        });
    }
}
