package org.treadwarm.survey;

import java.util.List;

/** What must hold between the parts of a survey. Parts that have a problem of their own already are not judged again. */
public final class Rules {
    /** The most unheated spaces that float; their temperatures are solved together. */
    public static final int MOST_FLOATING = 1000;

    /** The most rooms of one survey. */
    public static final int MOST_ROOMS = 5000;

    private static final Place ASSEMBLIES = Place.ROOT.at("/assemblies");
    private static final Place SPACES = Place.ROOT.at("/spaces");

    private final Survey survey;
    private final Findings findings;
    private final NameRules names;
    private final GroundRules ground;
    private final SurfaceRules surfaces;
    private final JunctionRules junctions;
    private final AirRules air;
    private final FloorRules floors;

    private Rules(Survey survey, Findings findings) {
        this.survey = survey;
        this.findings = findings;
        this.names = new NameRules(survey, findings);
        this.ground = new GroundRules(survey, findings);
        this.air = new AirRules(findings);
        OtherSides otherSides = new OtherSides(survey, findings, names.roomNames());
        this.surfaces = new SurfaceRules(survey, findings, otherSides, ground);
        this.junctions = new JunctionRules(findings, otherSides);
        this.floors = new FloorRules(findings, otherSides, ground);
    }

    /** Adds what is wrong between the parts of a survey to the findings. */
    public static void check(Survey survey, Findings findings) {
        new Rules(survey, findings).check();
    }

    /** Adds what is wrong within one assembly, addressed from the root. */
    public static void checkAssembly(Assembly assembly, Findings findings) {
        new LayerRules(findings).assembly(Place.ROOT, assembly);
    }

    /** Adds what is wrong with layers whose warming up is to be computed. */
    public static void checkLayersThatHoldHeat(String pointer, List<Layer> layers, Findings findings) {
        new LayerRules(findings).layersThatHoldHeat(Place.ROOT.at(pointer), layers);
    }

    private void check() {
        names.check();
        assemblies();
        SpaceRules spaces = new SpaceRules(findings, surfaces, junctions, air);
        survey.spaces().forEach((name, space) -> spaces.check(SPACES.key(name), name, space));
        for (int i = 0; i < survey.rooms().size(); i++) {
            room(Place.ROOT.item("/rooms", i), survey.rooms().get(i));
        }
        new Listings(survey, findings).check();
        new ManifoldRules(survey, findings).check();
        if (ground.anyOnGround() && survey.site().annualMeanTemperature().isEmpty()) {
            findings.missing(
                    "/site/annualMeanTemperature",
                    "something lies on the ground, so the annual mean outdoor temperature is needed",
                    "-60 to 60 °C");
        }
        if (findings.isEmpty()) {
            Connections.check(survey, findings);
        }
    }

    private void assemblies() {
        LayerRules layers = new LayerRules(findings);
        survey.assemblies().forEach((name, assembly) -> layers.assembly(ASSEMBLIES.key(name), assembly));
    }

    private void warmUp(Place at, Room room, WarmUpGoal goal, boolean heated) {
        if (room.reheat().value() > 0) {
            findings.add(
                    at,
                    "/reheat",
                    room.reheat().typed(),
                    "a reheat is either given or computed from a setback",
                    "0 W/m2 beside warmUp, or no warmUp");
        }
        if (!heated) {
            findings.add(at, "/warmUp", "no heated floor", "only a heated floor warms a room up", "leave it out");
        }
        if (goal.from().value() > room.indoorTemperature().value()) {
            findings.add(
                    at,
                    "/warmUp/from",
                    goal.from().typed(),
                    "a setback is no warmer than the room",
                    "at most the indoor temperature");
        }
    }

    private void room(Place at, Room room) {
        surfaces.check(at, room.name(), true, room.surfaces());
        boolean heated = room.heatedFloor().isPresent() || !findings.clean(at, "/heatedFloor");
        junctions.check(at, room.name(), room.junctions(), true, heated);
        room.air().ifPresent(given -> air.check(at.at("/air"), given));
        room.warmUp().ifPresent(goal -> warmUp(at, room, goal, heated));
        room.heatedFloor().ifPresent(floor -> floors.check(at.at("/heatedFloor"), room, floor));
    }
}
