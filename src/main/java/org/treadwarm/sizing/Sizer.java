package org.treadwarm.sizing;

import org.treadwarm.survey.Problem;
import org.treadwarm.survey.Survey;

/** The main job: a survey in, a sizing out. */
public final class Sizer {
    private Sizer() {}

    /**
     * Sizes every room of a survey.
     *
     * @param survey one that intake accepted
     * @throws NoBalanceException when floating spaces have no steady temperature, as negative psi values can bring about
     */
    public static Sizing size(Survey survey) throws NoBalanceException {
        Plan plan = Plan.of(survey);
        Evaluation evaluation = new Evaluation(plan);
        if (!evaluation.evaluate(plan.values)) {
            throw new NoBalanceException(new Problem(
                    "/spaces",
                    plan.floatingNodes.length + " unheated spaces",
                    "the unheated spaces have no steady temperature: their losses and negative psi values cancel",
                    "losses that add up to more than nothing for every unheated space"));
        }
        return new Answers(evaluation).sizing();
    }
}
