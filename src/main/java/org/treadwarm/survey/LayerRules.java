package org.treadwarm.survey;

import java.util.HashMap;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.treadwarm.physics.envelope.CombinedMethod;
import org.treadwarm.tables.Material;
import org.treadwarm.tables.Materials;
import org.treadwarm.units.Reading;

/** What must hold within an assembly and its layers. */
final class LayerRules {
    private static final String WAYS =
            "one of: resistance; thickness with conductivity; thickness with material; airGap";

    /** The most layers on one side of a heater whose warming up is computed. */
    private static final int MOST_WARMED = 20;

    private final Findings findings;

    LayerRules(Findings findings) {
        this.findings = findings;
    }

    void assembly(Place at, Assembly assembly) {
        boolean judged = findings.clean(at, "/layers") && findings.clean(at, "/uValue");
        if (assembly.uValue().isPresent() && !assembly.layers().isEmpty()) {
            findings.add(
                    at.pointer(),
                    "layers and uValue",
                    "an assembly is known by its layers or by its U-value",
                    "exactly one of layers and uValue");
        } else if (assembly.uValue().isEmpty() && assembly.layers().isEmpty() && judged) {
            findings.add(
                    at.pointer(),
                    "neither layers nor uValue",
                    "an assembly needs its layers or its U-value",
                    "exactly one of layers and uValue");
        }
        layers(at.at("/layers"), assembly.layers());
    }

    void layers(Place at, List<Layer> layers) {
        Map<String, Double> shares = new HashMap<>();
        Set<String> named = new HashSet<>();
        int frames = 0;
        for (int i = 0; i < layers.size(); i++) {
            Layer layer = layers.get(i);
            Place own = at.item(i);
            layer(own, layer);
            if (layer.bridging().isPresent()) {
                Bridging bridging = layer.bridging().get();
                bridging(own, layer, bridging);
                frames +=
                        bridging.frame().isEmpty() || named.add(bridging.frame().get()) ? 1 : 0;
                oneShare(own, bridging, shares);
            }
        }
        if (frames > CombinedMethod.MOST_FRAMES) {
            findings.add(
                    at.pointer(),
                    frames + " frames",
                    "too many frames cross each other here",
                    "at most " + CombinedMethod.MOST_FRAMES + " that are not in register");
        }
    }

    /** The layers hold heat, so their density and specific heat must be known wherever they are no bare resistance. */
    void layersThatHoldHeat(Place at, List<Layer> layers) {
        if (layers.size() > MOST_WARMED) {
            findings.add(
                    at.pointer(), layers.size() + " layers", "there are too many layers", "at most " + MOST_WARMED);
        }
        layers(at, layers);
        for (int i = 0; i < layers.size(); i++) {
            Layer layer = layers.get(i);
            Place own = at.item(i);
            if (!findings.clean(own, "") || !findings.clean(own, "/material") || LayerMatter.isResistanceAlone(layer)) {
                continue;
            }
            List<String> missing = LayerMatter.of(layer).missing();
            if (missing.contains("density")) {
                findings.missing(
                        own,
                        "/density",
                        "the density is missing, and no material tells it, so the heat the layer holds is not known",
                        "0.5 to 25000 kg/m3");
            }
            if (missing.contains("specificHeat")) {
                findings.missing(
                        own,
                        "/specificHeat",
                        "the specific heat capacity is missing, and no material tells it, so the heat the layer holds is not known",
                        "50 to 20000 J/(kg.K)");
            }
        }
    }

    private void oneShare(Place layer, Bridging bridging, Map<String, Double> shares) {
        if (bridging.frame().isEmpty() || !findings.clean(layer, "/bridging/share")) {
            return;
        }
        double share = bridging.share().value();
        Double other = shares.putIfAbsent(bridging.frame().get(), share);
        if (other != null && other != share) {
            findings.add(
                    layer,
                    "/bridging/share",
                    bridging.share().typed(),
                    "layers of the frame \"" + bridging.frame().get()
                            + "\" are crossed by the same members, so they have one share",
                    "the same share, or another frame");
        }
    }

