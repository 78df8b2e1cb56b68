package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.HashMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.treadwarm.physics.envelope.HeatFlow;
import org.treadwarm.sizing.Plan.AirWay;
import org.treadwarm.sizing.Plan.AssemblyPlan;
import org.treadwarm.sizing.Plan.EdgePlan;
import org.treadwarm.sizing.Plan.Face;
import org.treadwarm.sizing.Plan.FloorPlan;
import org.treadwarm.sizing.Plan.GroundPlan;
import org.treadwarm.sizing.Plan.HeaterPlan;
import org.treadwarm.sizing.Plan.LayerLimit;
import org.treadwarm.sizing.Plan.Link;
import org.treadwarm.sizing.Plan.LinkKind;
import org.treadwarm.sizing.Plan.PartPlan;
import org.treadwarm.sizing.Plan.PathRef;
import org.treadwarm.sizing.Plan.RoomIndexes;
import org.treadwarm.sizing.Plan.Side;
import org.treadwarm.sizing.Plan.SiteIndexes;
import org.treadwarm.survey.Air;
import org.treadwarm.survey.Assembly;
import org.treadwarm.survey.FloorPart;
import org.treadwarm.survey.Ground;
import org.treadwarm.survey.GroundKind;
import org.treadwarm.survey.HeatedFloor;
import org.treadwarm.survey.Heater;
import org.treadwarm.survey.HeaterKind;
import org.treadwarm.survey.Junction;
import org.treadwarm.survey.JunctionPlace;
import org.treadwarm.survey.Layer;
import org.treadwarm.survey.Opening;
import org.treadwarm.survey.Place;
import org.treadwarm.survey.Room;
import org.treadwarm.survey.Site;
import org.treadwarm.survey.Space;
import org.treadwarm.survey.SpaceKind;
import org.treadwarm.survey.Surface;
import org.treadwarm.survey.Survey;
import org.treadwarm.survey.WarmUpGoal;
import org.treadwarm.tables.Films;
import org.treadwarm.units.Reading;

/** Compiles a survey: names become node numbers, readings become indexes, materials become numbers. */
final class PlanBuilder {
    private static final int NONE = Stack.NONE;

    /** Own surfaces, heard surfaces, own junctions, heard junctions, air. */
    private static final int RANKS = 5;

    private static final int SIDES = Side.values().length;

    final Survey survey;
    final Inputs inputs = new Inputs();
    final int rooms;
    final int spaces;
    final String[] nodeNames;
    final int[] nodeTemperature;
    final int[] floating;
    final int[] factor;
    final StackBuilder stacks = new StackBuilder(inputs);
    final List<AssemblyPlan> assemblies = new ArrayList<>();
    final List<Face> faces = new ArrayList<>();
    final List<GroundPlan> grounds = new ArrayList<>();
    final List<Link> links = new ArrayList<>();
    final FloorPlan[] floors;
    final RoomIndexes[] roomIndexes;
    int[] floatingNodes;
    int[] pairFrom;
    int[] pairTo;
    int[] linkPair;
    SiteIndexes site;

    private final Map<String, Integer> nodes = new HashMap<>();
    private final Map<String, Integer> assemblyNumbers = new HashMap<>();

    /** The number of the face of each assembly on each side, or none. */
    private final int[] faceNumbers;

    PlanBuilder(Survey survey) {
        this.survey = survey;
        rooms = survey.rooms().size();
        spaces = survey.spaces().size();
        nodeNames = new String[rooms + spaces + 2];
        nodeTemperature = new int[rooms + spaces + 2];
        floating = new int[rooms + spaces + 2];
        factor = new int[rooms + spaces + 2];
        floors = new FloorPlan[rooms];
        roomIndexes = new RoomIndexes[rooms];
        faceNumbers = new int[survey.assemblies().size() * SIDES];
    }

