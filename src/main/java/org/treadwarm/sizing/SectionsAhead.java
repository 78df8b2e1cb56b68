package org.treadwarm.sizing;

import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import org.treadwarm.survey.Survey;

/** The floors that a sizing would have to solve anew between their cables or pipes, so that they can be solved before it, at leisure. */
public final class SectionsAhead {
    private final List<SectionGeometry> unknown;

    private SectionsAhead(List<SectionGeometry> unknown) {
        this.unknown = unknown;
    }

    /** Those of a survey that intake accepted; none where there are more than are remembered. */
    public static SectionsAhead of(Survey survey) {
        Plan plan = Plan.of(survey);
        Evaluation evaluation = new Evaluation(plan, Sections.looking());
        return new SectionsAhead(evaluation.evaluate(plan.values) ? evaluation.sections.unknown() : List.of());
    }

    /** Whether others are the same floors. */
    @Override
    public boolean equals(Object other) {
        return other instanceof SectionsAhead ahead && ahead.unknown.equals(unknown);
    }

    @Override
    public int hashCode() {
        return unknown.hashCode();
    }

    /** Number of different floors. */
    public int count() {
        return unknown.size();
    }

    /**
     * Solves them; the sizings that follow have them at hand.
     *
     * @param stopped asked at every step of the solver whether to give up
     * @param progress told now and then what share is done
     * @throws CancellationException when asked to give up; what was solved until then is kept
     */
    public void solve(BooleanSupplier stopped, DoubleConsumer progress) {
        for (int i = 0; i < unknown.size(); i++) {
            double before = i;
            Sections.solve(unknown.get(i), stopped, share -> progress.accept((before + share) / unknown.size()));
            progress.accept((i + 1.0) / unknown.size());
        }
    }
}
