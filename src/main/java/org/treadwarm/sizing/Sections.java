package org.treadwarm.sizing;

import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.concurrent.CancellationException;
import java.util.concurrent.atomic.LongAdder;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
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

    private static final Map<SectionGeometry, Tried> KEPT = new LinkedHashMap<>(2 * MOST_KEPT, 0.75f, true) {
        @Override
        protected boolean removeEldestEntry(Map.Entry<SectionGeometry, Tried> eldest) {
            return size() > MOST_KEPT;
        }
    };

    /** What solving a geometry came to: its response, or why there is none. */
    private record Tried(Optional<FloorResponse> response, String whyNot) {}

    private final boolean looking;
    private final BooleanSupplier stopped;
    private final Set<SectionGeometry> met = new LinkedHashSet<>();

    private static final LongAdder REMEMBERED = new LongAdder();
    private static final LongAdder SOLVED = new LongAdder();

    private int solved;
    private int followed;
    private boolean gaveUp;
    private String whyNot = "";

    /** @param stopped asked at every step of the solver, and before each floor is followed through time, whether to give up */
    Sections(BooleanSupplier stopped) {
        this(false, stopped);
    }

    private Sections(boolean looking, BooleanSupplier stopped) {
        this.looking = looking;
        this.stopped = stopped;
    }

    /** Solves nothing and follows nothing, but remembers what it was asked for. */
    static Sections looking() {
        return new Sections(true, () -> false);
    }

    /** The geometries met that would have to be solved anew; none when there are more than can be remembered. */
    List<SectionGeometry> unknown() {
        synchronized (KEPT) {
            return met.size() > MOST_KEPT
                    ? List.of()
                    : met.stream()
                            .filter(geometry -> !KEPT.containsKey(geometry))
                            .toList();
        }
    }

    /**
     * Solves a geometry and remembers what came of it.
     *
     * @throws java.util.concurrent.CancellationException when asked to give up; then nothing is remembered
     */
    static void solve(SectionGeometry geometry, BooleanSupplier stopped, DoubleConsumer progress) {
        remember(geometry, tried(geometry, stopped, progress));
    }

    private static Tried tried(SectionGeometry geometry, BooleanSupplier stopped, DoubleConsumer progress) {
        try {
            return new Tried(Optional.of(geometry.solve(stopped, progress)), "");
        } catch (CancellationException stop) {
            throw stop;
        } catch (IllegalArgumentException | IllegalStateException problem) {
            return new Tried(Optional.empty(), problem.getMessage());
        }
    }

    private static void remember(SectionGeometry geometry, Tried tried) {
        synchronized (KEPT) {
            KEPT.put(geometry, tried);
        }
    }

    /** The response of a geometry; empty when it cannot be had, and {@link #whyNot()} then says why. */
    Optional<FloorResponse> of(SectionGeometry geometry) {
        if (looking) {
            met.add(geometry);
            return Optional.empty();
        }
        Tried tried;
        synchronized (KEPT) {
            tried = KEPT.get(geometry);
        }
        (tried == null ? SOLVED : REMEMBERED).increment();
        if (tried == null) {
            if (solved == MOST_NEW) {
                gaveUp = true;
                whyNot = "one sizing solves at most " + MOST_NEW + " different floors";
                return Optional.empty();
            }
            solved++;
            tried = tried(geometry, stopped, share -> {});
            remember(geometry, tried);
        }
        whyNot = tried.whyNot();
        return tried.response();
    }

    static SectionCache.Reading reading() {
        synchronized (KEPT) {
            return new SectionCache.Reading(KEPT.size(), REMEMBERED.sum(), SOLVED.sum());
        }
    }

    /** Whether a geometry was met that this sizing could not solve any more, but a later one can. */
    boolean gaveUp() {
        return gaveUp;
    }

    /**
     * Whether this sizing may follow one more floor through time.
     *
     * @throws CancellationException when asked to give up
     */
    boolean mayFollow() {
        if (!looking && stopped.getAsBoolean()) {
            throw new CancellationException("asked to give up before a floor was followed through time");
        }
        return !looking && followed++ < MOST_NEW;
    }

    String whyNot() {
        return whyNot;
    }
}