    Plan build() {
        java.util.Arrays.fill(nodeTemperature, NONE);
        java.util.Arrays.fill(floating, NONE);
        java.util.Arrays.fill(factor, NONE);
        java.util.Arrays.fill(faceNumbers, NONE);
        site();
        nodes();
        survey.assemblies().forEach(this::assembly);
        int space = rooms;
        for (Map.Entry<String, Space> entry : survey.spaces().entrySet()) {
            Place at = Place.ROOT.at("/spaces").key(entry.getKey());
            Space given = entry.getValue();
            exchanges(at, space++, given.surfaces(), given.junctions(), given.air(), NONE, NONE);
        }
        for (int i = 0; i < rooms; i++) {
            room(i, survey.rooms().get(i));
        }
        pairs();
        return new Plan(this);
    }

    private void site() {
        Site given = survey.site();
        Place at = Place.ROOT.at("/site");
        site = new SiteIndexes(
                inputs.add(at, "/outdoorTemperature", given.outdoorTemperature()),
                inputs.optional(at, "/annualMeanTemperature", given.annualMeanTemperature()),
                inputs.add(at, "/altitude", given.altitude()),
                inputs.add(at, "/groundSeasonFactor", given.groundSeasonFactor()),
                inputs.add(at, "/groundwaterFactor", given.groundwaterFactor()));
    }

    private void nodes() {
        for (int i = 0; i < rooms; i++) {
            Room room = survey.rooms().get(i);
            name(i, room.name());
            nodeTemperature[i] =
                    inputs.add(Place.ROOT.item("/rooms", i), "/indoorTemperature", room.indoorTemperature());
        }
        int node = rooms;
        int floats = 0;
        for (Map.Entry<String, Space> entry : survey.spaces().entrySet()) {
            Space space = entry.getValue();
            Place at = Place.ROOT.at("/spaces").key(entry.getKey());
            name(node, entry.getKey());
            if (space.kind() == SpaceKind.HELD) {
                nodeTemperature[node] =
                        inputs.add(at, "/temperature", space.temperature().orElseThrow());
            } else if (space.temperatureFactor().isPresent()) {
                factor[node] = inputs.add(
                        at, "/temperatureFactor", space.temperatureFactor().get());
            } else {
                floating[node] = floats++;
            }
            node++;
        }
        name(node, Survey.OUTDOORS);
        nodeTemperature[node] = site.outdoor();
        name(node + 1, Survey.GROUND);
        nodeTemperature[node + 1] = site.annualMean();
        floatingNodes = new int[floats];
        for (int i = rooms; i < node; i++) {
            if (floating[i] != NONE) {
                floatingNodes[floating[i]] = i;
            }
        }
    }

    private void name(int node, String name) {
        nodeNames[node] = name;
        nodes.put(name, node);
    }

    private void assembly(String name, Assembly assembly) {
        Place at = Place.ROOT.at("/assemblies").key(name);
        HeatFlow direction = assembly.heatFlow().heatFlow();
        int stack = assembly.uValue().isPresent() ? NONE : stacks.add(at.at("/layers"), assembly.layers(), direction);
        assemblyNumbers.put(name, assemblies.size());
        assemblies.add(new AssemblyPlan(
                name,
                stack,
                inputs.optional(at, "/uValue", assembly.uValue()),
                Films.inside(direction.word()),
                Films.outside(direction.word()),
                inputs.optional(at, "/insideCoefficient", assembly.insideCoefficient()),
                inputs.optional(at, "/outsideCoefficient", assembly.outsideCoefficient())));
    }

    private void room(int i, Room room) {
        Place at = Place.ROOT.item("/rooms", i);
        int floorArea = inputs.add(at, "/floorArea", room.floorArea());
        int height = inputs.add(at, "/height", room.height());
        roomIndexes[i] = new RoomIndexes(
                floorArea,
                height,
                inputs.add(at, "/reheat", room.reheat()),
                inputs.optional(at, "/warmUp/from", room.warmUp().map(WarmUpGoal::from)),
                inputs.optional(at, "/warmUp/within", room.warmUp().map(WarmUpGoal::within)),
                inputs.add(at, "/allowance", room.allowance()),
                inputs.add(at, "/otherHeat", room.otherHeat()));
        exchanges(at, i, room.surfaces(), room.junctions(), room.air(), floorArea, height);
        if (room.heatedFloor().isPresent()) {
            floors[i] = floor(at.at("/heatedFloor"), i, room, room.heatedFloor().get(), floorArea);
        }
    }

