package org.treadwarm.draw;

import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/**
 * Temperatures of a heated floor and its room over hours: warming up, or cooling once the power is cut.
 *
 * @param event what happens
 * @param name the room's or floor's name
 * @param hours times in h from the start, rising from 0; at least 2
 * @param traces one to three lines, each of a place of its own, with a temperature at each time
 * @param thresholds at most three temperatures to mark, each of a place that is drawn
 */
public record WarmUpCurve(
        Event event, String name, List<Double> hours, List<Trace> traces, List<Threshold> thresholds) {
    /** What is drawn. */
    public enum Event {
        WARM_UP("Warm-up"),
        POWER_CUT("Power cut");

        private final String words;

        Event(String words) {
            this.words = words;
        }

        String words() {
            return words;
        }
    }

    private static final int MOST = 3;

    /** @throws IllegalArgumentException if the parts do not go together or a number cannot be drawn */
    public WarmUpCurve {
        hours = List.copyOf(hours);
        traces = List.copyOf(traces);
        thresholds = List.copyOf(thresholds);
        rise(hours);
        Checks.within("Number of lines", traces.size(), 1, MOST);
        Checks.within("Number of thresholds", thresholds.size(), 0, MOST);
        Set<Trace.Place> places = new HashSet<>();
        for (Trace trace : traces) {
            if (!places.add(trace.place()) || trace.temperatures().size() != hours.size()) {
                throw new IllegalArgumentException("One line with " + hours.size() + " temperatures for the "
                        + trace.place().words() + ", not "
                        + trace.temperatures().size());
            }
        }
        double end = hours.get(hours.size() - 1);
        for (Threshold threshold : thresholds) {
            if (!places.contains(threshold.of())) {
                throw new IllegalArgumentException(
                        "No line is drawn for the " + threshold.of().words() + " of " + threshold.name());
            }
            threshold.reachedAfter().ifPresent(reached -> Checks.within("Hours until the threshold", reached, 0, end));
        }
    }

    private static void rise(List<Double> hours) {
        if (hours.size() < 2 || hours.get(0) != 0) {
            throw new IllegalArgumentException("Times are at least 2 and start at 0 h");
        }
        for (int i = 1; i < hours.size(); i++) {
            if (!(hours.get(i) > hours.get(i - 1))) {
                throw new IllegalArgumentException(
                        "Times must rise: " + hours.get(i - 1) + " h then " + hours.get(i) + " h");
            }
        }
        Checks.within("Last time", hours.get(hours.size() - 1), 0.01, 10_000);
    }

    double end() {
        return hours.get(hours.size() - 1);
    }

    Trace trace(Trace.Place place) {
        Optional<Trace> found =
                traces.stream().filter(trace -> trace.place() == place).findFirst();
        return found.orElseThrow();
    }

    /** What became of a threshold: reached after some time, or how near the line came at the end. */
    String outcome(Threshold threshold) {
        if (threshold.reachedAfter().isPresent()) {
            return "reached after " + Figures.duration(threshold.reachedAfter().getAsDouble());
        }
        return "not reached within " + Figures.duration(end()) + ": "
                + Figures.celsius(trace(threshold.of()).last());
    }
}
