package org.treadwarm.tables;

import java.util.ArrayList;
import java.util.List;

/** The standard's factor and limit tables of warm-water floors (EN 1264-2, from memory, not read). */
public final class FloorFactors {
    private static final String SPACING = "spacing [m]";
    private static final String COVERING = "covering resistance [m2.K/W]";
    private static final String COVER = "cover over conductivity [m2.K/W]";
    private static final String LIMIT_COEFFICIENT = "B_G [W/m2]";

    private FloorFactors() {}

    /**
     * A factor over one argument.
     *
     * @param argument what it depends on, with its unit
     * @param points in the order of the table
     */
    public record Line(String argument, List<Point> points) {
        public Line {
            points = List.copyOf(points);
        }

        /** One row. */
        public record Point(double argument, double value, String source) {}
    }

    /**
     * A factor over two arguments.
     *
     * @param row what it depends on first, with its unit
     * @param column what it depends on second, with its unit
     * @param cells in the order of the table
     */
    public record Grid(String row, String column, List<Cell> cells) {
        public Grid {
            cells = List.copyOf(cells);
        }

        /** One row. */
        public record Cell(double row, double column, double value, String source) {}
    }

    /** a_T of types A and C by the resistance of the covering. */
    public static Line screedSpacing() {
        return line("screed-pipe-spacing-factors.csv", COVERING, "a_T");
    }

    /** a_U of types A and C by spacing and resistance of the covering. */
    public static Grid screedCover() {
        return grid("screed-pipe-factors.csv", COVERING, "a_U");
    }

    /** a_D of types A and C by spacing and resistance of the covering. */
    public static Grid screedDiameter() {
        return grid("screed-pipe-factors.csv", COVERING, "a_D");
    }

    /** B_G by spacing and s_u/lambda_E, W/m². */
    public static Grid limitCoefficient() {
        return grid("limit-curve-coefficients.csv", COVER, LIMIT_COEFFICIENT);
    }

    /** n_G by spacing and s_u/lambda_E. */
    public static Grid limitExponent() {
        return grid("limit-curve-exponents.csv", COVER, "n_G");
    }

    /** B_G of thick screeds by s_u/T, W/m². */
    public static Line thickLimitCoefficient() {
        return line("limit-curve-thick-screed.csv", "cover over spacing", LIMIT_COEFFICIENT);
    }

    /** n_G of thick screeds by s_u/T. */
    public static Line thickLimitExponent() {
        return line("limit-curve-thick-screed.csv", "cover over spacing", "n_G");
    }

    /** a_T of type B by s_u/lambda_E. */
    public static Line sheetSpacing() {
        return line("sheet-pipe-spacing-factors.csv", COVER, "a_T");
    }

    /** a_K of type B by spacing. */
    public static Line sheetContact() {
        return line("sheet-pipe-factors.csv", SPACING, "a_K");
    }

    /** b_u of type B by spacing. */
    public static Line sheetScreedShare() {
        return line("sheet-pipe-factors.csv", SPACING, "b_u");
    }

    private static Line line(String file, String argument, String value) {
        List<Line.Point> points = new ArrayList<>();
        Csv.rows(file)
                .forEach(row -> points.add(
                        new Line.Point(Csv.required(row, argument), Csv.required(row, value), row.get("source"))));
        return new Line(argument, points);
    }

    private static Grid grid(String file, String column, String value) {
        List<Grid.Cell> cells = new ArrayList<>();
        Csv.rows(file)
                .forEach(row -> cells.add(new Grid.Cell(
                        Csv.required(row, SPACING),
                        Csv.required(row, column),
                        Csv.required(row, value),
                        row.get("source"))));
        return new Grid(SPACING, column, cells);
    }
}
