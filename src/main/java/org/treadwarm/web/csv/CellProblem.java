package org.treadwarm.web.csv;

/**
 * What is wrong in one cell.
 *
 * @param row the row of the file, the header being 1
 * @param column the column's title; empty for the row as a whole
 * @param given what stands there, shortened
 * @param message what is wrong
 * @param allowed what is allowed there
 */
public record CellProblem(int row, String column, String given, String message, String allowed) {
    private static final int LONGEST = 80;

    /** Shortens what was given. */
    public CellProblem {
        given = given.length() <= LONGEST ? given : given.substring(0, LONGEST - 1) + "…";
    }
}
