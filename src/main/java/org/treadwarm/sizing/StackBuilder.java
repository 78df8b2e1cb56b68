package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.physics.envelope.HeatFlow;
import org.treadwarm.survey.AirGap;
import org.treadwarm.survey.Bridging;
import org.treadwarm.survey.Layer;
import org.treadwarm.survey.Place;
import org.treadwarm.tables.Materials;

/** Compiles piles of layers. */
final class StackBuilder {
    private static final int NONE = Stack.NONE;

    private final Inputs inputs;
    private final List<Stack> stacks = new ArrayList<>();
    private int layerCount;

    StackBuilder(Inputs inputs) {
        this.inputs = inputs;
    }

    /** The piles so far. */
    List<Stack> all() {
        return List.copyOf(stacks);
    }

    /** Number of layers in all piles so far. */
    int layers() {
        return layerCount;
    }

    /** Compiles one pile and gives its number. */
    int add(Place pile, List<Layer> layers, HeatFlow direction) {
        int[] frame = new int[layers.size()];
        int frames = frames(layers, frame);
        Stack stack = new Stack(layers.size(), layerCount, frames);
        for (int i = 0; i < layers.size(); i++) {
            Layer layer = layers.get(i);
            Place at = pile.item(i);
            layer(stack, i, layer, at, direction);
            stack.frame[i] = frame[i];
            if (layer.bridging().isPresent()) {
                Bridging bridging = layer.bridging().get();
                stack.share[i] = inputs.add(at, "/bridging/share", bridging.share());
                stack.bridgeConductivity[i] = inputs.optional(at, "/bridging/conductivity", bridging.conductivity());
                stack.bridgeResistance[i] = inputs.optional(at, "/bridging/resistance", bridging.resistance());
            }
        }
        layerCount += layers.size();
        stacks.add(stack);
        return stacks.size() - 1;
    }

    private void layer(Stack stack, int i, Layer layer, Place at, HeatFlow direction) {
        stack.resistance[i] = inputs.optional(at, "/resistance", layer.resistance());
        if (layer.airGap().isPresent()) {
            AirGap gap = layer.airGap().get();
            stack.airGap[i] = true;
            stack.thickness[i] = inputs.add(at, "/airGap/thickness", gap.thickness());
            stack.direction[i] = gap.direction().map(d -> d.heatFlow()).orElse(direction);
            if (!gap.emissivities().isEmpty()) {
                stack.emissivityInside[i] = inputs.add(
                        at, "/airGap/emissivities/0", gap.emissivities().get(0));
                stack.emissivityOutside[i] = inputs.add(
                        at, "/airGap/emissivities/1", gap.emissivities().get(1));
            }
            return;
        }
        stack.thickness[i] = inputs.optional(at, "/thickness", layer.thickness());
        stack.conductivity[i] = inputs.optional(at, "/conductivity", layer.conductivity());
        if (layer.resistance().isEmpty() && layer.conductivity().isEmpty()) {
            stack.tableConductivity[i] = Materials.find(layer.material().orElseThrow())
                    .orElseThrow()
                    .conductivity()
                    .orElseThrow();
        }
    }

    /** Numbers the frames that cross the layers; layers of one named frame share a number. */
    private static int frames(List<Layer> layers, int[] frame) {
        Map<String, Integer> named = new HashMap<>();
        int frames = 0;
        for (int i = 0; i < layers.size(); i++) {
            Optional<Bridging> bridging = layers.get(i).bridging();
            frame[i] = NONE;
            if (bridging.isPresent()) {
                Optional<String> name = bridging.get().frame();
                frame[i] = name.isPresent() ? named.getOrDefault(name.get(), frames) : frames;
                frames = Math.max(frames, frame[i] + 1);
                if (name.isPresent()) {
                    named.put(name.get(), frame[i]);
                }
            }
        }
        return frames;
    }
}
