package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
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

    double[] values() {
        return Arrays.copyOf(values, addresses.size());
    }

    List<String> addresses() {
        return addresses;
    }
}
