package org.treadwarm.physics.water;

import java.util.List;
import java.util.Map;
import org.treadwarm.physics.PracticeLimit;
import org.treadwarm.physics.PracticeLimit.Judged;
import org.treadwarm.physics.water.RoomCircuits.Loops;

/** The circuits of a room beside the limits of practice. Limits of several sources stand side by side and are never blended. */
public final class CircuitLimits {
    private CircuitLimits() {}

    /**
     * Every limit beside what the room's loops do.
     *
     * @param asked what the room asked
     * @param loops what was laid
     * @param onManifold number of loops on its manifold
     * @param limits of the quantities loop length, pressure drop, velocity, spread, supply temperature, loops on a manifold,
     *     and spacing, of which the widest is judged; in SI units and degrees Celsius
     * @throws IllegalArgumentException for a limit of another quantity
     */
    public static List<Judged> judge(RoomCircuits asked, Loops loops, int onManifold, List<PracticeLimit> limits) {
        double widest =
                asked.zones().stream().mapToDouble(HeatedZone::spacing).max().orElseThrow();
        Map<String, Double> values = Map.of(
                "loop length", loops.length(),
                "pressure drop", loops.pressureDrop(),
                "velocity", loops.flow().velocity(),
                "spread", asked.spread(),
                "supply temperature", asked.supply(),
                "loops on a manifold", (double) onManifold,
                "spacing", widest);
        return limits.stream()
                .map(limit -> limit.judge(value(values, limit.name())))
                .toList();
    }

    private static double value(Map<String, Double> values, String name) {
        Double value = values.get(name);
        if (value == null) {
            throw new IllegalArgumentException("the limited quantity is " + name + ", allowed is " + values.keySet());
        }
        return value;
    }
}
