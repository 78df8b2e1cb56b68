package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/**
 * Draws a room's floor in plan to scale: what stands on it, the heated rest, and runs of cable or pipe at their spacing.
 *
 * <p>The runs are indicative, and the drawing says so: they show how densely and how far heat is laid.
 */
public final class FloorPlanDrawing {
    private static final double MARGIN = 12;
    private static final Stroke WALL = new Stroke(Palette.INK, 3, "");
    private static final Stroke RUN = new Stroke(Palette.ACCENT, 1.25, "");
    private static final Stroke ZONE = new Stroke(Palette.INK, 1.25, "7 4");

    private final Canvas canvas;
    private final Sheet sheet;
    private final FloorPlanStrip plan;
    private final Label head;
    private final PlanAreas areas;
    private final int each;
    private final Clearing clearing = new Clearing();
    private final PlanLettering lettering;

    private FloorPlanDrawing(Sheet sheet, FloorPlanStrip plan) {
        this.canvas = new Canvas(sheet);
        this.sheet = sheet;
        this.plan = plan;
        this.head = Label.empty().and("Floor plan: " + plan.name(), sheet.width() - 2 * MARGIN, TextStyle.PLAIN);
        double left = MARGIN + 22 + Lettering.width(Figures.metres(plan.length()), false);
        double width = sheet.width() - left - MARGIN - 2;
        double scale = Math.min(width / plan.width(), (sheet.roomy() ? 460 : 400) / plan.length());
        Box room = new Box(left, 10 + head.height() + 14, plan.width() * scale, plan.length() * scale);
        this.areas = PlanAreas.of(plan, room, scale);
        this.each = areas.each(plan);
        this.lettering = new PlanLettering(canvas, plan, areas, clearing);
    }

    /** The drawing as SVG text. */
    public static String draw(Sheet sheet, FloorPlanStrip plan) {
        return new FloorPlanDrawing(sheet, plan).draw();
    }

    private String draw() {
        canvas.label(new Point(MARGIN, 10 + head.height() / 2), head, TextStyle.Anchor.START);
        heatedArea();
        lines();
        lettering.place();
        canvas.rectangle(areas.room(), Palette.NONE, WALL);
        runs();
        lettering.draw();
        Box room = areas.room();
        Dimension.across(canvas, room.x(), room.right(), room.bottom() + 14, Figures.metres(plan.width()));
        Dimension.down(canvas, room.x() - 14, room.y(), room.bottom(), Figures.metres(plan.length()));
        ScaleBar.draw(canvas, new Point(room.x(), room.bottom() + 48), areas.scale());
        return canvas.write(notes(room.bottom() + 48 + ScaleBar.HEIGHT), "Floor plan of " + plan.name(), description());
    }

    /** Pale, with a margin as wide as the clearance round walls and units. */
    private void heatedArea() {
        double clear = plan.runs().clearance() * areas.scale();
        Box heated = areas.room().grown(-clear);
        canvas.rectangle(areas.room(), Palette.PAPER, Stroke.NONE);
        if (heated.width() > 0 && heated.height() > 0) {
            canvas.rectangle(heated, Palette.PALE_NEUTRAL, Stroke.NONE);
        }
        for (FixedUnit unit : plan.units()) {
            canvas.rectangle(within(areas.box(unit).grown(clear)), Palette.PAPER, Stroke.NONE);
        }
        for (FixedUnit unit : plan.units()) {
            canvas.rectangle(areas.box(unit), canvas.unitHatch(), Stroke.OUTLINE);
        }
    }

    private Box within(Box box) {
        Box room = areas.room();
        return Box.between(
                new Point(Math.max(box.x(), room.x()), Math.max(box.y(), room.y())),
                new Point(Math.min(box.right(), room.right()), Math.min(box.bottom(), room.bottom())));
    }

