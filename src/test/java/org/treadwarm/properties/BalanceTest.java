package org.treadwarm.properties;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.SplittableRandom;
import java.util.stream.LongStream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.treadwarm.reference.SurveyGenerator;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.sizing.Sizing.PathLoss;

/** No heat is made or lost on the way: every floating space balances, and what one side gives the other side gets. */
class BalanceTest {
    private static final double RELATIVE = 1e-9;

    static LongStream seeds() {
        return LongStream.range(10_000, 10_200);
    }

    private static Sizing sizing(long seed) {
        return Surveys.sized(SurveyGenerator.random(new SplittableRandom(seed)));
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void theHeatFlowsOfAFloatingSpaceSumToNothing(long seed) {
        Sizing sizing = sizing(seed);
        sizing.spaces().forEach(space -> {
            double sum = 0;
            double size = 0;
            for (PathLoss path : space.paths()) {
                sum += path.heatFlow();
                size += path.conductance().orElseThrow() * (Math.abs(space.temperature()) + 20);
            }
            assertThat(sum).as("seed %d, %s", seed, space.name()).isCloseTo(0, within(RELATIVE * (1 + size)));
        });
        assertThat(sizing.network().residual()).as("seed %d", seed).isLessThan(1e-8);
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void whatOneSideGivesTheOtherGets(long seed) {
        Sizing sizing = sizing(seed);
        Map<List<String>, Double> between = new HashMap<>();
        sizing.rooms()
                .forEach(room -> collect(between, room.name(), room.heatLoss().paths()));
        sizing.spaces().forEach(space -> collect(between, space.name(), space.paths()));
        List<String> listed =
                between.keySet().stream().map(pair -> pair.get(0)).distinct().toList();
        between.forEach((pair, heat) -> {
            if (listed.contains(pair.get(1))) {
                double opposite = between.getOrDefault(List.of(pair.get(1), pair.get(0)), 0.0);
                assertThat(heat)
                        .as("seed %d, %s", seed, pair)
                        .isCloseTo(-opposite, within(RELATIVE * (1 + Math.abs(heat))));
            }
        });
    }

    private static void collect(Map<List<String>, Double> between, String owner, List<PathLoss> paths) {
        paths.forEach(path ->
                path.to().ifPresent(to -> between.merge(List.of(owner, to), path.heatFlow(), Double::sum)));
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void theSumsOfARoomAreTheSumsOfItsPaths(long seed) {
        sizing(seed).rooms().forEach(room -> {
            Sizing.HeatLoss loss = room.heatLoss();
            double paths = loss.paths().stream().mapToDouble(PathLoss::heatFlow).sum();
            double size = loss.paths().stream()
                    .mapToDouble(path -> Math.abs(path.heatFlow()))
                    .sum();
            assertThat(loss.total()).as("seed %d", seed).isCloseTo(paths, within(RELATIVE * (1 + size)));
            assertThat(loss.transmission() + loss.junctions() + loss.air() + loss.reheat())
                    .as("seed %d", seed)
                    .isCloseTo(loss.total(), within(RELATIVE * (1 + size)));
            assertThat(loss.gainsFromNeighbours()).as("seed %d", seed).isNotNegative();
        });
    }

    @ParameterizedTest
    @MethodSource("seeds")
    void theHeaterMakesWhatGoesUpDownAndToTheEdge(long seed) {
        sizing(seed)
                .rooms()
                .forEach(room -> room.floor().atCarryingFlux().ifPresent(carrying -> {
                    Sizing.FloorSizing floor = room.floor();
                    double up = floor.requiredFlux().orElseThrow();
                    assertMade(
                            seed,
                            floor.heaterFlux().orElseThrow(),
                            up,
                            floor.downwardFlux().orElseThrow(),
                            floor.edgeFlux().orElseThrow());
                    assertMade(
                            seed,
                            carrying.heaterFlux(),
                            floor.carryingFlux().orElseThrow(),
                            carrying.downwardFlux(),
                            carrying.edgeFlux());
                    assertThat(floor.requiredFlux().orElseThrow() * floor.area().orElseThrow())
                            .isCloseTo(floor.requiredHeat().orElseThrow(), within(1e-9 * (1 + up)));
                    assertThat(floor.limits()).filteredOn(Sizing.Limit::governs).hasSize(1);
                }));
    }

    private static void assertMade(long seed, double made, double up, double down, double edge) {
        assertThat(made)
                .as("seed %d", seed)
                .isCloseTo(up + down + edge, within(RELATIVE * (1 + Math.abs(up) + Math.abs(down) + Math.abs(edge))));
    }
}
