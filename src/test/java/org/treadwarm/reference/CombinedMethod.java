package org.treadwarm.reference;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;

/** Resistance of layers with bridging by the combined method of ISO 6946 (from memory). */
final class CombinedMethod {
    private final List<JsonNode> layers;
    private final String direction;

    /** Layers that one set of members crosses in register. */
    private record Crossing(double share, List<JsonNode> layers) {}

    /** Layers from the inner to the outer face, heat flowing in {@code direction}. */
    CombinedMethod(List<JsonNode> layers, String direction) {
        this.layers = layers;
        this.direction = direction;
    }

    /** (R' + R'')/2 in m²K/W with the films of both faces included. */
    double resistance(double innerFilm, double outerFilm) {
        return (upperLimit(innerFilm + outerFilm) + lowerLimit(innerFilm + outerFilm)) / 2;
    }

    /** Every combination of members and free field is a path from face to face. */
    private double upperLimit(double films) {
        List<Crossing> crossings = crossings();
        double conductance = 0;
        for (int combination = 0; combination < 1 << crossings.size(); combination++) {
            double share = 1;
            List<JsonNode> bridged = new ArrayList<>();
            for (int index = 0; index < crossings.size(); index++) {
                boolean through = (combination >> index & 1) == 1;
                Crossing crossing = crossings.get(index);
                share *= through ? crossing.share() : 1 - crossing.share();
                bridged.addAll(through ? crossing.layers() : List.of());
            }
            conductance += share / pathResistance(films, bridged);
        }
        return 1 / conductance;
    }

    private double pathResistance(double films, List<JsonNode> bridged) {
        double sum = films;
        for (JsonNode layer : layers) {
            boolean through = bridged.stream().anyMatch(other -> other == layer);
            sum += through ? LayerResistance.ofBridge(layer) : LayerResistance.of(layer, direction);
        }
        return sum;
    }

    /** Every layer is levelled on its own. */
    private double lowerLimit(double films) {
        double sum = films;
        for (JsonNode layer : layers) {
            double free = LayerResistance.of(layer, direction);
            if (layer.has("bridging")) {
                double share = Fields.number(layer.get("bridging"), "share");
                sum += 1 / (share / LayerResistance.ofBridge(layer) + (1 - share) / free);
            } else {
                sum += free;
            }
        }
        return sum;
    }

    private List<Crossing> crossings() {
        List<Crossing> crossings = new ArrayList<>();
        List<String> frames = new ArrayList<>();
        for (JsonNode layer : layers) {
            if (layer.has("bridging")) {
                JsonNode bridging = layer.get("bridging");
                double share = Fields.number(bridging, "share");
                int known = bridging.has("frame") ? frames.indexOf(Fields.text(bridging, "frame")) : -1;
                if (known < 0) {
                    frames.add(Fields.text(bridging, "frame", ""));
                    crossings.add(new Crossing(share, new ArrayList<>(List.of(layer))));
                } else if (crossings.get(known).share() != share) {
                    throw new IllegalArgumentException("one frame has two shares in " + layers);
                } else {
                    crossings.get(known).layers().add(layer);
                }
            }
        }
        return crossings;
    }
}
