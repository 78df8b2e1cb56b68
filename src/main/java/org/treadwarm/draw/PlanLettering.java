package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * The lettering within a floor plan: each piece where it belongs, or as near to it as it meets nothing else.
 *
 * <p>It is placed before the runs are drawn, as they are broken for it, and drawn after them.
 */
final class PlanLettering {
    private static final double PAD = 4;
    private static final double BALLOON = 22;
    private static final double RADIUS = 10;
    /** Widths to which words are broken, the widest that fits first. */
    private static final List<Double> WIDTHS = List.of(400.0, 180.0, 120.0, 90.0, 66.0);

    private final Canvas canvas;
    private final FloorPlanStrip plan;
    private final PlanAreas areas;
    private final Clearing clearing;
    private final List<String> notes = new ArrayList<>();
    private final List<Runnable> drawn = new ArrayList<>();

    PlanLettering(Canvas canvas, FloorPlanStrip plan, PlanAreas areas, Clearing clearing) {
        this.canvas = canvas;
        this.plan = plan;
        this.areas = areas;
        this.clearing = clearing;
    }

    /** Finds the places; what comes first has the better ones. */
    void place() {
        plan.mark().ifPresent(this::mark);
        units();
        loopNumbers();
        plan.zone().ifPresent(this::zone);
        runs();
    }

    void draw() {
        drawn.forEach(Runnable::run);
    }

    /** What letters mean, and what had no room in the plan. */
    List<String> notes() {
        return List.copyOf(notes);
    }

    private void mark(PlanMark mark) {
        Box room = areas.room();
        Point at = new Point(room.x() + mark.x() * areas.scale(), room.y() + mark.y() * areas.scale());
        String words = mark.kind().words();
        Optional<Box> place = clearing.inSight(at, BALLOON, room.grown(-2));
        if (place.isPresent()) {
            Point middle = led(at, place.get());
            drawn.add(() -> {
                canvas.rectangle(place.get().grown(-1), Palette.PAPER, Stroke.HEAVY);
                canvas.text(middle, mark.kind().letter(), TextStyle.STRONG.at(TextStyle.Anchor.MIDDLE));
            });
            notes.add(mark.kind().letter() + ": " + words + ".");
        } else {
            notes.add("Not marked: " + words + ", " + Figures.metres(mark.x()) + " from the left and "
                    + Figures.metres(mark.y()) + " from the top.");
        }
    }

    /** Leads from a place to the rim of its balloon, unless that stands on it; returns the balloon's middle. */
    private Point led(Point from, Box balloon) {
        Point middle = new Point(balloon.middleX(), balloon.middleY());
        double length = Math.hypot(middle.x() - from.x(), middle.y() - from.y());
        if (length > RADIUS) {
            double share = 1 - RADIUS / length;
            Point rim =
                    new Point(from.x() + share * (middle.x() - from.x()), from.y() + share * (middle.y() - from.y()));
            clearing.line(List.of(from, rim));
            drawn.add(() -> {
                canvas.line(from, rim, Stroke.LEADER);
                canvas.circle(from, 3, Palette.INK, Stroke.NONE);
            });
        }
        return middle;
    }

    /** Each by its name, or by a letter where it is too small for its name. */
    private void units() {
        char letter = 'A';
        for (FixedUnit unit : plan.units()) {
            Box box = areas.box(unit).grown(-1);
            Point middle = new Point(box.middleX(), box.middleY());
            if (!written(unit.name(), middle, List.of(box), box.width() - PAD)) {
                String sign = String.valueOf(letter);
                Optional<Box> place =
                        clearing.inSight(middle, BALLOON, areas.room().grown(-2));
                if (place.isPresent()) {
                    Point at = led(middle, place.get());
                    drawn.add(() -> {
                        canvas.circle(at, RADIUS, Palette.PAPER, Stroke.THIN);
                        canvas.text(at, sign, TextStyle.PLAIN.at(TextStyle.Anchor.MIDDLE));
                    });
                    notes.add(sign + ": " + unit.name() + ".");
                    letter++;
                } else {
                    notes.add("No room for a letter at: " + unit.name() + ".");
                }
            }
        }
    }

    private void loopNumbers() {
        List<Box> parts = areas.loops();
        if (parts.size() == 1) {
            return;
        }
        for (int i = 0; i < parts.size(); i++) {
            Box part = parts.get(i);
            int number = i + 1;
            Point start = areas.loopsAcross()
                    ? new Point(part.middleX(), part.y() + BALLOON)
                    : new Point(part.x() + BALLOON, part.middleY());
            clearing.near(start, BALLOON, BALLOON, part)
                    .ifPresent(box -> drawn.add(
                            () -> LayerNumbers.balloon(canvas, new Point(box.middleX(), box.middleY()), number)));
        }
        notes.add("Loops 1 " + (parts.size() == 2 ? "and " : "to ") + parts.size() + " are equal strips, numbered from "
                + (areas.loopsAcross() ? "the left." : "the top."));
    }

    private void zone(PeripheralZone zone) {
        String words = "peripheral zone, runs at " + Figures.thickness(zone.spacing());
        double width = areas.strips().stream().mapToDouble(Box::width).max().orElse(0);
        Box first = areas.strips().get(0);
        if (!written(words, new Point(first.middleX(), first.middleY()), areas.strips(), width)) {
            notes.add("Beyond the dashed line: " + words + ".");
        }
    }

    private void runs() {
        if (plan.runs().spacing().isEmpty()) {
            return;
        }
        String words = "uns at " + Figures.thickness(plan.runs().spacing().getAsDouble()) + ", indicative";
        Box inner = areas.inner();
        Point middle = new Point(inner.middleX(), inner.middleY());
        if (!written("r" + words, middle, List.of(inner), inner.width())) {
            notes.add("R" + words + ".");
        }
    }

    /** Writes words near a place within one of the rooms, in as few lines as fit; false if they do not. */
    private boolean written(String words, Point wanted, List<Box> rooms, double widest) {
        for (double width : WIDTHS) {
            Label label = Label.empty().and(words, Math.min(width, widest), TextStyle.PLAIN);
            for (Box room : cut(label, words) ? List.<Box>of() : rooms) {
                Optional<Box> place = clearing.near(wanted, label.width() + PAD, label.height() + 2, room);
                if (place.isPresent()) {
                    Box box = place.get();
                    drawn.add(() -> {
                        canvas.rectangle(box, Palette.PAPER, Stroke.NONE);
                        canvas.label(new Point(box.middleX(), box.middleY()), label, TextStyle.Anchor.MIDDLE);
                    });
                    return true;
                }
            }
        }
        return false;
    }

    /** Whether a word had to be cut to fit the width. */
    private static boolean cut(Label label, String words) {
        List<String> lines = label.lines().stream().map(Label.Line::text).toList();
        return !String.join(" ", lines).equals(words.strip().replaceAll("\\s+", " "));
    }
}
