package org.treadwarm.sizing;

import java.util.List;
import org.treadwarm.survey.Shielding;
import org.treadwarm.survey.Survey;
import org.treadwarm.survey.Zone;

/**
 * A survey as plain numbers: which input each formula takes, and which node each conductance joins. Nodes are the rooms, then
 * the spaces, in survey order, then outdoors and the ground.
 */
final class Plan {
    /** What a conductance comes from. */
    enum LinkKind {
        SURFACE,
        OPENING,
        JUNCTION,
        AIR
    }

    /** What lies on the other side, as far as films go. */
    enum Side {
        OUTDOORS("outdoors"),
        INDOORS("indoors"),
        GROUND("ground");

        final String word;

        Side(String word) {
            this.word = word;
        }
    }

    /** An assembly towards one kind of other side. */
    record Face(int assembly, Side side) {}

    /** An assembly: its stack of layers, or an input that holds its U-value; its films. */
    record AssemblyPlan(
            String name,
            int stack,
            int uValue,
            double insideFilm,
            double outsideFilm,
            int insideCoefficient,
            int outsideCoefficient) {}

    /** A ground floor: inputs of ISO 13370; the last four and the factor only for a suspended one. */
    record GroundPlan(
            boolean suspended,
            int area,
            int perimeter,
            int wall,
            int soil,
            int floorHeight,
            int wallUValue,
            int ventArea,
            int windSpeed,
            Shielding shielding) {}

    /**
     * A conductance between an owner and another node.
     *
     * @param face index of its face for a surface or opening, else -1
     * @param ground index of its ground floor, else -1
     * @param area input of its area, or of its width when a height is given
     * @param height input of its height, else -1
     * @param count input of how many openings, else -1
     * @param firstOpening first link of the openings in it
     * @param openings number of openings in it
     * @param first first input of a junction (psi, length) or of air (rate and volume, flow, supply and recovery)
     */
    record Link(
            LinkKind kind,
            String name,
            int owner,
            int other,
            int face,
            int ground,
            int area,
            int height,
            int count,
            int firstOpening,
            int openings,
            int first,
            int second,
            int third,
            AirWay airWay) {}

    /** How air is known. */
    enum AirWay {
        NONE,
        RATE,
        FLOW,
        SUPPLY
    }

    /** One path of a room or space: a link, seen from its owner or from the other side. */
    record PathRef(int link, boolean heard) {}

    /** An edge of a heated floor: a junction that sees the heater. */
    record EdgePlan(String name, int psi, int length, int other) {}

    /** A heated floor. Indexes are -1 for what is not given. */
    record FloorPlan(
            int room,
            int area,
            int above,
            int below,
            int ground,
            int other,
            List<EdgePlan> edges,
            int maximumSurface,
            List<LayerLimit> layerLimits,
            HeaterPlan heater,
            List<PartPlan> parts) {}

    /** A part of a heated floor with its own spacing: inputs of its area and of the spacing that holds for it. */
    record PartPlan(String name, Zone zone, int area, int spacing) {}

    /** What makes the heat; indexes are -1 for what is not given, all of them when there is no heater. */
    record HeaterPlan(
            boolean water,
            int density,
            int spacing,
            int diameter,
            int wallThickness,
            int wallConductivity,
            int linearPower,
            int supplyTemperature,
            int spread,
            boolean parted) {
        /** Whether the heat it makes per m² is known: given, or by the cable's power and its spacing or those of its parts. */
        boolean hasDensity() {
            return density != Stack.NONE || linearPower != Stack.NONE && (spacing != Stack.NONE || parted);
        }
    }

    /** A layer above the heater with a highest temperature of its own. */
    record LayerLimit(String name, int layer, int maximum) {}

    final Survey survey;
    final double[] values;
    private final Inputs inputs;
    final int rooms;
    final int spaces;
    final int outdoors;
    final int ground;
    final String[] nodeNames;
    final int[] nodeTemperature;
    final int[] floating;
    final int[] factor;
    final List<Stack> stacks;
    final int layers;
    final List<AssemblyPlan> assemblies;
    final List<Face> faces;
    final List<GroundPlan> grounds;
    final List<Link> links;
    final PathRef[][] paths;
    final FloorPlan[] floors;
    final int[] floatingNodes;
    final int[] pairFrom;
    final int[] pairTo;
    final int[] linkPair;
    final SiteIndexes site;
    final RoomIndexes[] roomIndexes;

    /** Inputs of the site; annualMean is -1 when not given. */
    record SiteIndexes(int outdoor, int annualMean, int altitude, int season, int groundwater) {}

    /** Inputs of a room. */
    record RoomIndexes(
            int floorArea, int height, int reheat, int setback, int warmUpTime, int allowance, int otherHeat) {}

    Plan(PlanBuilder built) {
        survey = built.survey;
        values = built.inputs.values();
        inputs = built.inputs;
        rooms = built.rooms;
        spaces = built.spaces;
        outdoors = rooms + spaces;
        ground = outdoors + 1;
        nodeNames = built.nodeNames;
        nodeTemperature = built.nodeTemperature;
        floating = built.floating;
        factor = built.factor;
        stacks = built.stacks.all();
        layers = built.stacks.layers();
        assemblies = List.copyOf(built.assemblies);
        faces = List.copyOf(built.faces);
        grounds = List.copyOf(built.grounds);
        links = List.copyOf(built.links);
        paths = built.paths();
        floors = built.floors;
        floatingNodes = built.floatingNodes;
        pairFrom = built.pairFrom;
        pairTo = built.pairTo;
        linkPair = built.linkPair;
        site = built.site;
        roomIndexes = built.roomIndexes;
    }

    /** The address of an input as a JSON Pointer into the survey. */
    String address(int input) {
        return inputs.address(input);
    }

    /** The plan of a survey in which everything holds that must hold. */
    static Plan of(Survey survey) {
        return new PlanBuilder(survey).build();
    }
}
