package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import org.treadwarm.physics.envelope.HeatFlow;
import org.treadwarm.survey.AirGap;
import org.treadwarm.survey.Bridging;
import org.treadwarm.survey.Direction;
import org.treadwarm.survey.Layer;
import org.treadwarm.survey.Pointer;

/** Steps of a pile of layers: each layer's resistance, and the two limits of the combined method. */
final class LayerSteps {
    private final Addresses addresses;
    private final Steps steps;

    LayerSteps(Addresses addresses, Steps steps) {
        this.addresses = addresses;
        this.steps = steps;
    }

    /** Resistances of layers that stand at a pointer in the survey and at another in the answer. */
    void resistances(String from, String at, List<Layer> layers, HeatFlow direction) {
        for (int i = 0; i < layers.size(); i++) {
            Layer layer = layers.get(i);
            String given = Addresses.survey(Pointer.to(from, i));
            String answer = Pointer.to(at, i);
            resistance(answer + "/resistance", given, layer, direction);
            layer.bridging().ifPresent(bridging -> framing(answer + "/framingResistance", given, layer, bridging));
        }
    }

    private void resistance(String at, String given, Layer layer, HeatFlow direction) {
        if (layer.resistance().isPresent()) {
            steps.add(at, "layer-resistance-as-given", "R", Symbol.of("R_given", given + "/resistance"));
        } else if (layer.airGap().isPresent()) {
            airGap(at, given + "/airGap", layer.airGap().get(), direction);
        } else {
            String conductivity = layer.conductivity().isPresent()
                    ? given + "/conductivity"
                    : TableNumbers.conductivity(layer.material().orElseThrow());
            steps.add(
                    at,
                    "layer-resistance",
                    "R",
                    Symbol.of("d", given + "/thickness"),
                    Symbol.of("lambda", conductivity));
        }
    }

    private void airGap(String at, String given, AirGap gap, HeatFlow direction) {
        boolean ordinary = gap.emissivities().isEmpty();
        HeatFlow across = gap.direction().map(Direction::heatFlow).orElse(direction);
        steps.add(
                at,
                "air-gap-" + across.word(),
                "R",
                Symbol.of("d", given + "/thickness"),
                Symbol.of("epsilon_1", ordinary ? TableNumbers.ordinaryEmissivity() : given + "/emissivities/0"),
                Symbol.of("epsilon_2", ordinary ? TableNumbers.ordinaryEmissivity() : given + "/emissivities/1"));
    }

    private void framing(String at, String given, Layer layer, Bridging bridging) {
        if (bridging.resistance().isPresent()) {
            steps.add(at, "framing-resistance-as-given", "R", Symbol.of("R_given", given + "/bridging/resistance"));
        } else {
            String thickness = given + (layer.airGap().isPresent() ? "/airGap" : "") + "/thickness";
            steps.add(
                    at,
                    "framing-resistance",
                    "R",
                    Symbol.of("d", thickness),
                    Symbol.of("lambda", given + "/bridging/conductivity"));
        }
    }

    /** Addresses of the layers that no frame crosses. */
    static List<String> unbridged(Stack stack, String layers) {
        List<String> unbridged = new ArrayList<>();
        for (int i = 0; i < stack.layers; i++) {
            if (stack.frame[i] == Stack.NONE) {
                unbridged.add(Addresses.sizing(Pointer.to(layers, i) + "/resistance"));
            }
        }
        return unbridged;
    }

    /** R' and R'' of a pile, with the addresses of the films that belong to it. */
    void limits(String upper, String lower, Stack stack, List<String> films, String layers) {
        List<String> everywhere = new ArrayList<>(films);
        everywhere.addAll(unbridged(stack, layers));
        Symbol common = Symbol.all("R", everywhere);
        if (stack.frames == 0) {
            steps.add(upper, "resistances-in-series", "R_T", common);
            steps.add(lower, "resistances-in-series", "R_T", common);
            return;
        }
        List<Symbol> frames = new ArrayList<>(List.of(common));
        for (int frame = 0; frame < stack.frames; frame++) {
            List<Integer> crossed = crossed(stack, frame, frame);
            frames.add(Symbol.of("f" + (frame + 1), share(stack, crossed.get(0))));
            frames.add(resistances("L" + (frame + 1), layers, crossed, "/resistance"));
            frames.add(resistances("B" + (frame + 1), layers, crossed, "/framingResistance"));
        }
        steps.add(upper, "upper-limit", "R_upper", frames.toArray(new Symbol[0]));
        List<Integer> bridged = crossed(stack, 0, stack.frames - 1);
        steps.add(
                lower,
                "lower-limit",
                "R_lower",
                common,
                Symbol.all("f", bridged.stream().map(i -> share(stack, i)).toList()),
                resistances("L", layers, bridged, "/resistance"),
                resistances("B", layers, bridged, "/framingResistance"));
    }

    private String share(Stack stack, int layer) {
        return addresses.input(stack.share[layer]);
    }

    private static Symbol resistances(String name, String layers, List<Integer> chosen, String key) {
        return Symbol.all(
                name,
                chosen.stream()
                        .map(i -> Addresses.sizing(Pointer.to(layers, i) + key))
                        .toList());
    }

    /** The layers that some of the frames cross. */
    private static List<Integer> crossed(Stack stack, int firstFrame, int lastFrame) {
        List<Integer> crossed = new ArrayList<>();
        for (int i = 0; i < stack.layers; i++) {
            if (stack.frame[i] != Stack.NONE && stack.frame[i] >= firstFrame && stack.frame[i] <= lastFrame) {
                crossed.add(i);
            }
        }
        return crossed;
    }
}
