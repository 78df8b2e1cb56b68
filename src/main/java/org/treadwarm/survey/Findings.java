package org.treadwarm.survey;

import java.util.ArrayList;
import java.util.Collection;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.function.Supplier;

/** The problems found so far: each address once, the first finding counts. */
public final class Findings {
    /** After so many, looking further helps nobody. */
    public static final int MOST = 1000;

    /** After so many, no more nearest names are searched for: a search costs much, and so many slips are no slips. */
    private static final int MOST_HINTS = 100;

    private final List<Problem> problems = new ArrayList<>();
    private final Set<String> pointers = new HashSet<>();
    private final Set<String> unread = new HashSet<>();

    /** Adds a problem, unless its address has one already or lies in what could not be read. */
    public void add(String pointer, String given, String message, String allowed) {
        if (problems.size() < MOST && !isUnread(pointer) && pointers.add(pointer)) {
            problems.add(new Problem(pointer, given, message, allowed));
        }
    }

    /** Adds that something is missing, unless a finding there tells already why it could not be read. */
    public void missing(String pointer, String message, String allowed) {
        if (clean(pointer)) {
            add(pointer, "nothing", message, allowed);
        }
    }

    /** Adds a problem at an address below a place. */
    void add(Place above, String below, String given, String message, String allowed) {
        add(above.pointer() + below, given, message, allowed);
    }

    /** Adds that something is missing at an address below a place. */
    void missing(Place above, String below, String message, String allowed) {
        missing(above.pointer() + below, message, allowed);
    }

    /** Adds a problem that leaves everything below its address unread, so that nothing more is found there. */
    public void addUnread(String pointer, String given, String message, String allowed) {
        add(pointer, given, message, allowed);
        unread.add(pointer);
    }

    private boolean isUnread(String pointer) {
        for (int end = pointer.lastIndexOf('/');
                !unread.isEmpty() && end >= 0;
                end = pointer.lastIndexOf('/', end - 1)) {
            if (unread.contains(pointer.substring(0, end))) {
                return true;
            }
        }
        return false;
    }

    /** Words that name the nearest of the listed names, to end a message with; empty when there is none to name. */
    String hint(String given, Supplier<? extends Collection<String>> names) {
        return problems.size() < MOST_HINTS
                ? Nearest.to(given, names.get())
                        .map(name -> "; did you mean \"" + name + "\"?")
                        .orElse("")
                : "";
    }

    /** Whether what stands at this address was read, be it a reading alone or with its basis, and nothing was found there. */
    public boolean clean(String pointer) {
        return !pointers.contains(pointer) && !pointers.contains(pointer + "/reading") && !isUnread(pointer);
    }

    /** Whether nothing was found at an address below a place; the address is put together only when that can matter. */
    boolean clean(Place above, String below) {
        return pointers.isEmpty() || clean(above.pointer() + below);
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
