package org.treadwarm.survey;

import java.util.List;
import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** The foot of an outer wall beside a heated slab on the ground, whose psi value is to be solved in section. */
public record WallFootQuestion(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0.5,
                max = 200,
                label = "characteristic dimension of the slab",
                help = "Its area over half its exposed perimeter (ISO 13370).")
        Reading characteristicDimension,

        @Quantity(kind = QuantityKind.CONDUCTIVITY, min = 0.1, max = 10, label = "conductivity of the soil")
        Reading soilConductivity,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0.03,
                max = 3,
                label = "full thickness of the outer walls",
                help = "As the ISO 13370 value of the slab has it.")
        Reading wallThickness,

        @Wording(label = "layers below the heated plane", help = "From the heated plane down; at most 20.")
        List<Layer> below,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 0.5,
                label = "thickness of the floor above the heated plane",
                help = "The wall is taped from the finished surface up; what stands beside these layers is in psi.",
                fallback = "0 m")
        Reading above,

        @Wording(label = "layers of the wall", help = "From inside to outside; at most 20, each with its thickness.")
        List<Layer> wall,

        @Quantity(kind = QuantityKind.TRANSMITTANCE, min = 0.5, max = 100, label = "inside surface coefficient")
        Optional<Reading> insideCoefficient,

        @Quantity(kind = QuantityKind.TRANSMITTANCE, min = 0.5, max = 100, label = "outside surface coefficient")
        Optional<Reading> outsideCoefficient,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 3,
                label = "height of the heated plane above the ground outside",
                assume = "0.15 m",
                assumeWhy = "Common practice, no source.")
        Reading heatedPlane,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 5,
                label = "depth of the foundation below the ground outside",
                assume = "0.6 m",
                assumeWhy = "Common practice, no source.")
        Reading foundation,

        @Quantity(
                kind = QuantityKind.CONDUCTIVITY,
                min = 0.02,
                max = 10,
                label = "conductivity of the foundation",
                help = "Of all that stands under the wall, from the heated plane down.",
                assume = "1.3 W/(m.K)",
                assumeWhy = "Dense concrete blocks, common practice, no source.")
        Reading footConductivity,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0.001,
                max = 0.5,
                formUnit = "mm",
                label = "thickness of the edge insulation",
                help = "Upright between floor and wall. Leave all three out for none.")
        Optional<Reading> edgeThickness,

        @Quantity(kind = QuantityKind.CONDUCTIVITY, min = 0.005, max = 2, label = "conductivity of the edge insulation")
        Optional<Reading> edgeConductivity,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0.005,
                max = 3,
                formUnit = "mm",
                label = "depth of the edge insulation",
                help = "From the heated plane down.")
        Optional<Reading> edgeDepth) {
    private static final int MOST_LAYERS = 20;
    private static final double THINNEST_WALL = 0.03;
    private static final double THICKEST_WALL = 3;

    /** Of the characteristic dimension; the section's ground is 2.5 times that deep. */
    private static final double DEEPEST = 2;

    /** Thickness of the wall's layers together, m; a layer without one counts as nothing. */
    public double thicknessOfWall() {
        return wall.stream()
                .flatMap(layer -> layer.anyThickness().stream())
                .mapToDouble(Reading::value)
                .sum();
    }

    /** Adds what is wrong within the question to the findings. */
    public void check(Findings findings) {
        below(findings);
        wall(findings);
        edge(findings);
        if (findings.isEmpty() && deepest() > DEEPEST * characteristicDimension.value()) {
            findings.add(
                    "/characteristicDimension",
                    characteristicDimension.typed(),
                    "floor, foundation or edge insulation reach too deep for a section so narrow",
                    "at least half the greatest depth, " + deepest() + " m");
        }
    }

    /** How far floor, foundation and edge insulation reach below the ground outside or the heated plane, m. */
    private double deepest() {
        double floor = below.stream()
                .flatMap(layer -> layer.thickness().stream())
                .mapToDouble(Reading::value)
                .sum();
        return Math.max(
                foundation.value(),
                Math.max(floor, edgeDepth.map(Reading::value).orElse(0.0)));
    }

    private void below(Findings findings) {
        count(findings, "/below", below);
        new LayerRules(findings).layers(Place.ROOT.at("/below"), below);
        for (int i = 0; i < below.size(); i++) {
            Layer layer = below.get(i);
            String at = "/below/" + i;
            if (!findings.clean(at) || !findings.clean(at + "/thickness")) {
                continue;
            }
            if (layer.airGap().isPresent()) {
                findings.add(at + "/airGap", "an air gap", "a slab in section has no air gap", "a solid layer");
            } else if (layer.bridging().isPresent()) {
                findings.add(at + "/bridging", "framing", "a slab in section has no framing", "leave it out");
            } else if (layer.thickness().isEmpty()) {
                unknownThickness(findings, at, layer, i, "below the heated plane");
            } else if (layer.resistance().filter(given -> given.value() == 0).isPresent()) {
                findings.add(
                        at + "/resistance",
                        "0 m2.K/W",
                        "a layer with a thickness and no resistance conducts without bound",
                        "more than 0 m2.K/W");
            }
        }
    }

    private void wall(Findings findings) {
        count(findings, "/wall", wall);
        new LayerRules(findings).layers(Place.ROOT.at("/wall"), wall);
        for (int i = 0; i < wall.size(); i++) {
            String at = "/wall/" + i;
            if (findings.clean(at)
                    && findings.clean(at + "/thickness")
                    && wall.get(i).anyThickness().isEmpty()) {
                unknownThickness(findings, at, wall.get(i), i, "of the wall");
            }
        }
        if (findings.isEmpty() && (thicknessOfWall() < THINNEST_WALL || thicknessOfWall() > THICKEST_WALL)) {
            findings.add(
                    "/wall",
                    thicknessOfWall() + " m together",
                    "the layers of the wall are too thin or too thick together",
                    THINNEST_WALL + " to " + THICKEST_WALL + " m");
        }
    }

    private static void count(Findings findings, String pointer, List<Layer> layers) {
        if (layers.isEmpty() && findings.clean(pointer)) {
            findings.add(pointer, "no layers", "a section needs layers with thicknesses", "1 to " + MOST_LAYERS);
        } else if (layers.size() > MOST_LAYERS) {
            findings.add(pointer, layers.size() + " layers", "too many layers", "1 to " + MOST_LAYERS);
        }
    }

    private static void unknownThickness(Findings findings, String at, Layer layer, int i, String where) {
        findings.missing(
                at + "/thickness",
                "the thickness of \"" + layer.title(i + 1) + "\" " + where
                        + " is missing, so it cannot be drawn in section",
                "0.01 mm to 10 m, beside its resistance");
    }

    private void edge(Findings findings) {
        int given = count(edgeThickness) + count(edgeConductivity) + count(edgeDepth);
        if (given == 0 || given == 3) {
            if (findings.isEmpty() && given == 3 && edgeThickness.orElseThrow().value() >= halfWidth()) {
                findings.add(
                        "/edgeThickness",
                        edgeThickness.get().typed(),
                        "the edge insulation leaves no floor",
                        "less than half the characteristic dimension");
            }
            return;
        }
        missing(findings, "/edgeThickness", edgeThickness, "its thickness is missing");
        missing(findings, "/edgeConductivity", edgeConductivity, "its conductivity is missing");
        missing(findings, "/edgeDepth", edgeDepth, "its depth is missing");
    }

    private static int count(Optional<Reading> reading) {
        return reading.isPresent() ? 1 : 0;
    }

    private static void missing(Findings findings, String pointer, Optional<Reading> reading, String message) {
        if (reading.isEmpty() && findings.clean(pointer)) {
            findings.missing(pointer, "edge insulation is known by all three: " + message, "all three, or none");
        }
    }

    /** Half the characteristic dimension: the width of floor in the section, m. */
    public double halfWidth() {
        return characteristicDimension.value() / 2;
    }
}