    private void exchanges(
            Place at,
            int owner,
            List<Surface> surfaces,
            List<Junction> junctions,
            Optional<Air> air,
            int floorArea,
            int height) {
        for (int i = 0; i < surfaces.size(); i++) {
            surface(at.item("/surfaces", i), owner, surfaces.get(i), floorArea);
        }
        for (int i = 0; i < junctions.size(); i++) {
            Junction junction = junctions.get(i);
            if (junction.at() == JunctionPlace.ROOM) {
                Place own = at.item("/junctions", i);
                int psi = inputs.add(own, "/psi", junction.psi());
                int length = inputs.add(own, "/length", junction.length());
                plain(
                        LinkKind.JUNCTION,
                        junction.title(),
                        owner,
                        nodes.get(junction.to()),
                        psi,
                        length,
                        NONE,
                        AirWay.NONE);
            }
        }
        air.ifPresent(given -> air(at.at("/air"), owner, given, floorArea, height));
    }

    private void plain(LinkKind kind, String name, int owner, int other, int first, int second, int third, AirWay way) {
        links.add(new Link(kind, name, owner, other, NONE, NONE, NONE, NONE, NONE, 0, 0, first, second, third, way));
    }

    private void air(Place at, int owner, Air air, int floorArea, int height) {
        int outdoors = rooms + spaces;
        if (air.changeRate().isPresent()) {
            int rate = inputs.add(at, "/changeRate", air.changeRate().get());
            if (air.volume().isPresent()) {
                int volume = inputs.add(at, "/volume", air.volume().get());
                plain(LinkKind.AIR, "air", owner, outdoors, rate, volume, NONE, AirWay.RATE);
            } else {
                plain(LinkKind.AIR, "air", owner, outdoors, rate, floorArea, height, AirWay.RATE);
            }
        } else if (air.flow().isPresent()) {
            int flow = inputs.add(at, "/flow", air.flow().get());
            plain(LinkKind.AIR, "air", owner, outdoors, flow, NONE, NONE, AirWay.FLOW);
        } else {
            int supply = inputs.add(at, "/supply", air.supply().orElseThrow());
            int recovery = inputs.add(at, "/recovery", air.recovery().orElseThrow());
            plain(LinkKind.AIR, "air", owner, outdoors, supply, recovery, NONE, AirWay.SUPPLY);
        }
    }

    private void surface(Place at, int owner, Surface surface, int floorArea) {
        int other = nodes.get(surface.to());
        int area = extent(at, surface.area(), surface.width());
        int second = inputs.optional(at, "/height", surface.height());
        // A given U-value already holds the slab, so what the survey says of it has no effect.
        boolean groundCounts =
                survey.assemblies().get(surface.assembly()).uValue().isEmpty();
        int ground = surface.ground().isPresent() && groundCounts
                ? ground(at.at("/ground"), surface.ground().get(), floorArea)
                : NONE;
        int face = face(surface.assembly(), side(other));
        int first = links.size() + 1;
        int count = surface.openings().size();
        links.add(new Link(
                LinkKind.SURFACE,
                surface.title(),
                owner,
                other,
                face,
                ground,
                area,
                second,
                NONE,
                first,
                count,
                NONE,
                NONE,
                NONE,
                AirWay.NONE));
        for (int i = 0; i < count; i++) {
            Opening opening = surface.openings().get(i);
            Place own = at.item("/openings", i);
            links.add(new Link(
                    LinkKind.OPENING,
                    opening.title(),
                    owner,
                    other,
                    face(opening.assembly(), side(other)),
                    NONE,
                    extent(own, opening.area(), opening.width()),
                    inputs.optional(own, "/height", opening.height()),
                    inputs.add(own, "/count", opening.count()),
                    0,
                    0,
                    NONE,
                    NONE,
                    NONE,
                    AirWay.NONE));
        }
    }

