package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.stream.Collectors;

/** Draws the foot of an outer wall in section: its materials, to scale, and the isotherms through them. */
public final class FootDrawing {
    private static final double MARGIN = 12;
    private static final double NUMBERS = 40;
    private static final double HEAD = 44;
    private static final double LABELS = 14;
    private static final Stroke PLANE = new Stroke(Palette.ACCENT, 3, "");
    private static final String PERCENT = "\u00a0%";

    private final Canvas canvas;
    private final Sheet sheet;
    private final FootSection section;
    private final FootScale scale;
    private final IsothermLevels levels;

    private FootDrawing(Sheet sheet, FootSection section) {
        this.canvas = new Canvas(sheet);
        this.sheet = sheet;
        this.section = section;
        double left = MARGIN + NUMBERS;
        double width = sheet.width() - left - (sheet.roomy() ? 150 : 124);
        this.scale = FootScale.fitting(section, left, HEAD, width, sheet.roomy() ? 540 : 380);
        this.levels = IsothermLevels.between(0, 100);
    }

    /** The drawing as SVG text. */
    public static String draw(Sheet sheet, FootSection section) {
        return new FootDrawing(sheet, section).draw();
    }

    private String draw() {
        materials();
        Dimension.over(
                canvas, scale.inner(), scale.outer(), HEAD - 12, "wall " + Figures.thickness(section.wallThickness()));
        SideLabels labels = new SideLabels(scale.frame().right() + LABELS, sheet.width() - MARGIN);
        IsothermLines.Drawn drawn = isotherms(labels);
        planes();
        words(drawn);
        heights(labels);
        double bottom = Math.max(scale.frame().bottom(), HEAD + labels.height());
        labels.draw(canvas, HEAD, bottom);
        double foot = key(notes(bottom + 14, drawn.unlabelled()) + 14);
        return canvas.write(foot, "Wall foot in section: " + section.name(), description());
    }

    private void materials() {
        scale.soil().forEach(box -> canvas.rectangle(box, canvas.hatch(MaterialFamily.GROUND), Stroke.NONE));
        for (LayerSpan span : scale.slab()) {
            canvas.rectangle(floor(span), canvas.hatch(span.layer().family()), Stroke.OUTLINE);
        }
        fill(scale.foundation(), MaterialFamily.CONCRETE_SCREED);
        fill(scale.wall(), section.wall().family());
        scale.edge().forEach(box -> fill(box, MaterialFamily.INSULATION));
        double bottom = scale.frame().bottom();
        Plane numbers = new Plane(true, new Point(scale.left(), 0));
        LayerNumbers.draw(canvas, numbers, scale.slab(), 0, HEAD, Math.max(bottom, HEAD + numbered()));
    }

    private double numbered() {
        return section.slab().size() * LayerNumbers.PITCH;
    }

    private Box floor(LayerSpan span) {
        return new Box(scale.left(), span.start(), scale.inner() - scale.left(), span.end() - span.start());
    }

    private void fill(Box box, MaterialFamily family) {
        canvas.rectangle(box, canvas.hatch(family), Stroke.OUTLINE);
    }

    private List<Box> outlines() {
        List<Box> outlines =
                new ArrayList<>(scale.slab().stream().map(this::floor).toList());
        outlines.add(scale.wall());
        outlines.add(scale.foundation());
        outlines.addAll(scale.edge());
        return outlines;
    }

    private IsothermLines.Drawn isotherms(SideLabels labels) {
        Isolines isolines = new Isolines(scale.columns(), scale.rows(), scale.values());
        Map<Double, List<List<Point>>> lines = new LinkedHashMap<>();
        levels.values().forEach(level -> lines.put(level, isolines.at(level)));
        List<Box> taken = new ArrayList<>(List.of(scale.inside(), scale.outside()));
        outlines().forEach(box -> sides(box, taken));
        return new IsothermLines(canvas, scale.frame(), lines, levels::text, PERCENT)
                .draw(scale.outer(), taken, outlines(), labels);
    }

    private static void sides(Box box, List<Box> taken) {
        taken.add(new Box(box.x(), box.y(), box.width(), 1));
        taken.add(new Box(box.x(), box.bottom(), box.width(), 1));
        taken.add(new Box(box.x(), box.y(), 1, box.height()));
        taken.add(new Box(box.right(), box.y(), 1, box.height()));
    }

    private void planes() {
        double strip = scale.edge().stream().mapToDouble(Box::width).sum();
        if (section.above() > 0) {
            double y = scale.surface();
            canvas.line(new Point(scale.left(), y), new Point(scale.inner(), y), Stroke.GUIDE);
        }
        canvas.line(
                new Point(scale.outer(), scale.ground()),
                new Point(scale.frame().right(), scale.ground()),
                Stroke.HEAVY);
        canvas.line(new Point(scale.left(), scale.plane()), new Point(scale.inner() - strip, scale.plane()), PLANE);
    }

