package org.treadwarm.sizing;

import java.util.List;

/** A symbol of a formula and the addresses of the numbers it stands for. */
record Symbol(String name, List<String> addresses) {
    static Symbol of(String name, String address) {
        return new Symbol(name, List.of(address));
    }

    static Symbol all(String name, List<String> addresses) {
        return new Symbol(name, List.copyOf(addresses));
    }
}
