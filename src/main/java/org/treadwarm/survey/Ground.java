package org.treadwarm.survey;

import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** The slab or suspended floor that a piece of floor belongs to (ISO 13370). Area and perimeter are of one and the same slab. */
public record Ground(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,
        @Wording(label = "kind of ground floor") GroundKind kind,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 1000,
                moreThanMin = true,
                plausibleFrom = 1,
                plausibleTo = 300,
                label = "exposed perimeter",
                help = "Of the outer walls round this slab. A room without an outer wall gives the whole slab.")
        Reading exposedPerimeter,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 1e-5,
                max = 10,
                plausibleFrom = 0.05,
                plausibleTo = 1.2,
                formUnit = "m",
                label = "full thickness of the outer walls",
                assume = "0.3 m",
                assumeWhy = "ISO 13370 examples, from memory.")
        Reading wallThickness,

        @Quantity(
                kind = QuantityKind.CONDUCTIVITY,
                min = 0.001,
                max = 500,
                plausibleFrom = 0.5,
                plausibleTo = 4,
                label = "conductivity of the soil",
                help = "Clay or silt 1.5, sand or gravel 2.0, rock 3.5 W/(m.K) (ISO 13370, from memory).",
                assume = "2.0 W/(m.K)",
                assumeWhy = "ISO 13370, soil not known, from memory.")
        Reading soilConductivity,

        @Quantity(
                kind = QuantityKind.AREA,
                min = 0,
                max = 10000,
                moreThanMin = true,
                plausibleFrom = 1,
                plausibleTo = 2000,
                label = "area of the slab that the perimeter belongs to",
                help = "The room's floor area when left out.")
        Optional<Reading> area,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 1000,
                plausibleFrom = 0.1,
                plausibleTo = 2,
                label = "height of the floor above the ground outside",
                assume = "0.3 m",
                assumeWhy = "Common practice, no source.")
        Optional<Reading> floorHeight,

        @Quantity(
                kind = QuantityKind.TRANSMITTANCE,
                min = 0.01,
                max = 20,
                plausibleFrom = 0.1,
                plausibleTo = 4,
                label = "U-value of the walls of the void",
                assume = "1.7 W/(m2.K)",
                assumeWhy = "Uninsulated masonry, common practice, no source.")
        Optional<Reading> wallUValue,

        @Quantity(
                kind = QuantityKind.AREA_PER_LENGTH,
                min = 0,
                max = 10,
                plausibleFrom = 2e-4,
                plausibleTo = 0.05,
                label = "vent area per metre of perimeter",
                assume = "0.0015 m2/m",
                assumeWhy = "1 500 mm2 per metre, the usual building rule, from memory.")
        Optional<Reading> ventArea,

        @Quantity(
                kind = QuantityKind.SPEED,
                min = 0,
                max = 60,
                plausibleFrom = 0.5,
                plausibleTo = 10,
                label = "mean wind speed at 10 m height",
                assume = "4 m/s",
                assumeWhy = "Common practice, no source.")
        Optional<Reading> windSpeed,

        @Wording(label = "wind shielding of the void", fallback = "average")
        Shielding shielding) {}
