package org.treadwarm.survey;

import java.util.List;
import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** A build-up of layers from inside to outside, or a component of a known U-value. */
public record Assembly(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,

        @Wording(label = "layers", help = "From inside to outside.")
        List<Layer> layers,

        @Quantity(
                kind = QuantityKind.TRANSMITTANCE,
                min = 0.01,
                max = 20,
                plausibleFrom = 0.05,
                plausibleTo = 7,
                label = "U-value",
                help = "As given by the maker, films included.")
        Optional<Reading> uValue,

        @Wording(
                label = "heat flow",
                help = "Decides the surface films and air gaps (ISO 6946).",
                fallback = "horizontal")
        Direction heatFlow,

        @Quantity(
                kind = QuantityKind.TRANSMITTANCE,
                min = 0.5,
                max = 100,
                plausibleFrom = 2,
                plausibleTo = 15,
                label = "inside surface coefficient",
                help = "Replaces the standard's inside film.")
        Optional<Reading> insideCoefficient,

        @Quantity(
                kind = QuantityKind.TRANSMITTANCE,
                min = 0.5,
                max = 100,
                plausibleFrom = 5,
                plausibleTo = 60,
                label = "outside surface coefficient",
                help = "Replaces the standard's outside film towards outdoors.")
        Optional<Reading> outsideCoefficient) {}
