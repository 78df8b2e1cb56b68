package org.treadwarm.units;

import java.util.Optional;

/**
 * A measured or assumed number.
 *
 * @param value SI value; degrees Celsius for a temperature
 * @param spread plus or minus, in the same SI unit (kelvin for a temperature); 0 when none was given
 * @param typed what was typed, to the letter
 * @param basis how it was come by, when that is known
 */
public record Reading(double value, double spread, String typed, Optional<Basis> basis) {
    /** A plain number in the SI unit, as a program gives it. */
    public static Reading of(double value) {
        return new Reading(value, 0, plain(value), Optional.empty());
    }

    /** The same reading with its basis. */
    public Reading on(Basis known) {
        return new Reading(value, spread, typed, Optional.of(known));
    }

    private static String plain(double value) {
        String text = Double.toString(value);
        return text.endsWith(".0") ? text.substring(0, text.length() - 2) : text;
    }
}
