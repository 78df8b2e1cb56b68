package org.treadwarm.units;

import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/**
 * The one declaration of a quantity, on the record component that holds it: what it measures, what is possible, what is
 * plausible, and its words. Reading, range checks, warnings, form labels and help, the API's schema and the printed sheet all
 * use this declaration and no other.
 */
@Retention(RetentionPolicy.RUNTIME)
@Target(ElementType.RECORD_COMPONENT)
public @interface Quantity {
    /** What the number measures. */
    QuantityKind kind();

    /** The smallest possible SI value; a smaller one is refused. */
    double min();

    /** The largest possible SI value; a larger one is refused. */
    double max();

    /** Whether the smallest value itself is refused too. */
    boolean moreThanMin() default false;

    /** Whether the largest value itself is refused too. */
    boolean lessThanMax() default false;

    /** Whether only whole numbers are possible. */
    boolean whole() default false;

    /** The smallest SI value that raises no eyebrow; below it the sizing warns. Common practice, no source. */
    double plausibleFrom() default Double.NEGATIVE_INFINITY;

    /** The largest SI value that raises no eyebrow. Common practice, no source. */
    double plausibleTo() default Double.POSITIVE_INFINITY;

    /** The label, in the trade's words, without the unit. */
    String label();

    /** One sentence of help. */
    String help() default "";

    /** The unit shown beside a form field, added to a bare number typed there; the SI unit when empty. */
    String formUnit() default "";

    /** The reading that stands when none is given; none when empty. */
    String fallback() default "";

    /** What "not known" assumes, as a reading; none when empty. */
    String assume() default "";

    /** Why that assumption, and where it comes from. */
    String assumeWhy() default "";
}
