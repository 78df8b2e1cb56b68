package org.treadwarm.physics.warmup;

/**
 * A plane wall that cools from one temperature through films on both faces: Fourier's series, to hold the numerical solution
 * against. Source: F. P. Incropera, D. P. DeWitt, Fundamentals of Heat and Mass Transfer, 5.5 (from memory).
 *
 * @param biot Bi = h L/lambda with half the thickness L, more than 0
 */
public record PlaneWall(double biot) {
    private static final int MOST_TERMS = 2000;

    /** Throws IllegalArgumentException when the number is not finite and more than 0. */
    public PlaneWall {
        Require.positive("Biot number", biot);
    }

    /** Root zeta of zeta tan(zeta) = Bi number n, from 0. */
    public double root(int n) {
        double low = n * Math.PI;
        double high = low + Math.PI / 2;
        while (true) {
            double middle = low + (high - low) / 2;
            if (middle <= low || middle >= high) {
                return middle;
            }
            // zeta sin - Bi cos has the sign of zeta tan - Bi, turned where the cosine is negative; no pole to step
            // over.
            double excess = middle * Math.sin(middle) - biot * Math.cos(middle);
            if (n % 2 == 0 ? excess < 0 : excess > 0) {
                low = middle;
            } else {
                high = middle;
            }
        }
    }

    /** Factor C of the term with a root: 4 sin(zeta)/(2 zeta + sin(2 zeta)). */
    public static double factor(double root) {
        return 4 * Math.sin(root) / (2 * root + Math.sin(2 * root));
    }

    /**
     * Temperature left, as a share of the first difference to the fluid.
     *
     * @param place distance from the middle over half the thickness, 0 to 1
     * @param fourier Fo = a t/L², more than 0
     */
    public double share(double place, double fourier) {
        Require.positive("Fourier number", fourier);
        double sum = 0;
        for (int n = 0; n < MOST_TERMS; n++) {
            double root = root(n);
            double decay = Math.exp(-root * root * fourier);
            sum += factor(root) * decay * Math.cos(root * place);
            if (decay < 1e-18) {
                return sum;
            }
        }
        throw new ArithmeticException("the series needs more than " + MOST_TERMS + " terms at Fo = " + fourier);
    }

    /** Heat given off, as a share of what there was. */
    public double heatGivenOff(double fourier) {
        Require.positive("Fourier number", fourier);
        double left = 0;
        for (int n = 0; n < MOST_TERMS; n++) {
            double root = root(n);
            double decay = Math.exp(-root * root * fourier);
            left += factor(root) * decay * Math.sin(root) / root;
            if (decay < 1e-18) {
                return 1 - left;
            }
        }
        throw new ArithmeticException("the series needs more than " + MOST_TERMS + " terms at Fo = " + fourier);
    }
}
