package org.treadwarm.physics.network;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Floating temperatures of networks whose answer is known, and balances of random ones. */
class NetworkTest {
    private static Network chain(int size) {
        int[] from = IntStream.range(0, size - 1).toArray();
        int[] to = IntStream.range(1, size).toArray();
        return new Network(size, from, to);
    }

    @Test
    void oneSpaceIsTheMeanOfWhatItTouches() {
        Network network = new Network(1, new int[0], new int[0]);
        network.addAnchor(0, 30);
        network.addAnchor(0, 10);
        double[] temperature = new double[1];
        assertThat(network.factor()).isTrue();
        network.solve(new double[] {30 * 20 + 10 * -10}, temperature);
        assertThat(temperature[0]).isCloseTo(12.5, within(1e-14));
    }

    @ParameterizedTest
    @ValueSource(ints = {2, 3, 50, 500})
    void aChainFallsInAStraightLine(int size) {
        Network network = chain(size);
        for (int link = 0; link < size - 1; link++) {
            network.addLink(link, 4);
        }
        network.addAnchor(0, 4);
        network.addAnchor(size - 1, 4);
        double[] source = new double[size];
        source[0] = 4 * 20;
        source[size - 1] += 4 * -10;
        double[] temperature = new double[size];
        assertThat(network.factor()).isTrue();
        network.solve(source, temperature);
        for (int i = 0; i < size; i++) {
            assertThat(temperature[i]).isCloseTo(20 - 30.0 * (i + 1) / (size + 1), within(1e-10));
        }
        assertThat(network.residual(source, temperature)).isLessThan(1e-10);
    }

    @Test
    void theRaysOfAStarHangOnItsMiddle() {
        int rays = 200;
        Network network = new Network(
                rays + 1, new int[rays], IntStream.rangeClosed(1, rays).toArray());
        double[] source = new double[rays + 1];
        for (int ray = 1; ray <= rays; ray++) {
            network.addLink(ray - 1, 2);
            network.addAnchor(ray, 3);
            source[ray] = 3 * 5;
        }
        network.addAnchor(0, 10);
        source[0] = 10 * 25;
        double[] temperature = new double[rays + 1];
        assertThat(network.factor()).isTrue();
        network.solve(source, temperature);
        double perRay = 1 / (1 / 2.0 + 1 / 3.0);
        double middle = (10 * 25 + rays * perRay * 5) / (10 + rays * perRay);
        assertThat(temperature[0]).isCloseTo(middle, within(1e-11));
        for (int ray = 1; ray <= rays; ray++) {
            assertThat(temperature[ray]).isCloseTo((2 * middle + 3 * 5) / 5, within(1e-11));
        }
    }

    @Test
    void groupsThatDoNotTouchAreSolvedSideBySide() {
        Network network = new Network(4, new int[] {0, 3}, new int[] {2, 1});
        double[] source = new double[4];
        network.addLink(0, 5);
        network.addLink(1, 7);
        network.addAnchor(0, 5);
        network.addAnchor(1, 7);
        source[0] = 5 * 18;
        source[1] = 7 * -4;
        double[] temperature = new double[4];
        assertThat(network.factor()).isTrue();
        network.solve(source, temperature);
        assertThat(temperature).containsExactly(new double[] {18, -4, 18, -4}, within(1e-13));
    }

    @Test
    void aGroupThatNothingHoldsHasNoAnswer() {
        Network network = new Network(4, new int[] {0, 2}, new int[] {1, 3});
        network.addLink(0, 5);
        network.addLink(1, 5);
        network.addAnchor(0, 1);
        assertThat(network.factor()).isFalse();
        network.addAnchor(3, 1e-3);
        assertThat(network.factor()).isTrue();
    }

    @Test
    void lossesThatCancelHaveNoAnswer() {
        Network network = new Network(1, new int[0], new int[0]);
        assertThat(network.factor()).isFalse();
        network.addAnchor(0, 3);
        network.addAnchor(0, -3);
        assertThat(network.factor()).isFalse();
        network.addAnchor(0, -1);
        assertThat(network.factor()).isFalse();
    }

    @Test
    void clearForgetsEveryConductance() {
        Network network = chain(3);
        network.addLink(0, 1);
        network.addLink(1, 1);
        network.addAnchor(0, 1);
        assertThat(network.factor()).isTrue();
        network.clear();
        assertThat(network.factor()).isFalse();
    }

    @Test
    void parallelLinksAddUp() {
        Network network = new Network(2, new int[] {0, 1}, new int[] {1, 0});
        network.addLink(0, 1);
        network.addLink(1, 2);
        network.addAnchor(0, 6);
        network.addAnchor(1, 6);
        double[] temperature = new double[2];
        assertThat(network.factor()).isTrue();
        network.solve(new double[] {6 * 20, 0}, temperature);
        assertThat(temperature[0]).isCloseTo(15, within(1e-13));
        assertThat(temperature[1]).isCloseTo(5, within(1e-13));
    }

    @Test
    void noSpaceAtAllIsSolved() {
        Network network = new Network(0, new int[0], new int[0]);
        assertThat(network.factor()).isTrue();
        assertThat(network.size()).isZero();
        assertThat(network.residual(new double[0], new double[0])).isZero();
    }

    @ParameterizedTest
    @ValueSource(longs = {1, 2, 3, 4, 5, 6, 7, 8, 9, 10})
    void everyBalanceOfARandomNetworkCloses(long seed) {
        SplittableRandom random = new SplittableRandom(seed);
        int size = random.nextInt(2, 120);
        int links = random.nextInt(0, 3 * size);
        int[] from = new int[links];
        int[] to = new int[links];
        for (int link = 0; link < links; link++) {
            from[link] = random.nextInt(size);
            to[link] = (from[link] + random.nextInt(1, size)) % size;
        }
        Network network = new Network(size, from, to);
        for (int link = 0; link < links; link++) {
            network.addLink(link, random.nextDouble(0.01, 100));
        }
        double[] source = new double[size];
        double low = Double.POSITIVE_INFINITY;
        double high = Double.NEGATIVE_INFINITY;
        for (int i = 0; i < size; i++) {
            double known = random.nextDouble(-20, 25);
            double conductance = random.nextDouble(0.01, 50);
            network.addAnchor(i, conductance);
            source[i] = conductance * known;
            low = Math.min(low, known);
            high = Math.max(high, known);
        }
        double[] temperature = new double[size];
        assertThat(network.factor()).as("seed %d", seed).isTrue();
        network.solve(source, temperature);
        assertThat(network.residual(source, temperature)).as("seed %d", seed).isLessThan(1e-9);
        for (double each : temperature) {
            assertThat(each)
                    .as("seed %d: no space is colder or warmer than all it hangs on", seed)
                    .isBetween(low, high);
        }
    }

    @Test
    void theResidualTellsAWrongAnswer() {
        Network network = chain(2);
        network.addLink(0, 4);
        network.addAnchor(0, 4);
        assertThat(network.residual(new double[] {80, 0}, new double[] {20, 19}))
                .isCloseTo(4, within(1e-13));
    }
}
