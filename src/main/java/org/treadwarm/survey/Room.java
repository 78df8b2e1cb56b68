package org.treadwarm.survey;

import java.util.List;
import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** A heated room, held at its indoor temperature. */
public record Room(
        @Wording(label = "id", longest = 40) Optional<String> id,
        @Wording(label = "name") String name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,

        @Quantity(
                kind = QuantityKind.TEMPERATURE,
                min = -60,
                max = 60,
                plausibleFrom = 5,
                plausibleTo = 28,
                label = "indoor temperature",
                help = "20 °C for living rooms, 24 °C for bathrooms (EN 12831-1, from memory).")
        Reading indoorTemperature,

        @Quantity(
                kind = QuantityKind.AREA,
                min = 0,
                max = 10000,
                moreThanMin = true,
                plausibleFrom = 1,
                plausibleTo = 500,
                label = "floor area",
                help = "The whole floor between the walls; 4.10 x 3.20 is read as a product.")
        Reading floorArea,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 1000,
                moreThanMin = true,
                plausibleFrom = 1.8,
                plausibleTo = 8,
                label = "room height",
                assume = "2.5 m",
                assumeWhy = "Common practice for dwellings, no source.")
        Reading height,

        @Wording(label = "surfaces") List<Surface> surfaces,
        @Wording(label = "junctions") List<Junction> junctions,
        @Wording(label = "air") Optional<Air> air,
        @Wording(label = "heated floor") Optional<HeatedFloor> heatedFloor,

        @Quantity(
                kind = QuantityKind.HEAT_FLUX,
                min = 0,
                max = 2000,
                plausibleFrom = 2,
                plausibleTo = 60,
                label = "reheat allowance per floor area",
                help = "For heating up again after a setback (EN 12831-1).",
                fallback = "0 W/m2")
        Reading reheat,

        @Wording(
                label = "warming up after a setback",
                help =
                        "Instead of a reheat per floor area: the reheat is then computed from the floor's and the room's heat.")
        Optional<WarmUpGoal> warmUp,

        @Quantity(
                kind = QuantityKind.RATIO,
                min = 0,
                max = 5,
                plausibleFrom = 0.01,
                plausibleTo = 0.3,
                formUnit = "%",
                label = "allowance on the required heat",
                help = "A share added to the required heat; it is printed.",
                fallback = "0")
        Reading allowance,

        @Quantity(
                kind = QuantityKind.POWER,
                min = 0,
                max = 100000,
                plausibleFrom = 50,
                plausibleTo = 5000,
                label = "other heat that stays",
                help = "A radiator that stays: set against the supplement, never against the required flux.",
                fallback = "0 W")
        Reading otherHeat) {}
