package org.treadwarm.physics.warmup;

/**
 * The scaled complementary error function erfcx(x) = exp(x²) erfc(x), written once for all that needs it.
 *
 * <p>For small arguments by erfc = 1 - erf with the series of erf, for larger ones by its continued fraction (Abramowitz and Stegun,
 * Handbook of Mathematical Functions, 7.1.6 and 7.1.14, from memory).
 */
final class ErrorFunction {
    private static final double ROOT_OF_PI = Math.sqrt(Math.PI);
    private static final double SERIES_TO = 2;
    private static final int DEPTH = 120;

    private ErrorFunction() {}

    /** exp(x²) erfc(x) for x of at least 0, to about 1e-13. */
    static double scaledComplement(double x) {
        Require.atLeastZero("argument of erfcx", x);
        if (x < SERIES_TO) {
            // erf(x) = 2/sqrt(pi) exp(-x²) sum of 2^n x^(2n+1)/(1·3·…·(2n+1)): every term is positive.
            double term = x;
            double sum = x;
            for (int n = 1; term > 1e-18 * sum; n++) {
                term *= 2 * x * x / (2 * n + 1);
                sum += term;
            }
            return Math.exp(x * x) - 2 / ROOT_OF_PI * sum;
        }
        double tail = x;
        for (int k = DEPTH; k >= 1; k--) {
            tail = x + k / 2.0 / tail;
        }
        return 1 / (ROOT_OF_PI * tail);
    }

    /** erfc(x) for x of at least 0. */
    static double complement(double x) {
        return Math.exp(-x * x) * scaledComplement(x);
    }
}
