package org.treadwarm.physics.electric;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * Which items of a stock cover an area.
 *
 * @param pieces the items taken, in the order of the stock
 * @param power of all, W
 * @param installedDensity power over the whole area, W/m²
 * @param bareArea area that nothing covers, m²; 0 where cables are laid, which spread over what mats leave
 * @param cableSpacing spacing of the cables' runs, m; empty without cables
 */
public record StockChoice(
        List<Pieces> pieces, double power, double installedDensity, double bareArea, OptionalDouble cableSpacing) {
    public StockChoice {
        pieces = List.copyOf(pieces);
    }

    /**
     * So many of an item.
     *
     * @param item the item
     * @param count at least 1
     */
    public record Pieces(StockItem item, int count) {}

    /**
     * The best choice of all combinations: the least bare area (to 1 mm²), then the fewest pieces, then the
     * lowest power (to 1 mW), then more of what stands earlier in the stock. A combination counts when its mats fit into the
     * area, its power reaches the required density over the whole area, and no part that is covered exceeds the largest
     * density, nor any run the least spacing.
     *
     * @return empty when no combination counts
     * @throws IllegalArgumentException when there are too many combinations to look at, as of many items of odd areas and powers
     */
    public static Optional<StockChoice> best(CoverDemand demand, List<StockItem> stock) {
        return new StockSearch(demand, stock).best();
    }

    /**
     * The strongest of all combinations, for a demand that none reaches: the most power (to 1 mW), then the least bare area, then the
     * fewest pieces, then more of what stands earlier in the stock. It counts as for {@link #best}, but for the required density.
     *
     * @return empty when no combination counts
     * @throws IllegalArgumentException when there are too many combinations to look at
     */
    public static Optional<StockChoice> strongest(CoverDemand demand, List<StockItem> stock) {
        return new StockSearch(demand, stock).strongest();
    }

    /** How many pieces in all. */
    public int count() {
        return pieces.stream().mapToInt(Pieces::count).sum();
    }
}
