package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Breaks lines where lettering stands on them. */
final class LineBreak {
    /** A part of a segment, as shares of its length from its first end. */
    private record Part(double from, double to) {}

    private static final List<Part> WHOLE = List.of(new Part(0, 1));

    private LineBreak() {}

    /** Whether a segment runs through a box. */
    static boolean meets(Point from, Point to, Box box) {
        boolean beside = Math.max(from.x(), to.x()) <= box.x()
                || Math.min(from.x(), to.x()) >= box.right()
                || Math.max(from.y(), to.y()) <= box.y()
                || Math.min(from.y(), to.y()) >= box.bottom();
        return !beside && inside(from, to, box).to() > 0;
    }

    /** Whether any segment of a line runs through a box. */
    static boolean meets(List<Point> line, Box box) {
        for (int i = 1; i < line.size(); i++) {
            if (meets(line.get(i - 1), line.get(i), box)) {
                return true;
            }
        }
        return false;
    }

    /** The pieces of a line that lie outside all the boxes, in the order of the line. */
    static List<List<Point>> outside(List<Point> line, List<Box> gaps) {
        if (gaps.isEmpty()) {
            return line.size() > 1 ? List.of(line) : List.of();
        }
        List<List<Point>> pieces = new ArrayList<>();
        List<Point> piece = new ArrayList<>();
        for (int i = 1; i < line.size(); i++) {
            Point from = line.get(i - 1);
            Point to = line.get(i);
            for (Part part : outside(from, to, gaps)) {
                Point start = between(from, to, part.from());
                if (piece.isEmpty() || !piece.get(piece.size() - 1).equals(start)) {
                    keep(piece, pieces);
                    piece = new ArrayList<>(List.of(start));
                }
                piece.add(between(from, to, part.to()));
            }
        }
        keep(piece, pieces);
        return pieces;
    }

    private static void keep(List<Point> piece, List<List<Point>> pieces) {
        if (piece.size() > 1) {
            pieces.add(piece);
        }
    }

    private static List<Part> outside(Point from, Point to, List<Box> gaps) {
        if (gaps.stream().noneMatch(gap -> meets(from, to, gap))) {
            return WHOLE;
        }
        List<Part> hidden = gaps.stream()
                .map(gap -> inside(from, to, gap))
                .filter(part -> part.to() > 0)
                .sorted(Comparator.comparingDouble(Part::from))
                .toList();
        List<Part> seen = new ArrayList<>();
        double reached = 0;
        for (Part part : hidden) {
            if (part.from() > reached) {
                seen.add(new Part(reached, part.from()));
            }
            reached = Math.max(reached, part.to());
        }
        if (reached < 1) {
            seen.add(new Part(reached, 1));
        }
        return seen;
    }

    private static Point between(Point from, Point to, double share) {
        if (share == 0 || share == 1) {
            return share == 0 ? from : to;
        }
        return new Point(from.x() + share * (to.x() - from.x()), from.y() + share * (to.y() - from.y()));
    }

    /** The part in the box, cut by one pair of sides after the other; from zero to zero if there is none. */
    private static Part inside(Point from, Point to, Box box) {
        Part wide = inside(from.x(), to.x(), box.x(), box.right());
        Part high = inside(from.y(), to.y(), box.y(), box.bottom());
        Part both = new Part(Math.max(wide.from(), high.from()), Math.min(wide.to(), high.to()));
        return both.from() < both.to() ? both : new Part(0, 0);
    }

    private static Part inside(double from, double to, double low, double high) {
        if (from == to) {
            return from > low && from < high ? new Part(0, 1) : new Part(0, 0);
        }
        double one = (low - from) / (to - from);
        double other = (high - from) / (to - from);
        return new Part(Math.max(0, Math.min(one, other)), Math.min(1, Math.max(one, other)));
    }
}
