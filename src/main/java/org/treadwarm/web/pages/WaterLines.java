package org.treadwarm.web.pages;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.function.Function;
import java.util.stream.Collectors;
import org.treadwarm.sizing.Sizing.LoopValve;
import org.treadwarm.sizing.Sizing.PartLoops;
import org.treadwarm.sizing.Sizing.PracticeJudgement;
import org.treadwarm.sizing.Sizing.Total;
import org.treadwarm.sizing.Sizing.WaterLayout;
import org.treadwarm.sizing.Sizing.WaterTotal;
import org.treadwarm.units.Numbers;
import org.treadwarm.web.pages.Answer.Line;
import org.treadwarm.web.pages.LayoutLines.Grid;
import org.treadwarm.web.pages.LayoutLines.Layout;
import org.treadwarm.web.pages.LayoutLines.Row;

/** What a fitter needs to lay and balance the loops of a floor: a sentence, a row for the loops of each part, and the rest apart. */
final class WaterLines {
    private static final String NOTE =
            "Drops are of straight pipe without bends, fittings and manifold; state the drops of manifold and heat source to have"
                    + " the pump's pressure with them. Flush, vent and test the pressure before the floor"
                    + " is covered; heat a screed up by its maker's rules; protect against frost when switched off.";

    private final String room;
    private final WaterLayout layout;
    private final Total total;
    private final List<Loops> loops;

    /** The loops of the floor or of one part of it, all alike. */
    private record Loops(
            String part,
            int count,
            double length,
            double massFlow,
            double volumeFlow,
            double drop,
            double velocity,
            double reynolds) {}

    private WaterLines(String room, WaterLayout layout, Total total) {
        this.room = room;
        this.layout = layout;
        this.total = total;
        this.loops = layout.parts().isEmpty()
                ? List.of(whole(layout))
                : layout.parts().stream().map(this::ofPart).toList();
    }

    static Layout of(String room, WaterLayout layout, Total total) {
        WaterLines lines = new WaterLines(room, layout, total);
        return new Layout("Warm-water layout", lines.summary(), lines.top(), lines.grid(), lines.more(), NOTE);
    }

    private static Loops whole(WaterLayout layout) {
        return new Loops(
                "",
                layout.loops(),
                layout.loopLength(),
                layout.massFlow(),
                layout.volumeFlow(),
                layout.pressureDrop(),
                layout.velocity(),
                layout.reynolds());
    }

    private Loops ofPart(PartLoops part) {
        return new Loops(
                part.name(),
                part.loops(),
                part.loopLength(),
                part.massFlow(),
                part.massFlow() * layout.volumeFlow() / layout.massFlow(),
                part.pressureDrop(),
                part.velocity(),
                part.reynolds());
    }

    private String summary() {
        String laid = loops.stream()
                .map(each -> (each.part().isEmpty() ? "" : each.part() + ": ") + each.count()
                        + (each.count() == 1 ? " loop of " : " loops of ") + Numbers.fixed(each.length(), 1) + "\u00a0m"
                        + (each.count() == 1 ? "" : " each"))
                .collect(Collectors.joining("; "));
        return LayoutLines.capital(laid) + ". Water " + Numbers.fixed(layout.supplyTemperature(), 1) + "\u00a0°C in, "
                + Numbers.fixed(layout.returnTemperature(), 1) + "\u00a0°C out.";
    }

    private List<Line> top() {
        return List.of(
                LayoutLines.line("Supply", layout.supplyTemperature(), 1, "°C", governed()),
                LayoutLines.line(
                        "Return",
                        layout.returnTemperature(),
                        1,
                        "°C",
                        "spread " + Numbers.fixed(layout.spread(), 1) + " K"),
                LayoutLines.line("Flow of the room", 60_000 * layout.volumeFlow(), 2, "l/min", ""),
                LayoutLines.line("Water in the loops", 1000 * layout.waterContent(), 1, "l", ""));
    }

    private String governed() {
        return total.water()
                .map(water -> water.governingRoom().equals(room)
                        ? "this room governs the job"
                        : water.governingRoom() + " governs the job")
                .orElse("");
    }

