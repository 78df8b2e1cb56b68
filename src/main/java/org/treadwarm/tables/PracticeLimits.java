package org.treadwarm.tables;

import java.util.List;

/** Limits of practice for circuits and cables, as read; values of several sources stand side by side. */
public final class PracticeLimits {
    private static final List<Row> ROWS = Csv.rows("practice-limits.csv").stream()
            .map(row -> new Row(
                    row.get("subject"),
                    row.get("quantity"),
                    row.get("sense"),
                    Csv.required(row, "limit [SI]"),
                    row.get("unit"),
                    row.get("source")))
            .toList();

    private PracticeLimits() {}

    /**
     * One limit.
     *
     * @param subject water or electric
     * @param quantity what is limited
     * @param sense "at most" or "at least"
     * @param limit in SI units and degrees Celsius
     * @param unit of the limit
     * @param source where it was read
     */
    public record Row(String subject, String quantity, String sense, double limit, String unit, String source) {}

    /** Every row. */
    public static List<Row> all() {
        return ROWS;
    }
}
