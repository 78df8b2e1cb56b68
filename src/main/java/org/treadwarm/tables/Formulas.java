package org.treadwarm.tables;

import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;

/**
 * The formulas of a sizing, each an equation in a small language: numbers, {@code pi}, symbols, {@code + - * / ^}, parentheses,
 * and functions whose arguments are parted by semicolons. A symbol may stand for several numbers: arithmetic then goes number
 * by number, and {@code sum}, {@code min} and {@code max} of one argument bring them together, as {@code count} counts them.
 * {@code max} of two arguments and {@code ln} go number by number.
 *
 * <p>A symbol that ends in # stands for a row of symbols with 1, 2, 3 and so on in its place. {@code paths(C; f#; L#; B#)}
 * adds, over all combinations of frames, the share of each path over its resistance: C, and for each frame either B with the
 * share f or L with the share 1 - f; several numbers of one L or B are added. {@code imbalance(x#)} is the largest size of any
 * of the sums of x1, x2 and so on; 0 when there is none.
 */
public final class Formulas {
    private static final List<Formula> ROWS = Csv.rows("formulas.csv").stream()
            .map(row -> new Formula(row.get("id"), row.get("formula"), row.get("words"), row.get("source")))
            .toList();
    private static final Map<String, Formula> BY_ID =
            ROWS.stream().collect(Collectors.toUnmodifiableMap(Formula::id, Function.identity()));

    private Formulas() {}

    /**
     * One formula.
     *
     * @param id its name, unique
     * @param formula the equation; where a number is found as a root, the equation it solves
     * @param words what it says, for a contractor
     * @param source the standard and its clause, or what else it rests on
     */
    public record Formula(String id, String formula, String words, String source) {}

    /** Every row. */
    public static List<Formula> all() {
        return ROWS;
    }

    /** The row of this id. */
    public static Optional<Formula> find(String id) {
        return Optional.ofNullable(BY_ID.get(id));
    }
}
