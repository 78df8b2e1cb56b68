package org.treadwarm.reference;

import com.fasterxml.jackson.databind.JsonNode;

/** U of a surface or opening in W/(m²K). */
final class Transmittance {
    /** Film at the outer face towards outdoors, m²K/W (ISO 6946, from memory). */
    static final double OUTSIDE_FILM = 0.04;

    /** Film where heat flows down, m²K/W (ISO 6946, from memory). */
    static final double DOWNWARD_FILM = 0.17;

    private Transmittance() {}

    /** Between a room or space and outdoors, or another room or space. */
    static double inAir(JsonNode assembly, boolean outdoors) {
        if (assembly.has("uValue")) {
            return Fields.number(assembly, "uValue");
        }
        String direction = Fields.text(assembly, "heatFlow", "horizontal");
        double inside = insideFilm(assembly, film(direction));
        double outside = outdoors ? outsideFilm(assembly) : inside;
        return 1 / new CombinedMethod(Fields.list(assembly, "layers"), direction).resistance(inside, outside);
    }

    /** Of a surface on ground that is not heated; without season and groundwater factors. */
    static double onGround(JsonNode assembly, JsonNode surface, double standardArea) {
        if (assembly.has("uValue")) {
            return Fields.number(assembly, "uValue");
        }
        String direction = Fields.text(assembly, "heatFlow", "horizontal");
        double layers = new CombinedMethod(Fields.list(assembly, "layers"), direction).resistance(0, 0);
        Ground ground = new Ground(surface.path("ground"), standardArea);
        double inside = insideFilm(assembly, DOWNWARD_FILM);
        return ground.suspended()
                ? ground.suspendedTransmittance(inside + layers + DOWNWARD_FILM)
                : ground.slabTransmittance(inside + layers + OUTSIDE_FILM);
    }

    private static double insideFilm(JsonNode assembly, double standard) {
        return assembly.has("insideCoefficient") ? 1 / Fields.number(assembly, "insideCoefficient") : standard;
    }

    private static double outsideFilm(JsonNode assembly) {
        return assembly.has("outsideCoefficient") ? 1 / Fields.number(assembly, "outsideCoefficient") : OUTSIDE_FILM;
    }

    private static double film(String direction) {
        return switch (direction) {
            case "up" -> 0.10;
            case "horizontal" -> 0.13;
            case "down" -> DOWNWARD_FILM;
            default -> throw new IllegalArgumentException("heatFlow " + direction);
        };
    }
}
