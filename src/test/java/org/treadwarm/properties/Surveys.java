package org.treadwarm.properties;

import com.fasterxml.jackson.databind.JsonNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.sizing.NoBalanceException;
import org.treadwarm.sizing.Sizer;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.survey.Problem;
import org.treadwarm.survey.Survey;
import org.treadwarm.wire.Json;

/** Shortcuts from trees to answers, and the stored surveys (all invented). */
public final class Surveys {
    private Surveys() {}

    /** The invented survey of a studio and its shower room, in the readings of a surveyor. */
    public static ObjectNode studio() {
        return stored("studio");
    }

    /** An invented survey with every key of the document in it, in plain SI numbers. */
    public static ObjectNode everything() {
        return stored("everything");
    }

    /** An invented survey whose floors are solved between their cables or pipes. */
    public static ObjectNode solved() {
        return stored("solved");
    }

    /** The studio alone, which no warning is raised for. */
    public static ObjectNode quiet() {
        ObjectNode survey = studio();
        Trees.remove(survey, "/rooms/1");
        Trees.remove(survey, "/rooms/0/surfaces/3");
        Trees.remove(survey, "/spaces/stair");
        return survey;
    }

    private static ObjectNode stored(String name) {
        return (ObjectNode) Trees.resource("/surveys/" + name + ".json");
    }

    public static Survey accepted(JsonNode tree) {
        Outcome<Survey> outcome = Intake.survey(tree);
        if (outcome instanceof Outcome.Refused<Survey> refused) {
            throw new AssertionError("refused: " + refused.problems() + " in " + tree);
        }
        return ((Outcome.Accepted<Survey>) outcome).value();
    }

    /** Every problem of a document; none when it is accepted. */
    public static List<Problem> problems(JsonNode tree) {
        return Intake.survey(tree) instanceof Outcome.Refused<Survey> refused ? refused.problems() : List.of();
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
