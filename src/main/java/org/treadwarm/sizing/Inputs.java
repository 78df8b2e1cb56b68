package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.treadwarm.units.Reading;

/** The readings of a survey as one array of SI numbers, each with its address. */
final class Inputs {
    private double[] values = new double[64];
    private final List<String> addresses = new ArrayList<>();

    /** Takes a reading in and gives its index. */
    int add(String pointer, Reading reading) {
        int index = addresses.size();
        if (index == values.length) {
            values = Arrays.copyOf(values, 2 * index);
        }
        values[index] = reading.value();
        addresses.add(pointer);
        return index;
    }

    /** Takes a reading in, if there is one; else gives {@link Stack#NONE}. */
    int optional(String pointer, Optional<Reading> reading) {
        return reading.isPresent() ? add(pointer, reading.get()) : Stack.NONE;
    }

    double[] values() {
        return Arrays.copyOf(values, addresses.size());
    }

    List<String> addresses() {
        return addresses;
    }
}
