package org.treadwarm.physics.floor;

import org.treadwarm.physics.Require;

/**
 * A warm-water floor with its pipes in or below a screed.
 *
 * @param spacing T, m
 * @param cover s_u, thickness of the screed above the pipes, m
 * @param screedConductivity lambda_E, W/(m·K)
 * @param covering R_lambda,B, resistance of the floor covering, m²·K/W, at least 0
 * @param pipe the pipe
 */
public record ScreedFloor(double spacing, double cover, double screedConductivity, double covering, Pipe pipe) {
    public ScreedFloor {
        Require.positive("spacing", spacing);
        Require.positive("cover above the pipes", cover);
        Require.positive("conductivity of the screed", screedConductivity);
        Require.within("resistance of the covering", covering, 0, Double.MAX_VALUE);
    }

    /** s_u/lambda_E, m²·K/W. */
    public double coverResistance() {
        return cover / screedConductivity;
    }

    ScreedFloor withSpacing(double changed) {
        return new ScreedFloor(changed, cover, screedConductivity, covering, pipe);
    }

    ScreedFloor withCover(double changed) {
        return new ScreedFloor(spacing, changed, screedConductivity, covering, pipe);
    }
}
