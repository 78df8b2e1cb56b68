package org.treadwarm.survey;

import java.util.Optional;
import org.treadwarm.units.Reading;

/** An area that is given as such, or as a width and a height. */
final class Extent {
    private Extent() {}

    /** The area in m²; 0 while it is not known. */
    static double area(Optional<Reading> area, Optional<Reading> width, Optional<Reading> height) {
        if (area.isPresent()) {
            return area.get().value();
        }
        return width.isPresent() && height.isPresent()
                ? width.get().value() * height.get().value()
                : 0;
    }
}
