package org.treadwarm.sizing;

import java.util.List;
import java.util.Optional;
import java.util.concurrent.atomic.LongAdder;
import java.util.function.BooleanSupplier;
import org.treadwarm.survey.Problem;
import org.treadwarm.survey.Survey;
import org.treadwarm.survey.Unusual;

/** The main job: a survey in, a sizing out. */
public final class Sizer {
    private static final LongAdder SIZED = new LongAdder();

    private Sizer() {}

    /** How many surveys were sized since the program started. */
    public static long sized() {
        return SIZED.sum();
    }

    /**
     * Sizes every room of a survey.
     *
     * @param survey one that intake accepted
     * @throws NoBalanceException when floating spaces have no steady temperature, as negative psi values can bring about, or
     *     when an area or length is so near to nothing that numbers made with it are beyond all bounds
     */
    public static Sizing size(Survey survey) throws NoBalanceException {
        return size(survey, () -> false);
    }

    /**
     * The same, given up when asked to.
     *
     * @param stopped asked at every step of the solver of floors between their heaters, which alone may take long
     * @throws java.util.concurrent.CancellationException when asked to give up; floors solved until then are remembered
     */
    public static Sizing size(Survey survey, BooleanSupplier stopped) throws NoBalanceException {
        return sizedSurvey(survey, Unusual.in(survey), stopped).sizing();
    }

    /**
     * The same, with what drawings want to know beside the answer.
     *
     * @param unusual its unusual readings, which intake comes past anyway; walking a survey to find them costs half
     *     as much as its sizing
     */
    public static SizedSurvey sizedSurvey(Survey survey, List<Unusual> unusual, BooleanSupplier stopped)
            throws NoBalanceException {
        Evaluation evaluation = evaluated(survey, new Sections(stopped));
        SIZED.increment();
        return new SizedSurvey(evaluation, unusual);
    }

    /**
     * Finds out whether a survey can be sized, without solving floors between their heaters, so it never takes long.
     *
     * @throws NoBalanceException as {@link #size(Survey)}
     */
    public static void check(Survey survey) throws NoBalanceException {
        evaluated(survey, Sections.looking());
    }

    private static Evaluation evaluated(Survey survey, Sections sections) throws NoBalanceException {
        Plan plan = Plan.of(survey);
        Evaluation evaluation = new Evaluation(plan, sections);
        if (!evaluation.evaluate(plan.values)) {
            throw new NoBalanceException(new Problem(
                    "/spaces",
                    plan.floatingNodes.length + " unheated spaces",
                    "the unheated spaces have no steady temperature: their losses and negative psi values cancel",
                    "losses that add up to more than nothing for every unheated space"));
        }
        Optional<String> boundless = evaluation.boundless();
        if (boundless.isPresent()) {
            throw new NoBalanceException(new Problem(
                    boundless.get(),
                    "numbers beyond all bounds",
                    "an area or length here is so small that what is divided by it is beyond all bounds",
                    "areas and lengths of things that can be built"));
        }
        return evaluation;
    }
}
