package org.treadwarm.survey;

import java.util.List;
import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** The heated part of a room's floor. */
public record HeatedFloor(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,

        @Quantity(
                kind = QuantityKind.AREA,
                min = 0,
                max = 10000,
                moreThanMin = true,
                plausibleFrom = 0.5,
                plausibleTo = 500,
                label = "heated area",
                help = "Free floor only: nothing heated under fixed furniture.")
        Reading area,

        @Wording(label = "zone of use") Zone zone,

        @Wording(
                label = "parts",
                help =
                        "A peripheral strip and the occupied area, say: each with its own spacing, and all fed alike. Together they are the heated area.")
        List<FloorPart> parts,

        @Wording(label = "layers above the heater", help = "From the finished surface down to the heater.")
        List<Layer> above,

        @Wording(label = "layers below the heater", help = "From the heater down.")
        List<Layer> below,

        @Wording(label = "ground below") Optional<Ground> ground,

        @Wording(label = "space below", help = "Outdoors, a space or another room.")
        Optional<String> to,

        @Wording(label = "heater") Optional<Heater> heater,

        @Quantity(
                kind = QuantityKind.TEMPERATURE,
                min = -60,
                max = 60,
                plausibleFrom = 22,
                plausibleTo = 35,
                label = "highest surface temperature of the covering",
                help = "The maker's figure; 27 °C under timber is common practice, no source.",
                assume = "27 °C",
                assumeWhy = "Common practice under timber, no source; the maker's figure decides.")
        Optional<Reading> maximumSurfaceTemperature,

        @Wording(label = "plan of the room's floor", help = "A rectangle, for the free area and a drawing.")
        Optional<RoomPlan> plan) {}
