package org.treadwarm.physics.floor;

import java.util.Optional;
import org.treadwarm.physics.Require;

/**
 * A heating pipe.
 *
 * @param outerDiameter D, m
 * @param wallThickness s_R, m, less than half of D
 * @param wallConductivity lambda_R, W/(m·K)
 * @param sheath a sheath round the pipe, empty when bare
 */
public record Pipe(double outerDiameter, double wallThickness, double wallConductivity, Optional<Sheath> sheath) {
    /** Conductivity of the wall that the standard's coefficients are made for, lambda_R,0, W/(m·K). */
    static final double REFERENCE_CONDUCTIVITY = 0.35;

    /** Thickness of the wall that the standard's coefficients are made for, s_R,0, m. */
    static final double REFERENCE_THICKNESS = 0.002;

    public Pipe {
        Require.positive("outer diameter of the pipe", outerDiameter);
        Require.positive("conductivity of the pipe wall", wallConductivity);
        Require.positive("thickness of the pipe wall", wallThickness);
        if (wallThickness >= outerDiameter / 2) {
            throw new IllegalArgumentException("the thickness of the pipe wall is " + wallThickness
                    + ", allowed is less than half of the outer diameter " + outerDiameter);
        }
        double inner = outerDiameter;
        sheath.ifPresent(around -> {
            if (around.outerDiameter() <= inner) {
                throw new IllegalArgumentException("the sheath's outer diameter is " + around.outerDiameter()
                        + ", allowed is more than the pipe's " + inner);
            }
        });
    }

    /**
     * A sheath that fits closely.
     *
     * @param outerDiameter D_M, m
     * @param conductivity lambda_M, W/(m·K)
     */
    public record Sheath(double outerDiameter, double conductivity) {
        public Sheath {
            Require.positive("outer diameter of the sheath", outerDiameter);
            Require.positive("conductivity of the sheath", conductivity);
        }
    }

    /** A bare pipe of the wall that the standard's coefficients are made for: 0.35 W/(m·K), 2 mm. */
    public static Pipe reference(double outerDiameter) {
        return new Pipe(outerDiameter, REFERENCE_THICKNESS, REFERENCE_CONDUCTIVITY, Optional.empty());
    }

    /** Outer diameter of what lies in the screed: of the sheath where there is one, m. */
    public double embeddedDiameter() {
        return sheath.map(Sheath::outerDiameter).orElse(outerDiameter);
    }

    /** Inner diameter, m. */
    public double innerDiameter() {
        return outerDiameter - 2 * wallThickness;
    }

    /**
     * How much more wall and sheath resist than the reference wall at the same embedded diameter: the bracket of the standard's
     * correction, ln(D_M/D)/(2 lambda_M) + ln(D/(D - 2 s_R))/(2 lambda_R) - ln(D_M/(D_M - 2 s_R,0))/(2 lambda_R,0), m·K/W.
     */
    double excessResistance() {
        double around = sheath.map(
                        layer -> logarithm(layer.outerDiameter(), outerDiameter) / (2 * layer.conductivity()))
                .orElse(0.0);
        double wall = logarithm(outerDiameter, innerDiameter()) / (2 * wallConductivity);
        double reference = logarithm(embeddedDiameter(), embeddedDiameter() - 2 * REFERENCE_THICKNESS)
                / (2 * REFERENCE_CONDUCTIVITY);
        return around + wall - reference;
    }

    private static double logarithm(double outer, double inner) {
        return Math.log(outer / inner);
    }
}
