package org.treadwarm.units;

import java.util.List;

/**
 * One unit of one kind of quantity. The SI value of a number n in this unit is {@code (n + offset) x numerator /
 * denominator}; the factor is kept as an exact fraction so that 140 mm is 0.14 m and not a neighbour of it.
 *
 * @param symbol how the unit is written in the program's own texts
 * @param kind what it measures
 * @param numerator exact numerator of the factor to the SI unit
 * @param denominator exact denominator of the factor
 * @param offset added before multiplying; 0 for all but temperatures
 * @param source where the factor is defined
 * @param spellings further accepted spellings, already in normal form (see {@link UnitTable#normal})
 */
public record Unit(
        String symbol,
        QuantityKind kind,
        double numerator,
        double denominator,
        double offset,
        String source,
        List<String> spellings) {
    public Unit {
        spellings = List.copyOf(spellings);
    }

    /** The SI value (degrees Celsius for temperatures) of a number given in this unit. */
    public double toSi(double number) {
        return (number + offset) * numerator / denominator;
    }

    /** The number in this unit of an SI value. */
    public double fromSi(double si) {
        return si * denominator / numerator - offset;
    }
}
