package org.treadwarm.physics.section;

import java.util.List;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Param;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;
import org.treadwarm.physics.section.Condition.Film;
import org.treadwarm.physics.section.FloorHeater.WaterPipe;
import org.treadwarm.physics.section.FloorLayer.Resisting;
import org.treadwarm.physics.section.FloorLayer.Solid;

/** Sections of many cells, one heated floor from nothing, and its response. */
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 4, time = 2)
@Measurement(iterations = 4, time = 2)
@Fork(
        value = 1,
        jvmArgs = {"-Xms3g", "-Xmx3g", "-XX:+AlwaysPreTouch"})
public class SectionBench {
    /** Sections by their number of cells along a side. */
    @State(Scope.Benchmark)
    public static class Sections {
        @Param({"100", "316", "1000"})
        int cellsAlong;
    }

    /** An invented floor with pipes, and its response. */
    @State(Scope.Thread)
    public static class Floor {
        private final FloorSection section = new FloorSection(
                0.15,
                List.of(
                        new Resisting("parquet", 0.1),
                        new Solid("screed", 0.061, 1.2),
                        new Solid("insulation", 0.03, 0.035)),
                new WaterPipe(1, 0.053, 0.016, 0.002, 0.35, 2000, 38),
                new Film(20, 10.8),
                new Film(10, 1 / 0.17));
        private final FloorResponse response = FloorResponse.of(section, () -> false);
        private final FloorState state = response.newState();
        private double flux = 30;
    }

    /** Setting up and solving, relative residual 1e-8; the steps. */
    @Benchmark
    public int cells(Sections sections) {
        TwoLayers section = new TwoLayers(sections.cellsAlong);
        return section.solve(new double[section.lattice.cells()]).iterations();
    }

    /** A floor to 0.1 % of its flux. */
    @Benchmark
    public double floor(Floor floor) {
        return floor.section.solve().upwardFlux();
    }

    /** All fields of a response. */
    @Benchmark
    public Object response(Floor floor) {
        return FloorResponse.of(floor.section, () -> false);
    }

    /** One evaluation at another flux each time. */
    @Benchmark
    @OutputTimeUnit(TimeUnit.NANOSECONDS)
    public double evaluate(Floor floor) {
        floor.flux = floor.flux < 100 ? floor.flux + 0.37 : 30;
        floor.response.evaluate(floor.flux, 20, 10, floor.state);
        return floor.state.heatInput() + floor.state.surfaceMaximum();
    }
}
