package org.treadwarm.physics.warmup;

/**
 * How fine time and space are divided.
 *
 * @param tolerance largest estimated error of one time step at any node, K, or K per 100 °C of a node that is hotter, more
 *     than 0
 * @param refinement into how many equal parts each cell of the standard grid is divided, 1 to 64
 */
public record Accuracy(double tolerance, int refinement) {
    /** Some hundredths of a kelvin at the end of a day; see the published checks. */
    public static final Accuracy STANDARD = new Accuracy(2e-5, 1);

    /** Throws IllegalArgumentException when a number is out of its range. */
    public Accuracy {
        Require.positive("tolerance", tolerance);
        if (refinement < 1 || refinement > 64) {
            throw new IllegalArgumentException("refinement is " + refinement + "; it must be 1 to 64");
        }
    }
}
