package org.treadwarm.wire;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.OptionalDouble;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.sizing.Sizing.Caution;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.Limit;
import org.treadwarm.sizing.Sizing.PathLoss;
import org.treadwarm.sizing.Sizing.RoomSizing;
import org.treadwarm.sizing.Sizing.Warning;
import org.treadwarm.sizing.Verdict;
import org.treadwarm.survey.Survey;
import org.treadwarm.units.Numbers;

/** A sizing as readable text: the same numbers, rounded for reading. */
public final class PlainSheet {
    private static final String RULE = "-".repeat(78);

    private final StringBuilder text = new StringBuilder();

    private PlainSheet() {}

    /** The sheet of a survey and its sizing. */
    public static String of(Survey survey, Sizing sizing) {
        PlainSheet sheet = new PlainSheet();
        sheet.head(survey, sizing);
        sizing.rooms().forEach(sheet::room);
        sheet.tail(sizing);
        return sheet.text.toString().stripTrailing();
    }

    /** The working of a sizing as readable text. */
    public static String working(Survey survey, Sizing sizing) {
        PlainSheet sheet = new PlainSheet();
        sheet.line("WORKING: every number, its formula and source, and the addresses of what went in");
        JsonNode answer = Json.tree(sizing);
        for (WorkingAnswer step : WorkingAnswer.of(survey, sizing)) {
            sheet.line("%s = %s", step.address(), answer.at(step.address()).asText());
            sheet.line("    %s  [%s]", step.formula(), step.source());
            step.symbols().forEach((symbol, from) -> sheet.line("    %s: %s", symbol, String.join(", ", from)));
        }
        return sheet.text.toString().stripTrailing();
    }

    private void head(Survey survey, Sizing sizing) {
        line("HEATED FLOOR SIZING, method version %s", sizing.method().version());
        survey.name().ifPresent(name -> line("%s", name));
        survey.site().reference().ifPresent(reference -> line("Reference  %s", reference));
        line(
                "Design outdoor temperature %s °C",
                Numbers.fixed(survey.site().outdoorTemperature().value(), 1));
        line("Steady state on the coldest design day, without gains from sun or people.");
        for (Sizing.SpaceSizing space : sizing.spaces()) {
            line("Unheated: %s settles at %s °C", space.name(), Numbers.fixed(space.temperature(), 1));
        }
    }

    private void room(RoomSizing room) {
        line("%s", RULE);
        line("%s, %s °C", room.name().toUpperCase(Locale.ROOT), Numbers.fixed(room.indoorTemperature(), 1));
        line("  Heat out");
        for (PathLoss path : room.heatLoss().paths()) {
            String to = path.to().map(side -> " to " + side).orElse("");
            line("    %-48s %9s W %5s", shortened(path.name() + to), watts(path.heatFlow()), share(path.share()));
        }
        line("    %-48s %9s W", "total", watts(room.heatLoss().total()));
        room.fromFloorAbove()
                .ifPresent(heat -> line("    (the floor above may give %s W more; not counted)", watts(heat)));
        floor(room.floor());
    }

