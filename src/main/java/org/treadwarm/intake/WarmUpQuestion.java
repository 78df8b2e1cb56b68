package org.treadwarm.intake;

import java.util.List;
import java.util.Optional;
import org.treadwarm.survey.Findings;
import org.treadwarm.survey.Layer;
import org.treadwarm.survey.Rules;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** One heated floor, its layers written as in a survey, and the setback its room is to be warmed from. */
public record WarmUpQuestion(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,

        @Wording(label = "layers above the heater", help = "From the finished surface down to the heater.")
        List<Layer> above,

        @Wording(label = "layers below the heater", help = "From the heater down.")
        List<Layer> below,

        @Quantity(
                kind = QuantityKind.TRANSMITTANCE,
                min = 0.5,
                max = 100,
                label = "surface coefficient of the floor",
                help = "Leave it out for the basic characteristic of EN 1264-2.")
        Optional<Reading> surfaceCoefficient,

        @Quantity(kind = QuantityKind.TEMPERATURE, min = -60, max = 60, label = "temperature below")
        Reading belowTemperature,

        @Quantity(
                kind = QuantityKind.TRANSMITTANCE,
                min = 0.05,
                max = 100,
                label = "coefficient below the lowest layer",
                help = "1/0.17 m2.K/W downward into a room, ISO 6946 (from memory).",
                fallback = "5.88 W/(m2.K)")
        Reading belowCoefficient,

        @Quantity(kind = QuantityKind.HEAT_FLUX, min = 0, max = 2000, label = "heat of the heater")
        Reading density,

        @Wording(label = "room") RoomHeat room,

        @Quantity(kind = QuantityKind.TEMPERATURE, min = -60, max = 60, label = "outdoor temperature")
        Reading outdoorTemperature,

        @Wording(
                label = "temperature that counts",
                help = "air, or operative: the mean of air and mass",
                fallback = "air")
        String watched,

        @Quantity(kind = QuantityKind.TEMPERATURE, min = -60, max = 60, label = "setback temperature")
        Reading from,

        @Quantity(kind = QuantityKind.TEMPERATURE, min = -60, max = 60, label = "setpoint")
        Reading to,

        @Quantity(
                kind = QuantityKind.DURATION,
                min = 0,
                max = 480,
                moreThanMin = true,
                label = "time in which the room is to be warm",
                help = "Leave it out when the density needed for it is not wanted.")
        Optional<Reading> within,

        @Quantity(
                kind = QuantityKind.DURATION,
                min = 0.1,
                max = 480,
                label = "time looked at",
                help = "What has not happened by then is left out of the answer.",
                fallback = "72 h")
        Reading lookedAt) {
    private static final String AIR = "air";
    private static final String OPERATIVE = "operative";

    /** The room above the floor, everything per m² of heated floor. */
    public record RoomHeat(
            @Quantity(
                    kind = QuantityKind.TRANSMITTANCE,
                    min = 0.001,
                    max = 100,
                    label = "loss coefficient per heated area",
                    help = "Heat loss of the room per kelvin to outdoors, divided by the heated area.")
            Reading lossCoefficient,

            @Quantity(
                    kind = QuantityKind.AREAL_HEAT_CAPACITY,
                    min = 100,
                    max = 1e7,
                    label = "heat capacity of the air and of what follows it at once")
            Reading airCapacity,

            @Quantity(
                    kind = QuantityKind.AREAL_HEAT_CAPACITY,
                    min = 100,
                    max = 1e8,
                    label = "heat capacity of walls and furniture")
            Reading massCapacity,

            @Quantity(
                    kind = QuantityKind.TRANSMITTANCE,
                    min = 0.01,
                    max = 1000,
                    label = "coupling of air and mass",
                    help = "Surface coefficient of the walls times their area over the heated area.")
            Reading massCoupling,

            @Quantity(
                    kind = QuantityKind.HEAT_FLUX,
                    min = -1000,
                    max = 1000,
                    label = "other gain of the room",
                    fallback = "0 W/m2")
            Reading otherGain) {}

    /** Whether the operative temperature counts, not the air's. */
    public boolean operative() {
        return watched.equals(OPERATIVE);
    }

    void check(Findings findings) {
        Rules.checkLayersThatHoldHeat("/above", above, findings);
        Rules.checkLayersThatHoldHeat("/below", below, findings);
        if (!watched.equals(AIR) && !operative() && findings.clean("/watched")) {
            findings.add("/watched", watched, "no such temperature is looked at", "air, operative");
        }
        if (from.value() > to.value()) {
            findings.add("/from", from.typed(), "the setback is warmer than the setpoint", "at most the setpoint");
        }
    }
}
