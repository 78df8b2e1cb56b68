package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
import java.util.stream.Collectors;
import org.treadwarm.physics.floor.Pipe;
import org.treadwarm.physics.floor.ScreedFloor;
import org.treadwarm.physics.section.FloorHeater.WaterPipe;
import org.treadwarm.physics.section.FloorLayer.Solid;
import org.treadwarm.physics.water.CircuitLimits;
import org.treadwarm.physics.water.HeatCarrier;
import org.treadwarm.physics.water.HeatedZone;
import org.treadwarm.physics.water.HeatingWater;
import org.treadwarm.physics.water.JobSupply;
import org.treadwarm.physics.water.JobSupply.RoomNeed;
import org.treadwarm.physics.water.Manifold;
import org.treadwarm.physics.water.Manifold.Valve;
import org.treadwarm.physics.water.PropyleneGlycol;
import org.treadwarm.physics.water.RoomCircuits;
import org.treadwarm.physics.water.RoomCircuits.Loops;
import org.treadwarm.physics.water.Tube;
import org.treadwarm.physics.water.Water;
import org.treadwarm.sizing.PartedFloor.Part;
import org.treadwarm.sizing.Sizing.LoopValve;
import org.treadwarm.sizing.Sizing.ManifoldSizing;
import org.treadwarm.sizing.Sizing.PartLoops;
import org.treadwarm.sizing.Sizing.PracticeJudgement;
import org.treadwarm.sizing.Sizing.WaterLayout;
import org.treadwarm.sizing.Sizing.WaterTotal;
import org.treadwarm.survey.Heater;
import org.treadwarm.survey.Survey;
import org.treadwarm.units.Reading;

/** Lays the loops of a job's warm-water floors that are solved, and balances them. */
final class WaterLayouts {
    /** Longest loop that is laid, m, and largest drop of pressure in it, Pa; common practice, no source. */
    private static final double LONGEST = 100;

    private static final double LARGEST_DROP = 25_000;

    /** Water between these temperatures, degrees Celsius, is looked at: it neither freezes nor boils. */
    private static final double COLDEST = 1;

    private static final double HOTTEST = 95;

    private static final Water WATER = Water.atAtmosphere();

    /** A part of a room's floor, or the whole, whose loops are its own. */
    private record Run(Optional<String> part, SectionGeometry geometry, HeatedZone zone) {}

    /** A room's water before and after its loops are laid, those of each run alike. */
    private record Room(
            FloorEvaluation floor,
            String name,
            List<Run> runs,
            double over,
            OptionalDouble given,
            double supply,
            double spread,
            List<Loops> loops) {
        double heat() {
            return runs.stream().mapToDouble(run -> run.zone().heat()).sum();
        }

        Loops worst() {
            return loops.stream()
                    .max(Comparator.comparingDouble(Loops::pressureDrop))
                    .orElseThrow();
        }

        Optional<String> manifold() {
            return heater(floor).manifold();
        }

        /** What flows through its pipes. */
        HeatCarrier carrier() {
            double glycol = heater(floor).glycol().map(Reading::value).orElse(0.0);
            return glycol > 0 ? new PropyleneGlycol(glycol) : WATER;
        }

        /** The hottest that its water may be, degrees Celsius. */
        double hottest() {
            return carrier() instanceof PropyleneGlycol ? PropyleneGlycol.HOTTEST : HOTTEST;
        }

        double ownSupply() {
            return floor.room + HeatingWater.supplyOvertemperature(over, floor.waterSpread());
        }

        Room at(double temperature) {
            double found = HeatingWater.spread(over, temperature - floor.room);
            return new Room(floor, name, runs, over, given, temperature, found, loops);
        }

        Room laid(List<Loops> found) {
            return new Room(floor, name, runs, over, given, supply, spread, found);
        }
    }

    private final Map<Integer, WaterLayout> layouts = new TreeMap<>();
    private final ManifoldDrops manifoldDrops;
    private final OptionalDouble sourceDrop;
    private Optional<WaterTotal> total = Optional.empty();

