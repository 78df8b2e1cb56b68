package org.treadwarm.checks;

import java.util.Map;
import java.util.stream.DoubleStream;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Unit;
import org.treadwarm.units.UnitTable;

/** Conversions between units. */
final class UnitChecks {
    private UnitChecks() {}

    static Map<String, Computation> bindings() {
        return Map.of(
                "us-units",
                given -> Map.of("R_ip_per_R_si", one(QuantityKind.RESISTANCE, "m2.K/W", "h.ft2.°F/Btu")),
                "us-units-more",
                given -> Map.of(
                        "W_m2K_to_Btu", one(QuantityKind.TRANSMITTANCE, "W/(m2.K)", "Btu/(h.ft2.°F)"),
                        "W_mK_to_Btu_h_ft_F", one(QuantityKind.CONDUCTIVITY, "W/(m.K)", "Btu/(h.ft.°F)"),
                        "W_mK_to_Btu_in", one(QuantityKind.CONDUCTIVITY, "W/(m.K)", "Btu.in/(h.ft2.°F)"),
                        "W_to_Btu_h", one(QuantityKind.POWER, "W", "Btu/h"),
                        "W_m2_to_Btu_h_ft2", one(QuantityKind.HEAT_FLUX, "W/m2", "Btu/(h.ft2)"),
                        "L_s_to_cfm", one(QuantityKind.AIR_FLOW, "l/s", "cfm")));
    }

    /** An SI value in another unit of its kind. */
    static double from(QuantityKind kind, String unit, double si) {
        return unit(kind, unit).fromSi(si);
    }

    private static DoubleStream one(QuantityKind kind, String given, String wanted) {
        return DoubleStream.of(from(kind, wanted, unit(kind, given).toSi(1)));
    }

    private static Unit unit(QuantityKind kind, String text) {
        return UnitTable.find(kind, text).orElseThrow();
    }
}
