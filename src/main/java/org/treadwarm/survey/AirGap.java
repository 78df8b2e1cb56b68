package org.treadwarm.survey;

import java.util.List;
import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** An unventilated air layer (ISO 6946). */
public record AirGap(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 1e-5,
                max = 10,
                plausibleFrom = 4e-3,
                plausibleTo = 0.3,
                formUnit = "mm",
                label = "width of the air gap",
                help = "The formula of ISO 6946 holds below 0.3 m.")
        Reading thickness,

        @Wording(label = "direction of the heat flow", help = "The assembly's own when left out.")
        Optional<Direction> direction,

        @Quantity(
                kind = QuantityKind.RATIO,
                min = 0,
                max = 1,
                moreThanMin = true,
                plausibleFrom = 0.02,
                label = "emissivities of its two faces",
                help = "Two numbers; 0.9 for ordinary building materials.")
        List<Reading> emissivities) {}
