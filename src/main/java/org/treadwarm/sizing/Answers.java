package org.treadwarm.sizing;

import static java.util.OptionalDouble.empty;
import static java.util.OptionalDouble.of;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.treadwarm.physics.envelope.CombinedMethod;
import org.treadwarm.sizing.Plan.EdgePlan;
import org.treadwarm.sizing.Plan.FloorPlan;
import org.treadwarm.sizing.Plan.Link;
import org.treadwarm.sizing.Plan.LinkKind;
import org.treadwarm.sizing.Plan.PartPlan;
import org.treadwarm.sizing.Plan.PathRef;
import org.treadwarm.sizing.Plan.Side;
import org.treadwarm.sizing.Sizing.AssemblySizing;
import org.treadwarm.sizing.Sizing.Below;
import org.treadwarm.sizing.Sizing.Caution;
import org.treadwarm.sizing.Sizing.Edge;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.FloorState;
import org.treadwarm.sizing.Sizing.FreeFloor;
import org.treadwarm.sizing.Sizing.GroundPath;
import org.treadwarm.sizing.Sizing.HeatLoss;
import org.treadwarm.sizing.Sizing.LayerSizing;
import org.treadwarm.sizing.Sizing.Limit;
import org.treadwarm.sizing.Sizing.Method;
import org.treadwarm.sizing.Sizing.NetworkSolution;
import org.treadwarm.sizing.Sizing.PathLoss;
import org.treadwarm.sizing.Sizing.RoomSizing;
import org.treadwarm.sizing.Sizing.SideSizing;
import org.treadwarm.sizing.Sizing.SpaceSizing;
import org.treadwarm.sizing.Sizing.Total;
import org.treadwarm.survey.Assembly;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.Layer;
import org.treadwarm.survey.Unusual;
import org.treadwarm.units.Reading;

/** Turns the numbers of an evaluation into the records of the answer. */
final class Answers {
    private final Plan plan;
    private final Evaluation numbers;
    private final double[] fromAbove;
    private final boolean[] hasFloorAbove;
    private WaterLayouts waters;

    Answers(Evaluation numbers) {
        this.numbers = numbers;
        this.plan = numbers.plan;
        this.fromAbove = new double[plan.nodeNames.length];
        this.hasFloorAbove = new boolean[plan.nodeNames.length];
    }

    /** The answer, its first warnings being of the readings that are unusual. */
    Sizing sizing(List<Unusual> unusual) {
        for (FloorEvaluation floor : numbers.floors) {
            if (floor != null && floor.plan.other() != Stack.NONE) {
                FloorState required = state(floor, floor.requiredFlux);
                fromAbove[floor.plan.other()] += required.downwardFlux() * floor.area;
                hasFloorAbove[floor.plan.other()] = true;
            }
        }
        waters = WaterLayouts.of(numbers);
        List<RoomSizing> rooms = new ArrayList<>(plan.rooms);
        Warnings warnings = new Warnings(plan, numbers, unusual);
        for (int i = 0; i < plan.rooms; i++) {
            rooms.add(room(i));
            warnings.room(i, rooms.get(i));
        }
        List<SpaceSizing> spaces = new ArrayList<>();
        for (int node : plan.floatingNodes) {
            spaces.add(space(node));
        }
        List<AssemblySizing> assemblies = assemblies();
        return new Sizing(
                List.copyOf(rooms),
                List.copyOf(spaces),
                total(rooms),
                assemblies,
                new NetworkSolution(plan.floatingNodes.length, numbers.residual),
                warnings.all(),
                new Method(Sizing.METHOD_VERSION));
    }

    private RoomSizing room(int i) {
        HeatLoss loss = heatLoss(i);
        FloorSizing floor = numbers.floors[i] == null ? noFloor() : floor(numbers.floors[i]);
        List<Caution> cautions = Cautions.of(plan.survey.rooms().get(i), plan.survey);
        return new RoomSizing(plan.nodeNames[i], numbers.temperature[i], loss, floor, fromAbove(i), cautions);
    }

    private OptionalDouble fromAbove(int node) {
        return hasFloorAbove[node] ? of(fromAbove[node]) : empty();
    }

