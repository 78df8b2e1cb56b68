package org.treadwarm.checks;

import java.util.Map;
import java.util.stream.DoubleStream;
import org.treadwarm.physics.PracticeLimit;
import org.treadwarm.physics.electric.CableLaying;
import org.treadwarm.physics.electric.HeatingElement;
import org.treadwarm.sizing.Practice;

/** Electric cables: spacing, current, resistance. */
final class ElectricChecks {
    private static final double MILLIMETRES = 1000;

    private ElectricChecks() {}

    static Map<String, Computation> bindings() {
        return Map.ofEntries(
                Map.entry("electric-spacing", ElectricChecks::spacing),
                Map.entry("electric-current", ElectricChecks::current),
                Map.entry("electric-worked-1", ElectricChecks::worked),
                Map.entry("electric-density-practice", ElectricChecks::practice));
    }

    private static Map<String, DoubleStream> spacing(Inputs given) {
        return Map.of(
                "spacing_mm",
                given.numbers("W_per_m")
                        .flatMap(powerPerMetre -> given.numbers("W_per_m2")
                                .map(density -> CableLaying.spacing(powerPerMetre, density) * MILLIMETRES)));
    }

    private static Map<String, DoubleStream> current(Inputs given) {
        double voltage = given.number("U");
        HeatingElement hundred = new HeatingElement(100, voltage);
        return Map.of(
                "I", given.numbers("P").map(power -> new HeatingElement(power, voltage).current()),
                "R_ohm", given.numbers("P").map(power -> new HeatingElement(power, voltage).resistance()),
                "power_at_207V_pct", DoubleStream.of(hundred.powerAt(207)),
                "power_at_253V_pct", DoubleStream.of(hundred.powerAt(253)));
    }

    private static Map<String, DoubleStream> worked(Inputs given) {
        double density = given.number("W_m2");
        double area = given.number("free_area");
        double spacing = CableLaying.spacing(given.number("W_m"), density);
        double length = CableLaying.length(area, spacing);
        double power = length * given.number("W_m");
        HeatingElement element = new HeatingElement(power, given.number("U"));
        return Map.of(
                "P", DoubleStream.of(power),
                "length", DoubleStream.of(length),
                "spacing_mm", DoubleStream.of(spacing * MILLIMETRES),
                "I", DoubleStream.of(element.current()),
                "R", DoubleStream.of(element.resistance()));
    }

    private static Map<String, DoubleStream> practice(Inputs given) {
        return Map.of(
                "timber_max", limit("density under timber"),
                "timber_cable_max_W_m", limit("power per metre under timber"));
    }

    private static DoubleStream limit(String name) {
        return Practice.electric().stream()
                .filter(limit -> limit.name().equals(name))
                .mapToDouble(PracticeLimit::limit);
    }
}
