package org.treadwarm.web.pages;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.treadwarm.draw.Sheet;
import org.treadwarm.jobs.Judgement;
import org.treadwarm.jobs.Partial;
import org.treadwarm.sizing.AssemblyEvaluation;
import org.treadwarm.sizing.AssemblyEvaluation.Conditions;
import org.treadwarm.sizing.SectionView;
import org.treadwarm.sizing.SizedSurvey;
import org.treadwarm.sizing.Sizing;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.FloorState;
import org.treadwarm.sizing.Sizing.FreeFloor;
import org.treadwarm.sizing.Sizing.PartSizing;
import org.treadwarm.sizing.Sizing.PartState;
import org.treadwarm.sizing.Sizing.RoomSizing;
import org.treadwarm.sizing.Sizing.SectionSizing;
import org.treadwarm.sizing.Sizing.SectionState;
import org.treadwarm.sizing.Sizing.Warning;
import org.treadwarm.sizing.SpaceBalance;
import org.treadwarm.sizing.Verdict;
import org.treadwarm.survey.Assembly;
import org.treadwarm.survey.Room;
import org.treadwarm.survey.Survey;
import org.treadwarm.units.Numbers;

/** What stands beside a form: the verdict, the drawings and the numbers of a part, as the document is now. */
final class Answer {
    private static final double INDOORS = 20;
    private static final double HUMIDITY = 0.5;

    private final Map<String, Object> model = new HashMap<>();

    private final String prefix;

    /** @param prefix begins the ids of the drawings, so that several answers can stand on one page */
    private Answer(String prefix) {
        this.prefix = prefix;
    }

    /** A line of numbers. */
    public record Line(String name, String value, String note) {}

    static Map<String, Object> of(JsonNode document, Part part) {
        Partial partial = needsFloors(part) ? Partial.of(document) : Partial.unsized(document);
        Answer answer = new Answer("");
        answer.start(partial, part);
        answer.model.put("unsized", "");
        Judgement judgement = partial.judgement();
        if (part.isAssembly()) {
            answer.assembly(document, part);
        } else if (part.isRoom()) {
            judgement.sized().ifPresent(sized -> answer.room(judgement.survey().orElseThrow(), sized, part));
        } else if (judgement.problems().isEmpty()) {
            answer.space(judgement.survey().orElseThrow(), part);
        }
        return answer.model;
    }

    /** Whether the floors of the job enter the answer; of a space or an assembly they do not, so nobody waits for them. */
    static boolean needsFloors(Part part) {
        return part.isRoom();
    }

    /** What stands there when the document is not sized, for a reason in words. */
    static Map<String, Object> unsized(JsonNode document, Part part, String reason) {
        Answer answer = new Answer("");
        answer.start(Partial.unsized(document), part);
        answer.model.put("unsized", reason);
        return answer.model;
    }

    private void start(Partial partial, Part part) {
        model.put("waiting", partial.judgement().problems().size());
        model.put(
                "own",
                partial.judgement().problems().stream()
                        .filter(problem -> part.holds(problem.pointer()))
                        .count());
        model.put("unfinished", partial.unfinished());
        model.put("verdict", "");
        model.put("pictures", List.of());
        model.put("lines", List.of());
        model.put("layouts", List.of());
        model.put("warnings", List.of());
        model.put("cautions", List.of());
        model.put("working", List.of());
    }

    /**
     * What an issued sheet says of a room.
     *
     * @param sizedAnew its survey sized again for the drawings that want more than the sheet holds; empty when today's method is
     *     another than the sheet's
     */
    static Map<String, Object> issued(Survey survey, Sizing sizing, int index, Optional<SizedSurvey> sizedAnew) {
        Answer answer = new Answer("r" + index + "-");
        answer.room(survey.rooms().get(index), sizing, index, sizedAnew);
        return answer.model;
    }

    private void room(Survey survey, SizedSurvey sized, Part part) {
        Sizing sizing = sized.sizing();
        for (int i = 0; i < sizing.rooms().size(); i++) {
            RoomSizing answer = sizing.rooms().get(i);
            if (answer.name().equals(part.title().strip())) {
                room(survey.rooms().get(i), sizing, i, Optional.of(sized));
                model.put("working", WorkingView.of(survey, sizing, "/rooms/" + i));
            }
        }
    }

