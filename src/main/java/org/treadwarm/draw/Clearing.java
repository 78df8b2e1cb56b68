package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.function.Predicate;

/** Looks for places where lettering meets neither lines nor other lettering. */
final class Clearing {
    private static final double STEP = 5;

    private final List<Box> taken = new ArrayList<>();
    private final List<List<Point>> lines = new ArrayList<>();

    void line(List<Point> line) {
        lines.add(line);
    }

    void outline(Box box) {
        lines.add(List.of(
                new Point(box.x(), box.y()),
                new Point(box.right(), box.y()),
                new Point(box.right(), box.bottom()),
                new Point(box.x(), box.bottom()),
                new Point(box.x(), box.y())));
    }

    void take(Box box) {
        taken.add(box);
    }

    /** All that is taken. */
    List<Box> taken() {
        return List.copyOf(taken);
    }

    /** The free place of a size within a room that is nearest to where its middle is wanted; it is taken at once. */
    Optional<Box> near(Point wanted, double width, double height, Box room) {
        return nearest(wanted, width, height, room, box -> true);
    }

    /** The same, for a place from which a leader can go to where its middle is wanted and meet no lettering. */
    Optional<Box> inSight(Point wanted, double size, Box room) {
        return nearest(
                wanted,
                size,
                size,
                room,
                box -> taken.stream()
                        .noneMatch(other -> LineBreak.meets(wanted, new Point(box.middleX(), box.middleY()), other)));
    }

    private Optional<Box> nearest(Point wanted, double width, double height, Box room, Predicate<Box> accepted) {
        List<Point> middles = new ArrayList<>();
        for (double x = room.x() + width / 2; x <= room.right() - width / 2; x += STEP) {
            for (double y = room.y() + height / 2; y <= room.bottom() - height / 2; y += STEP) {
                middles.add(new Point(x, y));
            }
        }
        middles.add(wanted);
        middles.sort(
                Comparator.comparingDouble(middle -> Math.hypot(middle.x() - wanted.x(), middle.y() - wanted.y())));
        Optional<Box> found = middles.stream()
                .map(middle -> new Box(middle.x() - width / 2, middle.y() - height / 2, width, height))
                .filter(room::holds)
                .filter(this::free)
                .filter(accepted)
                .findFirst();
        found.ifPresent(this::take);
        return found;
    }

    private boolean free(Box box) {
        return taken.stream().noneMatch(box::meets) && lines.stream().noneMatch(line -> LineBreak.meets(line, box));
    }
}
