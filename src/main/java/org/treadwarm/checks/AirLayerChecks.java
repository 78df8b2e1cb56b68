package org.treadwarm.checks;

import java.util.Map;
import java.util.stream.DoubleStream;
import java.util.stream.Stream;
import org.treadwarm.physics.envelope.AirLayer;
import org.treadwarm.physics.envelope.HeatFlow;
import org.treadwarm.physics.envelope.SurfaceFilm;

/** Air layers and surface films from their coefficients. */
final class AirLayerChecks {
    private AirLayerChecks() {}

    static Map<String, Computation> bindings() {
        return Map.of(
                "6946-airlayer-table",
                given -> Map.of(
                        "up", layers(given, HeatFlow.UP),
                        "horizontal", layers(given, HeatFlow.HORIZONTAL),
                        "down", layers(given, HeatFlow.DOWN)),
                "6946-airlayer-lowe-*",
                given -> Map.of("R", DoubleStream.of(layer(given, given.number("d_mm"), HeatFlow.HORIZONTAL))),
                "6946-rsi-from-coefficients",
                given -> Map.of("Rsi", insideFilms(given)),
                "6946-rse-wind",
                given -> Map.of("Rse", given.numbers("v_m_s").map(wind -> SurfaceFilm.outside(wind, 0.9, 0))),
                "6946-hr0-table",
                given -> Map.of("hr0", given.numbers("Tm_C").map(AirLayer::blackBodyCoefficient)));
    }

    private static DoubleStream layers(Inputs given, HeatFlow direction) {
        return given.numbers("d_mm").map(millimetres -> layer(given, millimetres, direction));
    }

    private static double layer(Inputs given, double millimetres, HeatFlow direction) {
        return AirLayer.resistance(
                millimetres / 1000, direction, given.number("eps1"), given.number("eps2"), given.number("Tm_C"));
    }

    private static DoubleStream insideFilms(Inputs given) {
        return Stream.of(HeatFlow.UP, HeatFlow.HORIZONTAL, HeatFlow.DOWN)
                .mapToDouble(flow -> SurfaceFilm.inside(flow, given.number("eps"), given.number("Tm_C")));
    }
}
