package org.treadwarm.physics.electric;

import java.util.List;
import java.util.Map;
import org.treadwarm.physics.PracticeLimit;
import org.treadwarm.physics.PracticeLimit.Judged;

/** A cable floor beside the limits of practice. */
public final class CableLimits {
    private CableLimits() {}

    /**
     * Every limit that bears on a floor, beside what the floor does.
     *
     * @param powerPerMetre of the cable, W/m
     * @param density where it is laid, W/m²
     * @param onTimber whether the floor is of timber, which has limits of its own
     * @param limits of the quantities spacing, density under timber, and power per metre under timber, in SI units; others do
     *     not bear on a floor and are passed over
     */
    public static List<Judged> judge(
            double powerPerMetre, double density, boolean onTimber, List<PracticeLimit> limits) {
        double spacing = CableLaying.spacing(powerPerMetre, density);
        Map<String, Double> values = onTimber
                ? Map.of(
                        "spacing", spacing,
                        "density under timber", density,
                        "power per metre under timber", powerPerMetre)
                : Map.of("spacing", spacing);
        return limits.stream()
                .filter(limit -> values.containsKey(limit.name()))
                .map(limit -> limit.judge(values.get(limit.name())))
                .toList();
    }
}
