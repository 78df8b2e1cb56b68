package org.treadwarm.survey;

import java.util.List;
import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** A floor to be solved between its cables or pipes, with what lies above and below it. */
public record SectionQuestion(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0.005,
                max = 2,
                label = "spacing of the cables or pipes, axis to axis")
        Reading spacing,

        @Wording(label = "above the finished surface") SectionAbove above,
        @Wording(label = "below the last layer") SectionBelow below,

        @Wording(label = "layers", help = "From the finished surface down; at most 20.")
        List<Layer> layers,

        @Wording(label = "heater") SectionHeater heater) {
    private static final int MOST_LAYERS = 20;

    /** A pipe that lies on the next layer touches it but for the rounding of its sizes, m. */
    private static final double ROUNDING = 1e-12;

    /** What the finished surface gives its heat to: a temperature, and a coefficient or the basic characteristic. */
    public record SectionAbove(
            @Quantity(kind = QuantityKind.TEMPERATURE, min = -60, max = 60, label = "room temperature")
            Reading temperature,

            @Quantity(kind = QuantityKind.TRANSMITTANCE, min = 0.5, max = 100, label = "surface coefficient")
            Optional<Reading> coefficient,

            @Wording(
                    label = "characteristic",
                    help = "Instead of a coefficient: q = 8.92 (theta_F - theta_i)^1.1 at every point.")
            Optional<Characteristic> characteristic) {}

    /** A law of the heat that a floor's surface gives off. */
    public enum Characteristic implements Word {
        EN_1264_2;

        @Override
        public String word() {
            return "EN 1264-2";
        }
    }

    /** What the last layer gives its heat to. */
    public record SectionBelow(
            @Quantity(kind = QuantityKind.TEMPERATURE, min = -60, max = 60, label = "temperature below")
            Reading temperature,

            @Quantity(kind = QuantityKind.TRANSMITTANCE, min = 0.01, max = 100, label = "coefficient below")
            Reading coefficient) {}

    /** A pipe or a cable. */
    public enum EmbeddedKind implements Word {
        PIPE("pipe"),
        CABLE("cable");

        private final String word;

        EmbeddedKind(String word) {
            this.word = word;
        }

        @Override
        public String word() {
            return word;
        }
    }

    /** The pipe or cable in its layer. */
    public record SectionHeater(
            @Wording(label = "kind of heater") EmbeddedKind kind,

            @Wording(label = "layer that holds it", help = "The name of one of the layers.")
            String layer,

            @Quantity(
                    kind = QuantityKind.LENGTH,
                    min = 0,
                    max = 10,
                    moreThanMin = true,
                    label = "depth of the axis below the top face of its layer")
            Reading depth,

            @Quantity(kind = QuantityKind.LENGTH, min = 0.001, max = 0.1, label = "outside diameter")
            Reading diameter,

            @Quantity(kind = QuantityKind.LENGTH, min = 0.0001, max = 0.05, label = "wall thickness of a pipe")
            Optional<Reading> wallThickness,

            @Quantity(kind = QuantityKind.CONDUCTIVITY, min = 0.01, max = 500, label = "conductivity of a pipe's wall")
            Optional<Reading> wallConductivity,

            @Quantity(
                    kind = QuantityKind.TRANSMITTANCE,
                    min = 1,
                    max = 1e6,
                    label = "film coefficient of the water in a pipe",
                    help = "Left out: the wall's inner face has the water's temperature.")
            Optional<Reading> filmCoefficient,

            @Quantity(kind = QuantityKind.TEMPERATURE, min = -60, max = 100, label = "water temperature of a pipe")
            Optional<Reading> waterTemperature,

            @Quantity(kind = QuantityKind.LINEAR_POWER, min = 0, max = 500, label = "power of a cable per metre")
            Optional<Reading> power) {}

    /** Number of the layer that holds the heater, from 0; -1 when no layer, or more than one, has that name. */
    public int heaterLayer() {
        int found = -1;
        for (int i = 0; i < layers.size(); i++) {
            if (layers.get(i).title(i + 1).equals(heater.layer())) {
                if (found >= 0) {
                    return -1;
                }
                found = i;
            }
        }
        return found;
    }

    /** Adds what is wrong within the section to the findings. */
    public void check(Findings findings) {
        new LayerRules(findings).layers(Place.ROOT.at("/layers"), layers);
        for (int i = 0; i < layers.size(); i++) {
            if (layers.get(i).bridging().isPresent()) {
                findings.add("/layers/" + i + "/bridging", "framing", "a section has no framing", "leave it out");
            }
        }
        if (layers.isEmpty() && findings.clean("/layers")) {
            findings.add("/layers", "no layers", "a section needs layers", "1 to " + MOST_LAYERS);
        }
        if (layers.size() > MOST_LAYERS) {
            findings.add("/layers", layers.size() + " layers", "too many layers", "1 to " + MOST_LAYERS);
        }
        if (above.coefficient().isPresent() == above.characteristic().isPresent()
                && findings.clean("/above/coefficient")
                && findings.clean("/above/characteristic")) {
            findings.add(
                    "/above",
                    above.coefficient().isPresent() ? "coefficient and characteristic" : "neither",
                    "the surface gives its heat off by a coefficient or by the characteristic",
                    "exactly one of coefficient and characteristic");
        }
        if (findings.isEmpty()) {
            heater(findings);
        }
    }

    private void heater(Findings findings) {
        boolean pipe = heater.kind() == EmbeddedKind.PIPE;
        if (pipe) {
            needed(findings, "/heater/wallThickness", heater.wallThickness(), "a pipe has a wall");
            needed(findings, "/heater/wallConductivity", heater.wallConductivity(), "a pipe has a wall");
            needed(findings, "/heater/waterTemperature", heater.waterTemperature(), "a pipe is heated by its water");
            unwanted(findings, "/heater/power", heater.power(), "only a cable has a power per metre");
        } else {
            needed(findings, "/heater/power", heater.power(), "a cable is heated by its power");
            unwanted(findings, "/heater/wallThickness", heater.wallThickness(), "only a pipe has a wall");
            unwanted(findings, "/heater/wallConductivity", heater.wallConductivity(), "only a pipe has a wall");
            unwanted(findings, "/heater/filmCoefficient", heater.filmCoefficient(), "only a pipe has water in it");
            unwanted(findings, "/heater/waterTemperature", heater.waterTemperature(), "only a pipe has water in it");
        }
        if (findings.isEmpty()) {
            place(findings);
        }
    }

    private static void needed(Findings findings, String pointer, Optional<Reading> reading, String message) {
        if (reading.isEmpty()) {
            findings.missing(pointer, message, "a reading");
        }
    }

    private static void unwanted(Findings findings, String pointer, Optional<Reading> reading, String message) {
        reading.ifPresent(given -> findings.add(pointer, given.typed(), message, "leave it out"));
    }

    private void place(Findings findings) {
        int holding = heaterLayer();
        if (holding < 0) {
            findings.add("/heater/layer", heater.layer(), "no one layer is called so", "the name of one of the layers");
            return;
        }
        double radius = heater.diameter().value() / 2;
        Optional<Reading> thickness = layers.get(holding).thickness();
        if (thickness.isEmpty() || layers.get(holding).resistance().isPresent()) {
            findings.add(
                    "/heater/layer",
                    heater.layer(),
                    "the layer that holds the heater has no thickness and conductivity",
                    "a layer with thickness and conductivity or material");
        } else if (heater.depth().value() < radius - ROUNDING
                || heater.depth().value() > thickness.get().value() - radius + ROUNDING) {
            findings.add(
                    "/heater/depth",
                    heater.depth().typed(),
                    "the heater would stick out of its layer",
                    "half a diameter or more from both faces of the layer");
        }
        if (heater.diameter().value() >= spacing.value()) {
            findings.add(
                    "/spacing",
                    spacing.typed(),
                    "the heaters would lie inside one another",
                    "more than the outside diameter");
        }
        heater.wallThickness()
                .filter(wall -> wall.value() >= radius)
                .ifPresent(wall -> findings.add(
                        "/heater/wallThickness",
                        wall.typed(),
                        "the wall leaves no room for the water",
                        "less than half the outside diameter"));
    }
}
