package org.treadwarm.physics.section;

import java.util.ArrayList;
import java.util.List;
import java.util.SortedSet;
import java.util.TreeSet;

/**
 * Places the lines of a grid in one direction: close together where the temperature bends, and smoothly farther apart from there
 * on, so that the error falls with the square of the cell size.
 */
public final class GridLines {
    /** Steps over a cell's wanted size in which that size is integrated. */
    private static final int STEPS_IN_CELL = 8;

    private final SortedSet<Double> fixed = new TreeSet<>();
    private final List<Fine> fines = new ArrayList<>();
    private final double growth;
    private final double coarsest;

    /** Cells of one size between two positions. */
    private record Fine(double from, double to, double size) {
        double wanted(double position, double growth) {
            return size + growth * Math.max(0, Math.max(from - position, position - to));
        }
    }

    /**
     * No lines yet.
     *
     * @param growth by how much cells grow per metre of distance from a fine stretch
     * @param coarsest largest cell, m
     */
    public GridLines(double growth, double coarsest) {
        this.growth = growth;
        this.coarsest = coarsest;
    }

    /** A line that must be there. */
    public GridLines at(double position) {
        fixed.add(position);
        return this;
    }

    /** Cells of a size between two positions, which are lines themselves. */
    public GridLines fine(double from, double to, double size) {
        fines.add(new Fine(from, to, size));
        return at(from).at(to);
    }

    /** The lines; such as coincide but for rounding are one. */
    public double[] lines() {
        List<Double> lines = new ArrayList<>();
        double same = 1e-9 * (fixed.last() - fixed.first());
        lines.add(fixed.first());
        for (double position : fixed) {
            double before = lines.get(lines.size() - 1);
            if (position - before > same) {
                fill(before, position, lines);
                lines.add(position);
            }
        }
        return lines.stream().mapToDouble(Double::doubleValue).toArray();
    }

    /** Inner lines at equal steps of the integral of one over the wanted size. */
    private void fill(double from, double to, List<Double> lines) {
        List<Double> places = new ArrayList<>(List.of(from));
        List<Double> counts = new ArrayList<>(List.of(0.0));
        double count = 0;
        for (double place = from; place < to; ) {
            double next = Math.min(to, place + wanted(place) / STEPS_IN_CELL);
            count += (next - place) / wanted((place + next) / 2);
            places.add(next);
            counts.add(count);
            place = next;
        }
        int cells = Math.max(2, (int) Math.ceil(count - 1e-6));
        int after = 1;
        for (int line = 1; line < cells; line++) {
            double goal = count * line / cells;
            while (counts.get(after) < goal) {
                after++;
            }
            double share = (goal - counts.get(after - 1)) / (counts.get(after) - counts.get(after - 1));
            lines.add(places.get(after - 1) + share * (places.get(after) - places.get(after - 1)));
        }
    }

    private double wanted(double position) {
        double size = coarsest;
        for (Fine fine : fines) {
            size = Math.min(size, fine.wanted(position, growth));
        }
        return size;
    }
}
