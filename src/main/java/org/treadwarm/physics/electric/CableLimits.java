package org.treadwarm.physics.electric;

import java.util.List;
import java.util.Map;
import org.treadwarm.physics.PracticeLimit;
import org.treadwarm.physics.PracticeLimit.Judged;

/** A cable floor beside the limits of practice. */
public final class CableLimits {
    private static final String DENSITY = "density under timber";

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
                ? Map.of("spacing", spacing, DENSITY, density, "power per metre under timber", powerPerMetre)
                : Map.of("spacing", spacing);
        return judge(values, limits);
    }

    /**
     * The limits that bear on a floor whose runs are not known, as under mats.
     *
     * @param density where it is laid, W/m²
     * @param onTimber whether the floor is of timber
     * @param limits as for a cable
     */
    public static List<Judged> judgeDensity(double density, boolean onTimber, List<PracticeLimit> limits) {
        return judge(onTimber ? Map.of(DENSITY, density) : Map.of(), limits);
    }

    private static List<Judged> judge(Map<String, Double> values, List<PracticeLimit> limits) {
        return limits.stream()
                .filter(limit -> values.containsKey(limit.name()))
                .map(limit -> limit.judge(values.get(limit.name())))
                .toList();
    }
}
