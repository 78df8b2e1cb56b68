package org.treadwarm.sizing;

import java.util.Optional;
import org.treadwarm.survey.Survey;

/** How a room of a survey warms up after its setback, for drawing. */
public final class WarmUpView {
    private WarmUpView() {}

    /**
     * The morning of a room; empty when it has no setback, or is not followed.
     *
     * @param survey one that was sized
     * @param room its number
     */
    public static Optional<WarmUpEvaluation> of(Survey survey, int room) {
        Plan plan = Plan.of(survey);
        Evaluation evaluation = new Evaluation(plan);
        return evaluation.evaluate(plan.values) && evaluation.floors[room] != null
                ? evaluation.floors[room].warmUp.map(WarmUpFloor::evaluation)
                : Optional.empty();
    }
}