    /** Between the parts of the floor. */
    private void lines() {
        plan.units().forEach(unit -> clearing.outline(areas.box(unit)));
        clearing.outline(areas.room());
        Box inner = areas.inner();
        List<Box> parts = areas.loops();
        for (Box part : parts.subList(1, parts.size())) {
            Point end = areas.loopsAcross() ? new Point(part.x(), part.bottom()) : new Point(part.right(), part.y());
            between(new Point(part.x(), part.y()), end, Stroke.GUIDE);
        }
        Point topLeft = new Point(inner.x(), inner.y());
        Point topRight = new Point(inner.right(), inner.y());
        Point bottomLeft = new Point(inner.x(), inner.bottom());
        Point bottomRight = new Point(inner.right(), inner.bottom());
        plan.zone()
                .ifPresent(zone -> zone.sides().stream().sorted().forEach(side -> {
                    switch (side) {
                        case TOP -> between(topLeft, topRight, ZONE);
                        case BOTTOM -> between(bottomLeft, bottomRight, ZONE);
                        case LEFT -> between(topLeft, bottomLeft, ZONE);
                        case RIGHT -> between(topRight, bottomRight, ZONE);
                    }
                }));
    }

    /** Broken where something stands on it. */
    private void between(Point from, Point to, Stroke stroke) {
        List<Box> units = plan.units().stream().map(areas::box).toList();
        for (List<Point> piece : LineBreak.outside(List.of(from, to), units)) {
            clearing.line(piece);
            canvas.polyline(piece, stroke);
        }
    }

    private void runs() {
        double clear = plan.runs().clearance() * areas.scale();
        List<Box> obstacles =
                plan.units().stream().map(unit -> areas.box(unit).grown(clear)).toList();
        for (Meander meander : areas.meanders(plan, each)) {
            for (List<Point> line : meander.lines(obstacles)) {
                LineBreak.outside(line, clearing.taken()).forEach(piece -> canvas.polyline(piece, RUN));
            }
        }
    }

    private double notes(double top) {
        Label label = Label.empty();
        double width = sheet.width() - 2 * MARGIN;
        for (String note : allNotes()) {
            label = label.and(note, width, TextStyle.PLAIN);
        }
        label = label.and("To scale, also in print: the bar measures it. " + meaning(), width, TextStyle.QUIET);
        canvas.label(new Point(MARGIN, top + label.height() / 2), label, TextStyle.Anchor.START);
        return top + label.height() + 10;
    }

    private String meaning() {
        return plan.runs().spacing().isPresent()
                ? "The runs show spacing and extent, not how to lay them."
                : "The pale area shows where heat may lie, not how to lay it.";
    }

    private List<String> allNotes() {
        List<String> all = new ArrayList<>();
        String words = plan.runs().words();
        String area = plan.heatedArea().isPresent()
                ? ", heated area " + Figures.rounded(plan.heatedArea().getAsDouble(), 1) + "\u00a0m²"
                : "";
        all.add(words + area + "; " + Figures.thickness(plan.runs().clearance()) + " clear of walls"
                + (plan.units().isEmpty() ? "." : " and hatched units."));
        if (each > 1) {
            all.add(each == 2 ? "Every second run is drawn." : "One run in " + each + " is drawn.");
        }
        all.addAll(lettering.notes());
        return all;
    }

    private String runsInWords() {
        return plan.runs().spacing().isPresent()
                ? " Runs at " + Figures.thickness(plan.runs().spacing().getAsDouble()) + ", indicative, in "
                        + plan.loops() + (plan.loops() == 1 ? " loop." : " loops.")
                : "";
    }

    private String description() {
        String units = plan.units().stream().map(FixedUnit::name).collect(Collectors.joining(", "));
        String zone = plan.zone()
                .map(strip -> " Along " + strip.sides().size() + " walls a peripheral zone "
                        + Figures.metres(strip.depth()) + " deep with runs at "
                        + Figures.thickness(strip.spacing()) + ".")
                .orElse("");
        return "A floor " + Figures.metres(plan.width()) + " by " + Figures.metres(plan.length()) + ". Not heated: "
                + (units.isEmpty() ? "nothing" : units) + "." + runsInWords() + zone + " "
                + String.join(" ", allNotes());
    }
}
