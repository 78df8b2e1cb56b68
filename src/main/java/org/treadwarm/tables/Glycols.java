package org.treadwarm.tables;

import java.util.List;

/** Mixtures of propylene glycol and water; a maker's table that does not say whether its percent go by mass or by volume. */
public final class Glycols {
    private static final List<Row> ROWS = Csv.rows("propylene-glycol.csv").stream()
            .map(row -> new Row(
                    Csv.required(row, "share of glycol [%]"),
                    Csv.required(row, "temperature [C]"),
                    Csv.required(row, "density [kg/m3]"),
                    Csv.required(row, "specific heat capacity [J/(kg.K)]"),
                    row.get("source")))
            .toList();

    private Glycols() {}

    /** One share in percent at one temperature in degrees Celsius: density in kg/m³, specific heat capacity in J/(kg·K). */
    public record Row(double percent, double temperature, double density, double specificHeat, String source) {}

    /** Every row of propylene glycol. */
    public static List<Row> propylene() {
        return ROWS;
    }
}
