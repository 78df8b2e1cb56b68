package org.treadwarm.physics.electric;

import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.treadwarm.physics.electric.StockChoice.Pieces;

/**
 * Goes through the stock item by item and keeps, of all combinations so far that cover the same area with the same length,
 * power and strongest cable, only the one that is to be preferred: what can be added to them, and what that makes, is the same.
 * So the search is exact, and its work grows with the number of different sums instead of the number of combinations.
 */
final class StockSearch {
    private static final int MOST_LOOKS = 100_000;

    /** Room for the rounding of floating-point numbers, as a share. */
    private static final double ROUNDING = 1e-9;

    /** Fewest pieces first, then more of what stands earlier in the stock. */
    private static final Comparator<Combination> PREFERRED =
            Comparator.comparingInt(Combination::pieces).thenComparing(Combination::counts, StockSearch::moreOfEarlier);

    private final CoverDemand demand;
    private final List<StockItem> stock;
    private int looks;

    StockSearch(CoverDemand demand, List<StockItem> stock) {
        this.demand = demand;
        this.stock = List.copyOf(stock);
    }

    /** What sums must be equal, to 1 mm², 1 mm and 1 mW, for two combinations to be alike. */
    private record Sums(long squareMillimetres, long millimetres, long milliwatts, double strongest) {}

    /** So many of each item up to some place in the stock; strongest is the largest W/m of the cables among them. */
    private record Combination(
            List<Integer> counts, int pieces, double matArea, double cableLength, double power, double strongest) {
        static final Combination NOTHING = new Combination(List.of(), 0, 0, 0, 0, 0);

        Combination with(StockItem item, int count) {
            List<Integer> extended = new ArrayList<>(counts);
            extended.add(count);
            double perMetre = count > 0 && item.cableLength() > 0 ? item.power() / item.cableLength() : 0;
            return new Combination(
                    List.copyOf(extended),
                    pieces + count,
                    matArea + count * item.matArea(),
                    cableLength + count * item.cableLength(),
                    power + count * item.power(),
                    Math.max(strongest, perMetre));
        }

        Sums sums() {
            return new Sums(
                    Math.round(matArea * 1e6), Math.round(cableLength * 1e3), Math.round(power * 1e3), strongest);
        }
    }

    Optional<StockChoice> best() {
        Comparator<Combination> order = Comparator.comparingLong(this::bareSquareMillimetres)
                .thenComparingInt(Combination::pieces)
                .thenComparingLong(combination -> combination.sums().milliwatts())
                .thenComparing(PREFERRED);
        return all().stream()
                .filter(this::isStrongEnough)
                .filter(this::keepsSpacing)
                .min(order)
                .map(this::choice);
    }

    Optional<StockChoice> strongest() {
        Comparator<Combination> order = Comparator.comparingLong(
                        (Combination combination) -> -combination.sums().milliwatts())
                .thenComparingLong(this::bareSquareMillimetres)
                .thenComparing(PREFERRED);
        return all().stream().filter(this::keepsSpacing).min(order).map(this::choice);
    }

    private Collection<Combination> all() {
        Collection<Combination> combinations = List.of(Combination.NOTHING);
        for (StockItem item : stock) {
            combinations = extended(combinations, item);
        }
        return combinations;
    }

    private Collection<Combination> extended(Collection<Combination> combinations, StockItem item) {
        Map<Sums, Combination> extended = new LinkedHashMap<>();
        for (Combination combination : combinations) {
            int count = 0;
            Combination with = combination.with(item, 0);
            while (count <= item.most() && fits(with)) {
                look();
                extended.merge(with.sums(), with, (one, other) -> PREFERRED.compare(one, other) <= 0 ? one : other);
                count++;
                if (isTooDense(item)) {
                    break;
                }
                with = combination.with(item, count);
            }
        }
        return extended.values();
    }

    private void look() {
        looks++;
        if (looks > MOST_LOOKS) {
            throw new IllegalArgumentException("a stock of " + stock.size() + " items has too many combinations for "
                    + demand.area() + " m2, allowed are " + MOST_LOOKS + " looks at one");
        }
    }

    /** Whether more may be added: what does not fit fits even less with more. */
    private boolean fits(Combination combination) {
        return combination.matArea() <= demand.area() * (1 + ROUNDING)
                && combination.cableLength() * demand.leastSpacing() <= demand.area() * (1 + ROUNDING)
                && combination.power() <= demand.area() * demand.largestDensity() * (1 + ROUNDING);
    }

    private boolean isTooDense(StockItem item) {
        return item.matArea() > 0 && item.power() / item.matArea() > demand.largestDensity() * (1 + ROUNDING);
    }

    private boolean isStrongEnough(Combination combination) {
        return combination.power() >= demand.area() * demand.requiredDensity() * (1 - ROUNDING);
    }

    private boolean keepsSpacing(Combination combination) {
        if (combination.cableLength() == 0) {
            return true;
        }
        double spacing = left(combination) / combination.cableLength();
        return spacing >= demand.leastSpacing() * (1 - ROUNDING)
                && combination.strongest() / spacing <= demand.largestDensity() * (1 + ROUNDING);
    }

    /** Area that the mats leave, m². */
    private double left(Combination combination) {
        return Math.max(0, demand.area() - combination.matArea());
    }

    private long bareSquareMillimetres(Combination combination) {
        return Math.round(bareArea(combination) * 1e6);
    }

    private double bareArea(Combination combination) {
        return combination.cableLength() > 0 ? 0 : left(combination);
    }

    private StockChoice choice(Combination combination) {
        List<Pieces> pieces = new ArrayList<>();
        for (int i = 0; i < stock.size(); i++) {
            if (combination.counts().get(i) > 0) {
                pieces.add(new Pieces(stock.get(i), combination.counts().get(i)));
            }
        }
        OptionalDouble spacing = combination.cableLength() > 0
                ? OptionalDouble.of(left(combination) / combination.cableLength())
                : OptionalDouble.empty();
        return new StockChoice(
                pieces, combination.power(), combination.power() / demand.area(), bareArea(combination), spacing);
    }

    private static int moreOfEarlier(List<Integer> one, List<Integer> other) {
        for (int i = 0; i < one.size(); i++) {
            if (!one.get(i).equals(other.get(i))) {
                return other.get(i) - one.get(i);
            }
        }
        return 0;
    }
}
