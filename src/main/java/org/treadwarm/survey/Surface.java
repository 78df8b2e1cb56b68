package org.treadwarm.survey;

import java.util.List;
import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** A piece of an envelope: an assembly, a gross area and what lies on its other side. */
public record Surface(
        @Wording(label = "id", longest = 40) Optional<String> id,
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,
        @Wording(label = "assembly") String assembly,

        @Quantity(
                kind = QuantityKind.AREA,
                min = 0,
                max = 10000,
                moreThanMin = true,
                plausibleFrom = 0.1,
                plausibleTo = 1000,
                label = "area",
                help = "Gross, openings not yet cut out; 4.10 x 2.40 is read as a product.")
        Optional<Reading> area,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 1000,
                moreThanMin = true,
                plausibleFrom = 0.1,
                plausibleTo = 50,
                label = "width")
        Optional<Reading> width,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 1000,
                moreThanMin = true,
                plausibleFrom = 0.1,
                plausibleTo = 50,
                label = "height")
        Optional<Reading> height,

        @Wording(label = "other side", help = "What lies on the other side: outdoors, ground, a space or another room.")
        String to,

        @Wording(label = "openings") List<Opening> openings,
        @Wording(label = "ground") Optional<Ground> ground) {
    /** What it is called: its name, or its assembly's. */
    public String title() {
        return name.orElse(assembly);
    }

    /** Gross area in m². */
    public double grossArea() {
        return Extent.area(area, width, height);
    }
}
