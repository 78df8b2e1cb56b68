package org.treadwarm.sizing;

import java.util.DoubleSummaryStatistics;
import java.util.OptionalDouble;
import java.util.function.ToDoubleFunction;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.Layer;
import org.treadwarm.tables.Material;
import org.treadwarm.tables.Materials;
import org.treadwarm.units.Reading;

/** Height and dead load of a heated floor's layers, when every layer's thickness and density are known. */
final class BuildUp {
    private BuildUp() {}

    /** Sum of the thicknesses above and below the heater, m. */
    static OptionalDouble height(HeatedFloor floor) {
        return sum(floor, BuildUp::thickness);
    }

    /** Sum of thickness times density, kg/m². */
    static OptionalDouble load(HeatedFloor floor) {
        return sum(floor, layer -> thickness(layer) * density(layer));
    }

    private static OptionalDouble sum(HeatedFloor floor, ToDoubleFunction<Layer> part) {
        if (floor.above().isEmpty() && floor.below().isEmpty()) {
            return OptionalDouble.empty();
        }
        DoubleSummaryStatistics parts = new DoubleSummaryStatistics();
        floor.above().forEach(layer -> parts.accept(part.applyAsDouble(layer)));
        floor.below().forEach(layer -> parts.accept(part.applyAsDouble(layer)));
        double sum = parts.getSum();
        return Double.isNaN(sum) ? OptionalDouble.empty() : OptionalDouble.of(sum);
    }

    private static double thickness(Layer layer) {
        return layer.anyThickness().map(Reading::value).orElse(Double.NaN);
    }

    private static double density(Layer layer) {
        if (layer.density().isPresent()) {
            return layer.density().get().value();
        }
        if (layer.airGap().isPresent()) {
            return 0;
        }
        return layer.material()
                .flatMap(Materials::find)
                .map(Material::density)
                .orElse(OptionalDouble.empty())
                .orElse(Double.NaN);
    }
}
