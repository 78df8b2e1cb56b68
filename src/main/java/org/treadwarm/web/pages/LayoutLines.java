package org.treadwarm.web.pages;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.LoopValve;
import org.treadwarm.sizing.Sizing.PracticeJudgement;
import org.treadwarm.sizing.Sizing.Total;
import org.treadwarm.sizing.Sizing.WarmUpSizing;
import org.treadwarm.sizing.Sizing.WaterLayout;
import org.treadwarm.sizing.Sizing.WaterTotal;
import org.treadwarm.units.Numbers;
import org.treadwarm.web.pages.Answer.Line;

/** What a fitter needs to feed a floor: elements and circuits, or loops and their valves. */
final class LayoutLines {
    private final List<Layout> layouts = new ArrayList<>();

    /** A headed table of lines, with a sentence below it. */
    public record Layout(String title, List<Line> lines, String note) {}

    private LayoutLines() {}

    static List<Layout> of(String room, FloorSizing floor, Total total) {
        LayoutLines lines = new LayoutLines();
        floor.electric().ifPresent(layout -> lines.layouts.add(ElectricLines.of(layout, floor)));
        floor.water().ifPresent(layout -> lines.water(room, layout, total));
        floor.warmup().ifPresent(lines::warmUp);
        return List.copyOf(lines.layouts);
    }

    private void water(String room, WaterLayout layout, Total total) {
        List<Line> lines = new ArrayList<>();
        lines.add(line("Supply", layout.supplyTemperature(), 1, "°C", governed(room, total)));
        lines.add(line(
                "Return", layout.returnTemperature(), 1, "°C", "spread " + Numbers.fixed(layout.spread(), 1) + " K"));
        lines.add(line(
                "Loops",
                layout.loops(),
                0,
                "",
                "of " + Numbers.fixed(layout.loopLength(), 1) + " m each, feeders included"));
        lines.add(line(
                "Flow of one loop",
                60_000 * layout.volumeFlow() / layout.loops(),
                2,
                "l/min",
                Numbers.fixed(3600 * layout.massFlow() / layout.loops(), 1) + " kg/h"));
        lines.add(line("Flow of the room", 60_000 * layout.volumeFlow(), 2, "l/min", ""));
        lines.add(line(
                "Drop of one loop",
                layout.pressureDrop() / 1000,
                2,
                "kPa",
                "straight pipe; " + Numbers.fixed(layout.velocity(), 2) + " m/s, Re "
                        + Numbers.fixed(layout.reynolds(), 0)));
        total.water().ifPresent(water -> valve(lines, room, water));
        lines.add(line("Water in the loops", 1000 * layout.waterContent(), 1, "l", ""));
        layout.tableMeanOvertemperature()
                .ifPresent(table -> lines.add(line(
                        "Standard table method",
                        table,
                        1,
                        "K",
                        "mean over-temperature of the water by EN 1264-2 (from memory); the section says "
                                + Numbers.fixed(layout.meanOvertemperature(), 1) + " K, and is what is used")));
        limits(lines, layout.limits());
        layouts.add(
                new Layout(
                        "Warm-water layout",
                        lines,
                        "Drops are of straight pipe without bends, fittings and manifold. Flush, vent and test the pressure before the floor"
                                + " is covered; heat a screed up by its maker's rules; protect against frost when switched off."));
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

    private static String governed(String room, Total total) {
        return total.water()
                .map(water -> water.governingRoom().equals(room)
                        ? "this room governs the job"
                        : water.governingRoom() + " governs the job")
                .orElse("");
    }

    private static void valve(List<Line> lines, String room, WaterTotal water) {
        water.valves().stream()
                .filter(valve -> valve.room().equals(room))
                .findFirst()
                .map(LoopValve::throttled)
                .ifPresent(throttled -> lines.add(line(
                        "To be throttled at each valve",
                        throttled / 1000,
                        2,
                        "kPa",
                        "against the worst loop of the job")));
    }

    /** One line for each quantity, with every limit of practice beside it. */
    static void limits(List<Line> lines, List<PracticeJudgement> limits) {
        Map<String, List<PracticeJudgement>> byName = new LinkedHashMap<>();
        limits.forEach(limit ->
                byName.computeIfAbsent(limit.name(), name -> new ArrayList<>()).add(limit));
        byName.forEach((name, of) -> {
            boolean kept = of.stream().allMatch(limit -> limit.margin() >= 0);
            String all = of.stream()
                    .map(limit -> (isMost(limit) ? "at most " : "at least ") + shown(name, limit.limit()) + ", "
                            + limit.source()
                            + (limit.margin() < 0 ? ": beyond it" : ""))
                    .collect(Collectors.joining("; "));
            lines.add(new Line(
                    name.substring(0, 1).toUpperCase(Locale.ROOT) + name.substring(1),
                    shown(name, of.get(0).value()),
                    (kept ? "kept: " : "look again: ") + all));
        });
    }

    private static boolean isMost(PracticeJudgement limit) {
        return Math.abs(limit.limit() - limit.value() - limit.margin()) <= 1e-9 * Math.abs(limit.limit());
    }

    private static String shown(String name, double value) {
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
