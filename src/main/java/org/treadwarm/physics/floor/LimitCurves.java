package org.treadwarm.physics.floor;

import org.treadwarm.physics.BilinearTable;
import org.treadwarm.physics.LinearTable;

/**
 * Limit curves of floors with pipes in the screed (types A and C): by spacing and s_u/lambda_E up to 0.0792 m²·K/W, by s_u/T
 * beyond. The two sets of tables meet within 6 % of the flux, not exactly.
 *
 * <p>Source: EN 1264-2, annex A (from memory, not read; less certain than the factors).
 */
public final class LimitCurves {
    private static final double LARGEST_COVER_RESISTANCE = 0.0792;
    private static final double LARGEST_SPACING = 0.375;

    private final BilinearTable coefficient;
    private final BilinearTable exponent;
    private final LinearTable thickCoefficient;
    private final LinearTable thickExponent;

    /**
     * The curves with their tables.
     *
     * @param coefficient B_G by spacing and s_u/lambda_E
     * @param exponent n_G by spacing and s_u/lambda_E
     * @param thickCoefficient B_G of thicker screeds by s_u/T
     * @param thickExponent n_G of thicker screeds by s_u/T
     */
    public LimitCurves(
            BilinearTable coefficient,
            BilinearTable exponent,
            LinearTable thickCoefficient,
            LinearTable thickExponent) {
        this.coefficient = coefficient;
        this.exponent = exponent;
        this.thickCoefficient = thickCoefficient;
        this.thickExponent = thickExponent;
    }

    /**
     * The curve of a floor. Beyond the last row of the thick screeds the surface is even, and its curve is that row's.
     *
     * @throws IllegalArgumentException for a spacing outside 0.05 to 0.375 m, s_u/lambda_E below 0.01 m²·K/W, or a screed that
     *     is beyond the first set of tables and before the second (s_u/T below 0.173)
     */
    public LimitCurve of(ScreedFloor floor) {
        if (floor.coverResistance() <= LARGEST_COVER_RESISTANCE) {
            return new LimitCurve(
                    coefficient.at(floor.spacing(), floor.coverResistance()),
                    exponent.at(floor.spacing(), floor.coverResistance()));
        }
        if (floor.spacing() > LARGEST_SPACING) {
            throw new IllegalArgumentException(
                    "the spacing is " + floor.spacing() + ", allowed is at most " + LARGEST_SPACING);
        }
        double slenderness = Math.min(floor.cover() / floor.spacing(), thickCoefficient.last());
        return new LimitCurve(thickCoefficient.at(slenderness), thickExponent.at(slenderness));
    }
}
