package org.treadwarm.web.pages;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.treadwarm.sizing.Sizing.PracticeJudgement;
import org.treadwarm.web.pages.Answer.Line;

/** The words beside a limit of practice. */
class LayoutLinesTest {
    private static String note(Optional<String> sense, double value, double margin) {
        List<Line> lines = new ArrayList<>();
        LayoutLines.limits(
                lines, List.of(new PracticeJudgement("velocity", sense, value, 0.15, margin, "common practice")));
        return lines.get(0).note();
    }

    @Test
    void aLeastThatIsJustMetIsStillALeast() {
        assertThat(note(Optional.of("at least"), 0.15, 0)).isEqualTo("kept: at least 0.15 m/s, common practice");
        assertThat(note(Optional.of("at most"), 0.15, 0)).isEqualTo("kept: at most 0.15 m/s, common practice");
        assertThat(note(Optional.of("at least"), 0.1, -0.05))
                .isEqualTo("look again: at least 0.15 m/s, common practice: beyond it");
    }

    @Test
    void aSheetFromBeforeTheSenseWasToldNamesTheLimitAlone() {
        assertThat(note(Optional.empty(), 0.15, 0)).isEqualTo("kept: limit 0.15 m/s, common practice");
    }
}
