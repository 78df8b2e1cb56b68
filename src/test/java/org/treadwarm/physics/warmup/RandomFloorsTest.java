package org.treadwarm.physics.warmup;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.List;
import java.util.SplittableRandom;
import java.util.function.BooleanSupplier;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;
import org.treadwarm.physics.warmup.WarmUp.Balance;

/** Floors from foil to metres of rock, over the whole of what a request may ask: each is answered, and no heat is lost. */
class RandomFloorsTest {
    private static final BooleanSupplier NEVER = () -> false;
    private static final double HORIZON = 480 * Floors.HOUR;

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12, 13, 14, 15, 16, 17, 18, 19, 20})
    void answersAndBalances(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        BuildUp floor = new BuildUp(
                layers(random),
                layers(random),
                random.nextBoolean() ? new Film.PowerLaw(8.92, 1.1) : new Film.Constant(between(random, 0.5, 100)),
                new Underside.Exchange(between(random, 0.05, 100), random.nextDouble() * 80 - 40));
        Room room = new Room(
                between(random, 100, 1e7),
                between(random, 100, 1e8),
                between(random, 0.01, 1000),
                between(random, 0.001, 100),
                random.nextDouble() * 80 - 40,
                random.nextDouble() * 200 - 100);
        WarmUp warmUp = new WarmUp(floor, room);
        double from = random.nextDouble() * 60 - 20;
        State start = warmUp.heldByHeating(from);
        assertThat(warmUp.value(start, Watched.AIR)).isGreaterThanOrEqualTo(from - 1e-9);
        double density = random.nextDouble() * 2000;
        Balance balance = warmUp.curve(start, density, HORIZON, 10, NEVER).balance();
        double out = balance.stored() + balance.lostOutdoors() + balance.lostBelow();
        double scale = Math.abs(balance.in())
                + Math.abs(balance.stored())
                + Math.abs(balance.lostOutdoors())
                + Math.abs(balance.lostBelow());
        assertThat(Math.abs(balance.in() - out) / scale).isLessThan(1e-9);
        assertThat(warmUp.after(start, density + 1, Watched.HEATER, HORIZON, NEVER))
                .isGreaterThan(warmUp.after(start, density, Watched.HEATER, HORIZON, NEVER));
        double to = from + random.nextDouble() * 10;
        Reheat.of(floor, room, Watched.OPERATIVE, from, to, between(random, 0.01, 480) * Floors.HOUR, NEVER)
                .ifPresent(reheat -> {
                    assertThat(reheat.extraDensity()).isNotNegative();
                    assertThat(reheat.extraHeat()).isNotNegative();
                });
        PowerCut cut = PowerCut.of(warmUp, to, HORIZON, NEVER);
        assertThat(cut.secondsToFive().orElse(0)).isBetween(0.0, HORIZON);
    }

    private static List<FloorLayer> layers(SplittableRandom random) {
        List<FloorLayer> layers = new ArrayList<>();
        int count = random.nextInt(6);
        for (int i = 0; i < count; i++) {
            layers.add(
                    random.nextInt(4) == 0
                            ? new FloorLayer.Massless(between(random, 1e-5, 50))
                            : new FloorLayer.Massive(
                                    between(random, 1e-5, 10),
                                    between(random, 0.001, 500),
                                    between(random, 0.5, 25_000),
                                    between(random, 50, 20_000)));
        }
        return layers;
    }

    /** Any order of magnitude between the two is as likely as another. */
    private static double between(SplittableRandom random, double low, double high) {
        return low * Math.pow(high / low, random.nextDouble());
    }
}
