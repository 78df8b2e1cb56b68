package org.treadwarm.tables;

import java.util.List;

/** Standard ratings of breakers; common practice, no source. */
public final class Breakers {
    private static final List<Row> ROWS = Csv.rows("breakers.csv").stream()
            .map(row -> new Row(
                    row.get("practice"),
                    Csv.required(row, "rating [A]"),
                    Csv.required(row, "share carried for hours"),
                    row.get("source")))
            .toList();

    private Breakers() {}

    /** One rating in A of a practice (european or us), and the share of it that a breaker may carry for hours. */
    public record Row(String practice, double rating, double continuousShare, String source) {}

    /** Every row, small to large within a practice. */
    public static List<Row> all() {
        return ROWS;
    }
}
