package org.treadwarm.web.pages;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.Collectors;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.LoopValve;
import org.treadwarm.sizing.Sizing.PartLimit;
import org.treadwarm.sizing.Sizing.PartLoops;
import org.treadwarm.sizing.Sizing.PartSizing;
import org.treadwarm.sizing.Sizing.PartState;
import org.treadwarm.sizing.Sizing.PracticeJudgement;
import org.treadwarm.sizing.Sizing.Total;
import org.treadwarm.sizing.Sizing.WarmUpSizing;
import org.treadwarm.sizing.Sizing.WaterLayout;
import org.treadwarm.sizing.Sizing.WaterTotal;
import org.treadwarm.sizing.Verdict;
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
        lines.parts(floor);
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
        if (layout.parts().isEmpty()) {
            loops(lines, "", layout.loops(), layout.loopLength(), layout.massFlow(), layout.volumeFlow());
            drop(lines, "", layout.pressureDrop(), layout.velocity(), layout.reynolds());
            total.water().ifPresent(water -> valve(lines, room, "", water));
        }
        for (PartLoops part : layout.parts()) {
            String of = ", " + part.name();
            double volumeFlow = part.massFlow() * layout.volumeFlow() / layout.massFlow();
            loops(lines, of, part.loops(), part.loopLength(), part.massFlow(), volumeFlow);
            drop(lines, of, part.pressureDrop(), part.velocity(), part.reynolds());
            total.water().ifPresent(water -> valve(lines, room, part.name(), water));
        }
        lines.add(line("Flow of the room", 60_000 * layout.volumeFlow(), 2, "l/min", ""));
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
        for (PartLoops part : layout.parts()) {
            limits(
                    lines,
                    part.limits().stream()
                            .map(limit -> named(limit, part.name()))
                            .toList());
        }
        layouts.add(
                new Layout(
                        "Warm-water layout",
                        lines,
                        "Drops are of straight pipe without bends, fittings and manifold; state the drops of manifold and heat source to have the pump's pressure with them. Flush, vent and test the pressure before the floor"
                                + " is covered; heat a screed up by its maker's rules; protect against frost when switched off."));
    }

    private static void loops(
            List<Line> lines, String of, int count, double length, double massFlow, double volumeFlow) {
        lines.add(line("Loops" + of, count, 0, "", "of " + Numbers.fixed(length, 1) + " m each, feeders included"));
        lines.add(line(
                "Flow of one loop" + of,
                60_000 * volumeFlow / count,
                2,
                "l/min",
                Numbers.fixed(3600 * massFlow / count, 1) + " kg/h"));
    }

    private static void drop(List<Line> lines, String of, double drop, double velocity, double reynolds) {
        lines.add(line(
                "Drop of one loop" + of,
                drop / 1000,
                2,
                "kPa",
                "straight pipe; " + Numbers.fixed(velocity, 2) + " m/s, Re " + Numbers.fixed(reynolds, 0)));
    }

    private static PracticeJudgement named(PracticeJudgement limit, String part) {
        return new PracticeJudgement(
                limit.name() + ", " + part,
                limit.sense(),
                limit.value(),
                limit.limit(),
                limit.margin(),
                limit.source());
    }

    /** What each part of the floor gives: at the required flux, or at the carrying flux when that is less. */
    private void parts(FloorSizing floor) {
        if (floor.parts().isEmpty()) {
            return;
        }
        boolean carries = floor.verdict() == Verdict.CARRIES;
        List<Line> lines = new ArrayList<>();
        for (PartSizing part : floor.parts()) {
            PartState state = carries ? part.atRequiredFlux() : part.atCarryingFlux();
            lines.add(new Line(
                    capital(part.name()),
                    Numbers.fixed(state.flux(), 1) + " W/m²",
                    part.zone() + " of " + Numbers.fixed(part.area(), 1) + " m², spacing "
                            + Numbers.fixed(1000 * part.spacing(), 0) + " mm; warmest point "
                            + Numbers.fixed(state.surfaceTemperature(), 1) + " °C, "
                            + Numbers.fixed(state.downwardFlux(), 1) + " W/m² down"));
            part.limits().stream()
                    .min(Comparator.comparingDouble(PartLimit::maximumFlux))
                    .ifPresent(lowest -> lines.add(new Line(
                            capital(part.name()) + " may give",
                            Numbers.fixed(lowest.maximumFlux(), 1) + " W/m²",
                            "by its lowest limit, " + lowest.name())));
        }
        layouts.add(new Layout(
                "Parts of the floor",
                lines,
                "All parts are fed alike, and the floor gives their mean over its area: here "
                        + (carries ? "the required flux" : "the carrying flux, which is too little")
                        + ". A peripheral strip is at most 1 m wide, along outer walls (EN 1264-3)."));
    }

    private static String capital(String text) {
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

    private static String governed(String room, Total total) {
        return total.water()
                .map(water -> water.governingRoom().equals(room)
                        ? "this room governs the job"
                        : water.governingRoom() + " governs the job")
                .orElse("");
    }

    private static void valve(List<Line> lines, String room, String part, WaterTotal water) {
        water.valves().stream()
                .filter(valve ->
                        valve.room().equals(room) && valve.part().orElse("").equals(part))
                .findFirst()
                .map(LoopValve::throttled)
                .ifPresent(throttled -> lines.add(line(
                        "To be throttled at each valve" + (part.isEmpty() ? "" : ", " + part),
                        throttled / 1000,
                        2,
                        "kPa",
                        water.manifolds().size() > 1
                                ? "against the worst loop of its manifold"
                                : "against the worst loop of the job")));
    }

    /** One line for each quantity, with every limit of practice beside it. */
    static void limits(List<Line> lines, List<PracticeJudgement> limits) {
        Map<String, List<PracticeJudgement>> byName = new LinkedHashMap<>();
        limits.forEach(limit ->
                byName.computeIfAbsent(limit.name(), name -> new ArrayList<>()).add(limit));
        byName.forEach((name, of) -> {
            boolean kept = of.stream().allMatch(limit -> limit.margin() >= 0);
            String all = of.stream()
                    .map(limit -> limit.sense().orElse("limit") + " " + shown(name, limit.limit()) + ", "
                            + limit.source()
                            + (limit.margin() < 0 ? ": beyond it" : ""))
                    .collect(Collectors.joining("; "));
            lines.add(
                    new Line(capital(name), shown(name, of.get(0).value()), (kept ? "kept: " : "look again: ") + all));
        });
    }

    private static String shown(String name, double value) {
        return switch (name.split(", ", 2)[0]) {
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
