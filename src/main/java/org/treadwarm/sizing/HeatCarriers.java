package org.treadwarm.sizing;

import java.util.Map;
import java.util.TreeMap;
import java.util.function.ToDoubleFunction;
import java.util.stream.Collectors;
import org.treadwarm.physics.BilinearTable;
import org.treadwarm.physics.water.PropyleneGlycol;
import org.treadwarm.tables.Glycols;
import org.treadwarm.tables.Glycols.Row;

/** Heat carriers, fitted out with the program's tables. */
public final class HeatCarriers {
    private static final BilinearTable DENSITY = table(Row::density);
    private static final BilinearTable SPECIFIC_HEAT = table(Row::specificHeat);

    private HeatCarriers() {}

    /** Propylene glycol and water: 20 to 40 %, 20 to 40 degrees Celsius. */
    public static PropyleneGlycol propyleneGlycol(double percent) {
        return new PropyleneGlycol(percent, DENSITY, SPECIFIC_HEAT);
    }

    private static BilinearTable table(ToDoubleFunction<Row> value) {
        Map<Double, Map<Double, Double>> rows = Glycols.propylene().stream()
                .collect(Collectors.groupingBy(
                        Row::percent, TreeMap::new, Collectors.toMap(Row::temperature, value::applyAsDouble)));
        return BilinearTable.of("share of glycol in percent", "temperature", rows);
    }
}
