package org.treadwarm.survey;

import java.util.ArrayList;
import java.util.List;
import org.treadwarm.units.Declared;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;

/**
 * A reading that is possible but raises an eyebrow.
 *
 * @param at where it stands
 * @param declared what it is declared to be
 * @param reading the reading
 */
public record Unusual(Place at, Declared declared, Reading reading) {
    /** Whether a reading lies outside what is plausible for what it is declared to be. */
    public static boolean is(Declared declared, Reading reading) {
        double value = reading.value();
        return !(value >= declared.plausibleFrom() && value <= declared.plausibleTo())
                && !isPlausibleZero(value, declared);
    }

    private static boolean isPlausibleZero(double value, Declared declared) {
        return value == 0 && declared.min() == 0 && declared.kind() != QuantityKind.RESISTANCE;
    }

    /** The unusual readings of a survey, in the order of the document. */
    public static List<Unusual> in(Survey survey) {
        List<Unusual> unusual = new ArrayList<>();
        new Readings(
                        Unusual::is,
                        (pointer, declared, reading) ->
                                unusual.add(new Unusual(Place.ROOT.at(pointer), declared, reading)))
                .visit(survey, Place.ROOT);
        return unusual;
    }
}
