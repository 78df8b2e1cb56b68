package org.treadwarm.tables;

import java.util.List;

/** Resistances of floor coverings and of a few ready-made layers, m²·K/W. */
public final class Coverings {
    private static final List<Row> ROWS = Csv.rows("coverings.csv").stream()
            .map(row -> new Row(row.get("name"), Csv.required(row, "resistance [m2.K/W]"), row.get("source")))
            .toList();

    private Coverings() {}

    /** One covering and its resistance. */
    public record Row(String name, double resistance, String source) {}

    /** Every row. */
    public static List<Row> all() {
        return ROWS;
    }
}
