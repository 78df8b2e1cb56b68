package org.treadwarm.draw;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * One layer of an assembly.
 *
 * @param name what it is made of
 * @param thickness thickness in m, above 0; empty if only its resistance is known
 * @param resistance thermal resistance in m²K/W, not negative
 * @param family what it is hatched as
 * @param bridge members that cross it
 * @param remarks what else is to be said of it
 */
public record Layer(
        String name,
        OptionalDouble thickness,
        double resistance,
        MaterialFamily family,
        Optional<Bridge> bridge,
        List<String> remarks) {
    /** @throws IllegalArgumentException if a number is out of its range */
    public Layer {
        remarks = List.copyOf(remarks);
        Checks.notNegative("Resistance", resistance);
        thickness.ifPresent(metres -> {
            if (Checks.notNegative("Thickness", metres) == 0) {
                throw new IllegalArgumentException("A layer drawn by its thickness must have one");
            }
        });
    }
}
