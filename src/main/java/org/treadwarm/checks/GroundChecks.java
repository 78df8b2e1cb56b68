package org.treadwarm.checks;

import java.util.HashMap;
import java.util.Locale;
import java.util.Map;
import java.util.stream.DoubleStream;
import org.treadwarm.physics.ground.SlabOnGround;
import org.treadwarm.tables.Films;

/** Slabs on the ground. */
final class GroundChecks {
    private GroundChecks() {}

    static Map<String, Computation> bindings() {
        return Map.of(
                "13370-uk-PA-table",
                GroundChecks::regulationTable,
                "13370-scots-limit",
                given -> Map.of("U", DoubleStream.of(byPerimeter(given, given.number("P_over_A"), thickness(given)))),
                "13370-published-uninsulated",
                given -> Map.of("U", byPerimeter(given, given.number("d_t_fitted"))),
                "13370-published-80mm",
                given -> Map.of("U", byPerimeter(given, thickness(given))),
                "13370-es-strip-1m",
                given -> Map.of(
                        "B_prime",
                        DoubleStream.of(SlabOnGround.characteristicDimension(given.number("A"), given.number("P")))),
                "13370-branch-continuity",
                GroundChecks::branches,
                "13370-edge-horizontal",
                given -> Map.of("U0", DoubleStream.of(slab(given, given.number("B_prime"), thickness(given)))),
                "12831-2003-uequiv-none",
                given -> Map.of("U_equiv", byDimension(given, thickness(given))),
                "12831-2003-uequiv-U*",
                given -> Map.of("U_equiv", byDimension(given, thickness(given, 1 / given.number("U_floor")))),
                "slab-*",
                given -> Map.of("U_formula", DoubleStream.of(slab(given, given.number("B"), given.number("d_t")))));
    }

    private static Map<String, DoubleStream> regulationTable(Inputs given) {
        Map<String, DoubleStream> rows = new HashMap<>();
        given.numbers("P_over_A").forEach(perimeter -> {
            String name = "U_row_" + String.format(Locale.ROOT, "%.2f", perimeter);
            rows.put(
                    name,
                    given.numbers("R_f")
                            .map(resistance -> byPerimeter(given, perimeter, thickness(given, resistance))));
        });
        return rows;
    }

    private static Map<String, DoubleStream> branches(Inputs given) {
        double dimension = given.number("B_prime");
        double thickness = given.number("d_t");
        double soil = given.number("lambda_g");
        return Map.of(
                "U_branch1", DoubleStream.of(SlabOnGround.littleInsulated(dimension, thickness, soil)),
                "U_branch2", DoubleStream.of(SlabOnGround.wellInsulated(dimension, thickness, soil)));
    }

    private static DoubleStream byPerimeter(Inputs given, double thickness) {
        return given.numbers("P_over_A").map(perimeter -> byPerimeter(given, perimeter, thickness));
    }

    private static double byPerimeter(Inputs given, double perimeterPerArea, double thickness) {
        return slab(given, SlabOnGround.characteristicDimension(1, perimeterPerArea), thickness);
    }

    private static DoubleStream byDimension(Inputs given, double thickness) {
        return given.numbers("B_prime").map(dimension -> slab(given, dimension, thickness));
    }

    private static double slab(Inputs given, double dimension, double thickness) {
        return SlabOnGround.transmittance(dimension, thickness, given.number("lambda_g"));
    }

    private static double thickness(Inputs given) {
        return thickness(given, given.number("R_f"));
    }

    private static double thickness(Inputs given, double resistance) {
        return SlabOnGround.equivalentThickness(
                given.number("w"), given.number("lambda_g"), Films.inside("down") + resistance + Films.outside("down"));
    }
}
