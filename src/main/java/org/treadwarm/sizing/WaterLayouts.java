package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.TreeMap;
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
import org.treadwarm.physics.water.PropyleneGlycol;
import org.treadwarm.physics.water.RoomCircuits;
import org.treadwarm.physics.water.RoomCircuits.Loops;
import org.treadwarm.physics.water.Tube;
import org.treadwarm.physics.water.Water;
import org.treadwarm.sizing.Sizing.LoopValve;
import org.treadwarm.sizing.Sizing.WaterLayout;
import org.treadwarm.sizing.Sizing.WaterTotal;
import org.treadwarm.survey.Heater;
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

    /** A room's water before and after its loops are laid. */
    private record Room(
            FloorEvaluation floor,
            String name,
            double flux,
            double downward,
            double heat,
            double over,
            OptionalDouble given,
            double supply,
            double spread,
            Optional<Loops> loops) {
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
            return floor.room + HeatingWater.supplyOvertemperature(over, floor.section.spread());
        }

        Room at(double temperature) {
            double found = HeatingWater.spread(over, temperature - floor.room);
            return new Room(floor, name, flux, downward, heat, over, given, temperature, found, loops);
        }

        Room laid(Loops found) {
            return new Room(floor, name, flux, downward, heat, over, given, supply, spread, Optional.of(found));
        }
    }

    private final Map<Integer, WaterLayout> layouts = new TreeMap<>();
    private Optional<WaterTotal> total = Optional.empty();

    private WaterLayouts() {}

    /** The loops of every room whose water floor is solved and gives heat. */
    static WaterLayouts of(Evaluation numbers) {
        WaterLayouts layouts = new WaterLayouts();
        List<Room> rooms = new ArrayList<>();
        for (FloorEvaluation floor : numbers.floors) {
            if (floor != null && floor.section != null && floor.plan.heater().water()) {
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
        SectionFloor.State state = floor.section.at(flux, numbers.outdoor);
        double over = state.water() - floor.room;
        double heat = state.made() * floor.area;
        if (flux <= 0 || over <= 0 || heat <= 0 || state.downward() < 0) {
            return Optional.empty();
        }
        double hot = floor.room + HeatingWater.supplyOvertemperature(over, floor.section.spread());
        if (hot > HOTTEST || floor.room < COLDEST) {
            return Optional.empty();
        }
        int supply = floor.plan.heater().supplyTemperature();
        return Optional.of(new Room(
                floor,
                numbers.plan.nodeNames[floor.plan.room()],
                flux,
                heat / floor.area - flux,
                heat,
                over,
                supply == Stack.NONE ? OptionalDouble.empty() : OptionalDouble.of(numbers.in[supply]),
                0,
                0,
                Optional.empty()));
    }

    private void lay(List<Room> rooms) {
        Room governing =
                rooms.stream().max(Comparator.comparingDouble(Room::ownSupply)).orElseThrow();
        List<RoomNeed> needs = rooms.stream()
                .map(room -> new RoomNeed(room.name(), room.floor().room, room.over(), room.heat()))
                .toList();
        double supply =
                JobSupply.of(needs, governing.floor().section.spread(), WATER).supply();
        List<Room> laid = rooms.stream()
                .map(room -> room.at(Math.max(room.given().orElse(supply), room.ownSupply())))
                .filter(room -> room.supply() <= room.hottest())
                .flatMap(room -> circuits(room).stream())
                .toList();
        if (laid.isEmpty()) {
            return;
        }
        List<Loops> loops = laid.stream().flatMap(room -> room.loops().stream()).toList();
        int onManifold = loops.stream().mapToInt(Loops::count).sum();
        laid.forEach(room -> layouts.put(room.floor().plan.room(), layout(room, onManifold)));
        double hottest = laid.stream().mapToDouble(Room::supply).max().orElseThrow();
        Manifold manifold = Manifold.balance(loops, 0, laid.get(0).carrier().density(hottest));
        total = Optional.of(new WaterTotal(
                hottest,
                governing.name(),
                manifold.duty().massFlow(),
                manifold.duty().volumeFlow(),
                manifold.duty().pressure(),
                manifold.content(),
                manifold.valves().stream()
                        .map(valve -> new LoopValve(
                                valve.room(), valve.loop(), valve.massFlow(), valve.drop(), valve.throttled()))
                        .toList()));
    }

    private static RoomCircuits asked(Room room) {
        FloorEvaluation floor = room.floor();
        double feeders = heater(floor).feederLength().map(Reading::value).orElse(0.0);
        HeatedZone zone = new HeatedZone(floor.area, floor.section.geometry.spacing(), room.flux(), room.downward());
        return new RoomCircuits(room.name(), List.of(zone), feeders, room.supply(), room.spread());
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

    private static WaterPipe pipe(Room room) {
        return (WaterPipe) room.floor().section.geometry.heater();
    }

    private static Tube tube(Room room) {
        return Tube.smooth(pipe(room).diameter() - 2 * pipe(room).wallThickness());
    }

    /** The room with its loops; empty when no number of loops keeps the longest length and the largest drop. */
    private static Optional<Room> circuits(Room room) {
        try {
            return Optional.of(room.laid(asked(room).lay(tube(room), room.carrier(), LONGEST, LARGEST_DROP)));
        } catch (IllegalArgumentException tooMuch) {
            return Optional.empty();
        }
    }

    private static WaterLayout layout(Room room, int onManifold) {
        Loops loops = room.loops().orElseThrow();
        double massFlow = loops.count() * loops.massFlow();
        OptionalDouble table = tableCoefficient(room);
        return new WaterLayout(
                room.supply(),
                room.supply() - room.spread(),
                room.spread(),
                room.over(),
                room.heat(),
                massFlow,
                massFlow / room.carrier().density(room.supply() - room.spread() / 2),
                loops.count(),
                loops.length(),
                loops.flow().velocity(),
                loops.flow().reynolds(),
                loops.flow().friction(),
                loops.pressureDrop(),
                loops.content(),
                table,
                table.isPresent() ? OptionalDouble.of(room.flux() / table.getAsDouble()) : OptionalDouble.empty(),
                ElectricLayouts.judgements(CircuitLimits.judge(asked(room), loops, onManifold, Practice.water())));
    }

    /** K_H of the table method for pipes in the screed; empty when the floor lies outside its tables. */
    private static OptionalDouble tableCoefficient(Room room) {
        SectionGeometry geometry = room.floor().section.geometry;
        Solid screed = (Solid) geometry.layers().get(geometry.heater().layer());
        double covering = room.floor().resistanceAbove - screed.resistance();
        WaterPipe pipe = pipe(room);
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
