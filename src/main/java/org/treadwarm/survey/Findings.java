package org.treadwarm.survey;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Set;

/** The problems found so far: each address once, the first finding counts. */
public final class Findings {
    /** After so many, looking further helps nobody. */
    public static final int MOST = 1000;

    private final List<Problem> problems = new ArrayList<>();
    private final Set<String> pointers = new HashSet<>();

    /** Adds a problem, unless its address has one already. */
    public void add(String pointer, String given, String message, String allowed) {
        if (problems.size() < MOST && pointers.add(pointer)) {
            problems.add(new Problem(pointer, given, message, allowed));
        }
    }

    /** Whether nothing was found at this address. */
    public boolean clean(String pointer) {
        return !pointers.contains(pointer);
    }

    /** Whether nothing was found at all. */
    public boolean isEmpty() {
        return problems.isEmpty();
    }

    /** Every problem, in the order found. */
    public List<Problem> all() {
        return List.copyOf(problems);
    }
}
