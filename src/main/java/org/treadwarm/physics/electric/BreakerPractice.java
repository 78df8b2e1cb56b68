package org.treadwarm.physics.electric;

import java.util.List;
import org.treadwarm.physics.Require;

/**
 * How a country chooses its breakers.
 *
 * @param ratings standard ratings from small to large, A
 * @param continuousShare share of its rating that a breaker may carry for hours, more than 0 and at most 1
 * @param source where that was read, or "common practice, no source"
 */
public record BreakerPractice(List<Double> ratings, double continuousShare, String source) {
    public BreakerPractice {
        ratings = List.copyOf(ratings);
        if (ratings.isEmpty() || !ratings.equals(ratings.stream().sorted().toList()) || ratings.get(0) <= 0) {
            throw new IllegalArgumentException(
                    "the ratings are " + ratings + ", allowed are positive ones from small to large");
        }
        Require.within("share of a rating carried for hours", continuousShare, Double.MIN_VALUE, 1);
    }

    /** Current that a breaker may carry for hours, A. */
    double carries(double rating) {
        return rating * continuousShare;
    }
}
