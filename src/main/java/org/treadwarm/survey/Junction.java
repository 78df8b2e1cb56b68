package org.treadwarm.survey;

import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** A linear thermal bridge (ISO 14683). */
public record Junction(
        @Wording(label = "id", longest = 40) Optional<String> id,
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,

        @Quantity(
                kind = QuantityKind.LINEAR_TRANSMITTANCE,
                min = -2,
                max = 5,
                plausibleFrom = -0.5,
                plausibleTo = 1.5,
                label = "psi",
                help = "Linear transmittance, in the dimension system of the site.",
                assume = "0.32 W/(m.K)",
                assumeWhy = "SAP 2012 table K1, default of a ground floor with its wall, internal dimensions.")
        Reading psi,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 1000,
                plausibleFrom = 0.1,
                plausibleTo = 200,
                label = "length")
        Reading length,

        @Wording(label = "other side", fallback = "outdoors")
        String to,

        @Wording(
                label = "warm side",
                help = "A wall foot of a heated slab sees the heater, not the room.",
                fallback = "room")
        JunctionPlace at) {
    /** What it is called: its name, or "junction". */
    public String title() {
        return name.orElse("junction");
    }
}
