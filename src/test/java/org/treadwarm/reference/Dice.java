package org.treadwarm.reference;

import com.fasterxml.jackson.databind.node.ObjectNode;
import java.util.List;
import java.util.random.RandomGenerator;

/** Random choices with short decimal numbers, so that a failing survey can be read. */
record Dice(RandomGenerator random) {
    boolean chance(double probability) {
        return random.nextDouble() < probability;
    }

    /** A whole number between two ends, both included. */
    int whole(int low, int high) {
        return random.nextInt(low, high + 1);
    }

    /** A number between two ends with at most so many decimals. */
    double number(double low, double high, int decimals) {
        double scale = Math.pow(10, decimals);
        return Math.round(random.nextDouble(low, high) * scale) / scale;
    }

    @SafeVarargs
    final <T> T oneOf(T... choices) {
        return choices[random.nextInt(choices.length)];
    }

    <T> T oneOf(List<T> choices) {
        return choices.get(random.nextInt(choices.size()));
    }

    /** Puts a number under a key, or with the rest of the probability leaves the key to its default. */
    void maybe(double probability, ObjectNode node, String key, double low, double high, int decimals) {
        if (chance(probability)) {
            node.put(key, number(low, high, decimals));
        }
    }

    /** Puts a text under a key, or with the rest of the probability leaves the key to its default. */
    void maybe(double probability, ObjectNode node, String key, String... choices) {
        if (chance(probability)) {
            node.put(key, oneOf(choices));
        }
    }
}
