package org.treadwarm.web.pages;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.PartLimit;
import org.treadwarm.sizing.Sizing.PartSizing;
import org.treadwarm.sizing.Sizing.PartState;
import org.treadwarm.sizing.Sizing.PracticeJudgement;
import org.treadwarm.sizing.Sizing.Total;
import org.treadwarm.sizing.Sizing.WarmUpSizing;
import org.treadwarm.sizing.Verdict;
import org.treadwarm.units.Numbers;
import org.treadwarm.web.pages.Answer.Line;

/** What a fitter needs to feed a floor: elements and circuits, or loops and their valves. */
final class LayoutLines {
    private final List<Layout> layouts = new ArrayList<>();

    /**
     * A headed table of lines, with a sentence below it.
     *
     * @param summary a sentence above it, or empty
     * @param grid a table of several columns; without rows there is none
     * @param more lines of less weight
     */
    public record Layout(String title, String summary, List<Line> lines, Grid grid, List<Line> more, String note) {
        Layout(String title, List<Line> lines, String note) {
            this(title, "", lines, NO_GRID, List.of(), note);
        }

        /** How many of the lesser lines ask to be looked at again, in words. */
        public String judged() {
            long again = more.stream()
                    .filter(line -> line.note().startsWith(LOOK_AGAIN))
                    .count();
            boolean limits = more.stream().anyMatch(line -> line.note().startsWith(KEPT));
            return again > 0
                    ? "Limits of practice: " + again + " to look at again"
                    : limits ? "Limits of practice: all kept" : "What limits them";
        }

        /** Whether a line asks to be looked at again. */
        public boolean isDoubtful() {
            return more.stream().anyMatch(line -> line.note().startsWith(LOOK_AGAIN));
        }
    }

    /** A table of several columns; the first head is that of the rows' names. */
    public record Grid(String title, List<String> heads, List<Row> rows) {}

    /** A row of a table of several columns. */
    public record Row(String name, List<String> cells) {}

    private static final Grid NO_GRID = new Grid("", List.of(), List.of());
    private static final String KEPT = "kept: ";
    private static final String LOOK_AGAIN = "look again: ";

    private LayoutLines() {}

    static List<Layout> of(String room, FloorSizing floor, Total total) {
        LayoutLines lines = new LayoutLines();
        lines.parts(floor);
        floor.electric().ifPresent(layout -> lines.layouts.add(ElectricLines.of(layout, floor)));
        floor.water().ifPresent(layout -> lines.layouts.add(WaterLines.of(room, layout, total)));
        floor.warmup().ifPresent(lines::warmUp);
        return List.copyOf(lines.layouts);
    }

    /** What each part of the floor gives: at the required flux, or at the carrying flux when that is less. */
    private void parts(FloorSizing floor) {
        if (floor.parts().isEmpty()) {
            return;
        }
        boolean carries = floor.verdict() == Verdict.CARRIES;
        Function<PartSizing, PartState> state = carries ? PartSizing::atRequiredFlux : PartSizing::atCarryingFlux;
        List<String> heads = new ArrayList<>(List.of("Part"));
        floor.parts().forEach(part -> heads.add(part.name()));
        List<Row> rows = List.of(
                row(floor, "Zone", PartSizing::zone),
                row(floor, "Area, m²", part -> Numbers.fixed(part.area(), 1)),
                row(floor, "Spacing, mm", part -> Numbers.fixed(1000 * part.spacing(), 0)),
                row(
                        floor,
                        "Gives, W/m²",
                        part -> Numbers.fixed(state.apply(part).flux(), 1)),
                row(
                        floor,
                        "Warmest point, °C",
                        part -> Numbers.fixed(state.apply(part).surfaceTemperature(), 1)),
                row(floor, "Down, W/m²", part -> Numbers.fixed(state.apply(part).downwardFlux(), 1)));
        layouts.add(new Layout(
                "Parts of the floor",
                "",
                List.of(),
                new Grid("Parts of the floor", heads, rows),
                floor.parts().stream().flatMap(part -> lowest(part).stream()).toList(),
                "All parts are fed alike, and the floor gives their mean over its area: here "
                        + (carries ? "the required flux" : "the carrying flux, which is too little")
                        + ". A peripheral strip is at most 1 m wide, along outer walls (EN 1264-3)."));
    }

    private static Row row(FloorSizing floor, String name, Function<PartSizing, String> cell) {
        return new Row(name, floor.parts().stream().map(cell).toList());
    }

