package org.treadwarm.sizing;

import java.util.List;
import java.util.Optional;
import org.treadwarm.physics.air.AirHeat;
import org.treadwarm.physics.ground.SlabOnGround;
import org.treadwarm.physics.ground.SuspendedFloor;
import org.treadwarm.physics.network.Network;
import org.treadwarm.sizing.Plan.AssemblyPlan;
import org.treadwarm.sizing.Plan.Face;
import org.treadwarm.sizing.Plan.GroundPlan;
import org.treadwarm.sizing.Plan.Link;
import org.treadwarm.sizing.Plan.LinkKind;
import org.treadwarm.sizing.Plan.PathRef;
import org.treadwarm.sizing.Plan.Side;
import org.treadwarm.survey.Pointer;
import org.treadwarm.tables.Films;

/**
 * One sizing as plain numbers: everything that a plan computes from one set of inputs. May be used again and again; makes no
 * garbage. Not for two threads at once.
 *
 * <p>Temperatures are kept as linear functions of the outdoor temperature, theta = c + w theta_e, since every balance is
 * linear: the design day and the lowest outdoor temperature a floor still carries come from the same two solutions.
 */
final class Evaluation {
    private static final double DECK_FILM = Films.inside("down");
    private static final double GROUND_FILM = Films.outside("down");

    final Plan plan;
    final double[] layerResistance;
    final double[] bridgeResistance;
    final double[] faceUpper;
    final double[] faceLower;
    final double[] faceResistance;
    final double[] faceUValue;
    final double[] groundDimension;
    final double[] groundThickness;
    final double[] groundUValue;
    final double[] groundToSoil;
    final double[] groundToOutdoors;
    final double[] area;
    final double[] uValue;
    final double[] conductance;
    final double[] constant;
    final double[] slope;
    final double[] temperature;
    final double[] roomConstant;
    final double[] roomSlope;
    final double[] reheat;
    final FloorEvaluation[] floors;
    final Network network;
    final Sections sections;
    double[] in;
    double outdoor;
    double residual;

    private final Stack.Frames frames = new Stack.Frames();
    private final double[] source;
    private final double[] solved;

    Evaluation(Plan plan) {
        this(plan, new Sections(() -> false));
    }

    Evaluation(Plan plan, Sections sections) {
        this.sections = sections;
        this.plan = plan;
        layerResistance = new double[plan.layers];
        bridgeResistance = new double[plan.layers];
        int faces = plan.faces.size();
        faceUpper = new double[faces];
        faceLower = new double[faces];
        faceResistance = new double[faces];
        faceUValue = new double[faces];
        int grounds = plan.grounds.size();
        groundDimension = new double[grounds];
        groundThickness = new double[grounds];
        groundUValue = new double[grounds];
        groundToSoil = new double[grounds];
        groundToOutdoors = new double[grounds];
        int links = plan.links.size();
        area = new double[links];
        uValue = new double[links];
        conductance = new double[links];
        int nodes = plan.nodeNames.length;
        constant = new double[nodes];
        slope = new double[nodes];
        temperature = new double[nodes];
        roomConstant = new double[plan.rooms];
        roomSlope = new double[plan.rooms];
        reheat = new double[plan.rooms];
        floors = new FloorEvaluation[plan.rooms];
        for (int i = 0; i < plan.rooms; i++) {
            floors[i] = plan.floors[i] == null ? null : new FloorEvaluation(this, plan.floors[i]);
        }
        network = new Network(plan.floatingNodes.length, plan.pairFrom, plan.pairTo);
        source = new double[network.size()];
        solved = new double[network.size()];
    }

    /**
     * Computes everything from a set of inputs.
     *
     * @return whether the floating spaces' balances have one answer
     */
    boolean evaluate(double[] inputs) {
        in = inputs;
        outdoor = in[plan.site.outdoor()];
        for (Stack stack : plan.stacks) {
            stack.evaluate(in, layerResistance, bridgeResistance);
        }
        for (int face = 0; face < faceUValue.length; face++) {
            face(face);
        }
        links();
        if (!temperatures()) {
            return false;
        }
        for (int room = 0; room < plan.rooms; room++) {
            losses(room);
            if (floors[room] != null) {
                floors[room].evaluate();
            }
        }
        return true;
    }