    private void floor(FloorSizing floor) {
        if (floor.verdict() == Verdict.NO_HEATED_FLOOR) {
            line("  No heated floor.");
            return;
        }
        line("  Heated floor, %s m2: %s", Numbers.fixed(floor.area().orElseThrow(), 1), floor.verdict());
        number("required flux", floor.requiredFlux(), 1, "W/m2");
        number("carrying flux", floor.carryingFlux(), 1, "W/m2");
        number("margin", floor.margin(), 1, "W/m2");
        floor.holdsDownTo()
                .ifPresent(cold -> line("    %-48s %9s °C", "holds down to outdoors", Numbers.fixed(cold, 1)));
        floor.holdsDownToReason().ifPresent(reason -> line("    %-48s %9s", "holds down to outdoors", reason));
        number("installed power", floor.installedPower(), 0, "W");
        floor.buildUpHeight().ifPresent(height -> number("build-up height", OptionalDouble.of(1000 * height), 0, "mm"));
        number("dead load", floor.load(), 0, "kg/m2");
        boolean carries = floor.verdict() == Verdict.CARRIES;
        if (!carries) {
            number("something else must add", floor.supplement(), 0, "W");
            line("  At the carrying flux:");
            Sizing.FloorState state = floor.atCarryingFlux().orElseThrow();
            state(
                    floor.section().isPresent() || !floor.parts().isEmpty(),
                    state.surfaceTemperature(),
                    state.heaterTemperature(),
                    state.downwardFlux(),
                    state.edgeFlux(),
                    state.heaterPower());
            line("  What it would take at the required flux:");
        }
        state(
                floor.section().isPresent() || !floor.parts().isEmpty(),
                floor.surfaceTemperature().orElseThrow(),
                floor.heaterTemperature().orElseThrow(),
                floor.downwardFlux().orElseThrow(),
                floor.edgeFlux().orElseThrow(),
                floor.heaterPower().orElseThrow());
        line("  Limits");
        for (Limit limit : floor.limits()) {
            line(
                    "    %-48s %9s W/m2%s",
                    shortened(limit.name()), Numbers.fixed(limit.maximumFlux(), 1), limit.governs() ? "  governs" : "");
        }
    }

    private void state(boolean solved, double surface, double heater, double down, double edge, double power) {
        number(
                solved ? "warmest point of the surface" : "mean surface temperature",
                OptionalDouble.of(surface),
                1,
                "°C");
        number(solved ? "cable or pipe, outside" : "heater plane temperature", OptionalDouble.of(heater), 1, "°C");
        number("downward flux", OptionalDouble.of(down), 1, "W/m2");
        number("edge flux", OptionalDouble.of(edge), 1, "W/m2");
        number("heater power", OptionalDouble.of(power), 0, "W");
    }

    private void tail(Sizing sizing) {
        line("%s", RULE);
        line("TOTAL");
        number("heat loss of the rooms", OptionalDouble.of(sizing.total().heatLoss()), 0, "W");
        number("heated area", OptionalDouble.of(sizing.total().heatedArea()), 1, "m2");
        number("heater power", OptionalDouble.of(sizing.total().heaterPower()), 0, "W");
        number("installed power", sizing.total().installedPower(), 0, "W");
        if (!sizing.warnings().isEmpty()) {
            line("SECOND LOOKS");
            for (Warning warning : sizing.warnings()) {
                line("  %s", warning.pointer());
                line("    %s %s %s", warning.message(), warning.why(), warning.settle());
            }
        }
        cautions(sizing);
        line(
                "On the safe side: season factor on the heated plane at its design temperature; heat of floors into other");
        line(
                "rooms not credited; no gains. Not on the safe side: first winter of a cold slab; mains at -10 %% voltage");
        line(
                "(-19 %% power); tolerance of the elements; rugs; mean instead of warmest surface; neighbours taken as heated.");
        line("Local codes and licensed practice decide.");
    }

    /** Each caution once, with the rooms it is about. */
    private void cautions(Sizing sizing) {
        Map<Caution, List<String>> rooms = new LinkedHashMap<>();
        sizing.rooms()
                .forEach(room -> room.cautions()
                        .forEach(caution -> rooms.computeIfAbsent(caution, key -> new ArrayList<>())
                                .add(room.name())));
        line("CAUTIONS");
        rooms.forEach((caution, names) -> {
            line("  %s", caution.text());
            line("    for %s [%s]", String.join(", ", names), caution.source());
        });
    }

    private void number(String name, OptionalDouble value, int decimals, String unit) {
        value.ifPresent(number -> line(
                "    %-48s %9s %s",
                name, decimals == 0 ? Numbers.grouped(number) : Numbers.fixed(number, decimals), unit));
    }

    private static String watts(double heat) {
        return Numbers.grouped(heat);
    }

    private static String share(OptionalDouble share) {
        return share.isPresent() ? Numbers.fixed(100 * share.getAsDouble(), 0) + " %" : "";
    }

    private static String shortened(String name) {
        return name.length() <= 48 ? name : name.substring(0, 47) + "…";
    }

    private void line(String format, Object... values) {
        text.append(String.format(Locale.ROOT, format, values).stripTrailing()).append('\n');
    }
}
