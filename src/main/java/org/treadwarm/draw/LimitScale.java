package org.treadwarm.draw;

import java.util.List;
import java.util.stream.Collectors;

/**
 * Draws the limits of a floor's heat flux on one scale, with what is required and what can be carried as pointers and
 * the margin between them as a measured span.
 */
public final class LimitScale {
    private static final double MARGIN = 14;
    private static final double AXIS_GAP = 58;

    private final Canvas canvas;
    private final FluxScale scale;
    private final Sheet sheet;
    private final Ticks ticks;
    private final double left;
    private final double right;

    private LimitScale(Sheet sheet, FluxScale scale) {
        this.canvas = new Canvas(sheet);
        this.scale = scale;
        this.sheet = sheet;
        this.left = sheet.roomy() ? sheet.width() * 0.36 : MARGIN + 12;
        this.right = sheet.width() - (sheet.roomy() ? 160 : MARGIN + 18);
        this.ticks = scale.axis(sheet.roomy() ? 6 : 4);
    }

    /** The drawing as SVG text. */
    public static String draw(Sheet sheet, FluxScale scale) {
        return new LimitScale(sheet, scale).draw();
    }

    private String draw() {
        double axis = FluxPointers.draw(canvas, scale, this::x, new Box(MARGIN, 8, sheet.width() - 2 * MARGIN, 0));
        axis(axis);
        double y = axis + AXIS_GAP;
        for (FluxLimit limit : scale.limits()) {
            y = sheet.roomy() ? row(limit, y) : tallRow(limit, y);
        }
        return canvas.write(y + 6, "Heat flux limits of " + scale.floor(), description());
    }

    private void axis(double y) {
        canvas.line(new Point(left, y), new Point(right, y), Stroke.HEAVY);
        for (double flux : ticks.values()) {
            canvas.line(new Point(x(flux), y), new Point(x(flux), y + 6), Stroke.OUTLINE);
            canvas.text(new Point(x(flux), y + 17), ticks.text(flux), TextStyle.QUIET.at(TextStyle.Anchor.MIDDLE));
        }
        canvas.text(new Point(right, y + 36), "heat flux up, W/m²", TextStyle.QUIET.at(TextStyle.Anchor.END));
    }

    /** Name, bar and number beside each other. */
    private double row(FluxLimit limit, double top) {
        Label name = Label.empty().and(limit.name(), left - 2 * MARGIN, style(limit));
        double height = Math.max(name.height(), governing(limit).height()) + 14;
        double middle = top + height / 2;
        canvas.label(new Point(MARGIN, middle), name, TextStyle.Anchor.START);
        bar(limit, new Box(left, top, right - left, height));
        canvas.label(new Point(right + 20, middle), governing(limit), TextStyle.Anchor.START);
        return top + height;
    }

    /** Name and number above the bar. */
    private double tallRow(FluxLimit limit, double top) {
        Label number = governing(limit);
        double room = sheet.width() - 3 * MARGIN - number.width();
        Label name = Label.empty().and(limit.name(), room, style(limit));
        double height = Math.max(name.height(), number.height());
        canvas.label(new Point(MARGIN, top + name.height() / 2), name, TextStyle.Anchor.START);
        canvas.label(new Point(sheet.width() - MARGIN, top + number.height() / 2), number, TextStyle.Anchor.END);
        bar(limit, new Box(left, top + height, right - left, 24));
        return top + height + 34;
    }

    private static TextStyle style(FluxLimit limit) {
        return limit.governs() ? TextStyle.STRONG : TextStyle.PLAIN;
    }

    private Label governing(FluxLimit limit) {
        Label number = Label.empty().and(Figures.flux(limit.maximumFlux()), 140, style(limit));
        number = limit.governs() ? number.and("governs", 140, TextStyle.WARM) : number;
        return beyond(limit) ? number.and("beyond the scale", 140, TextStyle.QUIET) : number;
    }

    private boolean beyond(FluxLimit limit) {
        return limit.maximumFlux() > ticks.highest();
    }

    private void bar(FluxLimit limit, Box row) {
        guide(scale.requiredFlux(), row);
        guide(scale.carriedFlux(), row);
        Stroke stroke = limit.governs() ? new Stroke(Palette.INK, 3, "") : Stroke.OUTLINE;
        double end = beyond(limit) ? right + 10 : x(limit.maximumFlux());
        double y = row.middleY();
        canvas.line(new Point(x(0), y), new Point(end, y), stroke);
        if (beyond(limit)) {
            canvas.polyline(List.of(new Point(end - 7, y - 5), new Point(end, y), new Point(end - 7, y + 5)), stroke);
        } else {
            canvas.line(new Point(end, y - 9), new Point(end, y + 9), stroke);
        }
    }

    private void guide(double flux, Box row) {
        canvas.line(new Point(x(flux), row.y()), new Point(x(flux), row.bottom()), Stroke.GUIDE);
    }

    private double x(double flux) {
        return left + (flux - ticks.lowest()) / (ticks.highest() - ticks.lowest()) * (right - left);
    }

    private String description() {
        String limits = scale.limits().stream()
                .map(limit ->
                        limit.name() + " " + Figures.flux(limit.maximumFlux()) + (limit.governs() ? " (governs)" : ""))
                .collect(Collectors.joining(", "));
        return "Required " + Figures.flux(scale.requiredFlux()) + ", can carry " + Figures.flux(scale.carriedFlux())
                + ", " + FluxPointers.margin(scale) + ". Limits: " + limits + ".";
    }
}
