package org.treadwarm.jobs;

import static org.assertj.core.api.Assertions.assertThat;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.nio.file.Path;
import java.time.Clock;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.BeforeEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.jobs.JobDesk.Saving;
import org.treadwarm.store.Change;
import org.treadwarm.store.Store;

class JobDeskTest {
    private static final Change BY_ANNA = Change.by("Anna");

    @TempDir
    Path folder;

    private Store store;
    private JobDesk desk;

    @BeforeEach
    void open() {
        store = Store.open(folder, Clock.systemUTC());
        desk = new JobDesk(store.jobs());
    }

    @AfterEach
    void close() {
        store.close();
    }

    @Test
    void aGoodSurveyIsNoDraftAndComesWithItsSizing() {
        Job job = desk.create("yard", Trees.studio(), BY_ANNA);

        assertThat(job.draft()).isFalse();
        assertThat(job.sizing()).isPresent();
        assertThat(job.revision()).isEqualTo(1);
        assertThat(desk.list())
                .singleElement()
                .satisfies(header -> assertThat(header.draft()).isFalse());
        assertThat(desk.current(job.id())).contains(job);
    }

    @Test
    void aSurveyWithProblemsIsADraftEverywhere() {
        ObjectNode survey = Trees.studio();
        survey.remove("site");

        Job job = desk.create("yard", survey, BY_ANNA);

        assertThat(job.draft()).isTrue();
        assertThat(job.sizing()).isEmpty();
        assertThat(job.problems()).isNotEmpty();
        assertThat(desk.list().get(0).draft()).isTrue();
        assertThat(desk.revisions(job.id()).get(0).draft()).isTrue();
    }

    @Test
    void aDraftThatIsPutRightIsNoDraftAnyMore() {
        Job draft = desk.create("yard", Trees.tree("{\"rooms\": []}"), BY_ANNA);

        Saving saving = desk.save(draft.id(), 1, "yard", Trees.studio(), BY_ANNA);

        assertThat(saving)
                .isInstanceOfSatisfying(
                        Saving.Saved.class,
                        saved -> assertThat(saved.job().draft()).isFalse());
        assertThat(desk.revisions(draft.id()))
                .extracting(header -> header.draft())
                .containsExactly(false, true);
    }

    @Test
    void savesNothingOverWhatSomebodySavedInBetween() {
        Job job = desk.create("yard", Trees.studio(), BY_ANNA);
        desk.save(job.id(), 1, "first", Trees.studio(), BY_ANNA);

        assertThat(desk.save(job.id(), 1, "second", Trees.studio(), BY_ANNA)).isEqualTo(new Saving.Stale(2));
        assertThat(desk.current(job.id()).orElseThrow().name()).isEqualTo("first");
    }

    @Test
    void saysThatAJobIsMissing() {
        assertThat(desk.save("nosuchjob123", 1, "a", Trees.studio(), BY_ANNA)).isEqualTo(new Saving.Missing());
        assertThat(desk.current("nosuchjob123")).isEmpty();
        assertThat(desk.revisions("nosuchjob123")).isEmpty();
    }

    @Test
    void everyRevisionStaysAsItWas() {
        JsonNode first = desk.create("yard", Trees.studio(), BY_ANNA).document();
        String id = desk.list().get(0).jobId();
        ObjectNode changed = first.deepCopy();
        ((ObjectNode) changed.get("rooms").get(0)).put("height", "2.9 m");
        desk.save(id, 1, "yard", changed, BY_ANNA);

        assertThat(desk.revision(id, 1).orElseThrow().document()).isEqualTo(first);
        assertThat(desk.revision(id, 2).orElseThrow().document()).isEqualTo(changed);
        assertThat(desk.revision(id, 3)).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "{}",
                "{\"rooms\": null}",
                "{\"rooms\": {\"a\": 1}}",
                "{\"rooms\": [5, \"x\", {\"id\": 7}]}",
                "{\"rooms\": [{\"id\": \"same\"}, {\"id\": \"same\"}]}",
                "{\"site\": [[[]]], \"nonsense\": {\"a\": [null, 1.50, true]}, \"rooms\": []}"
            })
    void documentsOfOddShapesAreKeptAsDraftsUnchanged(String text) {
        JsonNode survey = Trees.tree(text);

        Job job = desk.create("odd", survey, BY_ANNA);

        assertThat(job.draft()).isTrue();
        assertThat(desk.current(job.id()).orElseThrow().document()).isEqualTo(job.document());
        assertThat(job.document()).isEqualTo(survey);
    }

    @Test
    void theInventedDemoIsAddedOnce() {
        Demo.addTo(desk);
        Demo.addTo(desk);

        assertThat(desk.list())
                .singleElement()
                .satisfies(header -> assertThat(header.name()).isEqualTo(Demo.NAME));
        assertThat(desk.current(desk.list().get(0).jobId()).orElseThrow().draft())
                .isFalse();
    }
}
