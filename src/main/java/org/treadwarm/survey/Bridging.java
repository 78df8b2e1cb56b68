package org.treadwarm.survey;

import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** Framing that crosses a layer (ISO 6946). Layers of one frame are crossed by the same members. */
public record Bridging(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,

        @Quantity(
                kind = QuantityKind.RATIO,
                min = 0,
                max = 1,
                moreThanMin = true,
                lessThanMax = true,
                plausibleFrom = 0.01,
                plausibleTo = 0.4,
                formUnit = "%",
                label = "share of framing",
                assume = "15 %",
                assumeWhy = "BR 443 timber-frame wall, from memory; ceiling joists 9 %, suspended timber floor 12 %.")
        Reading share,

        @Quantity(
                kind = QuantityKind.CONDUCTIVITY,
                min = 0.001,
                max = 500,
                plausibleFrom = 0.02,
                plausibleTo = 4,
                label = "conductivity of the framing",
                assume = "0.13 W/(m.K)",
                assumeWhy = "Timber 500 kg/m3, ISO 10456, from memory.")
        Optional<Reading> conductivity,

        @Quantity(
                kind = QuantityKind.RESISTANCE,
                min = 0,
                max = 50,
                plausibleFrom = 0.005,
                plausibleTo = 12,
                label = "resistance of the framing")
        Optional<Reading> resistance,

        @Wording(label = "frame", help = "The same name on two layers means the same members cross both.")
        Optional<String> frame) {}
