package org.treadwarm.jobs;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.Optional;
import java.util.function.BooleanSupplier;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.Intake.Outcome;
import org.treadwarm.sizing.NoBalanceException;
import org.treadwarm.sizing.SizedSurvey;
import org.treadwarm.sizing.Sizer;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.survey.Problem;
import org.treadwarm.survey.Survey;

/** What a document comes to: a survey with its sizing, or its problems. */
public record Judgement(Optional<Survey> survey, Optional<SizedSurvey> sized, List<Problem> problems) {
    private static final int LONGEST = 1_000_000;

    /** The last ones, as the pages of a job ask for the same again and again. */
    private static final Remembered<Judgement> LAST = new Remembered<>(LONGEST, made -> 0);

    /**
     * Reads and sizes a document, which may take long where floors must be solved between their heaters. The last ones are
     * remembered.
     */
    public static Judgement of(JsonNode document) {
        // By its text, since order and spelling belong to a document and its equality does not see them.
        return LAST.of(document.toString(), () -> of(document, () -> false), Judgement::isLasting);
    }

    /** Whether the same document would come to the same again; not when its floors were too many to be solved at once. */
    public boolean isLasting() {
        return sized.map(SizedSurvey::isLasting).orElse(true);
    }

    /** The sizing, when there are no problems and it was asked for. */
    public Optional<Sizing> sizing() {
        return sized.map(SizedSurvey::sizing);
    }

    /**
     * Reads and sizes a document that nothing is remembered of, and gives up when asked to.
     *
     * @param stopped see {@link Sizer#size(Survey, BooleanSupplier)}
     * @throws java.util.concurrent.CancellationException when asked to give up
     */
    public static Judgement of(JsonNode document, BooleanSupplier stopped) {
        return judged(
                document, accepted -> Optional.of(Sizer.sizedSurvey(accepted.value(), accepted.unusual(), stopped)));
    }

    /** Reads a document and finds its problems without sizing it, which never takes long. */
    public static Judgement unsized(JsonNode document) {
        return judged(document, accepted -> {
            Sizer.check(accepted.value());
            return Optional.empty();
        });
    }

    /** What makes a sizing of a survey, or none. */
    private interface Sized {
        Optional<SizedSurvey> of(Outcome.Accepted<Survey> accepted) throws NoBalanceException;
    }

    private static Judgement judged(JsonNode document, Sized sized) {
        Outcome<Survey> outcome = Intake.survey(document);
        if (outcome instanceof Outcome.Refused<Survey> refused) {
            return new Judgement(Optional.empty(), Optional.empty(), refused.problems());
        }
        Outcome.Accepted<Survey> accepted = (Outcome.Accepted<Survey>) outcome;
        Survey survey = accepted.value();
        try {
            return new Judgement(Optional.of(survey), sized.of(accepted), List.of());
        } catch (NoBalanceException e) {
            return new Judgement(Optional.of(survey), Optional.empty(), List.of(e.problem()));
        }
    }
}
