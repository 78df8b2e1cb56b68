package org.treadwarm.physics.electric;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.SplittableRandom;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;
import org.treadwarm.physics.electric.StockChoice.Pieces;
import org.treadwarm.physics.electric.StockItem.Extent.Cable;
import org.treadwarm.physics.electric.StockItem.Extent.Mat;

/** Choice among a stock: known choices, ties, and a slow search written another way. */
class StockChoiceTest {
    private static final int DRAWS = 60;

    private static StockItem mat(double area, double power) {
        return new StockItem("mat " + area, new Mat(area), power);
    }

    private static StockItem cable(double length, double power) {
        return new StockItem("cable " + length, new Cable(length), power);
    }

    private static List<String> names(StockChoice choice) {
        return choice.pieces().stream()
                .map(pieces -> pieces.count() + " " + pieces.item().name())
                .toList();
    }

    @Test
    void coversWithTheLeastBareAreaThenTheFewestPieces() {
        List<StockItem> stock = List.of(mat(1, 150), mat(2, 300), mat(3.5, 525));
        StockChoice choice =
                StockChoice.best(new CoverDemand(5.6, 120, 200, 0.08), stock).orElseThrow();
        assertThat(names(choice)).containsExactly("1 mat 2.0", "1 mat 3.5");
        assertThat(choice.bareArea()).isCloseTo(0.1, within(1e-12));
        assertThat(choice.power()).isEqualTo(825);
        assertThat(choice.installedDensity()).isCloseTo(825 / 5.6, within(1e-12));
        assertThat(choice.cableSpacing()).isEmpty();
    }

    @Test
    void ofEqualChoicesTakesLessPowerAndThenWhatStandsEarlier() {
        CoverDemand demand = new CoverDemand(2, 100, 200, 0.08);
        StockItem strong = mat(2, 400);
        StockItem weak = mat(2, 300);
        StockItem same = new StockItem("same as weak", new Mat(2), 300);
        StockChoice choice =
                StockChoice.best(demand, List.of(strong, weak, same)).orElseThrow();
        assertThat(choice.pieces()).containsExactly(new Pieces(weak, 1));
        StockChoice turned =
                StockChoice.best(demand, List.of(same, strong, weak)).orElseThrow();
        assertThat(turned.pieces()).containsExactly(new Pieces(same, 1));
    }

    @Test
    void spreadsACableOverTheWholeArea() {
        List<StockItem> stock = List.of(cable(20, 340), cable(35, 595), cable(50, 850));
        StockChoice choice =
                StockChoice.best(new CoverDemand(4, 140, 200, 0.08), stock).orElseThrow();
        assertThat(names(choice)).containsExactly("1 cable 35.0");
        assertThat(choice.cableSpacing().orElseThrow()).isCloseTo(4.0 / 35, within(1e-12));
        assertThat(choice.bareArea()).isZero();
    }

    @Test
    void takesNoMoreThanCanBeHad() {
        StockItem scarce = new StockItem("scarce", new Mat(2), 300, 1);
        StockChoice choice = StockChoice.best(new CoverDemand(6, 50, 200, 0.08), List.of(scarce, mat(1, 150)))
                .orElseThrow();
        assertThat(names(choice)).containsExactly("1 scarce", "4 mat 1.0");
    }

    @Test
    void givesTheStrongestWhereNoneIsStrongEnough() {
        List<StockItem> stock = List.of(mat(2, 200), mat(1.5, 240), mat(0.5, 90));
        CoverDemand demand = new CoverDemand(3.4, 500, 1000, 0.08);
        assertThat(StockChoice.best(demand, stock)).isEmpty();
        StockChoice strongest = StockChoice.strongest(demand, stock).orElseThrow();
        assertThat(names(strongest)).containsExactly("6 mat 0.5");
        assertThat(strongest.power()).isEqualTo(540);
    }

    @Test
    void answersNothingWhereNothingFits() {
        assertThat(StockChoice.best(new CoverDemand(0.5, 100, 200, 0.08), List.of(mat(1, 150))))
                .isEmpty();
        assertThat(StockChoice.best(new CoverDemand(4, 140, 150, 0.2), List.of(cable(35, 595))))
                .isEmpty();
        assertThat(StockChoice.best(new CoverDemand(4, 100, 150, 0.08), List.of()))
                .isEmpty();
    }