    private HeatLoss heatLoss(int room) {
        double transmission = 0;
        double junctions = 0;
        double air = 0;
        double gains = 0;
        for (PathRef path : plan.paths[room]) {
            double heat = numbers.heatFlow(room, path);
            LinkKind kind = plan.links.get(path.link()).kind();
            switch (kind) {
                case SURFACE, OPENING -> {
                    transmission += heat;
                    if (heat < 0 && isNeighbour(path)) {
                        gains -= heat;
                    }
                }
                case JUNCTION -> junctions += heat;
                case AIR -> air += heat;
            }
        }
        double reheat = numbers.reheat[room];
        double total = transmission + junctions + air + reheat;
        List<PathLoss> paths = paths(room, total > 0 ? total : 0);
        if (reheat > 0) {
            paths.add(new PathLoss(
                    "reheat",
                    Optional.empty(),
                    "reheat",
                    empty(),
                    empty(),
                    empty(),
                    empty(),
                    reheat,
                    total > 0 ? of(reheat / total) : empty(),
                    Optional.empty()));
        }
        return new HeatLoss(total, transmission, junctions, air, reheat, gains, List.copyOf(paths));
    }

    private boolean isNeighbour(PathRef path) {
        Link link = plan.links.get(path.link());
        int other = path.heard() ? link.owner() : link.other();
        return other < plan.outdoors;
    }

    private List<PathLoss> paths(int node, double total) {
        List<PathLoss> paths = new ArrayList<>(plan.paths[node].length + 1);
        for (PathRef path : plan.paths[node]) {
            Link link = plan.links.get(path.link());
            int i = path.link();
            double conductance = numbers.conductance[i];
            double heat = numbers.heatFlow(node, path);
            boolean surface = numbers.isTransmission(path);
            paths.add(new PathLoss(
                    link.name(),
                    Optional.of(plan.nodeNames[path.heard() ? link.owner() : link.other()]),
                    kind(link.kind()),
                    surface ? of(numbers.area[i]) : empty(),
                    surface ? of(numbers.uValue[i]) : empty(),
                    of(conductance),
                    conductance == 0 ? empty() : of(numbers.difference(node, path)),
                    heat,
                    total > 0 ? of(heat / total) : empty(),
                    link.ground() == Stack.NONE
                            ? Optional.empty()
                            : Optional.of(groundPath(link.ground(), of(numbers.deckFilm(link))))));
        }
        return paths;
    }

    private GroundPath groundPath(int ground, OptionalDouble insideFilm) {
        boolean suspended = plan.grounds.get(ground).suspended();
        return new GroundPath(
                numbers.groundDimension[ground],
                numbers.groundThickness[ground],
                numbers.seasonal(),
                insideFilm,
                suspended ? of(numbers.groundToSoil[ground]) : empty(),
                suspended ? of(numbers.groundToOutdoors[ground]) : empty());
    }

    private static String kind(LinkKind kind) {
        return switch (kind) {
            case SURFACE -> "transmission";
            case OPENING -> "opening";
            case JUNCTION -> "junction";
            case AIR -> "air";
        };
    }

    /** What the floating spaces settle at. */
    List<SpaceBalance> spaceBalances() {
        return Arrays.stream(plan.floatingNodes)
                .mapToObj(node ->
                        new SpaceBalance(plan.nodeNames[node], numbers.temperature[node], List.copyOf(paths(node, 0))))
                .toList();
    }

    private SpaceSizing space(int node) {
        return new SpaceSizing(
                plan.nodeNames[node],
                numbers.temperature[node],
                of(numbers.slope[node]),
                fromAbove(node),
                List.copyOf(paths(node, 0)));
    }

    private Total total(List<RoomSizing> rooms) {
        double loss = 0;
        double power = 0;
        double area = 0;
        double installed = 0;
        boolean anyInstalled = false;
        for (RoomSizing room : rooms) {
            loss += room.heatLoss().total();
            power += room.floor().heaterPower().orElse(0);
            area += room.floor().area().orElse(0);
            installed += room.floor().installedPower().orElse(0);
            anyInstalled |= room.floor().installedPower().isPresent();
        }
        return new Total(loss, power, anyInstalled ? of(installed) : empty(), area, waters.total());
    }

