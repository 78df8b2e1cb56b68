package org.treadwarm.physics.electric;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import org.treadwarm.physics.electric.StockChoice.Pieces;

/** Walks through all combinations of a stock whose mats fit and whose power and length do not exceed what an area takes. */
final class StockSearch {
    private static final int MOST_LOOKS = 2_000_000;

    /** Room for the rounding of floating-point numbers, as a share. */
    private static final double ROUNDING = 1e-9;

    private static final Comparator<StockChoice> ORDER = Comparator.comparingLong(
                    (StockChoice choice) -> Math.round(choice.bareArea() * 1e6))
            .thenComparingInt(StockChoice::count)
            .thenComparingLong(choice -> Math.round(choice.power() * 1e3));

    private final CoverDemand demand;
    private final List<StockItem> stock;
    private final int[] counts;
    private Optional<StockChoice> best = Optional.empty();
    private int looks;

    StockSearch(CoverDemand demand, List<StockItem> stock) {
        this.demand = demand;
        this.stock = List.copyOf(stock);
        this.counts = new int[stock.size()];
    }

    Optional<StockChoice> best() {
        walk(0);
        return best;
    }

    /** Tries every count of the items from one on, large counts first, so that of equal choices the first found stays. */
    private void walk(int index) {
        if (index == stock.size()) {
            judge();
            return;
        }
        int most = 0;
        counts[index] = 1;
        while (fits()) {
            most = counts[index];
            counts[index]++;
            look();
        }
        for (int count = most; count >= 0; count--) {
            counts[index] = count;
            walk(index + 1);
        }
    }

    private boolean fits() {
        double matArea = total(StockItem::matArea);
        double cableLength = total(StockItem::cableLength);
        return matArea <= demand.area() * (1 + ROUNDING)
                && cableLength * demand.leastSpacing() <= demand.area() * (1 + ROUNDING)
                && total(StockItem::power) <= demand.area() * demand.largestDensity() * (1 + ROUNDING);
    }

    private void judge() {
        look();
        double power = total(StockItem::power);
        if (power < demand.area() * demand.requiredDensity() * (1 - ROUNDING)) {
            return;
        }
        double left = Math.max(0, demand.area() - total(StockItem::matArea));
        double cableLength = total(StockItem::cableLength);
        OptionalDouble spacing = cableLength > 0 ? OptionalDouble.of(left / cableLength) : OptionalDouble.empty();
        boolean tooClose = spacing.isPresent() && spacing.getAsDouble() < demand.leastSpacing() * (1 - ROUNDING);
        if (tooClose || !keepsLargestDensity(spacing)) {
            return;
        }
        StockChoice choice =
                new StockChoice(pieces(), power, power / demand.area(), cableLength > 0 ? 0 : left, spacing);
        if (best.isEmpty() || ORDER.compare(choice, best.get()) < 0) {
            best = Optional.of(choice);
        }
    }

    private void look() {
        looks++;
        if (looks > MOST_LOOKS) {
            throw new IllegalArgumentException("a stock of " + stock.size() + " items has too many combinations for "
                    + demand.area() + " m2, allowed are " + MOST_LOOKS + " looks at one");
        }
    }

    private boolean keepsLargestDensity(OptionalDouble spacing) {
        for (int i = 0; i < counts.length; i++) {
            StockItem item = stock.get(i);
            if (counts[i] > 0 && density(item, spacing) > demand.largestDensity() * (1 + ROUNDING)) {
                return false;
            }
        }
        return true;
    }

    private static double density(StockItem item, OptionalDouble spacing) {
        return item.power() / (item.matArea() + item.cableLength() * spacing.orElse(0));
    }

    private List<Pieces> pieces() {
        List<Pieces> pieces = new ArrayList<>();
        for (int i = 0; i < counts.length; i++) {
            if (counts[i] > 0) {
                pieces.add(new Pieces(stock.get(i), counts[i]));
            }
        }
        return pieces;
    }

    private double total(ToDoubleFunction<StockItem> of) {
        double total = 0;
        for (int i = 0; i < counts.length; i++) {
            total += counts[i] * of.applyAsDouble(stock.get(i));
        }
        return total;
    }
}
