package org.treadwarm.reference;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** What a heated floor may give at most. */
final class FloorLimits {
    private final HeatedFloor floor;

    FloorLimits(HeatedFloor floor) {
        this.floor = floor;
    }

    /** Zone, covering, layers from the top down, heater. */
    List<Limit> at(Conditions conditions) {
        List<Limit> limits = new ArrayList<>();
        limits.add(zone());
        if (floor.json().has("maximumSurfaceTemperature")) {
            double maximum = Fields.number(floor.json(), "maximumSurfaceTemperature");
            limits.add(new Limit("covering surface temperature", floor.fluxAtSurface(maximum)));
        }
        limits.addAll(layers());
        if (floor.json().path("heater").has("density")) {
            limits.add(new Limit("heater density", heater(conditions)));
        }
        return limits;
    }

    /** The lowest limit, the first of equal ones. */
    Limit governing(Conditions conditions) {
        return at(conditions).stream()
                .min(Comparator.comparingDouble(Limit::maximumFlux))
                .orElseThrow();
    }

    /** EN 1264-2. */
    private Limit zone() {
        String zone = Fields.text(floor.json(), "zone");
        return switch (zone) {
            case "occupied" -> new Limit("surface temperature, occupied area", floor.fluxAtSurface(29));
            case "peripheral" -> new Limit("surface temperature, peripheral area", floor.fluxAtSurface(35));
            case "bathroom" -> new Limit("surface temperature, bathroom", floor.fluxAtSurface(floor.indoor() + 9));
            default -> throw new IllegalArgumentException("zone " + zone);
        };
    }

    private List<Limit> layers() {
        List<Limit> limits = new ArrayList<>();
        List<JsonNode> above = floor.above();
        for (int index = 0; index < above.size(); index++) {
            if (above.get(index).has("maximumTemperature")) {
                double resistance = floor.resistanceOf(above.subList(0, index + 1));
                double maximum = Fields.number(above.get(index), "maximumTemperature");
                String name = Fields.text(above.get(index), "name", "layer " + (index + 1));
                limits.add(new Limit("layer temperature: " + name, layer(resistance, maximum)));
            }
        }
        return limits;
    }

    /** Where the warm face, {@code resistance} below the finished surface, reaches {@code maximum} °C. */
    private double layer(double resistance, double maximum) {
        if (maximum <= floor.indoor()) {
            return 0;
        }
        return Bisection.whereReached(
                flux -> floor.surfaceAt(flux) + flux * resistance, maximum, 0, floor.fluxAtSurface(maximum));
    }

    private double heater(Conditions conditions) {
        double density = Fields.number(floor.json().get("heater"), "density");
        if (floor.section(0, conditions).heaterFlux() >= density) {
            return 0;
        }
        if (floor.section(density, conditions).heaterFlux() < density) {
            return density;
        }
        return Bisection.whereReached(flux -> floor.section(flux, conditions).heaterFlux(), density, 0, density);
    }
}