    /** The address of the first room whose numbers are not finite, when there is one. */
    Optional<String> boundless() {
        for (int room = 0; room < plan.rooms; room++) {
            if (!Double.isFinite(roomConstant[room] + roomSlope[room] * outdoor)) {
                return Optional.of("/rooms/" + room);
            }
            if (floors[room] != null && !floors[room].isFinite()) {
                return Optional.of("/rooms/" + room + "/heatedFloor");
            }
        }
        for (int ground = 0; ground < groundDimension.length; ground++) {
            double numbers = groundDimension[ground] + groundToSoil[ground] + groundToOutdoors[ground];
            if (!Double.isFinite(numbers)) {
                return Optional.of(plan.address(plan.grounds.get(ground).perimeter()));
            }
        }
        for (int space = 0; space < plan.floatingNodes.length; space++) {
            if (!Double.isFinite(temperature[plan.floatingNodes[space]])) {
                return Optional.of(Pointer.to("/spaces", plan.nodeNames[plan.floatingNodes[space]]));
            }
        }
        return Optional.empty();
    }

    private void face(int number) {
        Face face = plan.faces.get(number);
        AssemblyPlan assembly = plan.assemblies.get(face.assembly());
        if (assembly.stack() == Stack.NONE) {
            faceUValue[number] = in[assembly.uValue()];
            return;
        }
        Stack stack = plan.stacks.get(assembly.stack());
        double films = face.side() == Side.GROUND ? 0 : insideFilm(assembly) + otherFilm(assembly, face.side());
        faceUpper[number] = stack.upperLimit(films, in, layerResistance, bridgeResistance, frames);
        faceLower[number] = stack.lowerLimit(films, in, layerResistance, bridgeResistance);
        faceResistance[number] = stack.frames == 0 ? faceUpper[number] : (faceUpper[number] + faceLower[number]) / 2;
        faceUValue[number] = 1 / faceResistance[number];
    }

    double insideFilm(AssemblyPlan assembly) {
        return assembly.insideCoefficient() == Stack.NONE
                ? assembly.insideFilm()
                : 1 / in[assembly.insideCoefficient()];
    }

    double otherFilm(AssemblyPlan assembly, Side side) {
        if (side == Side.INDOORS) {
            return insideFilm(assembly);
        }
        return assembly.outsideCoefficient() == Stack.NONE
                ? assembly.outsideFilm()
                : 1 / in[assembly.outsideCoefficient()];
    }

    double resistance(int stack, double films) {
        return plan.stacks.get(stack).total(films, in, layerResistance, bridgeResistance, frames);
    }

    double upperLimit(int stack, double films) {
        return plan.stacks.get(stack).upperLimit(films, in, layerResistance, bridgeResistance, frames);
    }

    double lowerLimit(int stack, double films) {
        return plan.stacks.get(stack).lowerLimit(films, in, layerResistance, bridgeResistance);
    }

    private void links() {
        double pressure = AirHeat.pressureRatio(in[plan.site.altitude()]);
        List<Link> links = plan.links;
        for (int i = links.size() - 1; i >= 0; i--) {
            Link link = links.get(i);
            switch (link.kind()) {
                case OPENING -> {
                    area[i] = extent(link) * in[link.count()];
                    uValue[i] = faceUValue[link.face()];
                    conductance[i] = area[i] * uValue[i];
                }
                case SURFACE -> surface(i, link);
                case JUNCTION -> conductance[i] = in[link.first()] * in[link.second()];
                case AIR -> conductance[i] = AirHeat.conductance(airFlow(link), pressure);
            }
        }
    }

