package org.treadwarm.reference;

import java.util.Map;

/**
 * The temperatures of all nodes at one outdoor temperature, °C.
 *
 * @param outdoor outdoor temperature
 * @param temperatures of rooms, held and floating spaces, outdoors and (where known) ground
 * @param factors of the spaces that have only a temperature factor
 */
record Conditions(double outdoor, Map<String, Double> temperatures, Map<String, Double> factors) {
    /** What a node sees when it looks at another one. */
    double seen(String from, String to) {
        double own = of(from);
        return factors.containsKey(to) ? own - factors.get(to) * (own - outdoor) : of(to);
    }

    /**
     * By how much a node is warmer than what it looks at, K. For a space with a temperature factor this is
     * factor x (own - outdoor) itself, not a difference of two rounded numbers.
     */
    double difference(String from, String to) {
        double own = of(from);
        return factors.containsKey(to) ? factors.get(to) * (own - outdoor) : own - of(to);
    }

    /** The temperature of a node that has one. */
    double of(String node) {
        if (!temperatures.containsKey(node)) {
            throw new IllegalArgumentException(node + " has no temperature");
        }
        return temperatures.get(node);
    }
}
