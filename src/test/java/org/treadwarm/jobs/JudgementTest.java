package org.treadwarm.jobs;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;

class JudgementTest {
    /** A survey whose first floor no sizing has met. */
    private static ObjectNode newFloor(String spacing) {
        ObjectNode survey = (ObjectNode) Demo.survey();
        ((ObjectNode) survey.at("/rooms/2/heatedFloor/heater")).put("spacing", spacing);
        return survey;
    }

    @Test
    void aSizingIsGivenUpWhenAskedTo() {
        assertThatExceptionOfType(CancellationException.class)
                .isThrownBy(() -> Judgement.of(newFloor("133.731 mm"), () -> true));
    }

    @Test
    void problemsAreFoundWithoutSizing() {
        Judgement unsized = Judgement.unsized(newFloor("133.732 mm"));

        assertThat(unsized.problems()).isEmpty();
        assertThat(unsized.survey()).isPresent();
        assertThat(unsized.sizing()).isEmpty();
        ObjectNode broken = newFloor("133.733 mm");
        ((ObjectNode) broken.at("/rooms/0")).remove("height");
        assertThat(Judgement.unsized(broken).problems())
                .isEqualTo(Judgement.of(broken).problems());
    }
}
