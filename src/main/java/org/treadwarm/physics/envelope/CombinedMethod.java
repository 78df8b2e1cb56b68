package org.treadwarm.physics.envelope;

/**
 * Thermal resistance of an element of homogeneous and bridged layers by the combined method.
 *
 * <p>Source: ISO 6946:2017, 6.7.2 (from memory). The upper limit R' adds resistances along each path from face to face and
 * sets the paths side by side; the lower limit R'' sets the parts of each layer side by side and adds the layers. Members of
 * one frame cross all its layers in register; different frames cross independently, in all combinations.
 */
public final class CombinedMethod {
    /** More frames than this would need more than 4 096 paths. */
    public static final int MOST_FRAMES = 12;

    private CombinedMethod() {}

    /**
     * Upper limit R' in m²·K/W.
     *
     * @param constant resistance common to every path: films and unbridged layers, m²·K/W, at least 0
     * @param frames number of frames, 0 to {@value #MOST_FRAMES}
     * @param share share of each frame, more than 0 and less than 1
     * @param between sum of the layers' own resistances beside the members of each frame, m²·K/W
     * @param through sum of the members' resistances in the layers of each frame, m²·K/W
     */
    public static double upperLimit(double constant, int frames, double[] share, double[] between, double[] through) {
        double conductance = 0;
        for (int path = 0; path < 1 << frames; path++) {
            double part = 1;
            double resistance = constant;
            for (int frame = 0; frame < frames; frame++) {
                boolean member = (path >> frame & 1) == 1;
                part *= member ? share[frame] : 1 - share[frame];
                resistance += member ? through[frame] : between[frame];
            }
            conductance += part / resistance;
        }
        return 1 / conductance;
    }

    /**
     * Resistance of one bridged layer for the lower limit, m²·K/W: its parts side by side.
     *
     * @param share share of the member, more than 0 and less than 1
     * @param between resistance of the layer beside the member, m²·K/W
     * @param through resistance of the member, m²·K/W
     */
    public static double sideBySide(double share, double between, double through) {
        return 1 / ((1 - share) / between + share / through);
    }

    /** Total resistance R = (R' + R'')/2, m²·K/W. */
    public static double total(double upperLimit, double lowerLimit) {
        return (upperLimit + lowerLimit) / 2;
    }

    /** Largest possible relative error e = (R' - R'')/(2 R), as a fraction (ISO 6946:2017, 6.7.2.5, from memory). */
    public static double largestRelativeError(double upperLimit, double lowerLimit) {
        return (upperLimit - lowerLimit) / (upperLimit + lowerLimit);
    }
}
