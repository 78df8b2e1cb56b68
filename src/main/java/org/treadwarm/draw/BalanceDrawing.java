package org.treadwarm.draw;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;

/**
 * Draws a room's heat balance: what goes out by which path against where it comes from, two columns to one scale.
 *
 * <p>Gains stand at the foot of the second column, for they bring heat in as the floor does.
 */
public final class BalanceDrawing {
    private static final double HEAD = 66;
    private static final double GAP = 10;
    /** Above this the numbers are wider than the gap between the columns; the blocks still carry theirs. */
    private static final double AXIS_LIMIT = 100_000;

    private final Canvas canvas;
    private final Balance balance;
    private final BalanceBlocks blocks;
    private final BalanceLayout layout;
    private final double height;

    private BalanceDrawing(Sheet sheet, Balance balance) {
        this.canvas = new Canvas(sheet);
        this.balance = balance;
        this.blocks = BalanceBlocks.of(balance);
        this.layout = BalanceLayout.on(sheet);
        this.height = Math.max(layout.leastHeight(), Math.max(needed(blocks.out()), needed(blocks.in())));
    }

    /** The drawing as SVG text. */
    public static String draw(Sheet sheet, Balance balance) {
        return new BalanceDrawing(sheet, balance).draw();
    }

    private String draw() {
        heads();
        column(blocks.out(), layout.outColumn(), layout.outLabels(), TextStyle.Anchor.END);
        column(blocks.in(), layout.inColumn(), layout.inLabels(), TextStyle.Anchor.START);
        if (layout.axis() && blocks.highest() > 0 && blocks.highest() < AXIS_LIMIT) {
            axis();
        }
        double foot = HEAD + height;
        canvas.line(
                new Point(layout.outColumn(), foot), new Point(layout.inColumn() + layout.bar(), foot), Stroke.HEAVY);
        double bottom = notes(foot + 26);
        return canvas.write(bottom, "Heat balance of " + balance.room(), description());
    }

    private void heads() {
        double middle = layout.middle();
        Label out = Label.empty()
                .and("Heat out", layout.headWidth(), TextStyle.PLAIN)
                .and(Figures.watts(balance.outWatts()), layout.headWidth(), TextStyle.STRONG);
        Label in = Label.empty()
                .and("Heat to come in", layout.headWidth(), TextStyle.PLAIN)
                .and(Figures.watts(BalanceBlocks.watts(blocks.in())), layout.headWidth(), TextStyle.STRONG);
        canvas.label(new Point(middle - 12, 28), out, TextStyle.Anchor.END);
        canvas.label(new Point(middle + 12, 28), in, TextStyle.Anchor.START);
    }

    private void column(List<Block> column, double x, double labelX, TextStyle.Anchor anchor) {
        List<Double> centres = centres(column);
        List<Double> labels = PushApart.centres(wishes(column), HEAD, HEAD + height);
        double labelSide = anchor == TextStyle.Anchor.END ? x : x + layout.bar();
        for (int i = 0; i < column.size(); i++) {
            Block block = column.get(i);
            double tall = block.watts() * scale();
            Box box = new Box(x, centres.get(i) - tall / 2, layout.bar(), tall);
            canvas.rectangle(box, fill(block.look()), stroke(block.look()));
            leader(new Point(labelSide, centres.get(i)), new Point(labelX, labels.get(i)));
            double gap = anchor == TextStyle.Anchor.END ? -4 : 4;
            canvas.label(new Point(labelX + gap, labels.get(i)), block.label(layout.labelWidth()), anchor);
        }
    }

    private void leader(Point block, Point label) {
        double knee = (label.x() - block.x()) / 3;
        canvas.polyline(
                List.of(block, new Point(block.x() + knee, block.y()), new Point(label.x() - knee, label.y()), label),
                Stroke.LEADER);
    }

    private void axis() {
        Ticks ticks = Ticks.around(0, blocks.highest(), 5);
        double left = layout.outColumn() + layout.bar();
        for (double watts : ticks.values()) {
            double y = HEAD + height - watts * scale();
            if (watts <= blocks.highest()) {
                canvas.line(new Point(left, y), new Point(left + 6, y), Stroke.THIN);
                canvas.line(new Point(layout.inColumn() - 6, y), new Point(layout.inColumn(), y), Stroke.THIN);
                String text = watts == 0 ? "0 W" : ticks.text(watts);
                canvas.text(
                        new Point(layout.middle(), watts == 0 ? y - 10 : y),
                        text,
                        TextStyle.QUIET.at(TextStyle.Anchor.MIDDLE));
            }
        }
    }

    private double notes(double top) {
        Label label = Label.empty();
        for (String note : BalanceNotes.of(balance, blocks)) {
            label = label.and(note, layout.noteWidth(), TextStyle.PLAIN);
        }
        canvas.label(new Point(BalanceLayout.MARGIN, top + label.height() / 2), label, TextStyle.Anchor.START);
        return top + label.height() + 10;
    }

    private List<Double> centres(List<Block> column) {
        List<Double> centres = new ArrayList<>();
        double y = HEAD + height - BalanceBlocks.watts(column) * scale();
        for (Block block : column) {
            centres.add(y + block.watts() * scale() / 2);
            y += block.watts() * scale();
        }
        return centres;
    }

    private List<PushApart.Wish> wishes(List<Block> column) {
        List<Double> centres = centres(column);
        List<PushApart.Wish> wishes = new ArrayList<>();
        for (int i = 0; i < column.size(); i++) {
            wishes.add(new PushApart.Wish(centres.get(i), size(column.get(i))));
        }
        return wishes;
    }

    private double needed(List<Block> column) {
        return column.stream().mapToDouble(this::size).sum();
    }

    private double size(Block block) {
        return block.label(layout.labelWidth()).height() + GAP;
    }

    private double scale() {
        return blocks.highest() > 0 ? height / blocks.highest() : 0;
    }

    private String fill(Block.Look look) {
        return switch (look) {
            case LOSS -> Palette.PALE_NEUTRAL;
            case GAIN -> canvas.gainHatch();
            case FLOOR -> Palette.PALE_ACCENT;
            case MISSING -> Palette.NONE;
        };
    }

    private static Stroke stroke(Block.Look look) {
        return look == Block.Look.MISSING ? Stroke.DASHED : Stroke.OUTLINE;
    }

    private String description() {
        String paths = balance.paths().stream()
                .map(path -> path.label() + " " + Figures.watts(path.watts()))
                .collect(Collectors.joining(", "));
        String supply = blocks.in().stream()
                .filter(block -> block.look() != Block.Look.GAIN)
                .map(block -> (block.name() + " " + block.figures() + " " + block.remark()).strip())
                .collect(Collectors.joining(", "));
        return "To be supplied: " + Figures.watts(balance.totalWatts()) + ". By path: " + paths + ". Supply: " + supply
                + ".";
    }
}
