package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import org.treadwarm.physics.envelope.CombinedMethod;
import org.treadwarm.physics.envelope.HeatFlow;
import org.treadwarm.physics.warmup.FloorLayer;
import org.treadwarm.survey.Layer;
import org.treadwarm.survey.LayerMatter;
import org.treadwarm.survey.Place;

/**
 * A survey's layers as they pass and hold heat. A framed layer has the mean resistance of its two parts side by side (isothermal
 * planes) and the heat capacity of what lies between the framing.
 */
final class ThermalLayers {
    private ThermalLayers() {}

    /** The layers in their order, which intake accepted as layers that hold heat. */
    static List<FloorLayer> of(List<Layer> layers, HeatFlow direction) {
        double[] resistances = resistances(layers, direction);
        List<FloorLayer> thermal = new ArrayList<>();
        for (int i = 0; i < layers.size(); i++) {
            Layer layer = layers.get(i);
            thermal.add(
                    LayerMatter.isResistanceAlone(layer)
                            ? new FloorLayer.Massless(resistances[i])
                            : massive(LayerMatter.of(layer), resistances[i]));
        }
        return List.copyOf(thermal);
    }

    private static FloorLayer massive(LayerMatter matter, double resistance) {
        double thickness = matter.thickness().orElseThrow();
        return new FloorLayer.Massive(
                thickness,
                thickness / resistance,
                matter.density().orElseThrow(),
                matter.specificHeat().orElseThrow());
    }

    private static double[] resistances(List<Layer> layers, HeatFlow direction) {
        Inputs inputs = new Inputs();
        StackBuilder builder = new StackBuilder(inputs);
        builder.add(Place.ROOT, layers, direction);
        Stack stack = builder.all().get(0);
        double[] in = inputs.values();
        double[] layer = new double[stack.layers];
        double[] framing = new double[stack.layers];
        stack.evaluate(in, layer, framing);
        double[] mean = new double[stack.layers];
        for (int i = 0; i < stack.layers; i++) {
            mean[i] = stack.frame[i] == Stack.NONE
                    ? layer[i]
                    : CombinedMethod.sideBySide(in[stack.share[i]], layer[i], framing[i]);
        }
        return mean;
    }
}
