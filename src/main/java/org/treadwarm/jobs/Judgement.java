package org.treadwarm.jobs;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.Optional;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.sizing.NoBalanceException;
import org.treadwarm.sizing.Sizer;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.survey.Problem;
import org.treadwarm.survey.Survey;

/** What a document comes to: a survey with its sizing, or its problems. */
public record Judgement(Optional<Survey> survey, Optional<Sizing> sizing, List<Problem> problems) {
    /** Reads and sizes a document. */
    public static Judgement of(JsonNode document) {
        Outcome<Survey> outcome = Intake.survey(document);
        if (outcome instanceof Outcome.Refused<Survey> refused) {
            return new Judgement(Optional.empty(), Optional.empty(), refused.problems());
        }
        Survey survey = ((Outcome.Accepted<Survey>) outcome).value();
        try {
            return new Judgement(Optional.of(survey), Optional.of(Sizer.size(survey)), List.of());
        } catch (NoBalanceException e) {
            return new Judgement(Optional.of(survey), Optional.empty(), List.of(e.problem()));
        }
    }
}
