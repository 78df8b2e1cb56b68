package org.treadwarm.survey;

import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** What makes the heat in the floor. */
public record Heater(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,
        @Wording(label = "kind of heater") HeaterKind kind,

        @Quantity(
                kind = QuantityKind.HEAT_FLUX,
                min = 0,
                max = 2000,
                plausibleFrom = 20,
                plausibleTo = 250,
                label = "installed density of an electric heater")
        Optional<Reading> density,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 1000,
                moreThanMin = true,
                plausibleFrom = 0.03,
                plausibleTo = 0.4,
                formUnit = "mm",
                label = "spacing of the cables or pipes")
        Optional<Reading> spacing) {}
