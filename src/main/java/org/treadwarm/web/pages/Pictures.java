package org.treadwarm.web.pages;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import org.treadwarm.draw.AirSide;
import org.treadwarm.draw.Balance;
import org.treadwarm.draw.BalanceDrawing;
import org.treadwarm.draw.Beneath;
import org.treadwarm.draw.Bridge;
import org.treadwarm.draw.BuildUp;
import org.treadwarm.draw.BuildUpDrawing;
import org.treadwarm.draw.FloorBuildUpDrawing;
import org.treadwarm.draw.FloorHeat;
import org.treadwarm.draw.FloorSection;
import org.treadwarm.draw.FluxLimit;
import org.treadwarm.draw.FluxScale;
import org.treadwarm.draw.HeatPath;
import org.treadwarm.draw.HeaterCut;
import org.treadwarm.draw.IsothermDrawing;
import org.treadwarm.draw.IsothermSection;
import org.treadwarm.draw.LimitScale;
import org.treadwarm.draw.MaterialFamily;
import org.treadwarm.draw.Sheet;
import org.treadwarm.draw.SurfaceProfile;
import org.treadwarm.draw.TemperatureField;
import org.treadwarm.draw.Threshold;
import org.treadwarm.draw.Trace;
import org.treadwarm.draw.WarmUpCurve;
import org.treadwarm.draw.WarmUpDrawing;
import org.treadwarm.sizing.AssemblyEvaluation;
import org.treadwarm.sizing.SectionView;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.FloorState;
import org.treadwarm.sizing.Sizing.LayerSizing;
import org.treadwarm.sizing.Sizing.PartSizing;
import org.treadwarm.sizing.Sizing.PartState;
import org.treadwarm.sizing.Sizing.RoomSizing;
import org.treadwarm.sizing.Sizing.SectionSizing;
import org.treadwarm.sizing.Sizing.SectionState;
import org.treadwarm.sizing.Verdict;
import org.treadwarm.sizing.WarmUpEvaluation;
import org.treadwarm.sizing.WarmUpEvaluation.CurvePoint;
import org.treadwarm.survey.Assembly;
import org.treadwarm.survey.Bridging;
import org.treadwarm.survey.Direction;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.HeaterKind;
import org.treadwarm.survey.Layer;
import org.treadwarm.survey.Room;
import org.treadwarm.survey.Survey;
import org.treadwarm.units.Numbers;
import org.treadwarm.units.Reading;

/** From answers to drawings. */
final class Pictures {
    private static final double MOST_DRAWN = 9e5;

    private Pictures() {}

    /** The balance of a room; empty when a number is too large to draw. */
    static Optional<String> balance(RoomSizing room, Sheet sheet) {
        List<HeatPath> paths = new ArrayList<>();
        double sum = 0;
        for (var path : room.heatLoss().paths()) {
            sum += Math.abs(path.heatFlow());
            String to = path.to()
                    .filter(side -> !side.equals("outdoors") && !path.name().contains(side))
                    .map(side -> " to " + side)
                    .orElse("");
            paths.add(new HeatPath(path.name() + to, path.heatFlow(), path.share()));
        }
        if (sum > MOST_DRAWN) {
            return Optional.empty();
        }
        FloorSizing floor = room.floor();
        Optional<FloorHeat> heat = floor.verdict() == Verdict.NO_HEATED_FLOOR
                ? Optional.empty()
                : Optional.of(new FloorHeat(
                        floor.requiredHeat().orElseThrow(),
                        Math.min(
                                MOST_DRAWN,
                                floor.carryingFlux().orElseThrow()
                                        * floor.area().orElseThrow()),
                        floor.shortfall().orElseThrow()));
        return Optional.of(BalanceDrawing.draw(
                sheet, new Balance(room.name(), paths, room.heatLoss().total(), heat)));
    }

    /** The floor's limits on one scale. */
    static Optional<String> limits(RoomSizing room, Sheet sheet) {
        FloorSizing floor = room.floor();
        if (floor.verdict() == Verdict.NO_HEATED_FLOOR || floor.requiredFlux().orElseThrow() > MOST_DRAWN) {
            return Optional.empty();
        }
        List<FluxLimit> limits = floor.limits().stream()
                .map(limit -> new FluxLimit(limit.name(), limit.maximumFlux(), limit.governs()))
                .toList();
        return Optional.of(LimitScale.draw(
                sheet,
                new FluxScale(
                        room.name(),
                        floor.requiredFlux().orElseThrow(),
                        floor.carryingFlux().orElseThrow(),
                        limits)));
    }

