package org.treadwarm.sizing;

import java.util.Arrays;
import java.util.Optional;
import org.treadwarm.survey.Place;
import org.treadwarm.units.Reading;

/** The readings of a survey as one array of SI numbers, each with its address. */
final class Inputs {
    private double[] values = new double[64];
    private Place[] places = new Place[64];
    private String[] keys = new String[64];
    private int count;

    /** Takes in the reading that stands under a key of a place, and gives its index. */
    int add(Place place, String key, Reading reading) {
        int index = count++;
        if (index == values.length) {
            values = Arrays.copyOf(values, 2 * index);
            places = Arrays.copyOf(places, 2 * index);
            keys = Arrays.copyOf(keys, 2 * index);
        }
        values[index] = reading.value();
        places[index] = place;
        keys[index] = key;
        return index;
    }

    /** Takes a reading in, if there is one; else gives {@link Stack#NONE}. */
    int optional(Place place, String key, Optional<Reading> reading) {
        return reading.isPresent() ? add(place, key, reading.get()) : Stack.NONE;
    }

    double[] values() {
        return Arrays.copyOf(values, count);
    }

    /** The address of a reading as a JSON Pointer. */
    String address(int index) {
        return places[index].pointer() + keys[index];
    }
}
