package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;
import java.util.Map;

/** Finds the place where each isotherm is broken for its temperature, so that no label meets anything else. */
final class IsothermLabels {
    private static final double HALF_HEIGHT = 9;
    private static final double PAD = 4;
    /** A closed line shorter than so many labels would be all gap. */
    private static final double SHORTEST = 3;

    private static final double WALK = 5;

    private final Box room;
    private final double wanted;
    private final List<Box> taken;

    /**
     * Places within a room.
     *
     * @param room where labels may stand
     * @param wanted the x they are to stand near, so that they can be read one under another
     * @param taken where nothing may be written
     */
    IsothermLabels(Box room, double wanted, List<Box> taken) {
        this.room = room;
        this.wanted = wanted;
        this.taken = new ArrayList<>(taken);
    }

    /** A place on a line and how little it is liked. */
    private record Place(Box box, double dislike) {}

    /** The label of a level among the lines of all levels; empty if there is no room for it. */
    List<Box> place(double level, String text, Map<Double, List<List<Point>>> lines) {
        double width = Lettering.width(text, false) + PAD;
        List<Place> places = new ArrayList<>();
        for (List<Point> line : lines.get(level)) {
            if (length(line) > SHORTEST * width) {
                walk(line, width, places);
            }
        }
        places.sort((one, other) -> Double.compare(one.dislike(), other.dislike()));
        for (Place place : places) {
            if (free(place.box(), level, lines)) {
                taken.add(place.box());
                return List.of(place.box());
            }
        }
        return List.of();
    }

    private void walk(List<Point> line, double width, List<Place> places) {
        double since = WALK;
        for (int i = 1; i < line.size(); i++) {
            Point from = line.get(i - 1);
            Point to = line.get(i);
            double step = Math.hypot(to.x() - from.x(), to.y() - from.y());
            since += step;
            if (since >= WALK) {
                since = 0;
                double x = (from.x() + to.x()) / 2;
                double y = (from.y() + to.y()) / 2;
                double steepness = Math.abs(to.y() - from.y()) / Math.max(step, 1e-9);
                Box box = new Box(x - width / 2, y - HALF_HEIGHT, width, 2 * HALF_HEIGHT);
                places.add(new Place(box, steepness + 4 * Math.abs(x - wanted) / room.width()));
            }
        }
    }

    private boolean free(Box box, double level, Map<Double, List<List<Point>>> lines) {
        return room.holds(box)
                && taken.stream().noneMatch(box::meets)
                && lines.entrySet().stream()
                        .filter(other -> other.getKey() != level)
                        .flatMap(other -> other.getValue().stream())
                        .noneMatch(line -> LineBreak.meets(line, box));
    }

    private static double length(List<Point> line) {
        double length = 0;
        for (int i = 1; i < line.size(); i++) {
            Point from = line.get(i - 1);
            length += Math.hypot(line.get(i).x() - from.x(), line.get(i).y() - from.y());
        }
        return length;
    }
}
