package org.treadwarm.survey;

import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** Draughts and ventilation: a change rate, a flow, or a supply with heat recovery. */
public record Air(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,

        @Quantity(
                kind = QuantityKind.CHANGE_RATE,
                min = 0,
                max = 50,
                plausibleFrom = 0.05,
                plausibleTo = 5,
                label = "air change rate",
                help = "How often the whole air is replaced by outdoor air in an hour.",
                assume = "0.5 1/h",
                assumeWhy = "EN 12831-1, least rate of a habitable room, from memory; old leaky rooms have 1 and more.")
        Optional<Reading> changeRate,

        @Quantity(
                kind = QuantityKind.AIR_FLOW,
                min = 0,
                max = 100,
                plausibleFrom = 1e-3,
                plausibleTo = 0.5,
                formUnit = "m3/h",
                label = "flow of outdoor air")
        Optional<Reading> flow,

        @Quantity(
                kind = QuantityKind.AIR_FLOW,
                min = 0,
                max = 100,
                plausibleFrom = 1e-3,
                plausibleTo = 0.5,
                formUnit = "m3/h",
                label = "supply with heat recovery")
        Optional<Reading> supply,

        @Quantity(
                kind = QuantityKind.RATIO,
                min = 0,
                max = 1,
                plausibleFrom = 0.3,
                plausibleTo = 0.95,
                formUnit = "%",
                label = "heat recovered",
                help = "Share of the temperature difference that the recovery gives back.")
        Optional<Reading> recovery,

        @Quantity(
                kind = QuantityKind.VOLUME,
                min = 0,
                max = 100000,
                moreThanMin = true,
                plausibleFrom = 2,
                plausibleTo = 2000,
                label = "air volume",
                help = "Floor area times height when left out.")
        Optional<Reading> volume) {}