    private void surface(int i, Link link) {
        double net = extent(link);
        for (int k = 0; k < link.openings(); k++) {
            net -= area[link.firstOpening() + k];
        }
        area[i] = Math.max(0, net);
        if (link.other() != plan.ground) {
            uValue[i] = faceUValue[link.face()];
            conductance[i] = area[i] * uValue[i];
            return;
        }
        if (link.ground() != Stack.NONE) {
            groundDimension[link.ground()] = dimension(plan.grounds.get(link.ground()));
        }
        AssemblyPlan assembly = plan.assemblies.get(plan.faces.get(link.face()).assembly());
        uValue[i] = assembly.stack() == Stack.NONE
                ? faceUValue[link.face()]
                : unheatedGround(link.ground(), faceResistance[link.face()], deckFilm(link));
        conductance[i] = area[i] * uValue[i] * seasonal();
    }

    private double extent(Link link) {
        return link.height() == Stack.NONE ? in[link.area()] : in[link.area()] * in[link.height()];
    }

    /** Season factor times groundwater factor. */
    double seasonal() {
        return in[plan.site.season()] * in[plan.site.groundwater()];
    }

    /** Film above an unheated floor on the ground. */
    double deckFilm(Link link) {
        int coefficient =
                plan.assemblies.get(plan.faces.get(link.face()).assembly()).insideCoefficient();
        return coefficient == Stack.NONE ? DECK_FILM : 1 / in[coefficient];
    }

    private double unheatedGround(int ground, double floorResistance, double inside) {
        if (!plan.grounds.get(ground).suspended()) {
            return slab(ground, inside + floorResistance + GROUND_FILM);
        }
        suspended(ground);
        double floor = 1 / (inside + floorResistance + DECK_FILM);
        groundUValue[ground] = SuspendedFloor.transmittance(floor, groundToSoil[ground], groundToOutdoors[ground]);
        return groundUValue[ground];
    }

    private double dimension(GroundPlan given) {
        return SlabOnGround.characteristicDimension(in[given.area()], in[given.perimeter()]);
    }

    /** Transmittance of a slab with films and floor of this resistance. */
    double slab(int ground, double resistance) {
        GroundPlan given = plan.grounds.get(ground);
        double soil = in[given.soil()];
        double dimension = dimension(given);
        double thickness = SlabOnGround.equivalentThickness(in[given.wall()], soil, resistance);
        groundDimension[ground] = dimension;
        groundThickness[ground] = thickness;
        groundUValue[ground] = SlabOnGround.transmittance(dimension, thickness, soil);
        return groundUValue[ground];
    }

    /** Transmittances of the void below a suspended floor, to the soil and to outdoors. */
    void suspended(int ground) {
        GroundPlan given = plan.grounds.get(ground);
        double soil = in[given.soil()];
        double dimension = dimension(given);
        double thickness = SlabOnGround.equivalentThickness(in[given.wall()], soil, DECK_FILM + GROUND_FILM);
        groundDimension[ground] = dimension;
        groundThickness[ground] = thickness;
        groundToSoil[ground] = SuspendedFloor.voidToGround(dimension, thickness, soil);
        groundToOutdoors[ground] = SuspendedFloor.voidToOutdoors(
                dimension,
                in[given.floorHeight()],
                in[given.wallUValue()],
                in[given.ventArea()],
                in[given.windSpeed()],
                given.shielding().factor());
    }

    /** Volume flow of a link of air, m³/h, recovered heat taken off. */
    private double airFlow(Link link) {
        return switch (link.airWay()) {
            case RATE ->
                link.third() == Stack.NONE
                        ? in[link.first()] * in[link.second()]
                        : in[link.first()] * in[link.second()] * in[link.third()];
            case FLOW -> in[link.first()] * 3600;
            case SUPPLY -> in[link.first()] * 3600 * (1 - in[link.second()]);
            case NONE -> throw new IllegalStateException("no air here");
        };
    }

    private boolean temperatures() {
        for (int node = 0; node < constant.length; node++) {
            boolean known = plan.nodeTemperature[node] != Stack.NONE;
            constant[node] = known ? in[plan.nodeTemperature[node]] : 0;
            slope[node] = 0;
        }
        constant[plan.outdoors] = 0;
        slope[plan.outdoors] = 1;
        if (network.size() > 0 && !solve()) {
            return false;
        }
        for (int node = 0; node < constant.length; node++) {
            temperature[node] = constant[node] + slope[node] * outdoor;
        }
        return true;
    }

