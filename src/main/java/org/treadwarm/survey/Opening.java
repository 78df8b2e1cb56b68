package org.treadwarm.survey;

import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** Windows or doors of one kind, cut out of their surface. */
public record Opening(
        @Wording(label = "id", longest = 40) Optional<String> id,
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,
        @Wording(label = "assembly") String assembly,

        @Quantity(
                kind = QuantityKind.AREA,
                min = 0,
                max = 10000,
                moreThanMin = true,
                plausibleFrom = 0.05,
                plausibleTo = 30,
                label = "area of one piece",
                help = "The hole in the wall, frame included; 1.20 x 1.40 is read as a product.")
        Optional<Reading> area,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 1000,
                moreThanMin = true,
                plausibleFrom = 0.1,
                plausibleTo = 10,
                label = "width of one piece")
        Optional<Reading> width,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 1000,
                moreThanMin = true,
                plausibleFrom = 0.1,
                plausibleTo = 6,
                label = "height of one piece")
        Optional<Reading> height,

        @Quantity(
                kind = QuantityKind.RATIO,
                min = 1,
                max = 1000,
                whole = true,
                plausibleTo = 50,
                label = "how many",
                fallback = "1")
        Reading count) {
    /** What it is called: its name, or "opening". */
    public String title() {
        return name.orElse("opening");
    }

    /** Area of all its pieces, m². */
    public double totalArea() {
        return Extent.area(area, width, height) * count.value();
    }
}