    private WaterLayouts(Survey survey) {
        this.manifoldDrops = new ManifoldDrops(survey);
        this.sourceDrop = survey.site()
                .heatSourceDrop()
                .map(drop -> OptionalDouble.of(drop.value()))
                .orElse(OptionalDouble.empty());
    }

    /** The loops of every room whose water floor is solved and gives heat. */
    static WaterLayouts of(Evaluation numbers) {
        WaterLayouts layouts = new WaterLayouts(numbers.plan.survey);
        List<Room> rooms = new ArrayList<>();
        for (FloorEvaluation floor : numbers.floors) {
            if (floor != null && floor.plan.heater().water()) {
                room(numbers, floor).ifPresent(rooms::add);
            }
        }
        if (!rooms.isEmpty()) {
            layouts.lay(rooms);
        }
        return layouts;
    }

    Optional<WaterLayout> of(int room) {
        return Optional.ofNullable(layouts.get(room));
    }

    Optional<WaterTotal> total() {
        return total;
    }

    private static Optional<Room> room(Evaluation numbers, FloorEvaluation floor) {
        double flux = Math.min(floor.requiredFlux, floor.carryingFlux);
        if (flux <= 0 || floor.room < COLDEST || floor.section == null && floor.parted == null) {
            return Optional.empty();
        }
        List<Part> parts = floor.parted == null
                ? List.of(new Part("", floor.zone(), floor.area, floor.section))
                : floor.parted.parts;
        List<SectionFloor.State> states = floor.parted == null
                ? List.of(floor.section.at(flux, numbers.outdoor))
                : floor.parted.at(flux, numbers.outdoor);
        List<Run> runs = new ArrayList<>();
        for (int i = 0; i < parts.size(); i++) {
            SectionFloor.State state = states.get(i);
            if (state.downward() < 0) {
                return Optional.empty();
            }
            if (state.flux() > 0) {
                runs.add(run(floor, parts.get(i), state));
            }
        }
        double over = states.get(0).water() - floor.room;
        if (over <= 0) {
            return Optional.empty();
        }
        int supply = floor.plan.heater().supplyTemperature();
        Room room = new Room(
                floor,
                numbers.plan.nodeNames[floor.plan.room()],
                List.copyOf(runs),
                over,
                supply == Stack.NONE ? OptionalDouble.empty() : OptionalDouble.of(numbers.in[supply]),
                0,
                0,
                List.of());
        return room.ownSupply() > room.hottest() ? Optional.empty() : Optional.of(room);
    }

    private static Run run(FloorEvaluation floor, Part part, SectionFloor.State state) {
        SectionGeometry geometry = part.section().geometry;
        return new Run(
                floor.parted == null ? Optional.empty() : Optional.of(part.name()),
                geometry,
                new HeatedZone(part.area(), geometry.spacing(), state.flux(), state.made() - state.flux()));
    }

    private void lay(List<Room> rooms) {
        Room governing =
                rooms.stream().max(Comparator.comparingDouble(Room::ownSupply)).orElseThrow();
        List<RoomNeed> needs = rooms.stream()
                .map(room -> new RoomNeed(room.name(), room.floor().room, room.over(), room.heat()))
                .toList();
        double supply =
                JobSupply.of(needs, governing.floor().waterSpread(), WATER).supply();
        List<Room> laid = rooms.stream()
                .map(room -> room.at(Math.max(room.given().orElse(supply), room.ownSupply())))
                .filter(room -> room.supply() <= room.hottest())
                .flatMap(room -> circuits(room).stream())
                .toList();
        if (laid.isEmpty()) {
            return;
        }
        Map<Optional<String>, List<Room>> byManifold =
                laid.stream().collect(Collectors.groupingBy(Room::manifold, LinkedHashMap::new, Collectors.toList()));
        byManifold.values().forEach(on -> {
            int loops = on.stream().mapToInt(WaterLayouts::count).sum();
            on.forEach(room -> layouts.put(room.floor().plan.room(), layout(room, loops)));
        });
        total = Optional.of(total(governing.name(), byManifold));
    }