    private boolean solve() {
        network.clear();
        for (int i = 0; i < conductance.length; i++) {
            Link link = plan.links.get(i);
            int a = plan.floating[link.owner()];
            int b = plan.floating[link.other()];
            if (plan.linkPair[i] != Stack.NONE) {
                network.addLink(plan.linkPair[i], conductance[i]);
            } else if (a != Stack.NONE) {
                network.addAnchor(a, conductance[i]);
            } else if (b != Stack.NONE) {
                network.addAnchor(b, conductance[i]);
            }
        }
        if (!network.factor()) {
            return false;
        }
        solve(constant, constant);
        solve(slope, slope);
        sources(constant, outdoor, slope);
        for (int i = 0; i < solved.length; i++) {
            int node = plan.floatingNodes[i];
            solved[i] = constant[node] + slope[node] * outdoor;
        }
        residual = network.residual(source, solved);
        return true;
    }

    private void solve(double[] known, double[] into) {
        sources(known, 0, known);
        network.solve(source, solved);
        for (int i = 0; i < solved.length; i++) {
            into[plan.floatingNodes[i]] = solved[i];
        }
    }

    /** Conductance times known temperature, summed for each floating space. */
    private void sources(double[] known, double times, double[] more) {
        java.util.Arrays.fill(source, 0);
        for (int i = 0; i < conductance.length; i++) {
            if (plan.linkPair[i] != Stack.NONE) {
                continue;
            }
            Link link = plan.links.get(i);
            int a = plan.floating[link.owner()];
            int b = plan.floating[link.other()];
            if (a != Stack.NONE) {
                source[a] += conductance[i] * (known[link.other()] + times * more[link.other()]);
            } else if (b != Stack.NONE) {
                source[b] += conductance[i] * (known[link.owner()] + times * more[link.owner()]);
            }
        }
    }

    private void losses(int room) {
        double sum = 0;
        double perOutdoor = 0;
        for (PathRef path : plan.paths[room]) {
            sum += conductance[path.link()] * (constant[room] - constantSeenFrom(room, otherNode(path)));
            perOutdoor -= conductance[path.link()] * slopeSeenFrom(otherNode(path));
        }
        double reheat = in[plan.roomIndexes[room].reheat()] * in[plan.roomIndexes[room].floorArea()];
        this.reheat[room] = reheat;
        roomConstant[room] = sum + reheat;
        roomSlope[room] = perOutdoor;
    }

    private int otherNode(PathRef path) {
        Link link = plan.links.get(path.link());
        return path.heard() ? link.owner() : link.other();
    }

    /** Raises the heat a room needs by a reheat that is computed, W. */
    void addReheat(int room, double heat) {
        reheat[room] += heat;
        roomConstant[room] += heat;
    }

    /** The part of a node's temperature that does not move with the outdoor temperature, as a room sees it. */
    double constantSeenFrom(int room, int node) {
        return plan.factor[node] == Stack.NONE ? constant[node] : (1 - in[plan.factor[node]]) * constant[room];
    }

    /** How far a node's temperature moves with the outdoor temperature, as a room sees it. */
    double slopeSeenFrom(int node) {
        return plan.factor[node] == Stack.NONE ? slope[node] : in[plan.factor[node]];
    }

    /** Temperature difference from a room or space to the other side of one of its paths, K. */
    double difference(int node, PathRef path) {
        int other = otherNode(path);
        return plan.factor[other] == Stack.NONE
                ? temperature[node] - temperature[other]
                : in[plan.factor[other]] * (temperature[node] - outdoor);
    }

    /** Heat along a path, out of the room or space, W. */
    double heatFlow(int node, PathRef path) {
        return conductance[path.link()] * difference(node, path);
    }

    /** Whether a path carries heat through a surface or opening. */
    boolean isTransmission(PathRef path) {
        LinkKind kind = plan.links.get(path.link()).kind();
        return kind == LinkKind.SURFACE || kind == LinkKind.OPENING;
    }
}
