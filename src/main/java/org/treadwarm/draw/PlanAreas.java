package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;
import java.util.function.ToDoubleFunction;

/**
 * How a floor is divided, in pixels: the strip along the walls, and the rest of it in equal parts.
 *
 * @param room the whole floor
 * @param inner what the strip along the walls leaves
 * @param strips the parts of that strip
 * @param loops the equal parts of the rest, from the left or from the top
 * @param scale pixels per m
 */
record PlanAreas(Box room, Box inner, List<Box> strips, List<Box> loops, double scale) {
    private static final int MOST_RUNS = 120;
    /** In pixels; runs that are nearer cannot be told apart. */
    private static final double LEAST_PITCH = 4;

    static PlanAreas of(FloorPlanStrip plan, Box room, double scale) {
        double left = depth(plan, PeripheralZone.Side.LEFT) * scale;
        double right = depth(plan, PeripheralZone.Side.RIGHT) * scale;
        double top = depth(plan, PeripheralZone.Side.TOP) * scale;
        double bottom = depth(plan, PeripheralZone.Side.BOTTOM) * scale;
        Box inner = new Box(room.x() + left, room.y() + top, room.width() - left - right, room.height() - top - bottom);
        List<Box> strips = new ArrayList<>();
        strips.add(new Box(room.x(), room.y(), room.width(), top));
        strips.add(new Box(room.x(), inner.bottom(), room.width(), bottom));
        strips.add(new Box(room.x(), inner.y(), left, inner.height()));
        strips.add(new Box(inner.right(), inner.y(), right, inner.height()));
        strips.removeIf(strip -> strip.width() <= 0 || strip.height() <= 0);
        return new PlanAreas(room, inner, List.copyOf(strips), divided(inner, plan.loops()), scale);
    }

    private static double depth(FloorPlanStrip plan, PeripheralZone.Side side) {
        return plan.zone().map(zone -> zone.along(side)).orElse(0.0);
    }

    private static List<Box> divided(Box inner, int loops) {
        List<Box> parts = new ArrayList<>();
        boolean across = inner.width() >= inner.height();
        double width = across ? inner.width() / loops : inner.width();
        double height = across ? inner.height() : inner.height() / loops;
        for (int i = 0; i < loops; i++) {
            parts.add(new Box(
                    inner.x() + (across ? i * width : 0), inner.y() + (across ? 0 : i * height), width, height));
        }
        return parts;
    }

    /** Where a unit stands. */
    Box box(FixedUnit unit) {
        return new Box(
                room.x() + unit.x() * scale, room.y() + unit.y() * scale, unit.width() * scale, unit.length() * scale);
    }

    /** Whether the loops lie from left to right. */
    boolean loopsAcross() {
        return inner.width() >= inner.height();
    }

    /** The runs of every part, each so many spacings apart. */
    List<Meander> meanders(FloorPlanStrip plan, int each) {
        double clearance = plan.runs().clearance();
        List<Meander> all = new ArrayList<>();
        plan.runs()
                .spacing()
                .ifPresent(spacing -> loops.forEach(part -> all.add(meander(part, spacing, clearance, each))));
        plan.zone().ifPresent(zone -> strips.forEach(part -> all.add(meander(part, zone.spacing(), clearance, each))));
        return all;
    }

    /** Clear of the walls, and half a spacing clear of the parts beside it. */
    private Meander meander(Box part, double spacing, double clearance, int each) {
        double half = spacing * scale / 2;
        double wall = clearance * scale;
        double left = meets(part, Box::x) ? wall : half;
        double right = meets(part, Box::right) ? wall : half;
        double top = meets(part, Box::y) ? wall : half;
        double bottom = meets(part, Box::bottom) ? wall : half;
        Box area = new Box(part.x() + left, part.y() + top, part.width() - left - right, part.height() - top - bottom);
        return new Meander(area, spacing * scale * each, part.height() > part.width());
    }

    private boolean meets(Box part, ToDoubleFunction<Box> side) {
        return Math.abs(side.applyAsDouble(part) - side.applyAsDouble(room)) < 0.01;
    }

    /** Of how many runs one is drawn, so that they are not too many or too near to be told apart. */
    int each(FloorPlanStrip plan) {
        int each = 1;
        while (tooDense(meanders(plan, each))) {
            each++;
        }
        return each;
    }

    private boolean tooDense(List<Meander> meanders) {
        int runs = meanders.stream().mapToInt(Meander::count).sum();
        boolean near = meanders.stream().anyMatch(one -> one.count() > 1 && one.pitch() < LEAST_PITCH);
        boolean fewer = meanders.stream().anyMatch(one -> one.count() > 1);
        return fewer && (near || runs > MOST_RUNS);
    }
}
