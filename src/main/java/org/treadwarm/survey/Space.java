package org.treadwarm.survey;

import java.util.List;
import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** What may lie on the other side of a surface, beside outdoors, the ground and other rooms. */
public record Space(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,
        @Wording(label = "kind of space") SpaceKind kind,

        @Quantity(
                kind = QuantityKind.TEMPERATURE,
                min = -60,
                max = 60,
                plausibleFrom = -5,
                plausibleTo = 30,
                label = "temperature it is held at",
                assume = "15 °C",
                assumeWhy = "Common practice for a neighbour who heats little, no source.")
        Optional<Reading> temperature,

        @Wording(label = "surfaces") List<Surface> surfaces,
        @Wording(label = "junctions") List<Junction> junctions,
        @Wording(label = "air") Optional<Air> air,

        @Quantity(
                kind = QuantityKind.RATIO,
                min = -1,
                max = 2,
                plausibleFrom = 0.05,
                plausibleTo = 1,
                label = "temperature factor",
                help = "The share of the difference to outdoors that rooms see through it (EN 12831-1).",
                assume = "0.8",
                assumeWhy = "EN 12831:2003, D.4.2, an unheated stair with three outer walls, from memory.")
        Optional<Reading> temperatureFactor) {
    /** Whether its temperature follows from the balance of what it exchanges. */
    public boolean floats() {
        return kind == SpaceKind.UNHEATED && temperatureFactor.isEmpty();
    }
}
