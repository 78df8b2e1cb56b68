package org.treadwarm.reference;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.List;

/** A heated floor per m² of its heated area. */
final class HeatedFloor {
    /** W/(m²K^1.1), EN 1264-2. */
    private static final double SURFACE_COEFFICIENT = 8.92;

    private static final double SURFACE_EXPONENT = 1.1;

    private final JsonNode survey;
    private final JsonNode room;
    private final JsonNode floor;

    /** The heated floor of a room that has one. */
    HeatedFloor(JsonNode survey, JsonNode room) {
        this.survey = survey;
        this.room = room;
        this.floor = room.get("heatedFloor");
    }

    double area() {
        return Fields.number(floor, "area");
    }

    /** Required flux in W/m² when the room loses {@code heatLoss} W. */
    double requiredFlux(double heatLoss) {
        return Math.max(0, heatLoss) * (1 + Fields.number(room, "allowance", 0)) / area();
    }

    /** Upward flux from the mean surface temperature, EN 1264-2; none from a surface that is not warmer. */
    double fluxAtSurface(double surface) {
        return SURFACE_COEFFICIENT * Math.pow(Math.max(0, surface - indoor()), SURFACE_EXPONENT);
    }

    double surfaceAt(double flux) {
        return indoor() + Math.pow(flux / SURFACE_COEFFICIENT, 1 / SURFACE_EXPONENT);
    }

    Section section(double flux, Conditions conditions) {
        double surface = surfaceAt(flux);
        double heater = surface + flux * resistanceOf(above());
        return new Section(flux, surface, heater, downward(heater, conditions), edge(heater, conditions));
    }

    /** From the finished surface down to the heater. */
    List<JsonNode> above() {
        return Fields.list(floor, "above");
    }

    /** Without films, m²K/W; {@code layers} lie above the heater, so heat flows up and bridging is refused. */
    double resistanceOf(List<JsonNode> layers) {
        if (layers.stream().anyMatch(layer -> layer.has("bridging"))) {
            throw new IllegalArgumentException("bridging above the heater in " + floor);
        }
        return layers.stream()
                .mapToDouble(layer -> LayerResistance.of(layer, "up"))
                .sum();
    }

    double indoor() {
        return Fields.number(room, "indoorTemperature");
    }

    JsonNode json() {
        return floor;
    }

    private double downward(double heater, Conditions conditions) {
        if (floor.has("to")) {
            String to = Fields.text(floor, "to");
            double film = to.equals(Couplings.OUTDOORS) ? Transmittance.OUTSIDE_FILM : Transmittance.DOWNWARD_FILM;
            return (heater - conditions.seen(name(), to)) / (resistanceBelow(film) + film);
        }
        Ground ground = new Ground(floor.path("ground"), Fields.number(room, "floorArea"));
        double groundFactor = Couplings.groundFactor(survey);
        double annualMean = conditions.of(Couplings.GROUND);
        if (!ground.suspended()) {
            double slab = ground.slabTransmittance(resistanceBelow(0) + Transmittance.OUTSIDE_FILM);
            return groundFactor * slab * (heater - annualMean);
        }
        double deck = 1 / (resistanceBelow(0) + Transmittance.DOWNWARD_FILM);
        double toGround = groundFactor * ground.voidToGround();
        double toOutdoors = ground.voidToOutdoors();
        double underfloor = (deck * heater + toGround * annualMean + toOutdoors * conditions.outdoor())
                / (deck + toGround + toOutdoors);
        return deck * (heater - underfloor);
    }

    /** Combined method with no film at the heater and the lower side's film, less that film. */
    private double resistanceBelow(double lowerFilm) {
        return new CombinedMethod(Fields.list(floor, "below"), "down").resistance(0, lowerFilm) - lowerFilm;
    }

    private double edge(double heater, Conditions conditions) {
        double sum = 0;
        for (JsonNode junction : Fields.list(room, "junctions")) {
            if (Fields.text(junction, "at", "room").equals("heated floor")) {
                double beyond = conditions.seen(name(), Fields.text(junction, "to", Couplings.OUTDOORS));
                sum += Fields.number(junction, "psi") * Fields.number(junction, "length") * (heater - beyond);
            }
        }
        return sum / area();
    }

    private String name() {
        return Fields.text(room, "name");
    }
}
