package org.treadwarm.units;

/**
 * A {@link Quantity} read off its record component: the same declaration as plain fields, since an annotation answers slowly
 * and a survey asks it often.
 *
 * @param kind what the number measures
 * @param min the smallest possible SI value
 * @param max the largest possible SI value
 * @param moreThanMin whether the smallest value itself is refused too
 * @param lessThanMax whether the largest value itself is refused too
 * @param whole whether only whole numbers are possible
 * @param plausibleFrom the smallest SI value that raises no eyebrow
 * @param plausibleTo the largest SI value that raises no eyebrow
 * @param label the label, without the unit
 * @param help one sentence of help; empty for none
 * @param formUnit the unit shown beside a form field; empty for the SI unit
 * @param fallback the reading that stands when none is given; empty for none
 * @param assume what "not known" assumes; empty for none
 * @param assumeWhy why that
 */
public record Declared(
        QuantityKind kind,
        double min,
        double max,
        boolean moreThanMin,
        boolean lessThanMax,
        boolean whole,
        double plausibleFrom,
        double plausibleTo,
        String label,
        String help,
        String formUnit,
        String fallback,
        String assume,
        String assumeWhy) {
    /** The declaration that an annotation makes. */
    public static Declared by(Quantity quantity) {
        return new Declared(
                quantity.kind(),
                quantity.min(),
                quantity.max(),
                quantity.moreThanMin(),
                quantity.lessThanMax(),
                quantity.whole(),
                quantity.plausibleFrom(),
                quantity.plausibleTo(),
                quantity.label(),
                quantity.help(),
                quantity.formUnit(),
                quantity.fallback(),
                quantity.assume(),
                quantity.assumeWhy());
    }
}
