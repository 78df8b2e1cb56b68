package org.treadwarm.reference;

import java.util.HashMap;
import java.util.HashSet;
import java.util.Map;
import java.util.Set;

/** Keeps apart the names of parts that the two sides of a pair list, for the same name from both is refused. */
final class PartNames {
    private final Map<String, Set<String>> listed = new HashMap<>();
    private int made;

    /** Whether {@code from} may list a part with this name towards {@code to}; if so it is taken as listed. */
    boolean claim(String from, String to, String name) {
        if (listed.getOrDefault(to + "\n" + from, Set.of()).contains(name)) {
            return false;
        }
        listed.computeIfAbsent(from + "\n" + to, pair -> new HashSet<>()).add(name);
        return true;
    }

    /** A name that nobody has, claimed. */
    String make(String from, String to) {
        made++;
        String name = "part " + made;
        claim(from, to, name);
        return name;
    }

    /** A number that is used once in the survey. */
    int next() {
        made++;
        return made;
    }
}
