package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** Gathers the steps of a working. */
final class Steps {
    private final List<Step> steps = new ArrayList<>();

    /** A step whose formula has a symbol for the number itself. */
    void add(String pointer, String formula, String itself, Symbol... others) {
        Map<String, List<String>> symbols = new LinkedHashMap<>();
        symbols.put(itself, List.of(Addresses.sizing(pointer)));
        for (Symbol symbol : others) {
            symbols.put(symbol.name(), symbol.addresses());
        }
        steps.add(new Step(pointer, formula, Collections.unmodifiableMap(symbols)));
    }

    /** A step whose formula holds in the answer sized again with the number itself as the outdoor temperature. */
    void addAgain(String pointer, String formula, Symbol left, Symbol right) {
        Map<String, List<String>> symbols = new LinkedHashMap<>();
        symbols.put(left.name(), left.addresses());
        symbols.put(right.name(), right.addresses());
        steps.add(new Step(pointer, formula, Collections.unmodifiableMap(symbols)));
    }

    List<Step> all() {
        return List.copyOf(steps);
    }
}
