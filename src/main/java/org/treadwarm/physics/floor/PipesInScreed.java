package org.treadwarm.physics.floor;

import org.treadwarm.physics.BilinearTable;
import org.treadwarm.physics.LinearTable;
import org.treadwarm.physics.Require;

/**
 * Coefficient K_H of floors with pipes in the screed (type A) or in a levelling layer below it (type C), q = K_H dT_H with
 * K_H = B a_B a_T^m_T a_U^m_U a_D^m_D.
 *
 * <p>Source: EN 1264-2, clause 6 and annex A; the same method in ISO 11855-2 (from memory, not read).
 */
public final class PipesInScreed {
    private static final double SYSTEM_COEFFICIENT = 6.7;
    private static final double LEAST_SPACING = 0.05;
    private static final double LARGEST_SPACING = 0.375;
    private static final double LEAST_COVER = 0.01;
    private static final double LEAST_DIAMETER = 0.008;
    private static final double LARGEST_DIAMETER = 0.030;

    private final LinearTable spacingFactor;
    private final BilinearTable coverFactor;
    private final BilinearTable diameterFactor;

    /**
     * The method with its tables.
     *
     * @param spacingFactor a_T by the resistance of the covering
     * @param coverFactor a_U by spacing and resistance of the covering
     * @param diameterFactor a_D by spacing and resistance of the covering
     */
    public PipesInScreed(LinearTable spacingFactor, BilinearTable coverFactor, BilinearTable diameterFactor) {
        this.spacingFactor = spacingFactor;
        this.coverFactor = coverFactor;
        this.diameterFactor = diameterFactor;
    }

    /**
     * The factors and exponents of a floor.
     *
     * @param aB covering factor
     * @param aT spacing factor
     * @param aU cover factor
     * @param aD diameter factor
     * @param mT exponent 1 - T/0.075
     * @param mU exponent 100 (0.045 - s_u)
     * @param mD exponent 250 (D - 0.020)
     */
    public record Factors(double aB, double aT, double aU, double aD, double mT, double mU, double mD) {
        /** a_B a_T^m_T a_U^m_U a_D^m_D. */
        public double product() {
            return aB * Math.pow(aT, mT) * Math.pow(aU, mU) * Math.pow(aD, mD);
        }
    }

    /**
     * Factors and exponents; those of 0.375 m for a wider spacing.
     *
     * @throws IllegalArgumentException for a spacing below 0.05 m, a cover below 0.01 m, an embedded diameter outside 0.008 to
     *     0.030 m, or a covering above 0.15 m²·K/W
     */
    public Factors factors(ScreedFloor floor) {
        double spacing =
                Math.min(Require.within("spacing", floor.spacing(), LEAST_SPACING, Double.MAX_VALUE), LARGEST_SPACING);
        double cover = Require.within("cover above the pipes", floor.cover(), LEAST_COVER, Double.MAX_VALUE);
        double diameter = Require.within(
                "outer diameter in the screed", floor.pipe().embeddedDiameter(), LEAST_DIAMETER, LARGEST_DIAMETER);
        return new Factors(
                TableMethod.coveringFactor(floor.screedConductivity(), floor.covering()),
                spacingFactor.at(floor.covering()),
                coverFactor.at(spacing, floor.covering()),
                diameterFactor.at(spacing, floor.covering()),
                1 - spacing / 0.075,
                100 * (0.045 - cover),
                250 * (diameter - 0.020));
    }

    /**
     * K_H, W/(m²·K). Pipes further apart than 0.375 m give K_H(0.375 m) 0.375/T. Cover beyond s_u* (0.100 m up to a spacing of
     * 0.2 m, else half the spacing, at most half of 0.375 m) adds its resistance: 1/K_H = 1/K_H(s_u*) + (s_u - s_u*)/lambda_E.
     *
     * @throws IllegalArgumentException as {@link #factors}
     */
    public double coefficient(ScreedFloor floor) {
        if (floor.spacing() > LARGEST_SPACING) {
            return coefficient(floor.withSpacing(LARGEST_SPACING)) * LARGEST_SPACING / floor.spacing();
        }
        double thickest = floor.spacing() <= 0.2 ? 0.100 : 0.5 * floor.spacing();
        if (floor.cover() > thickest) {
            return 1
                    / (1 / coefficient(floor.withCover(thickest))
                            + (floor.cover() - thickest) / floor.screedConductivity());
        }
        double product = factors(floor).product();
        return systemCoefficient(floor, product) * product;
    }

    /** B: 6.7 W/(m²·K) for the reference pipe, else 1/B = 1/6.7 + (1.1/pi) product T (excess resistance of the pipe). */
    private static double systemCoefficient(ScreedFloor floor, double product) {
        double inverse = 1 / SYSTEM_COEFFICIENT
                + HeatedFloor.EXPONENT
                        / Math.PI
                        * product
                        * floor.spacing()
                        * floor.pipe().excessResistance();
        if (inverse <= 0) {
            throw new IllegalArgumentException("the pipe wall resists so much less than the reference wall that the "
                    + "method gives no coefficient");
        }
        return 1 / inverse;
    }
}
