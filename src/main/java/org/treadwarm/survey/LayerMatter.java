package org.treadwarm.survey;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.treadwarm.tables.Material;
import org.treadwarm.tables.Materials;
import org.treadwarm.units.Reading;

/**
 * What a layer is made of, as far as its own figures, or else those of its material, tell.
 *
 * @param thickness m
 * @param conductivity W/(m·K); from the thickness where the layer's resistance is given
 * @param density kg/m³
 * @param specificHeat J/(kg·K)
 */
public record LayerMatter(
        OptionalDouble thickness, OptionalDouble conductivity, OptionalDouble density, OptionalDouble specificHeat) {
    /** The matter of a layer; an air gap has none. */
    public static LayerMatter of(Layer layer) {
        if (layer.airGap().isPresent()) {
            return new LayerMatter(
                    OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty(), OptionalDouble.empty());
        }
        Optional<Material> material = layer.material().flatMap(Materials::find);
        OptionalDouble thickness = value(layer.thickness());
        return new LayerMatter(
                thickness,
                conductivity(layer, thickness, material),
                or(value(layer.density()), material.map(Material::density)),
                or(value(layer.specificHeat()), material.map(Material::specificHeat)));
    }

    /**
     * Whether a layer counts as a resistance that holds no heat: an air gap, or a resistance beside which thickness, density and
     * specific heat are not all known.
     */
    public static boolean isResistanceAlone(Layer layer) {
        return layer.airGap().isPresent()
                || layer.resistance().isPresent() && !of(layer).missing().isEmpty();
    }

    /** The keys of what is not known. */
    public List<String> missing() {
        List<String> missing = new ArrayList<>();
        note(missing, "thickness", thickness);
        note(missing, "conductivity", conductivity);
        note(missing, "density", density);
        note(missing, "specificHeat", specificHeat);
        return List.copyOf(missing);
    }

    private static OptionalDouble conductivity(Layer layer, OptionalDouble thickness, Optional<Material> material) {
        if (layer.resistance().isPresent()) {
            double resistance = layer.resistance().get().value();
            return thickness.isPresent() && resistance > 0
                    ? OptionalDouble.of(thickness.getAsDouble() / resistance)
                    : OptionalDouble.empty();
        }
        return or(value(layer.conductivity()), material.map(Material::conductivity));
    }

    private static void note(List<String> missing, String key, OptionalDouble value) {
        if (value.isEmpty()) {
            missing.add(key);
        }
    }

    private static OptionalDouble value(Optional<Reading> reading) {
        return reading.isPresent() ? OptionalDouble.of(reading.get().value()) : OptionalDouble.empty();
    }

    private static OptionalDouble or(OptionalDouble own, Optional<OptionalDouble> other) {
        return own.isPresent() ? own : other.orElse(OptionalDouble.empty());
    }
}