    private static int count(Room room) {
        return room.loops().stream().mapToInt(Loops::count).sum();
    }

    private WaterTotal total(String governing, Map<Optional<String>, List<Room>> byManifold) {
        Map<Optional<String>, Manifold> balanced = new LinkedHashMap<>();
        byManifold.forEach((name, on) ->
                balanced.put(name, balance(on, manifoldDrops.of(name).orElse(0))));
        double pressure = balanced.values().stream()
                .mapToDouble(manifold -> manifold.duty().pressure())
                .max()
                .orElseThrow();
        List<ManifoldSizing> manifolds = new ArrayList<>();
        List<LoopValve> valves = new ArrayList<>();
        balanced.forEach((name, manifold) -> {
            manifolds.add(answer(name, manifold, manifoldDrops.of(name), pressure));
            valves.addAll(valves(byManifold.get(name), manifold));
        });
        return new WaterTotal(
                byManifold.values().stream()
                        .mapToDouble(WaterLayouts::hottest)
                        .max()
                        .orElseThrow(),
                governing,
                manifolds.stream().mapToDouble(ManifoldSizing::massFlow).sum(),
                manifolds.stream().mapToDouble(ManifoldSizing::volumeFlow).sum(),
                pressure + sourceDrop.orElse(0),
                sourceDrop,
                manifolds.stream().mapToDouble(ManifoldSizing::waterContent).sum(),
                List.copyOf(manifolds),
                List.copyOf(valves));
    }

    private static ManifoldSizing answer(
            Optional<String> name, Manifold manifold, OptionalDouble ownDrop, double pressure) {
        double worst = manifold.valves().stream().mapToDouble(Valve::drop).max().orElseThrow();
        return new ManifoldSizing(
                name,
                manifold.valves().size(),
                manifold.duty().massFlow(),
                manifold.duty().volumeFlow(),
                manifold.duty().pressure(),
                ownDrop.isPresent() ? OptionalDouble.of(worst) : OptionalDouble.empty(),
                ownDrop,
                pressure - manifold.duty().pressure(),
                manifold.content());
    }

    private static double hottest(List<Room> rooms) {
        return rooms.stream().mapToDouble(Room::supply).max().orElseThrow();
    }

    private static Manifold balance(List<Room> rooms, double ownDrop) {
        List<Loops> loops =
                rooms.stream().flatMap(room -> room.loops().stream()).toList();
        return Manifold.balance(loops, ownDrop, rooms.get(0).carrier().density(hottest(rooms)));
    }

    /** The valves of a manifold; its loops stand in the order of rooms and parts. */
    private static List<LoopValve> valves(List<Room> rooms, Manifold manifold) {
        List<LoopValve> valves = new ArrayList<>();
        for (Room room : rooms) {
            for (int i = 0; i < room.loops().size(); i++) {
                for (int loop = 1; loop <= room.loops().get(i).count(); loop++) {
                    Valve valve = manifold.valves().get(valves.size());
                    valves.add(new LoopValve(
                            room.name(),
                            room.runs().get(i).part(),
                            loop,
                            valve.massFlow(),
                            valve.drop(),
                            valve.throttled()));
                }
            }
        }
        return List.copyOf(valves);
    }

    private static RoomCircuits asked(Room room, Run run) {
        double feeders = heater(room.floor()).feederLength().map(Reading::value).orElse(0.0);
        return new RoomCircuits(room.name(), List.of(run.zone()), feeders, room.supply(), room.spread());
    }

    private static Heater heater(FloorEvaluation floor) {
        return floor.whole()
                .plan
                .survey
                .rooms()
                .get(floor.plan.room())
                .heatedFloor()
                .orElseThrow()
                .heater()
                .orElseThrow();
    }