    private void layer(Place at, Layer layer) {
        boolean judged = findings.clean(at, "/resistance")
                && findings.clean(at, "/thickness")
                && findings.clean(at, "/conductivity")
                && findings.clean(at, "/material")
                && findings.clean(at, "/airGap")
                && findings.clean(at, "/airGap/thickness");
        if (!judged) {
            return;
        }
        boolean resistance = layer.resistance().isPresent();
        boolean conductivity = layer.conductivity().isPresent();
        if (layer.airGap().isPresent()) {
            airGap(at, layer, layer.airGap().get());
        } else if (resistance && conductivity) {
            findings.add(at.pointer(), "resistance and conductivity", "a layer is described in two ways", WAYS);
        } else if (!resistance && layer.thickness().isEmpty()) {
            if (conductivity || layer.material().isPresent()) {
                findings.add(
                        at, "/thickness", "nothing", "the thickness is missing", "0.01 mm to 10 m, or a resistance");
            } else {
                findings.add(at.pointer(), "none of them", "nothing says how well this layer insulates", WAYS);
            }
        } else if (!resistance && !conductivity) {
            material(at, layer);
        }
    }

    private void material(Place at, Layer layer) {
        if (layer.material().isEmpty()) {
            findings.add(
                    at.pointer(),
                    "a thickness alone",
                    "with a thickness, the conductivity or the material is needed",
                    WAYS);
            return;
        }
        String name = layer.material().get();
        Optional<Material> row = Materials.find(name);
        if (row.isEmpty()) {
            findings.add(
                    at,
                    "/material",
                    name,
                    "the materials table has no \"" + name + "\"" + findings.hint(name, LayerRules::materialNames),
                    "a name from the table, or a conductivity beside it");
        } else if (row.get().conductivity().isEmpty()) {
            findings.add(
                    at,
                    "/conductivity",
                    "nothing",
                    "the table gives only a range for \"" + name + "\"",
                    "a conductivity from "
                            + row.get().conductivityFrom().orElseThrow() + " to "
                            + row.get().conductivityTo().orElseThrow() + " W/(m.K), by the maker's sheet");
        }
    }

    private static List<String> materialNames() {
        return Materials.all().stream()
                .flatMap(row -> Stream.concat(Stream.of(row.name()), row.alsoCalled().stream()))
                .toList();
    }

    private void airGap(Place at, Layer layer, AirGap gap) {
        if (layer.resistance().isPresent()
                || layer.conductivity().isPresent()
                || layer.thickness().isPresent()
                || layer.material().isPresent()) {
            findings.add(at.pointer(), "airGap and another way", "a layer is described in two ways", WAYS);
        }
        List<Reading> emissivities = gap.emissivities();
        if (!emissivities.isEmpty() && emissivities.size() != 2) {
            findings.add(
                    at,
                    "/airGap/emissivities",
                    emissivities.size() + " numbers",
                    "an air gap has two faces",
                    "two numbers, or leave them out for 0.9 and 0.9");
        }
    }

    private void bridging(Place layerAt, Layer layer, Bridging bridging) {
        Place at = layerAt.at("/bridging");
        if (!findings.clean(at, "/conductivity") || !findings.clean(at, "/resistance")) {
            return;
        }
        if (bridging.conductivity().isPresent() == bridging.resistance().isPresent()) {
            findings.add(
                    at.pointer(),
                    bridging.conductivity().isPresent() ? "conductivity and resistance" : "neither of them",
                    "framing is known by its conductivity or by its resistance",
                    "exactly one of conductivity and resistance");
        } else if (bridging.conductivity().isPresent()
                && layer.anyThickness().isEmpty()
                && findings.clean(layerAt, "/thickness")) {
            findings.add(
                    at,
                    "/conductivity",
                    bridging.conductivity().get().typed(),
                    "the layer has no thickness, so the framing's conductivity does not give its resistance",
                    "a thickness for the layer, or a resistance for the framing");
        }
    }
}
