package org.treadwarm.sizing;

import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Level;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.treadwarm.bench.BenchSurveys;
import org.treadwarm.survey.Survey;

/** Jobs of 10, 100 and 1 000 rooms: the cost of a room must not grow with their number. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MILLISECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(2)
public class JobBench {
    @Param({"10", "100", "1000"})
    public int rooms;

    private Survey survey;

    @Setup(Level.Trial)
    public void setUp() {
        survey = BenchSurveys.survey(BenchSurveys.job(rooms));
    }

    @Benchmark
    public Sizing wholeJob() throws NoBalanceException {
        return Sizer.size(survey);
    }
}
