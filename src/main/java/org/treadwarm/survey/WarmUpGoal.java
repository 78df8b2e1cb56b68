package org.treadwarm.survey;

import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;

/** From which temperature a room must be warm again, and within what time. */
public record WarmUpGoal(
        @Quantity(
                kind = QuantityKind.TEMPERATURE,
                min = -60,
                max = 60,
                plausibleFrom = 5,
                plausibleTo = 24,
                label = "setback temperature",
                help = "The room's air after a long setback.")
        Reading from,

        @Quantity(
                kind = QuantityKind.DURATION,
                min = 0.1,
                max = 48,
                plausibleFrom = 0.5,
                plausibleTo = 12,
                label = "time to be warm again")
        Reading within) {}
