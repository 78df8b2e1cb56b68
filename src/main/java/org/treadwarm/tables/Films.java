package org.treadwarm.tables;

import java.util.List;
import java.util.Map;

/** Design surface films (ISO 6946:2017, table 7, from memory). */
public final class Films {
    private static final List<Film> ROWS = Csv.rows("films.csv").stream()
            .map(row -> new Film(
                    row.get("heat flow"),
                    Csv.required(row, "inside film [m2.K/W]"),
                    Csv.required(row, "outside film [m2.K/W]"),
                    row.get("source")))
            .toList();
    private static final Map<String, Film> BY_DIRECTION =
            ROWS.stream().collect(java.util.stream.Collectors.toMap(Film::heatFlow, film -> film));

    private Films() {}

    /**
     * One row.
     *
     * @param heatFlow up, horizontal or down
     * @param inside Rsi, m²·K/W
     * @param outside Rse, m²·K/W
     * @param source where the row comes from
     */
    public record Film(String heatFlow, double inside, double outside, String source) {}

    /** Every row. */
    public static List<Film> all() {
        return ROWS;
    }

    /** Rsi in m²·K/W for a direction of the heat flow: up, horizontal or down. */
    public static double inside(String heatFlow) {
        return BY_DIRECTION.get(heatFlow).inside();
    }

    /** Rse in m²·K/W. */
    public static double outside(String heatFlow) {
        return BY_DIRECTION.get(heatFlow).outside();
    }
}