    private void room(Room room, Sizing sizing, int index, Optional<SizedSurvey> sized) {
        RoomSizing answer = sizing.rooms().get(index);
        FloorSizing floor = answer.floor();
        model.put("verdict", verdict(floor));
        model.put(
                "mark",
                floor.verdict() == Verdict.CARRIES
                        ? "carries"
                        : floor.verdict() == Verdict.NO_HEATED_FLOOR ? "none" : "short");
        List<Picture> pictures = new ArrayList<>();
        add(pictures, "Heat out, and heat from the floor", "balance", sheet -> Pictures.balance(answer, sheet));
        add(pictures, "What the floor must give and may give", "limits", sheet -> Pictures.limits(answer, sheet));
        add(pictures, "The heated floor in section", "floor", sheet -> Pictures.floor(room, answer, sheet));
        add(pictures, "The floor in plan", "plan", sheet -> PlanPicture.of(room, answer, sheet));
        if (sized.isPresent() && (floor.section().isPresent() || !floor.parts().isEmpty())) {
            List<SectionView> views = sized.get().sections(index);
            for (int i = 0; i < views.size(); i++) {
                int number = i;
                add(
                        pictures,
                        "The floor between its cables or pipes"
                                + (floor.parts().isEmpty()
                                        ? ""
                                        : ", " + floor.parts().get(i).name()),
                        views.size() == 1 ? "isotherms" : "isotherms-" + (i + 1),
                        sheet -> Pictures.isotherms(room, answer, views.get(number), number, sheet));
            }
        }
        if (sized.isPresent() && floor.warmup().isPresent()) {
            sized.get().morning(index).ifPresent(morning -> {
                add(
                        pictures,
                        "The morning after a setback",
                        "warmup",
                        sheet -> Pictures.warmUp(answer, morning, sheet));
                add(
                        pictures,
                        "The heater fails on the coldest day",
                        "powercut",
                        sheet -> Pictures.powerCut(answer, morning.powerCut(), sheet));
            });
        }
        model.put("pictures", pictures);
        model.put("lines", lines(answer));
        model.put("layouts", LayoutLines.of(answer.name(), floor, sizing.total()));
        model.put(
                "paths",
                answer.heatLoss().paths().stream()
                        .map(path -> new Line(
                                path.name() + path.to().map(to -> " to " + to).orElse(""),
                                watts(path.heatFlow()),
                                pathNote(path)))
                        .toList());
        String pointer = "/rooms/" + index;
        model.put(
                "warnings",
                sizing.warnings().stream()
                        .filter(warning -> warning.pointer().equals(pointer)
                                || warning.pointer().startsWith(pointer + "/"))
                        .toList());
        model.put("cautions", answer.cautions());
    }

    private static String pathNote(Sizing.PathLoss path) {
        StringBuilder note = new StringBuilder();
        path.area().ifPresent(area -> note.append(Numbers.fixed(area, 2)).append(" m²"));
        path.uValue()
                .ifPresent(u -> note.append(", U ").append(Numbers.fixed(u, 3)).append(" W/(m²·K)"));
        path.temperatureDifference()
                .ifPresent(difference -> note.append(note.length() > 0 ? ", " : "")
                        .append(Numbers.fixed(difference, 1))
                        .append(" K"));
        return note.toString();
    }

    private static String verdict(FloorSizing floor) {
        if (floor.verdict() == Verdict.NO_HEATED_FLOOR) {
            return "No heated floor";
        }
        String margin = Numbers.fixed(Math.abs(floor.margin().orElseThrow()), 1) + " W/m²";
        return floor.verdict() == Verdict.CARRIES
                ? "The floor carries this room, with " + margin + " to spare"
                : "The floor is short by " + margin + ": " + shortfall(floor);
    }

    /** Watts that no line break tears apart. */
    private static String watts(double heat) {
        return Numbers.grouped(heat).replace(' ', '\u00a0') + "\u00a0W";
    }

    private static String shortfall(FloorSizing floor) {
        double missing = floor.shortfall().orElseThrow();
        double supplement = floor.supplement().orElseThrow();
        String left = "something else must add " + watts(supplement);
        return supplement == missing
                ? left
                : "of the missing " + watts(missing) + ", heat that stays covers " + watts(missing - supplement) + "; "
                        + left;
    }