    /**
     * Mats of one density in steps of half a square metre make few different sums, so a large area is no harder. The 119 halves
     * of a square metre need a mat of odd halves, at most 7, beside which four of 24 are too few: six pieces.
     */
    @Test
    void choosesForALargeRoom() {
        List<StockItem> stock = IntStream.of(1, 2, 3, 4, 5, 6, 7, 8, 10, 12, 14, 16, 20, 24)
                .mapToObj(halves -> mat(halves / 2.0, halves * 75.0))
                .toList();
        StockChoice choice =
                StockChoice.best(new CoverDemand(59.7, 120, 200, 0.08), stock).orElseThrow();
        assertThat(choice.bareArea()).isCloseTo(0.2, within(1e-9));
        assertThat(choice.count()).isEqualTo(6);
        assertThat(choice.power()).isCloseTo(59.5 * 150, within(1e-9));
    }

    @Test
    void refusesMoreCombinationsThanItCanLookAt() {
        List<StockItem> many = IntStream.rangeClosed(1, 12)
                .mapToObj(i -> mat(0.1 + 0.01 * Math.sqrt(i), 15 + Math.cbrt(i)))
                .toList();
        assertThatIllegalArgumentException()
                .isThrownBy(() -> StockChoice.best(new CoverDemand(50, 100, 200, 0.08), many))
                .withMessageContaining("too many combinations");
    }

    @Test
    void agreesWithAPlainSearchOverAllCounts() {
        SplittableRandom random = new SplittableRandom(23);
        int found = 0;
        for (int i = 0; i < DRAWS; i++) {
            List<StockItem> stock = new ArrayList<>();
            for (int k = 0; k < 3; k++) {
                stock.add(
                        random.nextInt(3) == 0
                                ? cable(random.nextInt(10, 60), random.nextInt(100, 900))
                                : mat(random.nextInt(2, 12) / 2.0, random.nextInt(100, 900)));
            }
            CoverDemand demand =
                    new CoverDemand(random.nextInt(2, 20), random.nextInt(50, 120), random.nextInt(120, 220), 0.07);
            Optional<StockChoice> choice = StockChoice.best(demand, stock);
            Optional<double[]> plain = plain(demand, stock);
            assertThat(choice.isPresent()).as("draw %d", i).isEqualTo(plain.isPresent());
            if (choice.isPresent()) {
                found++;
                StockChoice best = choice.orElseThrow();
                double[] expected = plain.orElseThrow();
                assertThat(best.bareArea()).as("draw %d", i).isCloseTo(expected[0], within(1e-6));
                assertThat(best.count()).as("draw %d", i).isEqualTo((int) expected[1]);
                assertThat(best.power()).as("draw %d", i).isCloseTo(expected[2], within(1e-3));
            }
        }
        assertThat(found).isGreaterThan(DRAWS / 4);
    }

    /** Bare area, number of pieces and power of the best of all counts from 0 to 45 of three items. */
    private static Optional<double[]> plain(CoverDemand demand, List<StockItem> stock) {
        double[] best = null;
        for (int code = 0; code < 46 * 46 * 46; code++) {
            int[] counts = {code % 46, code / 46 % 46, code / 46 / 46};
            double mats = 0;
            double length = 0;
            double power = 0;
            for (int k = 0; k < 3; k++) {
                StockItem item = stock.get(k);
                power += counts[k] * item.power();
                if (item.extent() instanceof Mat mat) {
                    mats += counts[k] * mat.area();
                } else if (item.extent() instanceof Cable cable) {
                    length += counts[k] * cable.length();
                }
            }
            double left = demand.area() - mats;
            boolean keeps = left > -1e-9
                    && power / demand.area() > demand.requiredDensity() - 1e-7
                    && (length == 0 || left / length > demand.leastSpacing() - 1e-10);
            for (int k = 0; k < 3 && keeps; k++) {
                StockItem item = stock.get(k);
                double covered = item.extent() instanceof Cable cable
                        ? cable.length() * left / length
                        : ((Mat) item.extent()).area();
                keeps = counts[k] == 0 || item.power() / covered < demand.largestDensity() + 1e-7;
            }
            double[] got = {length > 0 ? 0 : Math.max(0, left), counts[0] + counts[1] + counts[2], power};
            if (keeps && (best == null || isBetter(got, best))) {
                best = got;
            }
        }
        return Optional.ofNullable(best);
    }

    private static boolean isBetter(double[] one, double[] other) {
        if (Math.abs(one[0] - other[0]) > 1e-6) {
            return one[0] < other[0];
        }
        return one[1] != other[1] ? one[1] < other[1] : one[2] < other[2];
    }
}
