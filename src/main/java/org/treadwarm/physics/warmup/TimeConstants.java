package org.treadwarm.physics.warmup;

/**
 * The time constants of a chain: tau = 1/lambda for the smallest roots lambda of det(K - lambda C) = 0, with the conductances K and
 * the heat capacities C. The number of negative pivots of K - lambda C is the number of roots below lambda (Sylvester's law of
 * inertia), so each root is found by bisection, however close together they lie.
 */
final class TimeConstants {
    private TimeConstants() {}

    /** The longest of them, s, longest first. */
    static double[] of(Chain chain, int count) {
        if (!(chain.film instanceof Film.Constant film)) {
            throw new IllegalArgumentException(
                    "a film by a power law has no time constants; it must have one coefficient");
        }
        int most = count(chain, film.coefficient(), Double.MAX_VALUE);
        if (count < 1 || count > most) {
            throw new IllegalArgumentException(count + " time constants; there must be 1 to " + most);
        }
        double[] constants = new double[count];
        for (int i = 0; i < count; i++) {
            constants[i] = 1 / root(chain, film.coefficient(), i);
        }
        return constants;
    }

    private static double root(Chain chain, double film, int index) {
        double low = 0;
        double high = 1e-9;
        while (count(chain, film, high) <= index) {
            low = high;
            high *= 2;
        }
        while (true) {
            double middle = low + (high - low) / 2;
            if (middle <= low || middle >= high) {
                return middle;
            }
            if (count(chain, film, middle) <= index) {
                low = middle;
            } else {
                high = middle;
            }
        }
    }

    /** How many roots lie below lambda. */
    private static int count(Chain chain, double film, double lambda) {
        double fromBelow = chain.undersideCoefficient;
        double eliminated = 0;
        int negative = 0;
        for (int i = 0; i < chain.nodes(); i++) {
            double upward = i == chain.surface ? film : chain.conductance()[i];
            double loss = i == chain.air ? chain.room.lossCoefficient() : 0;
            double pivot = fromBelow + upward + loss - lambda * chain.capacity()[i] - eliminated;
            if (pivot == 0) {
                pivot = -Double.MIN_NORMAL;
            }
            if (pivot < 0) {
                negative++;
            }
            eliminated = upward * upward / pivot;
            fromBelow = upward;
        }
        return negative;
    }
}
