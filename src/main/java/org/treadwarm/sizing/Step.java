package org.treadwarm.sizing;

import java.util.List;
import java.util.Map;

/**
 * How one number of an answer came about: no numbers, only where they are.
 *
 * <p>What went in is given by address: {@code survey:} and the pointer of a reading, also where it was left out and its default
 * stands; {@code sizing:} and the pointer of another number of the same answer; {@code table:} and a number of the tables (see
 * {@link TableNumbers}); {@code again:} and a pointer into the answer that the survey would have with this step's own number as
 * its outdoor temperature.
 *
 * @param address pointer (RFC 6901) of the number in the answer
 * @param formula id of its row in {@link org.treadwarm.tables.Formulas}
 * @param symbols addresses of what each symbol of the formula stands for, mostly one, in reading order; a symbol of the
 *     formula that ends in # stands here with 1, 2, 3 and so on in its place
 */
public record Step(String address, String formula, Map<String, List<String>> symbols) {}
