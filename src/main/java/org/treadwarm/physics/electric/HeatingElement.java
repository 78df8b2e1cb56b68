package org.treadwarm.physics.electric;

import org.treadwarm.physics.Require;

/**
 * A heating cable or mat as a resistance.
 *
 * @param power P at the rated voltage, W
 * @param voltage U rated, V
 */
public record HeatingElement(double power, double voltage) {
    /** Lowest resistance of a sound element over its rated one: 5 % less, from memory. */
    public static final double LOWEST_SHARE = 0.95;

    /** Highest resistance of a sound element over its rated one: 10 % more, from memory. */
    public static final double HIGHEST_SHARE = 1.10;

    public HeatingElement {
        Require.positive("power of the element", power);
        Require.positive("voltage", voltage);
    }

    /** Current I = P/U, A. */
    public double current() {
        return power / voltage;
    }

    /** Resistance R = U²/P, ohm. */
    public double resistance() {
        return voltage * voltage / power;
    }

    /** Lowest resistance to accept when the element is put into service, ohm. */
    public double lowestResistance() {
        return LOWEST_SHARE * resistance();
    }

    /** Highest resistance to accept when the element is put into service, ohm. */
    public double highestResistance() {
        return HIGHEST_SHARE * resistance();
    }

    /** Power at another voltage, which goes with its square, W. */
    public double powerAt(double otherVoltage) {
        double share = Require.positive("voltage", otherVoltage) / voltage;
        return power * share * share;
    }
}
