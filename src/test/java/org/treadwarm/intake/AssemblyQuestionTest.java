package org.treadwarm.intake;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.properties.Trees;
import org.treadwarm.survey.Problem;

/** One assembly with the conditions to look at it under. */
class AssemblyQuestionTest {
    @Test
    void hasConditionsThatStandWhenNoneAreGiven() {
        Outcome<AssemblyQuestion> outcome = Intake.assembly(Trees.json("{'layers': [{'resistance': 2}]}"));
        assertThat(outcome).isInstanceOfSatisfying(Outcome.Accepted.class, accepted -> {
            AssemblyQuestion question = (AssemblyQuestion) accepted.value();
            assertThat(question.indoorTemperature().value()).isEqualTo(20);
            assertThat(question.outdoorTemperature().value()).isEqualTo(-5);
            assertThat(question.relativeHumidity().value()).isEqualTo(0.5);
            assertThat(question.outdoors()).isTrue();
            assertThat(question.assembly().layers()).hasSize(1);
        });
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            quoteCharacter = '`',
            value = {
                "{} | ``",
                "{'uValue': 1, 'layers': [{'resistance': 2}]} | ``",
                "{'uValue': 1, 'to': 'ground'} | /to",
                "{'uValue': 1, 'relativeHumidity': '120 %'} | /relativeHumidity",
                "{'layers': [{'resistance': -2}]} | /layers/0/resistance",
                "{'layers': [{'thickness': 1}]} | /layers/0",
                "[] | ``",
            })
    void isRefusedAtTheRootOrBelow(String question, String pointer) {
        Outcome<AssemblyQuestion> outcome = Intake.assembly(Trees.json(question));
        assertThat(outcome).isInstanceOf(Outcome.Refused.class);
        List<Problem> problems = ((Outcome.Refused<AssemblyQuestion>) outcome).problems();
        assertThat(problems).extracting(Problem::pointer).containsExactly(pointer);
    }
}
