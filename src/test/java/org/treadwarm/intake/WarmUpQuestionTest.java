package org.treadwarm.intake;

import static org.assertj.core.api.Assertions.assertThat;

import org.junit.jupiter.api.Test;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.properties.Trees;
import org.treadwarm.survey.Problem;

/** One floor and the setback to warm its room up from; more of it in the tests over HTTP. */
class WarmUpQuestionTest {
    private static final String ROOM =
            "{'lossCoefficient': 1.2, 'airCapacity': 9000, 'massCapacity': 150000, 'massCoupling': 8}";

    private static Outcome<WarmUpQuestion> ask(String more) {
        return Intake.warmUp(Trees.json("{'belowTemperature': 15, 'density': 100, 'outdoorTemperature': -9,"
                + " 'from': 16, 'to': 20, 'room': " + ROOM + more + "}"));
    }

    @Test
    void hasConditionsThatStandWhenNoneAreGiven() {
        assertThat(ask("")).isInstanceOfSatisfying(Outcome.Accepted.class, accepted -> {
            WarmUpQuestion question = (WarmUpQuestion) accepted.value();
            assertThat(question.belowCoefficient().value()).isEqualTo(5.88);
            assertThat(question.lookedAt().value()).isEqualTo(72);
            assertThat(question.room().otherGain().value()).isZero();
            assertThat(question.operative()).isFalse();
            assertThat(question.within()).isEmpty();
            assertThat(question.surfaceCoefficient()).isEmpty();
        });
    }

    @Test
    void tellsWhichLayersLackWhat() {
        Outcome<WarmUpQuestion> outcome = ask(", 'above': [{'thickness': 0.01, 'conductivity': 1},"
                + " {'thickness': 0.01, 'conductivity': 1, 'density': 2000}, {'resistance': 0.1}],"
                + " 'below': [{'thickness': 0.01, 'material': 'EPS'}, {'thickness': 0.01, 'material': 'moonstone'}]");
        assertThat(outcome).isInstanceOf(Outcome.Refused.class);
        assertThat(((Outcome.Refused<WarmUpQuestion>) outcome).problems())
                .extracting(Problem::pointer)
                .containsExactly(
                        "/above/0/density", "/above/0/specificHeat", "/above/1/specificHeat", "/below/1/material");
    }
}
