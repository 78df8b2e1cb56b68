package org.treadwarm.tables;

import java.util.List;

/** The standard's printed table of unventilated air layers, for reading; a sizing computes them by its formula. */
public final class AirGaps {
    private static final List<Row> ROWS = Csv.rows("air-gaps.csv").stream()
            .map(row -> new Row(
                    Csv.required(row, "thickness [mm]"),
                    Csv.required(row, "up [m2.K/W]"),
                    Csv.required(row, "horizontal [m2.K/W]"),
                    Csv.required(row, "down [m2.K/W]"),
                    row.get("source")))
            .toList();

    private AirGaps() {}

    /** One thickness in mm and its resistances in m²·K/W. */
    public record Row(double thickness, double up, double horizontal, double down, String source) {}

    /** Every row, thin to thick. */
    public static List<Row> all() {
        return ROWS;
    }
}
