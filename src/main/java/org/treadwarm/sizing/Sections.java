package org.treadwarm.sizing;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.atomic.LongAdder;
import org.treadwarm.physics.section.FloorResponse;

/**
 * Solved sections, remembered by their geometry over all sizings, so that only the first sizing of a floor waits for it. One
 * sizing solves a bounded number of new ones.
 */
final class Sections {
    /** The most floors remembered; each takes a few kilobytes. */
    private static final int MOST_KEPT = 500;

    /** The most floors that one sizing solves anew, so that its time is bounded. */
    static final int MOST_NEW = 100;

    private static final Map<SectionGeometry, FloorResponse> KEPT = new LinkedHashMap<>(2 * MOST_KEPT, 0.75f, true) {
        @Override
        protected boolean removeEldestEntry(Map.Entry<SectionGeometry, FloorResponse> eldest) {
            return size() > MOST_KEPT;
        }
    };

    private static final LongAdder REMEMBERED = new LongAdder();
    private static final LongAdder SOLVED = new LongAdder();

    private int solved;
    private int followed;
    private String whyNot = "";

    /** The response of a geometry; empty when it cannot be had, and {@link #whyNot()} then says why. */
    Optional<FloorResponse> of(SectionGeometry geometry) {
        synchronized (KEPT) {
            FloorResponse known = KEPT.get(geometry);
            if (known != null) {
                REMEMBERED.increment();
                return Optional.of(known);
            }
        }
        if (solved == MOST_NEW) {
            whyNot = "one sizing solves at most " + MOST_NEW + " different floors";
            return Optional.empty();
        }
        solved++;
        SOLVED.increment();
        try {
            FloorResponse response = geometry.solve();
            synchronized (KEPT) {
                KEPT.put(geometry, response);
            }
            return Optional.of(response);
        } catch (IllegalArgumentException | IllegalStateException problem) {
            whyNot = problem.getMessage();
            return Optional.empty();
        }
    }

    static SectionCache.Reading reading() {
        synchronized (KEPT) {
            return new SectionCache.Reading(KEPT.size(), REMEMBERED.sum(), SOLVED.sum());
        }
    }

    /** Whether this sizing may follow one more floor through time. */
    boolean mayFollow() {
        return followed++ < MOST_NEW;
    }

    String whyNot() {
        return whyNot;
    }
}
