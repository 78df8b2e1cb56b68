package org.treadwarm.jobs;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.withinPercentage;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.sizing.Sizing.RoomSizing;

class PartialTest {
    private static ObjectNode room(ObjectNode survey, int index) {
        return (ObjectNode) survey.get("rooms").get(index);
    }

    @Test
    void aFinishedSurveyIsSizedWhole() {
        Partial partial = Partial.of(Trees.studio());

        assertThat(partial.unfinished()).isEmpty();
        assertThat(partial.judgement().sizing()).isPresent();
        assertThat(partial.judgement()).isEqualTo(Judgement.of(Trees.studio()));
    }

    @Test
    void theOtherRoomsAreSizedAgainstAnUnfinishedOneHeldAtItsTemperature() {
        ObjectNode survey = Trees.studio();
        double whole = heatLossOfStudio(survey);
        room(survey, 1).put("height", "about so high");

        Partial partial = Partial.of(survey);

        assertThat(partial.unfinished()).containsExactly("shower room");
        assertThat(partial.judgement().sizing().orElseThrow().rooms())
                .extracting(RoomSizing::name)
                .containsExactly("studio");
        // Not quite the same: the loft over both loses what came up from the other room.
        assertThat(heatLossOfStudio(survey)).isCloseTo(whole, withinPercentage(0.2));
    }

    private static double heatLossOfStudio(JsonNode survey) {
        return Partial.of(survey)
                .judgement()
                .sizing()
                .orElseThrow()
                .rooms()
                .get(0)
                .heatLoss()
                .total();
    }

    @Test
    void theDocumentItselfIsLeftAlone() {
        ObjectNode survey = Trees.studio();
        room(survey, 1).remove("height");
        JsonNode before = survey.deepCopy();

        Partial.of(survey);

        assertThat(survey).isEqualTo(before);
    }

    @Test
    void aProblemOfTheSiteLeavesNothingToSize() {
        ObjectNode survey = Trees.studio();
        survey.putObject("site");

        Partial partial = Partial.of(survey);

        assertThat(partial.judgement().sizing()).isEmpty();
        assertThat(partial.judgement().problems())
                .isEqualTo(Judgement.of(survey).problems());
        assertThat(partial.unfinished()).isEmpty();
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "{}",
                "{\"rooms\": {\"0\": {}, \"1\": {}}}",
                "{\"rooms\": [1, {\"name\": 5}, null]}",
                "{\"rooms\": [{\"name\": \"a\"}, {}], \"spaces\": [1]}",
                "{\"site\": {\"outdoorTemperature\": -9}, \"spaces\": \"x\", \"rooms\": [{\"name\": \"outdoors\"}]}"
            })
    void oddDocumentsHaveProblemsAndNoSizing(String text) {
        Partial partial = Partial.of(Trees.tree(text));

        assertThat(partial.judgement().sizing()).isEmpty();
        assertThat(partial.judgement().problems()).isNotEmpty();
    }
}
