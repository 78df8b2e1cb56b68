package org.treadwarm.sizing;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Level;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.treadwarm.bench.BenchSurveys;
import org.treadwarm.intake.Document;
import org.treadwarm.intake.Intake;
import org.treadwarm.intake.NotJsonException;
import org.treadwarm.survey.Survey;
import org.treadwarm.wire.Json;

/** A room of 12 surfaces: the numbers alone, the whole sizing, its intake and its answer as JSON. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class SizingBench {
    private Survey survey;
    private Plan plan;
    private Evaluation evaluation;
    private Sizing sizing;
    private byte[] json;

    @Setup(Level.Trial)
    public void setUp() throws NoBalanceException {
        JsonNode tree = BenchSurveys.twelveSurfaces();
        survey = BenchSurveys.survey(tree);
        plan = Plan.of(survey);
        evaluation = new Evaluation(plan);
        sizing = Sizer.size(survey);
        json = Json.bytes(tree);
    }

    /** The core: every number of the sizing from plain inputs, without making garbage. */
    @Benchmark
    public double nominalSizing() {
        evaluation.evaluate(plan.values);
        return evaluation.floors[0].carryingFlux;
    }

    /** From a survey to the whole answer: plan, numbers, records, warnings and cautions. */
    @Benchmark
    public Sizing wholeSizing() throws NoBalanceException {
        return Sizer.size(survey);
    }

    /** The same after intake, which has found the unusual readings already: none. */
    @Benchmark
    public Sizing sizingAfterIntake() throws NoBalanceException {
        return Sizer.sizedSurvey(survey, List.of(), () -> false).sizing();
    }

    /** From JSON text to a survey in which everything holds. */
    @Benchmark
    public Object intake() throws NotJsonException {
        return Intake.survey(Document.read(json));
    }

    /** The answer as JSON text. */
    @Benchmark
    public byte[] answerAsJson() {
        return Json.bytes(sizing);
    }
}
