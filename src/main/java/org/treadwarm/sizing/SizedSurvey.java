package org.treadwarm.sizing;

import java.util.List;
import java.util.Optional;
import org.treadwarm.survey.Unusual;

/**
 * A survey that was sized: the answer, and what drawings want to know of how it was found without finding it again. May be used
 * from any number of threads.
 */
public final class SizedSurvey {
    private final Evaluation evaluation;
    private final Sizing sizing;

    SizedSurvey(Evaluation evaluation, List<Unusual> unusual) {
        this.evaluation = evaluation;
        this.sizing = new Answers(evaluation).sizing(unusual);
    }

    /** Whether sizing the same survey again would find the same; not when it has more floors than one sizing solves. */
    public boolean isLasting() {
        return !evaluation.sections.gaveUp();
    }

    /** The answer. */
    public Sizing sizing() {
        return sizing;
    }

    /**
     * The temperatures of a room's floor, of each of its parts when it is laid in parts; empty when it has no solved section or gives
     * no heat.
     *
     * @param room its number
     */
    public synchronized List<SectionView> sections(int room) {
        FloorEvaluation floor = evaluation.floors[room];
        return floor == null ? List.of() : SectionView.all(floor, evaluation.outdoor);
    }

    /**
     * How a room warms up after its setback; empty when it has none, or is not followed.
     *
     * @param room its number
     */
    public Optional<WarmUpEvaluation> morning(int room) {
        FloorEvaluation floor = evaluation.floors[room];
        return floor == null ? Optional.empty() : floor.warmUp.map(WarmUpFloor::evaluation);
    }
}