    private static List<Line> lines(RoomSizing answer) {
        FloorSizing floor = answer.floor();
        List<Line> lines = new ArrayList<>();
        lines.add(new Line("Heat loss", watts(answer.heatLoss().total()), ""));
        if (floor.verdict() == Verdict.NO_HEATED_FLOOR) {
            return lines;
        }
        flux(lines, "Required flux", floor.requiredFlux(), "upward, on the design day");
        flux(lines, "Carrying flux", floor.carryingFlux(), "the lowest limit");
        flux(
                lines,
                "Margin",
                floor.margin(),
                floor.marginShare().isPresent()
                        ? Numbers.fixed(100 * floor.marginShare().getAsDouble(), 0) + " % of the required flux"
                        : "");
        floor.holdsDownTo()
                .ifPresent(cold -> lines.add(new Line("Holds down to", Numbers.fixed(cold, 1) + " °C", "outdoors")));
        floor.holdsDownToReason()
                .ifPresent(reason -> lines.add(
                        new Line("Holds down to", reason.equals("never") ? "never" : "below -60 °C", "outdoors")));
        if (floor.verdict() == Verdict.CARRIES) {
            state(
                    lines,
                    "",
                    new FloorState(
                            floor.surfaceTemperature().orElseThrow(),
                            floor.heaterTemperature().orElseThrow(),
                            floor.downwardFlux().orElseThrow(),
                            floor.edgeFlux().orElseThrow(),
                            floor.heaterFlux().orElseThrow(),
                            floor.heaterPower().orElseThrow()),
                    floor.section().map(SectionSizing::atRequiredFlux),
                    floor.parts().stream().findFirst().map(PartSizing::atRequiredFlux));
        } else {
            state(
                    lines,
                    "at the carrying flux",
                    floor.atCarryingFlux().orElseThrow(),
                    floor.section().map(SectionSizing::atCarryingFlux),
                    floor.parts().stream().findFirst().map(PartSizing::atCarryingFlux));
            lines.add(new Line(
                    "What it would take",
                    watts(floor.heaterPower().orElseThrow()),
                    "from the heater, with a surface of "
                            + Numbers.fixed(floor.surfaceTemperature().orElseThrow(), 1) + " °C"));
        }
        floor.plan().ifPresent(plan -> lines.add(new Line("Free floor", area(plan.freeArea()), ofThePlan(plan))));
        floor.installedPower().ifPresent(power -> lines.add(new Line("Installed power", watts(power), "")));
        floor.buildUpHeight()
                .ifPresent(height ->
                        lines.add(new Line("Build-up height", Numbers.fixed(1000 * height, 0) + " mm", "")));
        floor.load().ifPresent(load -> lines.add(new Line("Dead load", Numbers.fixed(load, 0) + " kg/m²", "")));
        answer.fromFloorAbove()
                .ifPresent(heat -> lines.add(new Line("From the floor above", watts(heat), "not counted")));
        return lines;
    }

    private static String ofThePlan(FreeFloor plan) {
        return "of " + area(plan.area()) + " in plan"
                + (plan.heatedShare().isPresent()
                        ? "; " + Numbers.fixed(100 * plan.heatedShare().getAsDouble(), 0) + " % of it is heated"
                        : "");
    }

    private static String area(double area) {
        return Numbers.fixed(area, 2) + "\u00a0m²";
    }

    private static void flux(List<Line> lines, String name, OptionalDouble flux, String note) {
        flux.ifPresent(value -> lines.add(new Line(name, Numbers.fixed(value, 1) + " W/m²", note)));
    }

    private static void state(
            List<Line> lines,
            String note,
            FloorState state,
            Optional<SectionState> section,
            Optional<PartState> firstPart) {
        if (section.isPresent()) {
            solved(lines, note, section.get());
        } else if (firstPart.isPresent()) {
            degrees(lines, "Warmest point of the surface", state.surfaceTemperature(), "of all parts");
            degrees(lines, "Warmest cable or pipe, outside", state.heaterTemperature(), note);
            water(lines, note, firstPart.get().section());
        } else {
            degrees(lines, "Mean surface temperature", state.surfaceTemperature(), note);
            degrees(lines, "Heater plane", state.heaterTemperature(), note);
        }
        lines.add(new Line("Downward flux", Numbers.fixed(state.downwardFlux(), 1) + " W/m²", note));
        if (state.edgeFlux() != 0) {
            lines.add(new Line("Edge flux", Numbers.fixed(state.edgeFlux(), 1) + " W/m²", note));
        }
        lines.add(new Line("Heater power", watts(state.heaterPower()), note));
    }

    private static void solved(List<Line> lines, String note, SectionState section) {
        degrees(lines, "Warmest point of the surface", section.surfaceMaximum(), "over a cable or pipe");
        degrees(lines, "Mean surface temperature", section.surfaceMean(), note);
        degrees(lines, "Coolest point of the surface", section.surfaceMinimum(), "midway between two");
        degrees(lines, "Cable or pipe, outside", section.heaterTemperature(), note);
        water(lines, note, section);
    }

    private static void water(List<Line> lines, String note, SectionState section) {
        section.waterTemperature().ifPresent(water -> degrees(lines, "Water, mean", water, note));
        section.supplyTemperature().ifPresent(supply -> degrees(lines, "Water, supply", supply, note));
    }