    private static Optional<Line> lowest(PartSizing part) {
        return part.limits().stream()
                .min(Comparator.comparingDouble(PartLimit::maximumFlux))
                .map(limit -> new Line(
                        capital(part.name()) + " may give",
                        Numbers.fixed(limit.maximumFlux(), 1) + " W/m²",
                        "by its lowest limit, " + limit.name()));
    }

    static String capital(String text) {
        return text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
    }

    private void warmUp(WarmUpSizing found) {
        List<Line> lines = new ArrayList<>();
        lines.add(
                line("Setback", found.from(), 1, "°C", "warm again within " + Numbers.fixed(found.within(), 1) + " h"));
        lines.add(line("Reheat", found.reheatFlux(), 1, "W/m²", "of heated floor, counted in the heat loss"));
        lines.add(line("Density needed", found.densityNeeded(), 0, "W/m²", "to be warm in that time"));
        lines.add(new Line(
                "Warm after",
                found.hours().isPresent() ? Numbers.fixed(found.hours().getAsDouble(), 1) + " h" : "not in 72 h",
                "at " + Numbers.fixed(found.density(), 0) + " W/m²"));
        lines.add(new Line(
                "Without power",
                found.hoursToFive().isPresent()
                        ? Numbers.fixed(found.hoursToFive().getAsDouble(), 0) + " h"
                        : "over 72 h",
                "until the room is at 5 °C"));
        lines.add(new Line(
                "Without power",
                found.hoursToFreezing().isPresent()
                        ? Numbers.fixed(found.hoursToFreezing().getAsDouble(), 0) + " h"
                        : "over 72 h",
                "until the heater plane is at 0 °C: water in pipes may freeze"));
        layouts.add(new Layout(
                "Warming up",
                lines,
                "On the design day, after a setback that has lasted. What the room holds is assumed (common practice, no source): "
                        + Numbers.fixed(found.airCapacity() / 1000, 1) + " kJ/(m²·K) with the air, "
                        + Numbers.fixed(found.massCapacity() / 1000, 0)
                        + " kJ/(m²·K) in walls and furniture, coupled by "
                        + Numbers.fixed(found.massCoupling(), 1) + " W/(m²·K), all per m² of heated floor."));
    }

    /** One line for each quantity, with every limit of practice beside it. */
    static void limits(List<Line> lines, List<PracticeJudgement> limits) {
        Map<String, List<PracticeJudgement>> byName = new LinkedHashMap<>();
        limits.forEach(limit ->
                byName.computeIfAbsent(limit.name(), name -> new ArrayList<>()).add(limit));
        byName.forEach((name, of) ->
                lines.add(new Line(capital(name), shown(name, of.get(0).value()), judged(name, of))));
    }

    /** What limits say of a quantity: each once, and whether a value is beyond it. */
    private static String judged(String name, List<PracticeJudgement> limits) {
        boolean kept = limits.stream().allMatch(limit -> limit.margin() >= 0);
        return opening(kept)
                + limits.stream()
                        .map(limit -> words(name, limit) + (limit.margin() < 0 ? ": beyond it" : ""))
                        .collect(Collectors.joining("; "));
    }

    static String opening(boolean kept) {
        return kept ? KEPT : LOOK_AGAIN;
    }

    /** A limit and where it comes from. */
    static String words(String name, PracticeJudgement limit) {
        return limit.sense().orElse("limit") + " " + shown(name, limit.limit()) + ", " + limit.source();
    }

    /** A value of a quantity that practice limits, with its unit. */
    static String shown(String name, double value) {
        return switch (name) {
            case "loop length" -> Numbers.fixed(value, 0) + " m";
            case "pressure drop" -> Numbers.fixed(value / 1000, 1) + " kPa";
            case "velocity" -> Numbers.fixed(value, 2) + " m/s";
            case "spread" -> Numbers.fixed(value, 1) + " K";
            case "supply temperature" -> Numbers.fixed(value, 1) + " °C";
            case "spacing" -> Numbers.fixed(1000 * value, 0) + " mm";
            case "density under timber" -> Numbers.fixed(value, 0) + " W/m²";
            case "power per metre under timber" -> Numbers.fixed(value, 1) + " W/m";
            default -> Numbers.fixed(value, 0);
        };
    }

    static Line line(String name, double value, int decimals, String unit, String note) {
        return new Line(name, Numbers.fixed(value, decimals) + (unit.isEmpty() ? "" : " " + unit), note);
    }
}
