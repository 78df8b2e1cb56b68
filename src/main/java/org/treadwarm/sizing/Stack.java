package org.treadwarm.sizing;

import org.treadwarm.physics.envelope.AirLayer;
import org.treadwarm.physics.envelope.CombinedMethod;
import org.treadwarm.physics.envelope.HeatFlow;

/** A pile of layers, compiled: where each layer finds its numbers, and which frames cross it. */
final class Stack {
    static final int NONE = -1;

    /** Emissivity of ordinary building materials (ISO 6946:2017, 6.9.2, from memory). */
    static final double ORDINARY_EMISSIVITY = 0.9;

    final int layers;
    final int first;
    final int[] resistance;
    final int[] thickness;
    final int[] conductivity;
    final double[] tableConductivity;
    final boolean[] airGap;
    final HeatFlow[] direction;
    final int[] emissivityInside;
    final int[] emissivityOutside;
    final int[] frame;
    final int[] share;
    final int[] bridgeConductivity;
    final int[] bridgeResistance;
    final int frames;

    Stack(int layers, int first, int frames) {
        this.layers = layers;
        this.first = first;
        this.frames = frames;
        resistance = none(layers);
        thickness = none(layers);
        conductivity = none(layers);
        tableConductivity = new double[layers];
        airGap = new boolean[layers];
        direction = new HeatFlow[layers];
        emissivityInside = none(layers);
        emissivityOutside = none(layers);
        frame = none(layers);
        share = none(layers);
        bridgeConductivity = none(layers);
        bridgeResistance = none(layers);
    }

    private static int[] none(int length) {
        int[] indexes = new int[length];
        java.util.Arrays.fill(indexes, NONE);
        return indexes;
    }

    /** Computes the resistance of every layer and of the framing through it. */
    void evaluate(double[] in, double[] layerResistance, double[] bridgeResistances) {
        for (int i = 0; i < layers; i++) {
            layerResistance[first + i] = layerResistance(i, in);
            bridgeResistances[first + i] = frame[i] == NONE ? 0 : bridgeResistance(i, in);
        }
    }

    private double layerResistance(int i, double[] in) {
        if (resistance[i] != NONE) {
            return in[resistance[i]];
        }
        if (airGap[i]) {
            double inside = emissivityInside[i] == NONE ? ORDINARY_EMISSIVITY : in[emissivityInside[i]];
            double outside = emissivityOutside[i] == NONE ? ORDINARY_EMISSIVITY : in[emissivityOutside[i]];
            return AirLayer.resistance(in[thickness[i]], direction[i], inside, outside, AirLayer.MEAN_TEMPERATURE);
        }
        return in[thickness[i]] / (conductivity[i] == NONE ? tableConductivity[i] : in[conductivity[i]]);
    }

    private double bridgeResistance(int i, double[] in) {
        return bridgeResistance[i] != NONE ? in[bridgeResistance[i]] : in[thickness[i]] / in[bridgeConductivity[i]];
    }

    /** Sum of the layers that no frame crosses. */
    double unbridged(double[] layerResistance) {
        double sum = 0;
        for (int i = 0; i < layers; i++) {
            if (frame[i] == NONE) {
                sum += layerResistance[first + i];
            }
        }
        return sum;
    }

    /** Upper limit R' with the films given. */
    double upperLimit(double films, double[] in, double[] layer, double[] bridge, Frames scratch) {
        double constant = films + unbridged(layer);
        if (frames == 0) {
            return constant;
        }
        scratch.clear(frames);
        for (int i = 0; i < layers; i++) {
            if (frame[i] != NONE) {
                scratch.share[frame[i]] = in[share[i]];
                scratch.between[frame[i]] += layer[first + i];
                scratch.through[frame[i]] += bridge[first + i];
            }
        }
        return CombinedMethod.upperLimit(constant, frames, scratch.share, scratch.between, scratch.through);
    }

    /** Lower limit R'' with the films given. */
    double lowerLimit(double films, double[] in, double[] layer, double[] bridge) {
        double sum = films + unbridged(layer);
        for (int i = 0; i < layers; i++) {
            if (frame[i] != NONE) {
                sum += CombinedMethod.sideBySide(in[share[i]], layer[first + i], bridge[first + i]);
            }
        }
        return sum;
    }

    /** Total resistance by the combined method with the films given. */
    double total(double films, double[] in, double[] layer, double[] bridge, Frames scratch) {
        double upper = upperLimit(films, in, layer, bridge, scratch);
        return frames == 0 ? upper : CombinedMethod.total(upper, lowerLimit(films, in, layer, bridge));
    }

    /** Room to sum up the frames in. */
    static final class Frames {
        final double[] share = new double[CombinedMethod.MOST_FRAMES];
        final double[] between = new double[CombinedMethod.MOST_FRAMES];
        final double[] through = new double[CombinedMethod.MOST_FRAMES];

        void clear(int frames) {
            for (int i = 0; i < frames; i++) {
                between[i] = 0;
                through[i] = 0;
            }
        }
    }
}
