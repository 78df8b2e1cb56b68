package org.treadwarm.checks;

import java.util.Map;
import java.util.stream.DoubleStream;
import org.treadwarm.physics.moisture.SurfaceTemperature;
import org.treadwarm.physics.moisture.WaterVapour;

/** Saturation of water vapour and inside surface temperatures. */
final class MoistureChecks {
    private MoistureChecks() {}

    static Map<String, Computation> bindings() {
        return Map.of(
                "psat-13788-vs-crc", given -> Map.of("p_sat_Pa", saturation(given)),
                "psat-13788-ice-dk", given -> Map.of("p_sat_Pa", saturation(given)),
                "psat-13788-ice-unu",
                        given -> Map.of("p_sat_hPa", saturation(given).map(pressure -> pressure / 100)),
                "psat-13788-formula", given -> Map.of("p_sat_Pa", saturation(given)),
                "psat-inverse",
                        given -> Map.of("theta_C", given.numbers("p_Pa").map(WaterVapour::saturationTemperature)),
                "frsi-es-slab-edge", given -> Map.of("f_Rsi", DoubleStream.of(factor(given, given.number("theta_si")))),
                "frsi-20-50-minus5", MoistureChecks::mouldLimit,
                "frsi-plane-element", MoistureChecks::planeElement);
    }

    private static DoubleStream saturation(Inputs given) {
        return given.numbers("theta_C").map(WaterVapour::saturationPressure);
    }

    private static double factor(Inputs given, double surface) {
        return SurfaceTemperature.factor(surface, given.number("theta_i"), given.number("theta_e"));
    }

    /** The surface that room air makes 80 % humid is at the dew point of air 1/0.8 times as humid as the room's. */
    private static Map<String, DoubleStream> mouldLimit(Inputs given) {
        double surface =
                WaterVapour.dewPoint(given.number("theta_i"), given.number("phi_i") / given.number("phi_surface"));
        return Map.of("theta_si_min", DoubleStream.of(surface), "f_Rsi_min", DoubleStream.of(factor(given, surface)));
    }

    private static Map<String, DoubleStream> planeElement(Inputs given) {
        double resistance = SurfaceTemperature.MOULD_FILM + given.number("R_without_surfaces") + given.number("Rse");
        return Map.of("f_Rsi", DoubleStream.of(SurfaceTemperature.factorOfPlaneElement(resistance)));
    }
}
