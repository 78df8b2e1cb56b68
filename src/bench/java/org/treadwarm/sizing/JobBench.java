package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Level;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OperationsPerInvocation;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.Setup;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.openjdk.jmh.infra.Blackhole;
import org.treadwarm.bench.BenchSurveys;
import org.treadwarm.survey.Survey;

/**
 * Jobs of 10, 100 and 1 000 rooms: the cost of a room must not grow with their number. Each measurement sizes a thousand
 * rooms of as many surveys as that takes, so that every size reads the same amount of memory; one small job again and again
 * would lie in the processor's cache, as no customer's job does.
 */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 5, time = 1)
@Measurement(iterations = 5, time = 1)
@Fork(
        value = 2,
        jvmArgsAppend = {"-Xms2g", "-Xmx2g", "-XX:+AlwaysPreTouch"})
public class JobBench {
    private static final int ROOMS = 1000;

    @Param({"10", "100", "1000"})
    public int rooms;

    private final List<Survey> jobs = new ArrayList<>();

    @Setup(Level.Trial)
    public void setUp() {
        for (int i = 0; i < ROOMS / rooms; i++) {
            jobs.add(BenchSurveys.survey(BenchSurveys.job(rooms)));
        }
    }

    @Benchmark
    @OperationsPerInvocation(ROOMS)
    public void room(Blackhole blackhole) throws NoBalanceException {
        for (Survey job : jobs) {
            blackhole.consume(Sizer.size(job));
        }
    }

    /** The smallest job again and again, all of it in the cache. */
    @Benchmark
    @OperationsPerInvocation(ROOMS)
    public void sameJobAgain(Blackhole blackhole) throws NoBalanceException {
        for (int i = 0; i < ROOMS / rooms; i++) {
            blackhole.consume(Sizer.size(jobs.get(0)));
        }
    }
}
