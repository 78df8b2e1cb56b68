package org.treadwarm.units;

import java.lang.annotation.ElementType;
import java.lang.annotation.Retention;
import java.lang.annotation.RetentionPolicy;
import java.lang.annotation.Target;

/** The words of a record component that is no quantity: a name, a choice, a reference, a list. */
@Retention(RetentionPolicy.RUNTIME)
@Target(ElementType.RECORD_COMPONENT)
public @interface Wording {
    /** The label, in the trade's words. */
    String label();

    /** One sentence of help. */
    String help() default "";

    /** The text that stands when none is given; none when empty. */
    String fallback() default "";

    /** The largest number of characters of a text. */
    int longest() default 200;
}