    /** The input of an area, or of the width that is given with a height instead. */
    private int extent(Place at, Optional<Reading> area, Optional<Reading> width) {
        return area.isPresent() ? inputs.add(at, "/area", area.get()) : inputs.add(at, "/width", width.orElseThrow());
    }

    private Side side(int other) {
        return other == rooms + spaces ? Side.OUTDOORS : other == rooms + spaces + 1 ? Side.GROUND : Side.INDOORS;
    }

    private int face(String assembly, Side side) {
        int number = assemblyNumbers.get(assembly);
        int at = number * SIDES + side.ordinal();
        if (faceNumbers[at] == NONE) {
            faceNumbers[at] = faces.size();
            faces.add(new Face(number, side));
        }
        return faceNumbers[at];
    }

    private int ground(Place at, Ground ground, int floorArea) {
        boolean suspended = ground.kind() == GroundKind.SUSPENDED;
        grounds.add(new GroundPlan(
                suspended,
                ground.area().isPresent()
                        ? inputs.add(at, "/area", ground.area().get())
                        : floorArea,
                inputs.add(at, "/exposedPerimeter", ground.exposedPerimeter()),
                inputs.add(at, "/wallThickness", ground.wallThickness()),
                inputs.add(at, "/soilConductivity", ground.soilConductivity()),
                inputs.optional(at, "/floorHeight", ground.floorHeight()),
                inputs.optional(at, "/wallUValue", ground.wallUValue()),
                inputs.optional(at, "/ventArea", ground.ventArea()),
                inputs.optional(at, "/windSpeed", ground.windSpeed()),
                ground.shielding()));
        return grounds.size() - 1;
    }

    private FloorPlan floor(Place at, int node, Room room, HeatedFloor floor, int floorArea) {
        int above = stacks.add(at.at("/above"), floor.above(), HeatFlow.UP);
        int below = stacks.add(at.at("/below"), floor.below(), HeatFlow.DOWN);
        List<LayerLimit> limits = new ArrayList<>();
        for (int i = 0; i < floor.above().size(); i++) {
            Layer layer = floor.above().get(i);
            if (layer.maximumTemperature().isPresent()) {
                int maximum = inputs.add(
                        at.item("/above", i),
                        "/maximumTemperature",
                        layer.maximumTemperature().get());
                limits.add(new LayerLimit(layer.title(i + 1), i, maximum));
            }
        }
        HeaterPlan heater =
                heater(at.at("/heater"), floor.heater(), !floor.parts().isEmpty());
        return new FloorPlan(
                node,
                inputs.add(at, "/area", floor.area()),
                above,
                below,
                floor.ground().isPresent()
                        ? ground(at.at("/ground"), floor.ground().get(), floorArea)
                        : NONE,
                floor.to().map(nodes::get).orElse(NONE),
                edges(Place.ROOT.item("/rooms", node).at("/junctions"), room.junctions()),
                inputs.optional(at, "/maximumSurfaceTemperature", floor.maximumSurfaceTemperature()),
                List.copyOf(limits),
                heater,
                parts(at.at("/parts"), floor.parts(), heater.spacing()));
    }

    private List<PartPlan> parts(Place list, List<FloorPart> parts, int spacing) {
        List<PartPlan> plans = new ArrayList<>();
        for (int i = 0; i < parts.size(); i++) {
            FloorPart part = parts.get(i);
            Place at = list.item(i);
            int own = inputs.optional(at, "/spacing", part.spacing());
            plans.add(new PartPlan(
                    part.title(i + 1), part.zone(), inputs.add(at, "/area", part.area()), own == NONE ? spacing : own));
        }
        return List.copyOf(plans);
    }

