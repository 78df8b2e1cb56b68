package org.treadwarm.sizing;

import java.util.List;
import org.treadwarm.sizing.Sizing.PathLoss;
import org.treadwarm.survey.Survey;

/**
 * What a floating space settles at on the design day. Heated floors have no part in that balance, so none is solved for it.
 *
 * @param name of the space
 * @param temperature degrees Celsius
 * @param paths the heat that leaves it, W
 */
public record SpaceBalance(String name, double temperature, List<PathLoss> paths) {
    /** Those of a survey that intake accepted; none where the floating spaces have no steady temperature. */
    public static List<SpaceBalance> all(Survey survey) {
        Plan plan = Plan.of(survey);
        Evaluation evaluation = new Evaluation(plan, Sections.looking());
        return evaluation.evaluate(plan.values) ? new Answers(evaluation).spaceBalances() : List.of();
    }
}
