package org.treadwarm.reference;

import com.fasterxml.jackson.databind.JsonNode;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** All conductances of a survey in its order: spaces before rooms. */
final class Couplings {
    static final String OUTDOORS = "outdoors";
    static final String GROUND = "ground";

    private final JsonNode survey;
    private final List<Coupling> couplings = new ArrayList<>();

    private Couplings(JsonNode survey) {
        this.survey = survey;
    }

    static List<Coupling> of(JsonNode survey) {
        Couplings collected = new Couplings(survey);
        survey.path("spaces").properties().forEach(space -> collected.addAll(space.getKey(), space.getValue()));
        Fields.list(survey, "rooms").forEach(room -> collected.addAll(Fields.text(room, "name"), room));
        return collected.couplings;
    }

    private void addAll(String node, JsonNode owner) {
        Fields.list(owner, "surfaces").forEach(surface -> addSurface(node, owner, surface));
        Fields.list(owner, "junctions").stream()
                .filter(junction -> !Fields.text(junction, "at", "room").equals("heated floor"))
                .forEach(junction -> addJunction(node, junction));
        if (owner.has("air")) {
            double conductance = Air.conductance(owner, Fields.number(survey.get("site"), "altitude", 0));
            add("air", Coupling.Kind.AIR, node, OUTDOORS, conductance);
        }
    }

    private void addSurface(String node, JsonNode owner, JsonNode surface) {
        String to = Fields.text(surface, "to");
        double net = Fields.area(surface);
        List<Coupling> openings = new ArrayList<>();
        for (JsonNode opening : Fields.list(surface, "openings")) {
            double area = Fields.area(opening) * Fields.number(opening, "count", 1);
            double uValue = Transmittance.inAir(assembly(opening), to.equals(OUTDOORS));
            String name = Fields.text(opening, "name", "opening");
            openings.add(plane(name, Coupling.Kind.OPENING, node, to, area, uValue, 1));
            net -= area;
        }
        if (to.equals(GROUND) && !openings.isEmpty()) {
            throw new IllegalArgumentException("an opening towards ground in " + surface);
        }
        boolean ground = to.equals(GROUND);
        double uValue = ground
                ? Transmittance.onGround(assembly(surface), surface, Fields.number(owner, "floorArea", Double.NaN))
                : Transmittance.inAir(assembly(surface), to.equals(OUTDOORS));
        String name = Fields.text(surface, "name", Fields.text(surface, "assembly"));
        couplings.add(
                plane(name, Coupling.Kind.TRANSMISSION, node, to, net, uValue, ground ? groundFactor(survey) : 1));
        couplings.addAll(openings);
    }

    /** Season factor times groundwater factor (EN 12831-1, from memory). */
    static double groundFactor(JsonNode survey) {
        JsonNode site = survey.get("site");
        return Fields.number(site, "groundSeasonFactor", 1.45) * Fields.number(site, "groundwaterFactor", 1);
    }

    private void addJunction(String node, JsonNode junction) {
        double conductance = Fields.number(junction, "psi") * Fields.number(junction, "length");
        String name = Fields.text(junction, "name", "junction");
        add(name, Coupling.Kind.JUNCTION, node, Fields.text(junction, "to", OUTDOORS), conductance);
    }

    private JsonNode assembly(JsonNode part) {
        return survey.get("assemblies").get(Fields.text(part, "assembly"));
    }

    private void add(String name, Coupling.Kind kind, String from, String to, double conductance) {
        couplings.add(new Coupling(name, kind, from, to, conductance, OptionalDouble.empty(), OptionalDouble.empty()));
    }

    private static Coupling plane(
            String name, Coupling.Kind kind, String from, String to, double area, double uValue, double factor) {
        double conductance = area * uValue * factor;
        return new Coupling(name, kind, from, to, conductance, OptionalDouble.of(area), OptionalDouble.of(uValue));
    }
}
