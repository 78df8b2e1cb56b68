package org.treadwarm.draw;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;

/** Invented floors in plan. */
final class PlanSamples {
    private PlanSamples() {}

    static FloorPlanStrip bathroom() {
        return new FloorPlanStrip(
                "Bathroom, Mill Lane",
                2.4,
                3.1,
                OptionalDouble.of(4.6),
                List.of(
                        new FixedUnit("Bath", 0, 0, 0.75, 1.7),
                        new FixedUnit("Vanity unit", 1.6, 0, 0.8, 0.5),
                        new FixedUnit("WC", 0, 2.3, 0.55, 0.4)),
                new HeaterRuns("Heating cable", OptionalDouble.of(0.1), 0.05),
                Optional.empty(),
                1,
                Optional.of(new PlanMark(PlanMark.Kind.THERMOSTAT, 2.3, 2.6)));
    }

    static FloorPlanStrip kitchen() {
        return new FloorPlanStrip(
                "Kitchen and dining, Mill Lane",
                7.2,
                4.6,
                OptionalDouble.of(28.4),
                List.of(
                        new FixedUnit("Kitchen units", 0, 0, 3.4, 0.6),
                        new FixedUnit("Fridge", 0, 0.6, 0.65, 0.7),
                        new FixedUnit("Island", 1.6, 1.8, 1.6, 0.9)),
                new HeaterRuns("Pipe 16 mm", OptionalDouble.of(0.15), 0.1),
                Optional.of(new PeripheralZone(Set.of(PeripheralZone.Side.RIGHT, PeripheralZone.Side.BOTTOM), 1, 0.1)),
                2,
                Optional.of(new PlanMark(PlanMark.Kind.MANIFOLD, 0.2, 3.2)));
    }

    static FloorPlanStrip workshop() {
        return new FloorPlanStrip(
                "Workshop, Quillfen Floors",
                14,
                22,
                OptionalDouble.empty(),
                List.of(new FixedUnit("Press", 6, 9, 2, 3)),
                new HeaterRuns("Pipe 17 mm", OptionalDouble.of(0.1), 0.2),
                Optional.empty(),
                12,
                Optional.empty());
    }
}
