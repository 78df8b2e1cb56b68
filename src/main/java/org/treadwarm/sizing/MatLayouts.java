package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.treadwarm.physics.electric.CoverDemand;
import org.treadwarm.physics.electric.HeatingElement;
import org.treadwarm.physics.electric.StockChoice;
import org.treadwarm.physics.electric.StockChoice.Pieces;
import org.treadwarm.physics.electric.StockItem;
import org.treadwarm.physics.electric.StockItem.Extent.Mat;
import org.treadwarm.sizing.Sizing.FreeFloor;
import org.treadwarm.sizing.Sizing.MatLayout;
import org.treadwarm.sizing.Sizing.MatPieces;
import org.treadwarm.survey.Heater;
import org.treadwarm.survey.HeatingMat;
import org.treadwarm.survey.Pointer;
import org.treadwarm.units.Numbers;

/** Chooses mats for a floor from those that can be had. */
final class MatLayouts {
    /** Mats have no runs of ours; the choice asks for a spacing of cables all the same, m. */
    private static final double ANY_SPACING = 1;

    private final Heater heater;
    private final String pointer;
    private final double heated;
    private final double area;
    private final double neededPower;

    private MatLayouts(Heater heater, String pointer, double heated, double area, double neededPower) {
        this.heater = heater;
        this.pointer = pointer;
        this.heated = heated;
        this.area = area;
        this.neededPower = neededPower;
    }

    /** The mats chosen, or why none are. */
    record Made(Optional<MatLayout> layout, Optional<String> reason) {
        static final Made NOT_ASKED = new Made(Optional.empty(), Optional.empty());

        private static Made not(String reason) {
            return new Made(Optional.empty(), Optional.of(reason));
        }
    }

    /**
     * The mats of a heater that has some to choose from.
     *
     * @param pointer of the heater in the survey
     * @param heated heated area, m²
     * @param plan free area, if it is known
     * @param neededPower of the heater for the required flux, W
     */
    static Made of(Heater heater, String pointer, double heated, Optional<FreeFloor> plan, double neededPower) {
        if (heater.mats().isEmpty()) {
            return Made.NOT_ASKED;
        }
        double area = plan.map(found -> Math.min(heated, found.freeArea())).orElse(heated);
        return area > 0
                ? new MatLayouts(heater, pointer + "/mats", heated, area, neededPower).made()
                : Made.not("the plan leaves no floor free");
    }

    private Made made() {
        List<StockItem> stock = new ArrayList<>();
        for (int i = 0; i < heater.mats().size(); i++) {
            stock.add(item(heater.mats().get(i), i));
        }
        CoverDemand demand = new CoverDemand(area, Math.max(0, neededPower) / area, Double.MAX_VALUE, ANY_SPACING);
        try {
            return StockChoice.best(demand, stock)
                    .or(() -> StockChoice.strongest(demand, stock))
                    .filter(choice -> choice.count() > 0)
                    .map(choice -> new Made(Optional.of(layout(choice)), Optional.empty()))
                    .orElseGet(() -> Made.not("none of them fits into " + Numbers.fixed(area, 2) + " m2"));
        } catch (IllegalArgumentException tooMany) {
            return Made.not("they have too many combinations for " + Numbers.fixed(area, 2) + " m2");
        }
    }

    /** Named by its place, as two may have one name. */
    private static StockItem item(HeatingMat mat, int index) {
        int most = mat.count().map(count -> (int) count.value()).orElse(StockItem.UNLIMITED);
        return new StockItem(
                String.valueOf(index), new Mat(mat.area().value()), mat.power().value(), most);
    }

    private MatLayout layout(StockChoice choice) {
        List<MatPieces> pieces = choice.pieces().stream().map(this::pieces).toList();
        return new MatLayout(
                area,
                area - choice.bareArea(),
                choice.bareArea(),
                choice.power(),
                neededPower,
                choice.power() - neededPower,
                OptionalDouble.of(choice.power() / heated),
                pieces,
                ElectricLayouts.circuits(heater, pieces));
    }

    private MatPieces pieces(Pieces chosen) {
        int index = Integer.parseInt(chosen.item().name());
        HeatingMat mat = heater.mats().get(index);
        HeatingElement element = new HeatingElement(
                mat.power().value(), heater.voltage().orElseThrow().value());
        return new MatPieces(
                mat.title(index + 1),
                Pointer.to(pointer, index),
                chosen.count(),
                mat.area().value(),
                element.power(),
                element.power() / mat.area().value(),
                element.current(),
                element.resistance(),
                element.lowestResistance(),
                element.highestResistance());
    }
}
