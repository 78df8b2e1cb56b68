package org.treadwarm.physics;

/** Refusal of arguments outside what a formula allows. */
public final class Require {
    private Require() {}

    /**
     * The value itself.
     *
     * @throws IllegalArgumentException unless it is a finite number above 0
     */
    public static double positive(String name, double value) {
        if (!(value > 0 && Double.isFinite(value))) {
            throw new IllegalArgumentException("the " + name + " is " + value + ", allowed is more than 0");
        }
        return value;
    }

    /**
     * The value itself.
     *
     * @throws IllegalArgumentException unless it lies between the two bounds, or on one of them
     */
    public static double within(String name, double value, double least, double most) {
        if (!(value >= least && value <= most)) {
            throw new IllegalArgumentException(
                    "the " + name + " is " + value + ", allowed is " + least + " to " + most);
        }
        return value;
    }
}
