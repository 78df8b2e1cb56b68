package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/**
 * Runs of cable or pipe over an area in pixels, to and fro, left out where something stands in the way.
 *
 * @param area where runs may lie, clearances taken off
 * @param pitch distance of neighbouring runs
 * @param upright whether runs go up and down instead of across
 */
record Meander(Box area, double pitch, boolean upright) {
    /** Part of the pitch by which the ends of two runs may differ and still be joined. */
    private static final double JOINED = 0.5;

    /** A run across, from a left to a right end. */
    private record Run(double from, double to, double y) {
        boolean over(Run other) {
            return from < other.to && to > other.from;
        }

        double end(boolean right) {
            return right ? to : from;
        }
    }

    /** Runs joined to one line, and the side on which it ends. */
    private static final class Chain {
        private final List<Point> points = new ArrayList<>();
        private Run last;
        private boolean right;

        Chain(Run run, boolean fromRight) {
            this.last = run;
            this.right = !fromRight;
            points.add(new Point(run.end(fromRight), run.y()));
            points.add(new Point(run.end(right), run.y()));
        }

        boolean reaches(Run next, double most) {
            return Math.abs(last.end(right) - next.end(right)) <= most;
        }

        /** Where it turns to a next run: at the end of the shorter, so that it keeps clear of what is beside it. */
        double turnsAt(Run next) {
            return right ? Math.min(last.to(), next.to()) : Math.max(last.from(), next.from());
        }

        void turn(Run next) {
            double x = turnsAt(next);
            points.set(points.size() - 1, new Point(x, last.y()));
            points.add(new Point(x, next.y()));
            right = !right;
            points.add(new Point(next.end(right), next.y()));
            last = next;
        }
    }

    /** How many runs it has if nothing stands in the way. */
    int count() {
        double depth = upright ? area.width() : area.height();
        boolean none = area.width() <= 0 || area.height() <= 0;
        return none ? 0 : (int) Math.floor(depth / pitch + 1e-9) + 1;
    }

    /** The lines, each joined of as many runs as can be. */
    List<List<Point>> lines(List<Box> obstacles) {
        List<Chain> one = chains(obstacles, false);
        List<Chain> other = chains(obstacles, true);
        return (one.size() <= other.size() ? one : other)
                .stream()
                        .map(chain -> chain.points.stream().map(this::turned).toList())
                        .toList();
    }

    private List<Chain> chains(List<Box> obstacles, boolean fromRight) {
        List<Chain> all = new ArrayList<>();
        List<Chain> open = new ArrayList<>();
        for (int i = 0; i < count(); i++) {
            List<Chain> next = new ArrayList<>();
            List<Run> runs = runs(i, obstacles);
            for (Run run : runs) {
                List<Chain> above =
                        open.stream().filter(chain -> chain.last.over(run)).toList();
                boolean alone = above.size() == 1
                        && runs.stream().filter(above.get(0).last::over).count() == 1;
                if (alone && joins(above.get(0), run, obstacles)) {
                    above.get(0).turn(run);
                    next.add(above.get(0));
                } else {
                    Chain chain = new Chain(run, alone ? above.get(0).right : fromRight);
                    all.add(chain);
                    next.add(chain);
                }
            }
            open = next;
        }
        return all;
    }

    private boolean joins(Chain chain, Run next, List<Box> obstacles) {
        double x = chain.turnsAt(next);
        Point from = new Point(x, chain.last.y());
        Point to = new Point(x, next.y());
        return chain.reaches(next, JOINED * pitch)
                && obstacles.stream().noneMatch(box -> LineBreak.meets(from, to, turned(box)));
    }

    /** The parts of one run that are free, from the left. */
    private List<Run> runs(int number, List<Box> obstacles) {
        Box flat = turned(area);
        double y = flat.middleY() + (number - (count() - 1) / 2.0) * pitch;
        List<Box> hit = obstacles.stream()
                .map(this::turned)
                .filter(box -> box.y() < y && box.bottom() > y)
                .sorted(Comparator.comparingDouble(Box::x))
                .toList();
        List<Run> runs = new ArrayList<>();
        double from = flat.x();
        for (Box box : hit) {
            keep(new Run(from, Math.min(box.x(), flat.right()), y), runs);
            from = Math.max(from, box.right());
        }
        keep(new Run(from, flat.right(), y), runs);
        return runs;
    }

    private void keep(Run run, List<Run> runs) {
        if (run.to() - run.from() > pitch) {
            runs.add(run);
        }
    }

    private Box turned(Box box) {
        return upright ? new Box(box.y(), box.x(), box.height(), box.width()) : box;
    }

    private Point turned(Point point) {
        return upright ? new Point(point.y(), point.x()) : point;
    }
}
