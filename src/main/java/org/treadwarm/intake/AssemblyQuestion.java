package org.treadwarm.intake;

import java.util.List;
import java.util.Optional;
import org.treadwarm.survey.Assembly;
import org.treadwarm.survey.Direction;
import org.treadwarm.survey.Findings;
import org.treadwarm.survey.Layer;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** One assembly, written as in a survey, and the temperatures and humidity to look at it under. */
public record AssemblyQuestion(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,
        @Wording(label = "layers") List<Layer> layers,

        @Quantity(kind = QuantityKind.TRANSMITTANCE, min = 0.01, max = 20, label = "U-value")
        Optional<Reading> uValue,

        @Wording(label = "heat flow", fallback = "horizontal")
        Direction heatFlow,

        @Quantity(kind = QuantityKind.TRANSMITTANCE, min = 0.5, max = 100, label = "inside surface coefficient")
        Optional<Reading> insideCoefficient,

        @Quantity(kind = QuantityKind.TRANSMITTANCE, min = 0.5, max = 100, label = "outside surface coefficient")
        Optional<Reading> outsideCoefficient,

        @Wording(label = "to", help = "outdoors or indoors", fallback = "outdoors")
        String to,

        @Quantity(
                kind = QuantityKind.TEMPERATURE,
                min = -60,
                max = 60,
                label = "indoor temperature",
                fallback = "20 °C")
        Reading indoorTemperature,

        @Quantity(
                kind = QuantityKind.TEMPERATURE,
                min = -60,
                max = 60,
                label = "outdoor temperature",
                fallback = "-5 °C")
        Reading outdoorTemperature,

        @Quantity(
                kind = QuantityKind.RATIO,
                min = 0,
                max = 1,
                moreThanMin = true,
                label = "relative humidity indoors",
                fallback = "50 %")
        Reading relativeHumidity) {
    /** The assembly of the question. */
    public Assembly assembly() {
        return new Assembly(name, remark, layers, uValue, heatFlow, insideCoefficient, outsideCoefficient);
    }

    /** Whether the other side is outdoors. */
    public boolean outdoors() {
        return to.equals("outdoors");
    }

    void check(Findings findings) {
        if (!to.equals("outdoors") && !to.equals("indoors") && findings.clean("/to")) {
            findings.add("/to", to, "an assembly faces outdoors or another indoor space", "outdoors, indoors");
        }
    }
}