    private static WaterPipe pipe(Run run) {
        return (WaterPipe) run.geometry().heater();
    }

    private static Tube tube(Run run) {
        return Tube.smooth(pipe(run).diameter() - 2 * pipe(run).wallThickness());
    }

    /** The room with its loops; empty when no number of loops keeps the longest length and the largest drop. */
    private static Optional<Room> circuits(Room room) {
        try {
            return Optional.of(room.laid(room.runs().stream()
                    .map(run -> asked(room, run).lay(tube(run), room.carrier(), LONGEST, LARGEST_DROP))
                    .toList()));
        } catch (IllegalArgumentException tooMuch) {
            return Optional.empty();
        }
    }

    private static WaterLayout layout(Room room, int onManifold) {
        Loops worst = room.worst();
        double massFlow = massFlow(room.loops());
        boolean whole = room.floor().parted == null;
        Run run = room.runs().get(0);
        OptionalDouble table = whole ? tableCoefficient(room.floor(), run) : OptionalDouble.empty();
        return new WaterLayout(
                room.supply(),
                room.supply() - room.spread(),
                room.spread(),
                room.over(),
                room.heat(),
                massFlow,
                massFlow / room.carrier().density(room.supply() - room.spread() / 2),
                count(room),
                room.loops().stream().mapToDouble(Loops::length).max().orElseThrow(),
                worst.flow().velocity(),
                worst.flow().reynolds(),
                worst.flow().friction(),
                worst.pressureDrop(),
                room.loops().stream().mapToDouble(Loops::content).sum(),
                table,
                table.isPresent()
                        ? OptionalDouble.of(run.zone().upwardFlux() / table.getAsDouble())
                        : OptionalDouble.empty(),
                whole ? limits(room, 0, onManifold) : List.of(),
                whole ? List.of() : parts(room, onManifold));
    }

    private static double massFlow(List<Loops> loops) {
        return loops.stream()
                .mapToDouble(each -> each.count() * each.massFlow())
                .sum();
    }

    private static List<PracticeJudgement> limits(Room room, int run, int onManifold) {
        return ElectricLayouts.judgements(CircuitLimits.judge(
                asked(room, room.runs().get(run)), room.loops().get(run), onManifold, Practice.water()));
    }

    private static List<PartLoops> parts(Room room, int onManifold) {
        List<PartLoops> parts = new ArrayList<>();
        for (int i = 0; i < room.runs().size(); i++) {
            Loops loops = room.loops().get(i);
            parts.add(new PartLoops(
                    room.runs().get(i).part().orElseThrow(),
                    room.runs().get(i).zone().heat(),
                    massFlow(List.of(loops)),
                    loops.count(),
                    loops.length(),
                    loops.flow().velocity(),
                    loops.flow().reynolds(),
                    loops.flow().friction(),
                    loops.pressureDrop(),
                    loops.content(),
                    limits(room, i, onManifold)));
        }
        return List.copyOf(parts);
    }

    /** K_H of the table method for pipes in the screed; empty when the floor lies outside its tables. */
    private static OptionalDouble tableCoefficient(FloorEvaluation floor, Run run) {
        SectionGeometry geometry = run.geometry();
        Solid screed = (Solid) geometry.layers().get(geometry.heater().layer());
        double covering = floor.resistanceAbove - screed.resistance();
        WaterPipe pipe = pipe(run);
        try {
            return OptionalDouble.of(FloorMethods.pipesInScreed()
                    .coefficient(new ScreedFloor(
                            geometry.spacing(),
                            screed.thickness() - pipe.diameter(),
                            screed.conductivity(),
                            Math.max(0, covering),
                            new Pipe(
                                    pipe.diameter(),
                                    pipe.wallThickness(),
                                    pipe.wallConductivity(),
                                    Optional.empty()))));
        } catch (IllegalArgumentException outsideTheTables) {
            return OptionalDouble.empty();
        }
    }
}
