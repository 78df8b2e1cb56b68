package org.treadwarm.checks;

import java.util.Map;
import java.util.stream.DoubleStream;
import org.treadwarm.physics.floor.HeatedFloor;
import org.treadwarm.physics.floor.TableMethod;
import org.treadwarm.sizing.Sizing.Limit;

/** Heated floors: fluxes, temperatures and limits. */
final class HeatedFloorChecks {
    private HeatedFloorChecks() {}

    static Map<String, Computation> bindings() {
        return Map.ofEntries(
                Map.entry("en1264-basic-*", HeatedFloorChecks::basic),
                Map.entry("en1264-flux-read", HeatedFloorChecks::basicAtLimits),
                Map.entry("en1264-aB-*", HeatedFloorChecks::coveringFactor),
                Map.entry("en1264-phi", HeatedFloorChecks::limitConversion),
                Map.entry("en1264-down-*", HeatedFloorChecks::downward),
                Map.entry("floor-heating-downward", HeatedFloorChecks::envelopeDownward),
                Map.entry("en1264-surface-limits", HeatedFloorChecks::surfaceLimits),
                Map.entry("nonlin-1d-*", HeatedFloorChecks::throughResistance),
                Map.entry("electric-over-temperature-rule", HeatedFloorChecks::overtemperatures));
    }

    private static Map<String, DoubleStream> basic(Inputs given) {
        return Map.of("q_W_m2", DoubleStream.of(HeatedFloor.flux(given.number("mean_surface_overtemperature_K"))));
    }

    private static Map<String, DoubleStream> basicAtLimits(Inputs given) {
        return Map.of("q_W_m2", given.numbers("overtemperature_K").map(HeatedFloor::flux));
    }

    private static Map<String, DoubleStream> overtemperatures(Inputs given) {
        return Map.of("basic_characteristic_K", given.numbers("W_m2").map(HeatedFloor::overtemperature));
    }

    private static Map<String, DoubleStream> coveringFactor(Inputs given) {
        double screed = given.number("lambda_E");
        return Map.of("aB", given.numbers("R").map(covering -> TableMethod.coveringFactor(screed, covering)));
    }

    private static Map<String, DoubleStream> limitConversion(Inputs given) {
        return Map.of(
                "phi", overtemperature(given).map(TableMethod::limitConversion),
                "q_max_basic", overtemperature(given).map(HeatedFloor::flux));
    }

    private static DoubleStream overtemperature(Inputs given) {
        return given.groups("cases").stream().mapToDouble(limit -> limit.at(0) - limit.at(1));
    }

    private static Map<String, DoubleStream> downward(Inputs given) {
        return Map.of(
                "qu",
                DoubleStream.of(TableMethod.downwardFlux(
                        given.number("Ro"),
                        given.number("Ru"),
                        given.number("q"),
                        given.number("ti"),
                        given.number("tu"))));
    }

    private static Map<String, DoubleStream> envelopeDownward(Inputs given) {
        double up = TableMethod.resistanceUp(given.number("R_covering"), given.number("s_u"), given.number("lambda_E"));
        double down = TableMethod.downwardFlux(
                up, given.number("R_u"), given.number("q_up"), given.number("theta_i"), given.number("theta_u"));
        return Map.of("R_o", DoubleStream.of(up), "q_u", DoubleStream.of(down));
    }

    private static Map<String, DoubleStream> surfaceLimits(Inputs given) {
        return Map.of(
                "occupied_C", DoubleStream.of(surfaceLimit("occupied", given.number("occupied_room_C"))),
                "edge_C", DoubleStream.of(surfaceLimit("peripheral", given.number("edge_room_C"))),
                "bath_C", DoubleStream.of(surfaceLimit("bathroom", given.number("bath_room_C"))));
    }

    /** The surface temperature at which a sizing stops a floor of this zone of use. */
    private static double surfaceLimit(String zone, double indoor) {
        OneRoom room = new OneRoom(OneRoom.reading(indoor, "°C"), "0 °C");
        room.heatedFloor(zone);
        double flux = room.sized().floor().limits().stream()
                .filter(limit -> limit.name().startsWith("surface temperature"))
                .mapToDouble(Limit::maximumFlux)
                .min()
                .orElseThrow();
        return HeatedFloor.temperatureBelow(indoor, flux, 0);
    }

    private static Map<String, DoubleStream> throughResistance(Inputs given) {
        double flux = HeatedFloor.fluxAtTemperature(given.number("dTH"), 0, given.number("R"));
        return Map.of("q", DoubleStream.of(flux), "surface_dT", DoubleStream.of(HeatedFloor.overtemperature(flux)));
    }
}