    /** The heated floor in section, at the flux that it gives. */
    static Optional<String> floor(Room room, RoomSizing answer, Sheet sheet) {
        if (room.heatedFloor().isEmpty()) {
            return Optional.empty();
        }
        HeatedFloor given = room.heatedFloor().get();
        FloorSizing floor = answer.floor();
        if (given.above().isEmpty() && given.below().isEmpty()) {
            return Optional.empty();
        }
        boolean carries = floor.verdict() == Verdict.CARRIES;
        FloorState carrying = floor.atCarryingFlux().orElseThrow();
        double up = carries
                ? floor.requiredFlux().orElseThrow()
                : floor.carryingFlux().orElseThrow();
        double surface = carries ? floor.surfaceTemperature().orElseThrow() : carrying.surfaceTemperature();
        double heater = carries ? floor.heaterTemperature().orElseThrow() : carrying.heaterTemperature();
        double down = carries ? floor.downwardFlux().orElseThrow() : carrying.downwardFlux();
        double edge = carries ? floor.edgeFlux().orElseThrow() : carrying.edgeFlux();
        if (Math.abs(heater) > 900 || Math.abs(down) > MOST_DRAWN || Math.abs(edge) > MOST_DRAWN) {
            return Optional.empty();
        }
        FloorSection section = new FloorSection(
                answer.name(),
                new AirSide(answer.name(), answer.indoorTemperature()),
                layers(
                        given.above(),
                        floor.layersAbove().stream()
                                .map(layer -> layer.resistance())
                                .toList()),
                given.heater().map(kind -> kind.kind().label() + " heater").orElse("heater"),
                layers(
                        given.below(),
                        floor.layersBelow().stream()
                                .map(layer -> layer.resistance())
                                .toList()),
                beneath(given, floor),
                surface,
                heater,
                up,
                down,
                floor.edges().isEmpty() ? OptionalDouble.empty() : OptionalDouble.of(edge));
        return Optional.of(FloorBuildUpDrawing.draw(sheet, section));
    }

    /** The floor, or the part of it with this number, solved between its cables or pipes, with its isotherms; empty when it cannot be drawn. */
    static Optional<String> isotherms(Room room, RoomSizing answer, SectionView solved, int number, Sheet sheet) {
        FloorSizing floor = answer.floor();
        HeatedFloor given = room.heatedFloor().orElseThrow();
        boolean carries = floor.verdict() == Verdict.CARRIES;
        SectionState state;
        double down;
        if (floor.parts().isEmpty()) {
            SectionSizing section = floor.section().orElseThrow();
            state = carries ? section.atRequiredFlux() : section.atCarryingFlux();
            down = carries
                    ? floor.downwardFlux().orElseThrow()
                    : floor.atCarryingFlux().orElseThrow().downwardFlux();
        } else {
            PartSizing part = floor.parts().get(number);
            PartState there = carries ? part.atRequiredFlux() : part.atCarryingFlux();
            state = there.section();
            down = there.downwardFlux();
        }
        List<org.treadwarm.draw.Layer> layers = new ArrayList<>(solved(given.above(), floor.layersAbove()));
        layers.addAll(solved(given.below(), floor.layersBelow()));
        boolean water = given.heater().orElseThrow().kind() == HeaterKind.WATER;
        String words = (water ? "pipe " : "cable ") + Numbers.significant(1000 * solved.diameter(), 3) + " mm";
        try {
            return Optional.of(IsothermDrawing.draw(
                    sheet,
                    new IsothermSection(
                            answer.name(),
                            new AirSide(answer.name(), answer.indoorTemperature()),
                            layers,
                            new HeaterCut(words, solved.heaterDepth(), solved.diameter()),
                            solved.spacing(),
                            new TemperatureField(solved.x(), solved.depth(), solved.temperature()),
                            new SurfaceProfile(
                                    Arrays.stream(solved.surface()).boxed().toList(),
                                    Math.max(state.surfaceMaximum(), state.surfaceMean()),
                                    state.surfaceMean(),
                                    Math.min(state.surfaceMinimum(), state.surfaceMean()),
                                    OptionalDouble.of(solved.surfaceLimit())),
                            beneath(given, floor),
                            state.flux(),
                            down)));
        } catch (IllegalArgumentException beyondAnyDrawing) {
            return Optional.empty();
        }
    }

    /** The room's morning after a setback; empty when it is warm at once or cannot be drawn. */
    static Optional<String> warmUp(RoomSizing room, WarmUpEvaluation morning, Sheet sheet) {
        Threshold setpoint = new Threshold("setpoint", room.indoorTemperature(), Trace.Place.AIR, morning.hours());
        return curve(WarmUpCurve.Event.WARM_UP, room, morning.curve(), List.of(setpoint), sheet);
    }

    /** The room cooling down when the heater fails; empty when it is cold at once or cannot be drawn. */
    static Optional<String> powerCut(RoomSizing room, WarmUpEvaluation.PowerCutHours cut, Sheet sheet) {
        return curve(
                WarmUpCurve.Event.POWER_CUT,
                room,
                cut.curve(),
                List.of(
                        new Threshold("cold room", 5, Trace.Place.AIR, cut.hoursToFive()),
                        new Threshold("freezing", 0, Trace.Place.HEATER, cut.hoursToFreezing())),
                sheet);
    }