    /** Names what is seen, where there is room for the word. */
    private void words(IsothermLines.Drawn drawn) {
        Box air = scale.inside();
        word("inside", new Box(air.x(), air.y(), air.width(), scale.surface() - air.y()));
        word("outdoors", scale.outside());
        Clearing clearing = new Clearing();
        drawn.pieces().forEach(clearing::line);
        drawn.numbers().forEach(clearing::take);
        outlines().forEach(clearing::outline);
        Box beside = scale.soil().get(1);
        Box outside = Box.between(
                new Point(beside.x(), beside.y()),
                new Point(beside.right(), scale.frame().bottom()));
        double width = Lettering.width("ground", false) + 6;
        clearing.near(new Point(outside.middleX(), outside.middleY()), width, 18, outside.grown(-3))
                .ifPresent(box -> {
                    canvas.rectangle(box, Palette.PAPER, Stroke.NONE);
                    canvas.text(
                            new Point(box.middleX(), box.middleY()),
                            "ground",
                            TextStyle.PLAIN.at(TextStyle.Anchor.MIDDLE));
                });
    }

    private void word(String word, Box room) {
        if (Lettering.width(word, false) + 4 < room.width() && room.height() > TextStyle.LINE_HEIGHT) {
            canvas.text(
                    new Point(room.middleX(), room.y() + Math.min(room.height(), 60) / 2),
                    word,
                    TextStyle.PLAIN.at(TextStyle.Anchor.MIDDLE));
        }
    }

    private void heights(SideLabels labels) {
        double x = scale.frame().right() + LABELS - 6;
        if (section.heatedPlane() > 0) {
            Dimension.down(canvas, x, scale.plane(), scale.ground());
            labels.add(
                    (scale.plane() + scale.ground()) / 2,
                    "heated plane above ground",
                    Figures.thickness(section.heatedPlane()));
        }
        if (section.foundation() > 0 && section.showsFoundation()) {
            Dimension.down(canvas, x, scale.ground(), scale.footing());
            labels.add((scale.ground() + scale.footing()) / 2, "foundation", Figures.thickness(section.foundation()));
        }
    }

    private double notes(double from, List<String> unlabelled) {
        double width = sheet.width() - 2 * MARGIN;
        Label label = Label.empty().and(isothermWords(), width, TextStyle.PLAIN);
        if (!unlabelled.isEmpty()) {
            label = label.and(
                    "Close together, without a number: " + String.join(", ", unlabelled) + " %.",
                    width,
                    TextStyle.PLAIN);
        }
        label = label.and(cutWords(), width, TextStyle.QUIET);
        canvas.label(new Point(MARGIN, from + label.height() / 2), label, TextStyle.Anchor.START);
        return from + label.height();
    }

    private String isothermWords() {
        List<Double> values = levels.values();
        return "Lines of equal temperature every " + levels.text(levels.step()) + " %, from "
                + levels.text(values.get(0)) + " to "
                + levels.text(values.get(values.size() - 1))
                + " % of the difference between inside, 100 %, and outdoors, 0 %.";
    }

    private String cutWords() {
        String foundation = section.foundation() == 0 || section.showsFoundation()
                ? ""
                : " The foundation goes on to " + Figures.metres(section.foundation()) + " below the ground.";
        return "To scale. Only the junction is shown of a section that reaches farther." + foundation
                + (section.above() > 0 ? " Dotted: the finished surface." : "");
    }

    private double key(double from) {
        LayerKey key = new LayerKey(canvas, new Box(MARGIN, from, sheet.width() - 2 * MARGIN, 0));
        double y = key.draw(
                scale.slab(),
                scale.slab().stream().map(span -> List.<String>of()).toList());
        y = row(key, y, section.wall(), "as one material");
        if (section.heatedPlane() + section.foundation() > 0) {
            y = key.row(y, MaterialFamily.CONCRETE_SCREED, "foundation", List.of(section.footWords()));
        }
        for (FootSection.EdgeStrip strip : section.edge().stream().toList()) {
            y = row(key, y, strip.layer(), Figures.thickness(strip.depth()) + " deep");
        }
        return key.row(y, MaterialFamily.GROUND, "ground", List.of(section.soilWords()));
    }

    private static double row(LayerKey key, double y, Layer layer, String added) {
        return key.row(
                y,
                layer.family(),
                layer.name(),
                List.of(
                        Figures.thickness(layer.thickness().orElseThrow()),
                        Figures.resistance(layer.resistance()),
                        added));
    }

    private String description() {
        String slab = section.slab().stream()
                .map(layer ->
                        layer.name() + " " + Figures.thickness(layer.thickness().orElseThrow()))
                .collect(Collectors.joining(", "));
        String edge = section.edge()
                .map(strip -> "Upright at the floor's edge: " + strip.layer().name() + " "
                        + Figures.thickness(strip.layer().thickness().orElseThrow()) + ", "
                        + Figures.thickness(strip.depth()) + " deep. ")
                .orElse("No edge insulation. ");
        return "Inside at the left, outdoors at the right of the "
                + section.wall().name() + ", "
                + Figures.thickness(section.wallThickness()) + ". Below the heated plane: " + slab
                + ", then ground. The heated plane lies " + Figures.thickness(section.heatedPlane())
                + " above the ground outside; the foundation reaches " + Figures.thickness(section.foundation())
                + " below it. " + edge + isothermWords();
    }
}