    private static FloorSizing noFloor() {
        OptionalDouble none = empty();
        return new FloorSizing(
                Verdict.NO_HEATED_FLOOR,
                none,
                none,
                none,
                none,
                none,
                none,
                none,
                none,
                none,
                Optional.empty(),
                none,
                Optional.empty(),
                none,
                none,
                none,
                none,
                none,
                Optional.empty(),
                none,
                none,
                none,
                none,
                none,
                none,
                List.of(),
                List.of(),
                Optional.empty(),
                List.of(),
                List.of(),
                Optional.empty(),
                List.of(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty(),
                Optional.empty());
    }

    private FloorSizing floor(FloorEvaluation floor) {
        double required = floor.requiredFlux;
        double margin = floor.carryingFlux - required;
        double shortfall = Math.max(0, -margin) * floor.area;
        double otherHeat = numbers.in[plan.roomIndexes[floor.plan.room()].otherHeat()];
        FloorState state = state(floor, required);
        boolean holds = Double.isFinite(floor.holdsDownTo);
        HeatedFloor given =
                plan.survey.rooms().get(floor.plan.room()).heatedFloor().orElseThrow();
        Optional<FreeFloor> free = given.plan().map(rectangle -> FreeFloors.of(rectangle, floor.area));
        return new FloorSizing(
                margin >= 0 ? Verdict.CARRIES : Verdict.CARRIES_WITH_SUPPLEMENT,
                of(floor.area),
                of(floor.requiredHeat),
                of(required),
                of(floor.carryingFlux),
                of(margin),
                Double.isFinite(margin / required) ? of(margin / required) : empty(),
                of(shortfall),
                of(Math.max(0, shortfall - otherHeat)),
                holds ? of(floor.holdsDownTo) : empty(),
                holds ? Optional.empty() : Optional.of(floor.holdsDownTo < 0 ? "beyond -60" : "never"),
                of(state.surfaceTemperature()),
                Optional.of(floor.section == null && floor.parted == null ? "mean (plane)" : "warmest point (section)"),
                of(state.heaterTemperature()),
                of(state.downwardFlux()),
                of(state.edgeFlux()),
                of(state.heaterFlux()),
                of(state.heaterPower()),
                Optional.of(state(floor, floor.carryingFlux)),
                floor.plan.heater().hasDensity() ? of(floor.density()) : empty(),
                floor.plan.heater().hasDensity() ? of(floor.density() * floor.area) : empty(),
                BuildUp.height(given),
                BuildUp.load(given),
                of(floor.resistanceAbove),
                of(floor.resistanceBelow),
                layers(plan.stacks.get(floor.plan.above()), given.above()),
                layers(plan.stacks.get(floor.plan.below()), given.below()),
                Optional.of(below(floor)),
                edges(floor),
                limits(floor, given),
                floor.section == null ? Optional.empty() : Optional.of(new SectionAnswers(floor.section, given).all()),
                floor.parted == null ? List.of() : new PartAnswers(floor, given).all(),
                floor.sectionReason.isEmpty() ? Optional.empty() : Optional.of(floor.sectionReason),
                ElectricLayouts.of(floor, given, floor.mats.layout()),
                waters.of(floor.plan.room()),
                floor.warmUp.map(WarmUpFloor::answer),
                floor.warmUpReason.isEmpty() ? Optional.empty() : Optional.of(floor.warmUpReason),
                free,
                floor.mats.reason());
    }

    private FloorState state(FloorEvaluation floor, double flux) {
        if (floor.parted != null) {
            return PartAnswers.whole(floor.parted, flux, numbers.outdoor);
        }
        if (floor.section != null) {
            SectionFloor.State state = floor.section.at(flux, numbers.outdoor);
            return new FloorState(
                    state.warmest(),
                    state.heater(),
                    state.downward(),
                    state.edge(),
                    state.made(),
                    state.made() * floor.area);
        }
        double heater = floor.heaterTemperature(flux);
        double down = floor.downwardFlux(heater, numbers.outdoor);
        double edge = floor.edgeFlux(heater, numbers.outdoor);
        double made = flux + down + edge;
        return new FloorState(floor.surfaceTemperature(flux), heater, down, edge, made, made * floor.area);
    }

    private Below below(FloorEvaluation floor) {
        FloorPlan given = floor.plan;
        double temperature = (floor.downConstant + floor.downSlope * numbers.outdoor) / floor.downCoefficient;
        boolean bridged = plan.stacks.get(given.below()).frames > 0;
        boolean onGround = given.ground() != Stack.NONE;
        return new Below(
                plan.nodeNames[onGround ? plan.ground : given.other()],
                floor.downCoefficient,
                temperature,
                bridged ? of(numbers.upperLimit(given.below(), floor.filmBelow())) : empty(),
                bridged ? of(numbers.lowerLimit(given.below(), floor.filmBelow())) : empty(),
                onGround ? Optional.of(groundPath(given.ground(), empty())) : Optional.empty());
    }

    private List<Edge> edges(FloorEvaluation floor) {
        List<Edge> edges = new ArrayList<>();
        for (EdgePlan edge : floor.plan.edges()) {
            double temperature = numbers.constantSeenFrom(floor.plan.room(), edge.other())
                    + numbers.slopeSeenFrom(edge.other()) * numbers.outdoor;
            edges.add(new Edge(
                    edge.name(),
                    plan.nodeNames[edge.other()],
                    numbers.in[edge.psi()] * numbers.in[edge.length()],
                    temperature));
        }
        return List.copyOf(edges);
    }

    private List<Limit> limits(FloorEvaluation floor, HeatedFloor given) {
        List<Limit> limits = new ArrayList<>();
        int slots = floor.slotsOfAPart();
        for (int i = 0; i < slots && floor.parted == null; i++) {
            addLimit(limits, floor, i, Limits.name(floor.plan, given.zone(), i), Limits.source(i));
        }
        for (int i = 0; i < slots * floor.plan.parts().size() && floor.parted != null; i++) {
            PartPlan part = floor.plan.parts().get(i / slots);
            String name = Limits.name(floor.plan, part.zone(), i % slots) + ", " + part.name();
            addLimit(limits, floor, i, name, Limits.source(i % slots));
        }
        addLimit(limits, floor, floor.limits.length - 3, Limits.HEATER, Limits.HEATER_SOURCE);
        addLimit(limits, floor, floor.limits.length - 2, Limits.WATER, Limits.WATER_SOURCE);
        addLimit(limits, floor, floor.limits.length - 1, Limits.MATS, Limits.MATS_SOURCE);
        return List.copyOf(limits);
    }

    private static void addLimit(List<Limit> limits, FloorEvaluation floor, int i, String name, String source) {
        double maximum = floor.limits[i];
        if (Double.isFinite(maximum)) {
            limits.add(new Limit(name, maximum, maximum - floor.requiredFlux, floor.governing == i, source));
        }
    }

    private List<AssemblySizing> assemblies() {
        List<List<SideSizing>> sides = new ArrayList<>();
        plan.assemblies.forEach(assembly -> sides.add(new ArrayList<>()));
        for (int face = 0; face < plan.faces.size(); face++) {
            sides.get(plan.faces.get(face).assembly()).add(side(face));
        }
        List<AssemblySizing> answers = new ArrayList<>();
        int i = 0;
        for (Assembly assembly : plan.survey.assemblies().values()) {
            Plan.AssemblyPlan compiled = plan.assemblies.get(i);
            List<LayerSizing> layers = compiled.stack() == Stack.NONE
                    ? List.of()
                    : layers(plan.stacks.get(compiled.stack()), assembly.layers());
            answers.add(new AssemblySizing(compiled.name(), layers, List.copyOf(sides.get(i))));
            i++;
        }
        return List.copyOf(answers);
    }

    private List<LayerSizing> layers(Stack stack, List<Layer> given) {
        List<LayerSizing> layers = new ArrayList<>();
        for (int i = 0; i < given.size(); i++) {
            layers.add(new LayerSizing(
                    given.get(i).title(i + 1),
                    numbers.layerResistance[stack.first + i],
                    stack.frame[i] == Stack.NONE ? empty() : of(numbers.bridgeResistance[stack.first + i])));
        }
        return List.copyOf(layers);
    }

    private SideSizing side(int face) {
        Plan.AssemblyPlan assembly = plan.assemblies.get(plan.faces.get(face).assembly());
        Side side = plan.faces.get(face).side();
        if (assembly.stack() == Stack.NONE) {
            OptionalDouble none = empty();
            return new SideSizing(side.word, none, none, none, none, none, none, of(numbers.faceUValue[face]));
        }
        boolean ground = side == Side.GROUND;
        return new SideSizing(
                side.word,
                ground ? empty() : of(numbers.insideFilm(assembly)),
                ground ? empty() : of(numbers.otherFilm(assembly, side)),
                of(numbers.faceUpper[face]),
                of(numbers.faceLower[face]),
                numbers.faceUpper[face] + numbers.faceLower[face] == 0
                        ? empty()
                        : of(CombinedMethod.largestRelativeError(numbers.faceUpper[face], numbers.faceLower[face])),
                of(numbers.faceResistance[face]),
                ground ? empty() : of(numbers.faceUValue[face]));
    }

    /** The value of a reading, for rules that look at the survey. */
    static double value(Optional<Reading> reading) {
        return reading.map(Reading::value).orElse(0.0);
    }
}