    private static void degrees(List<Line> lines, String name, double temperature, String note) {
        lines.add(new Line(name, Numbers.fixed(temperature, 1) + " °C", note));
    }

    private void space(Survey survey, Part part) {
        Optional<SpaceBalance> found = SpaceBalance.all(survey).stream()
                .filter(space -> space.name().equals(part.key().strip()))
                .findFirst();
        found.ifPresent(space -> {
            model.put("verdict", "Settles at " + Numbers.fixed(space.temperature(), 1) + " °C on the design day");
            model.put("mark", "none");
            model.put(
                    "paths",
                    space.paths().stream()
                            .map(path -> new Line(
                                    path.name()
                                            + path.to().map(to -> " to " + to).orElse(""),
                                    watts(path.heatFlow()),
                                    pathNote(path)))
                            .toList());
        });
    }

    private void assembly(JsonNode document, Part part) {
        Optional<Assembly> read = Excerpt.assembly(document.at(part.pointer()));
        if (read.isEmpty()) {
            return;
        }
        double outdoor = Excerpt.outdoorTemperature(document).orElse(-5);
        Assembly assembly = read.get();
        AssemblyEvaluation answer = AssemblyEvaluation.of(assembly, new Conditions(true, INDOORS, outdoor, HUMIDITY));
        model.put("verdict", "U " + Numbers.fixed(answer.uValue(), 3) + " W/(m²·K) towards outdoors");
        model.put("mark", "none");
        List<Picture> pictures = new ArrayList<>();
        add(
                pictures,
                "Layers to scale, and the temperature through them",
                "layers",
                sheet -> Pictures.assembly(part.title(), assembly, answer, sheet));
        model.put("pictures", pictures);
        model.put("lines", assemblyLines(answer));
        model.put(
                "paths",
                answer.interfaces().stream()
                        .map(each -> new Line(each.name(), Numbers.fixed(each.temperature(), 1) + " °C", ""))
                        .toList());
        List<Warning> warnings = new ArrayList<>();
        if (answer.temperatureFactor() < 0.7) {
            warnings.add(new Warning(
                    "cold-surface",
                    part.pointer(),
                    "The inside surface is cold: f_Rsi is " + Numbers.fixed(answer.temperatureFactor(), 2) + ".",
                    "Below 0.70 mould is likely in a dwelling at 20 °C and 50 % (ISO 13788 and DIN 4108-2, from memory).",
                    "Insulate it, or keep the room drier."));
        }
        model.put("warnings", warnings);
    }

    private static List<Line> assemblyLines(AssemblyEvaluation answer) {
        List<Line> lines = new ArrayList<>();
        lines.add(new Line("U-value", Numbers.fixed(answer.uValue(), 3) + " W/(m²·K)", "1/R"));
        lines.add(new Line("Resistance R", Numbers.fixed(answer.resistance(), 3) + " m²·K/W", "films included"));
        answer.upperLimit()
                .ifPresent(upper -> lines.add(
                        new Line("Upper limit R'", Numbers.fixed(upper, 3) + " m²·K/W", "paths side by side")));
        answer.lowerLimit()
                .ifPresent(lower ->
                        lines.add(new Line("Lower limit R''", Numbers.fixed(lower, 3) + " m²·K/W", "layers averaged")));
        answer.largestRelativeError()
                .ifPresent(error -> lines.add(new Line(
                        "Largest error", Numbers.fixed(100 * error, 1) + " %", "of the combined method, ISO 6946")));
        lines.add(new Line("Inside film Rsi", Numbers.fixed(answer.insideFilm(), 2) + " m²·K/W", ""));
        lines.add(new Line("Outside film Rse", Numbers.fixed(answer.outsideFilm(), 2) + " m²·K/W", ""));
        lines.add(new Line(
                "Temperature factor f_Rsi",
                Numbers.fixed(answer.temperatureFactor(), 2),
                "with Rsi 0.25; 0.70 and more is wanted"));
        lines.add(new Line("Dew point indoors", Numbers.fixed(answer.dewPoint(), 1) + " °C", "at 20 °C and 50 %"));
        return lines;
    }

    /** A drawing in two widths: one for a desk or a tablet, one for a narrow column. */
    public record Picture(String title, String wide, String narrow) {}

    private void add(
            List<Picture> pictures,
            String title,
            String id,
            java.util.function.Function<Sheet, Optional<String>> draw) {
        Optional<String> wide = draw.apply(new Sheet("w-" + prefix + id, 560));
        Optional<String> narrow = draw.apply(Sheet.narrow("n-" + prefix + id));
        if (wide.isPresent() && narrow.isPresent()) {
            pictures.add(new Picture(title, wide.get(), narrow.get()));
        }
    }
}
