package org.treadwarm.physics.section;

/**
 * The part of a wall foot's section that is looked at, from the corner where the heated plane meets the wall.
 *
 * @param inward over the floor, m
 * @param outward beyond the wall's outer face, m
 * @param upward along the wall, m
 * @param downward into the ground, m
 */
public record FootWindow(double inward, double outward, double upward, double downward) {
    public FootWindow {
        Require.positive("width over the floor, m", inward);
        Require.positive("width outside, m", outward);
        Require.positive("height above the heated plane, m", upward);
        Require.positive("depth below the heated plane, m", downward);
    }
}
