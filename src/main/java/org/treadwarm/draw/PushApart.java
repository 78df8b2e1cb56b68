package org.treadwarm.draw;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;

/**
 * Moves things along a line until none overlap, keeping their order and moving them as little as possible (least
 * squares, by pooling neighbours that collide).
 */
final class PushApart {
    /** What wants to stand centred at a place and takes up a size, its gap included. */
    record Wish(double centre, double size) {}

    /** Neighbours that touch and therefore move together. */
    private record Pool(double start, int count) {
        Pool with(Pool other) {
            double weighted = start * count + other.start * other.count;
            return new Pool(weighted / (count + other.count), count + other.count);
        }
    }

    private PushApart() {}

    static double size(List<Wish> wishes) {
        return wishes.stream().mapToDouble(Wish::size).sum();
    }

    /**
     * The centres, between the bounds.
     *
     * @throws IllegalArgumentException if the wishes do not fit between the bounds
     */
    static List<Double> centres(List<Wish> wishes, double from, double to) {
        double slack = to - from - size(wishes);
        if (slack < -1e-6) {
            throw new IllegalArgumentException("The labels need more room than there is, by " + -slack);
        }
        List<Double> starts = starts(wishes);
        List<Double> centres = new ArrayList<>();
        double before = 0;
        for (int i = 0; i < wishes.size(); i++) {
            double start = Math.max(from, Math.min(starts.get(i), from + Math.max(0, slack)));
            centres.add(start + before + wishes.get(i).size() / 2);
            before += wishes.get(i).size();
        }
        return centres;
    }

    /** Where each would start if all before it had no size; equal numbers mean that they touch. */
    private static List<Double> starts(List<Wish> wishes) {
        Deque<Pool> pools = new ArrayDeque<>();
        double before = 0;
        for (Wish wish : wishes) {
            Pool pool = new Pool(wish.centre() - wish.size() / 2 - before, 1);
            while (!pools.isEmpty() && pools.peekLast().start() > pool.start()) {
                pool = pools.removeLast().with(pool);
            }
            pools.addLast(pool);
            before += wish.size();
        }
        List<Double> starts = new ArrayList<>();
        pools.forEach(pool -> {
            for (int i = 0; i < pool.count(); i++) {
                starts.add(pool.start());
            }
        });
        return starts;
    }
}