    private Grid grid() {
        List<String> heads = new ArrayList<>(List.of("Laid in"));
        loops.forEach(each -> heads.add(each.part().isEmpty() ? "whole floor" : each.part()));
        return new Grid(
                "Loops to lay, and their valves",
                heads,
                List.of(
                        row("Loops", each -> Integer.toString(each.count())),
                        row("Length of each, feeders included, m", each -> Numbers.fixed(each.length(), 1)),
                        row("Flow of each, l/min", each -> Numbers.fixed(60_000 * each.volumeFlow() / each.count(), 2)),
                        row("Drop of each, kPa", each -> Numbers.fixed(each.drop() / 1000, 2)),
                        row(
                                "To be throttled at each valve, kPa",
                                each -> throttled(each.part())
                                        .map(valve -> Numbers.fixed(valve.throttled() / 1000, 2))
                                        .orElse("not known"))));
    }

    private Row row(String name, Function<Loops, String> cell) {
        return new Row(name, loops.stream().map(cell).toList());
    }

    private Optional<LoopValve> throttled(String part) {
        return total.water().stream()
                .flatMap(water -> water.valves().stream())
                .filter(valve ->
                        valve.room().equals(room) && valve.part().orElse("").equals(part))
                .findFirst();
    }

    private List<Line> more() {
        List<Line> lines = new ArrayList<>(limits());
        for (Loops each : loops) {
            lines.add(new Line(
                    "One loop" + (each.part().isEmpty() ? "" : ", " + each.part()),
                    Numbers.fixed(3600 * each.massFlow() / each.count(), 1) + " kg/h",
                    Numbers.fixed(each.velocity(), 2) + " m/s, Re " + Numbers.fixed(each.reynolds(), 0)
                            + ", straight pipe"));
        }
        total.water().ifPresent(water -> lines.add(against(water)));
        layout.tableMeanOvertemperature()
                .ifPresent(table -> lines.add(LayoutLines.line(
                        "Standard table method",
                        table,
                        1,
                        "K",
                        "mean over-temperature of the water by EN 1264-2 (from memory); the section says "
                                + Numbers.fixed(layout.meanOvertemperature(), 1) + " K, and is what is used")));
        return lines;
    }

    private static Line against(WaterTotal water) {
        return new Line(
                "Throttled against",
                Numbers.fixed(water.pressure() / 1000, 2) + " kPa",
                water.manifolds().size() > 1
                        ? "the worst loop of the job; each valve against that of its manifold"
                        : "the worst loop of the job");
    }

    /** A limit of practice and the part it is of; the whole floor where that has no name. */
    private record Of(String part, PracticeJudgement limit) {}

    /** The limits of practice, those of the parts in one line; what must be looked at again stands first. */
    private List<Line> limits() {
        Map<String, List<Of>> byName = new LinkedHashMap<>();
        layout.limits().forEach(limit -> add(byName, new Of("", limit)));
        layout.parts().forEach(part -> part.limits().forEach(limit -> add(byName, new Of(part.name(), limit))));
        List<Line> beyond = new ArrayList<>();
        List<Line> kept = new ArrayList<>();
        byName.forEach((name, all) -> {
            boolean good = all.stream().allMatch(each -> each.limit().margin() >= 0);
            (good ? kept : beyond).add(limit(name, all, good));
        });
        beyond.addAll(kept);
        return beyond;
    }

    private static void add(Map<String, List<Of>> byName, Of of) {
        byName.computeIfAbsent(of.limit().name(), name -> new ArrayList<>()).add(of);
    }

    /** Values in the order of the parts, once where they are all the same. */
    private static Line limit(String name, List<Of> all, boolean good) {
        Map<String, String> values = new LinkedHashMap<>();
        all.forEach(each ->
                values.put(each.part(), LayoutLines.shown(name, each.limit().value())));
        Map<String, List<Of>> byLimit = new LinkedHashMap<>();
        all.forEach(each -> byLimit.computeIfAbsent(LayoutLines.words(name, each.limit()), words -> new ArrayList<>())
                .add(each));
        String judged = byLimit.entrySet().stream()
                .map(each -> each.getKey() + beyond(each.getValue()))
                .collect(Collectors.joining("; "));
        return new Line(
                LayoutLines.capital(name),
                values.values().stream().distinct().count() == 1
                        ? values.values().iterator().next()
                        : String.join(" / ", values.values()),
                LayoutLines.opening(good) + judged);
    }

    private static String beyond(List<Of> limits) {
        List<Of> beyond =
                limits.stream().filter(each -> each.limit().margin() < 0).toList();
        String parts =
                beyond.stream().map(Of::part).filter(part -> !part.isEmpty()).collect(Collectors.joining(", "));
        return beyond.isEmpty() ? "" : ": beyond it" + (parts.isEmpty() ? "" : " in " + parts);
    }
}