    private static Optional<String> curve(
            WarmUpCurve.Event event, RoomSizing room, List<CurvePoint> curve, List<Threshold> marks, Sheet sheet) {
        if (curve.size() < 2) {
            return Optional.empty();
        }
        try {
            return Optional.of(WarmUpDrawing.draw(
                    sheet,
                    new WarmUpCurve(
                            event,
                            room.name(),
                            curve.stream().map(CurvePoint::hour).toList(),
                            List.of(
                                    trace(Trace.Place.HEATER, curve, CurvePoint::heater),
                                    trace(Trace.Place.SURFACE, curve, CurvePoint::floor),
                                    trace(Trace.Place.AIR, curve, CurvePoint::air)),
                            marks)));
        } catch (IllegalArgumentException beyondAnyDrawing) {
            return Optional.empty();
        }
    }

    private static Trace trace(Trace.Place place, List<CurvePoint> curve, Function<CurvePoint, Double> temperature) {
        return new Trace(place, curve.stream().map(temperature).toList());
    }

    /** Layers as a section takes them: one known by its resistance has no thickness there. */
    private static List<org.treadwarm.draw.Layer> solved(List<Layer> given, List<LayerSizing> sized) {
        List<org.treadwarm.draw.Layer> layers =
                layers(given, sized.stream().map(LayerSizing::resistance).toList());
        List<org.treadwarm.draw.Layer> solved = new ArrayList<>();
        for (int i = 0; i < given.size(); i++) {
            org.treadwarm.draw.Layer layer = layers.get(i);
            boolean solid =
                    given.get(i).resistance().isEmpty() && given.get(i).airGap().isEmpty();
            solved.add(
                    solid
                            ? layer
                            : new org.treadwarm.draw.Layer(
                                    layer.name(),
                                    OptionalDouble.empty(),
                                    layer.resistance(),
                                    layer.family(),
                                    layer.bridge(),
                                    layer.remarks()));
        }
        return solved;
    }

    private static Beneath beneath(HeatedFloor given, FloorSizing floor) {
        if (given.ground().isPresent()) {
            return new Beneath(Beneath.Kind.GROUND, "ground", OptionalDouble.empty());
        }
        String to = given.to().orElseThrow();
        double temperature = floor.below().orElseThrow().temperature();
        Beneath.Kind kind = to.equals(Survey.OUTDOORS) ? Beneath.Kind.OUTDOORS : Beneath.Kind.ROOM;
        return new Beneath(kind, to, OptionalDouble.of(temperature));
    }

    /** An assembly in section with the temperature through it; empty for one without layers. */
    static Optional<String> assembly(String name, Assembly assembly, AssemblyEvaluation answer, Sheet sheet) {
        if (assembly.layers().isEmpty()) {
            return Optional.empty();
        }
        List<Double> temperatures =
                answer.interfaces().stream().map(each -> each.temperature()).toList();
        List<org.treadwarm.draw.Layer> layers = layers(
                assembly.layers(),
                answer.layers().stream().map(layer -> layer.resistance()).toList());
        AirSide inside = new AirSide("inside", answer.indoorTemperature());
        AirSide outside = new AirSide(answer.side(), answer.outdoorTemperature());
        boolean turned = assembly.heatFlow() == Direction.UP;
        return Optional.of(BuildUpDrawing.draw(
                sheet,
                new BuildUp(
                        name,
                        assembly.heatFlow() != Direction.HORIZONTAL,
                        turned ? outside : inside,
                        turned ? inside : outside,
                        turned ? reversed(layers) : layers,
                        turned ? reversed(temperatures) : temperatures,
                        OptionalDouble.of(answer.dewPoint()))));
    }

    private static <T> List<T> reversed(List<T> list) {
        List<T> reversed = new ArrayList<>(list);
        java.util.Collections.reverse(reversed);
        return reversed;
    }

    private static List<org.treadwarm.draw.Layer> layers(List<Layer> given, List<Double> resistances) {
        List<org.treadwarm.draw.Layer> layers = new ArrayList<>();
        for (int i = 0; i < given.size(); i++) {
            Layer layer = given.get(i);
            String title = layer.title(i + 1);
            String words =
                    title + " " + layer.material().orElse("") + (layer.airGap().isPresent() ? " air gap" : "");
            layers.add(new org.treadwarm.draw.Layer(
                    title,
                    layer.anyThickness()
                            .map(Reading::value)
                            .map(OptionalDouble::of)
                            .orElse(OptionalDouble.empty()),
                    resistances.get(i),
                    MaterialFamily.of(words),
                    layer.bridging().map(Pictures::bridge),
                    List.of()));
        }
        return layers;
    }

    private static Bridge bridge(Bridging bridging) {
        return new Bridge(bridging.share().value(), bridging.frame().orElse("framing"));
    }
}
