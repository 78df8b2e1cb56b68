package org.treadwarm.tables;

import java.util.List;
import java.util.OptionalDouble;

/** Default and limiting linear transmittances of junctions, W/(m·K), by dimension system. */
public final class PsiDefaults {
    private static final List<Row> ROWS = Csv.rows("psi.csv").stream()
            .map(row -> new Row(
                    row.get("junction"),
                    Csv.number(row, "external [W/(m.K)]"),
                    Csv.number(row, "overall internal [W/(m.K)]"),
                    Csv.number(row, "internal [W/(m.K)]"),
                    row.get("source")))
            .toList();

    private PsiDefaults() {}

    /** One junction and its psi in each dimension system that the source gives. */
    public record Row(
            String junction,
            OptionalDouble external,
            OptionalDouble overallInternal,
            OptionalDouble internal,
            String source) {}

    /** Every row. */
    public static List<Row> all() {
        return ROWS;
    }
}
