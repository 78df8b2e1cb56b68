package org.treadwarm.physics.warmup;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.TimeUnit;
import org.openjdk.jmh.annotations.Benchmark;
import org.openjdk.jmh.annotations.BenchmarkMode;
import org.openjdk.jmh.annotations.Fork;
import org.openjdk.jmh.annotations.Measurement;
import org.openjdk.jmh.annotations.Mode;
import org.openjdk.jmh.annotations.OutputTimeUnit;
import org.openjdk.jmh.annotations.Scope;
import org.openjdk.jmh.annotations.State;
import org.openjdk.jmh.annotations.Warmup;

/** A floor of five layers under its room: a day, the search of the density for three hours, a reheat. */
@State(Scope.Thread)
@BenchmarkMode(Mode.AverageTime)
@OutputTimeUnit(TimeUnit.MICROSECONDS)
@Warmup(iterations = 3, time = 1)
@Measurement(iterations = 4, time = 1)
@Fork(
        value = 1,
        jvmArgsAppend = {"-Xms512m", "-Xmx512m", "-XX:+AlwaysPreTouch"})
public class WarmUpBench {
    private static final double HOUR = 3600;

    private final Room room = new Room(9000, 150_000, 8, 1.2, -9, 0);
    private final BuildUp powerLaw = floor(new Film.PowerLaw(8.92, 1.1));
    private final WarmUp linear = new WarmUp(floor(new Film.Constant(10.8)), room);
    private final WarmUp warmUp = new WarmUp(powerLaw, room);

    private static BuildUp floor(Film film) {
        return new BuildUp(
                List.of(
                        new FloorLayer.Massive(0.01, 1.3, 2300, 840),
                        new FloorLayer.Massive(0.003, 1, 1800, 1000),
                        new FloorLayer.Massive(0.065, 1.4, 2000, 1000)),
                List.of(new FloorLayer.Massive(0.03, 0.036, 20, 1450), new FloorLayer.Massive(0.1, 1.65, 2200, 1000)),
                film,
                new Underside.Exchange(5.9, 15));
    }

    /** 24 hours from 16 °C with one film coefficient. */
    @Benchmark
    public double dayByOneCoefficient() {
        return linear.after(linear.held(16), 120, Watched.AIR, 24 * HOUR, () -> false);
    }

    /** 24 hours from 16 °C with the basic characteristic. */
    @Benchmark
    public double dayByPowerLaw() {
        return warmUp.after(warmUp.held(16), 120, Watched.AIR, 24 * HOUR, () -> false);
    }

    /** The density that warms from 16 to 20 °C in three hours. */
    @Benchmark
    public OptionalDouble densitySearch() {
        return warmUp.densityWithin(warmUp.held(16), Watched.AIR, 20, 3 * HOUR, () -> false);
    }

    /** The same from the layers to the extra heat of a sizing. */
    @Benchmark
    public Optional<Reheat> reheat() {
        return Reheat.of(powerLaw, room, Watched.AIR, 16, 20, 3 * HOUR, () -> false);
    }
}
