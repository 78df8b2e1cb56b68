package org.treadwarm.physics.floor;

import java.util.OptionalDouble;
import org.treadwarm.physics.LinearTable;
import org.treadwarm.physics.Require;

/**
 * Floors with pipes in the insulation, under a conducting sheet (type B): K_H = 6.5 a_B a_T^m_T a_U a_WL a_K. The standard's
 * table of the conducting factor a_WL (by K_WL, spacing and diameter) is not known to this program, so K_H is known only with an
 * a_WL from elsewhere.
 *
 * <p>Source: EN 1264-2, clause 6 and annex A, type B (from memory, not read).
 */
public final class PipesBelowScreed {
    private static final double CONDUCTING_REFERENCE = 0.125;

    private final LinearTable spacingFactor;
    private final LinearTable contactFactor;
    private final LinearTable screedShare;

    /**
     * The method with its tables.
     *
     * @param spacingFactor a_T by s_u/lambda_E
     * @param contactFactor a_K by spacing
     * @param screedShare b_u by spacing
     */
    public PipesBelowScreed(LinearTable spacingFactor, LinearTable contactFactor, LinearTable screedShare) {
        this.spacingFactor = spacingFactor;
        this.contactFactor = contactFactor;
        this.screedShare = screedShare;
    }

    /**
     * What the tables give for a floor.
     *
     * @param aT spacing factor
     * @param mT exponent 1 - T/0.075
     * @param aU cover factor
     * @param aK contact factor
     * @param bu share of the screed that conducts along with the sheet
     * @param kWL (s_WL lambda_WL + b_u s_u lambda_E)/0.125, the argument of the table of a_WL
     * @param covering R of the covering, m²·K/W
     * @param coveringSpacing 1 + 0.44 sqrt(T), the factor of R in a_B
     */
    public record Factors(
            double aT,
            double mT,
            double aU,
            double aK,
            double bu,
            double kWL,
            double covering,
            double coveringSpacing) {
        /** The characteristic with the conducting factor a_WL, or the table that is missing without one. */
        public Characteristic characteristic(OptionalDouble conductingFactor) {
            if (conductingFactor.isEmpty()) {
                return new Characteristic.TableNotKnown("a_WL of EN 1264-2, type B, at K_WL " + kWL);
            }
            double factor = Require.positive("conducting factor", conductingFactor.getAsDouble());
            double bare = PlaneElement.SYSTEM_COEFFICIENT * aU * Math.pow(aT, mT) * factor * aK;
            return new Characteristic.Known(bare / (1 + bare * covering * coveringSpacing));
        }
    }

    /** K_H, or why there is none. */
    public sealed interface Characteristic {
        /**
         * It is known.
         *
         * @param coefficient K_H, W/(m²·K)
         */
        record Known(double coefficient) implements Characteristic {}

        /**
         * A table of the standard is not known to this program.
         *
         * @param table which one, and where in it
         */
        record TableNotKnown(String table) implements Characteristic {}
    }

    /**
     * Factors of a floor.
     *
     * @param sheetThickness s_WL, m, at least 0
     * @param sheetConductivity lambda_WL, W/(m·K), at least 0
     * @throws IllegalArgumentException for a spacing outside 0.05 to 0.45 m or s_u/lambda_E outside 0.01 to 0.18 m²·K/W
     */
    public Factors factors(ScreedFloor floor, double sheetThickness, double sheetConductivity) {
        Require.within("thickness of the sheet", sheetThickness, 0, 0.01);
        Require.within("conductivity of the sheet", sheetConductivity, 0, 500);
        double spacing = floor.spacing();
        double share = screedShare.at(spacing);
        double conducting = sheetThickness * sheetConductivity + share * floor.cover() * floor.screedConductivity();
        return new Factors(
                spacingFactor.at(floor.coverResistance()),
                1 - spacing / 0.075,
                PlaneElement.coverFactor(floor.coverResistance()),
                contactFactor.at(spacing),
                share,
                conducting / CONDUCTING_REFERENCE,
                floor.covering(),
                1 + 0.44 * Math.sqrt(spacing));
    }
}
