package org.treadwarm.properties;

import com.fasterxml.jackson.databind.JsonNode;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.sizing.NoBalanceException;
import org.treadwarm.sizing.Sizer;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.survey.Survey;
import org.treadwarm.wire.Json;

/** Shortcuts from trees to answers. */
public final class Surveys {
    private Surveys() {}

    public static Survey accepted(JsonNode tree) {
        Outcome<Survey> outcome = Intake.survey(tree);
        if (outcome instanceof Outcome.Refused<Survey> refused) {
            throw new AssertionError("refused: " + refused.problems() + " in " + tree);
        }
        return ((Outcome.Accepted<Survey>) outcome).value();
    }

    public static Sizing sized(JsonNode tree) {
        try {
            return Sizer.size(accepted(tree));
        } catch (NoBalanceException e) {
            throw new AssertionError(e.problem() + " in " + tree, e);
        }
    }

    public static JsonNode answer(JsonNode tree) {
        return Json.tree(sized(tree));
    }
}