    private HeaterPlan heater(Place at, Optional<Heater> heater, boolean parted) {
        return new HeaterPlan(
                heater.map(given -> given.kind() == HeaterKind.WATER).orElse(false),
                inputs.optional(at, "/density", heater.flatMap(Heater::density)),
                inputs.optional(at, "/spacing", heater.flatMap(Heater::spacing)),
                inputs.optional(at, "/diameter", heater.flatMap(Heater::diameter)),
                inputs.optional(at, "/wallThickness", heater.flatMap(Heater::wallThickness)),
                inputs.optional(at, "/wallConductivity", heater.flatMap(Heater::wallConductivity)),
                inputs.optional(at, "/linearPower", heater.flatMap(Heater::linearPower)),
                inputs.optional(at, "/supplyTemperature", heater.flatMap(Heater::supplyTemperature)),
                inputs.optional(at, "/spread", heater.flatMap(Heater::spread)),
                parted);
    }

    private List<EdgePlan> edges(Place list, List<Junction> junctions) {
        List<EdgePlan> edges = new ArrayList<>();
        for (int i = 0; i < junctions.size(); i++) {
            Junction junction = junctions.get(i);
            if (junction.at() == JunctionPlace.HEATED_FLOOR) {
                Place at = list.item(i);
                edges.add(new EdgePlan(
                        junction.title(),
                        inputs.add(at, "/psi", junction.psi()),
                        inputs.add(at, "/length", junction.length()),
                        nodes.get(junction.to())));
            }
        }
        return List.copyOf(edges);
    }

    /** Joins the links between the same two floating spaces into one pair. */
    private void pairs() {
        Map<Long, Integer> known = new LinkedHashMap<>();
        linkPair = new int[links.size()];
        for (int i = 0; i < linkPair.length; i++) {
            Link link = links.get(i);
            int a = floating[link.owner()];
            int b = floating[link.other()];
            linkPair[i] = NONE;
            if (a != NONE && b != NONE) {
                long key = (long) Math.min(a, b) << 32 | Math.max(a, b);
                Integer pair = known.putIfAbsent(key, known.size());
                linkPair[i] = pair == null ? known.size() - 1 : pair;
            }
        }
        pairFrom = new int[known.size()];
        pairTo = new int[known.size()];
        known.forEach((key, pair) -> {
            pairFrom[pair] = (int) (key >> 32);
            pairTo[pair] = key.intValue();
        });
    }

    /** The paths of every room and space: own surfaces, heard surfaces, own junctions, heard junctions, air. */
    PathRef[][] paths() {
        // by node and rank, in one array
        int[] counts = new int[(rooms + spaces + 2) * RANKS];
        for (Link link : links) {
            counts[link.owner() * RANKS + rank(link, false)]++;
            if (isHeard(link)) {
                counts[link.other() * RANKS + rank(link, true)]++;
            }
        }
        PathRef[][] paths = new PathRef[rooms + spaces + 2][];
        for (int node = 0; node < paths.length; node++) {
            paths[node] = new PathRef[startsOf(counts, node * RANKS)];
        }
        for (int i = 0; i < links.size(); i++) {
            Link link = links.get(i);
            paths[link.owner()][counts[link.owner() * RANKS + rank(link, false)]++] = new PathRef(i, false);
            if (isHeard(link)) {
                paths[link.other()][counts[link.other() * RANKS + rank(link, true)]++] = new PathRef(i, true);
            }
        }
        return paths;
    }

    private static boolean isHeard(Link link) {
        return link.kind() != LinkKind.AIR;
    }

    private static int rank(Link link, boolean heard) {
        return switch (link.kind()) {
            case SURFACE, OPENING -> heard ? 1 : 0;
            case JUNCTION -> heard ? 3 : 2;
            case AIR -> 4;
        };
    }

    /** Turns the counts of one node into the places where each rank starts, and gives their sum. */
    private static int startsOf(int[] counts, int from) {
        int sum = 0;
        for (int i = from; i < from + RANKS; i++) {
            int count = counts[i];
            counts[i] = sum;
            sum += count;
        }
        return sum;
    }
}
