package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.treadwarm.physics.floor.HeatedFloor;
import org.treadwarm.physics.section.FloorResponse;
import org.treadwarm.sizing.Plan.EdgePlan;
import org.treadwarm.sizing.Plan.FloorPlan;
import org.treadwarm.sizing.Plan.LayerLimit;
import org.treadwarm.sizing.Plan.PartPlan;
import org.treadwarm.survey.Heater;
import org.treadwarm.survey.Zone;
import org.treadwarm.tables.Films;

/**
 * One heated floor as plain numbers. The heater's loss, downward and at the edge, is a linear function of the heater's
 * temperature and of the outdoor temperature: loss = K theta_h - (c + w theta_e), per m² of heated area.
 */
final class FloorEvaluation {
    /** Where the search for the lowest outdoor temperature ends, degrees Celsius: the lowest a survey may state. */
    static final double COLDEST = -60;

    private static final double INDOOR_FILM = Films.inside("down");
    private static final double OUTDOOR_FILM = Films.outside("down");
    private static final double GROUND_FILM = Films.outside("down");

    /** Limits of every part beside those of the layers: zone, covering. */
    private static final int SURFACE_LIMITS = 2;

    /** Limits of the whole floor: density of the heater, supply of the water, power of the chosen mats. */
    private static final int HEATER_LIMITS = 3;

    final FloorPlan plan;
    final double[] limits;
    final double[] toLayer;
    double area;
    double room;
    double resistanceAbove;
    double resistanceBelow;

    /** From the heater plane to what lies below, without factors of the season, m²·K/W. */
    double resistanceDown;

    double downCoefficient;
    double downConstant;
    double downSlope;
    double voidTemperature;
    double edgeCoefficient;
    double edgeConstant;
    double edgeSlope;
    double requiredHeat;
    double requiredFlux;
    double carryingFlux;
    int governing;
    double holdsDownTo;

    /** The floor solved between its cables or pipes; null when the heater has no spacing or cannot be solved. */
    SectionFloor section;

    /** The floor laid in parts, each solved between its cables or pipes; null without parts, or when they cannot be solved. */
    PartedFloor parted;

    /** How the floor warms its room after the setback that the survey gives; empty without one, or when it cannot be followed. */
    Optional<WarmUpFloor> warmUp = Optional.empty();

    /** Why a setback is not followed; empty when it is, or there is none. */
    String warmUpReason = "";

    /** The mats chosen for the required flux, if there are any to choose from. */
    MatLayouts.Made mats = MatLayouts.Made.NOT_ASKED;

    /** Power of the chosen mats over the heated area, W/m²; infinite when none are chosen. */
    double matsDensity;

    /** Why a floor with a spacing is not solved; empty when it is, or has none. */
    String sectionReason = "";

    private final Evaluation whole;
    private final org.treadwarm.survey.HeatedFloor given;

    FloorEvaluation(Evaluation whole, FloorPlan plan) {
        this.whole = whole;
        this.plan = plan;
        this.given = whole.plan.survey.rooms().get(plan.room()).heatedFloor().orElseThrow();
        this.limits = new double[Math.max(1, plan.parts().size()) * slotsOfAPart() + HEATER_LIMITS];
        this.toLayer = new double[plan.layerLimits().size()];
    }

    void evaluate() {
        area = whole.in[plan.area()];
        room = whole.constant[plan.room()];
        resistanceAbove = whole.resistance(plan.above(), 0);
        down();
        edge();
        warmUp();
        requiredHeat = requiredHeat(whole.outdoor);
        requiredFlux = requiredHeat / area;
        limits();
        section();
        mats();
        holdsDownTo =
                parted != null ? parted.lowestOutdoor() : section == null ? lowestOutdoor() : section.lowestOutdoor();
    }

    /** Whether every number of the floor is finite; a limit or a lowest outdoor temperature that is infinite means that there is none. */
    boolean isFinite() {
        double made = heaterFlux(requiredFlux, whole.outdoor) + heaterFlux(carryingFlux, whole.outdoor);
        double below = (downConstant + downSlope * whole.outdoor) / downCoefficient;
        return Double.isFinite(made * area + requiredHeat + below + edgeCoefficient) && !Double.isNaN(holdsDownTo);
    }

    private void down() {
        if (plan.ground() == Stack.NONE) {
            double film = filmBelow();
            double total = whole.resistance(plan.below(), film);
            resistanceBelow = total - film;
            resistanceDown = total;
            downCoefficient = 1 / total;
            downConstant = downCoefficient * whole.constantSeenFrom(plan.room(), plan.other());
            downSlope = downCoefficient * whole.slopeSeenFrom(plan.other());
            return;
        }
        resistanceBelow = whole.resistance(plan.below(), 0);
        double annualMean = whole.in[whole.plan.site.annualMean()];
        if (!whole.plan.grounds.get(plan.ground()).suspended()) {
            double slab = whole.slab(plan.ground(), resistanceBelow + GROUND_FILM);
            resistanceDown = 1 / slab;
            downCoefficient = whole.seasonal() * slab;
            downConstant = downCoefficient * annualMean;
            downSlope = 0;
            return;
        }
        whole.suspended(plan.ground());
        double floor = 1 / (resistanceBelow + INDOOR_FILM);
        double soil = whole.seasonal() * whole.groundToSoil[plan.ground()];
        double outdoors = whole.groundToOutdoors[plan.ground()];
        double share = floor / (floor + soil + outdoors);
        resistanceDown = 1 / floor + 1 / (whole.groundToSoil[plan.ground()] + outdoors);
        downCoefficient = share * (soil + outdoors);
        downConstant = share * soil * annualMean;
        downSlope = share * outdoors;
    }

    /** Film of the lower side that goes with the layers below, m²·K/W; 0 on the ground, whose formulas have it. */
    double filmBelow() {
        if (plan.ground() != Stack.NONE) {
            return 0;
        }
        return plan.other() == whole.plan.outdoors ? OUTDOOR_FILM : INDOOR_FILM;
    }

    private void edge() {
        edgeCoefficient = 0;
        edgeConstant = 0;
        edgeSlope = 0;
        for (int i = 0; i < plan.edges().size(); i++) {
            EdgePlan edge = plan.edges().get(i);
            double perArea = whole.in[edge.psi()] * whole.in[edge.length()] / area;
            edgeCoefficient += perArea;
            edgeConstant += perArea * whole.constantSeenFrom(plan.room(), edge.other());
            edgeSlope += perArea * whole.slopeSeenFrom(edge.other());
        }
    }

    /** Heat that the floor must give at an outdoor temperature, W. */
    double requiredHeat(double outdoor) {
        double allowance = whole.in[whole.plan.roomIndexes[plan.room()].allowance()];
        return Math.max(0, whole.roomConstant[plan.room()] + whole.roomSlope[plan.room()] * outdoor) * (1 + allowance);
    }

    double surfaceTemperature(double flux) {
        return room + HeatedFloor.overtemperature(flux);
    }

    double heaterTemperature(double flux) {
        return HeatedFloor.temperatureBelow(room, flux, resistanceAbove);
    }

    double downwardFlux(double heater, double outdoor) {
        return downCoefficient * heater - downConstant - downSlope * outdoor;
    }

    double edgeFlux(double heater, double outdoor) {
        return edgeCoefficient * heater - edgeConstant - edgeSlope * outdoor;
    }

    double heaterFlux(double flux, double outdoor) {
        double heater = heaterTemperature(flux);
        return flux + downwardFlux(heater, outdoor) + edgeFlux(heater, outdoor);
    }

    /** Heat that the heater makes, W/m²: as given, or the cable's power over its spacing. For a heater that {@link Plan.HeaterPlan#hasDensity()}. */
    double density() {
        if (plan.heater().density() != Stack.NONE) {
            return whole.in[plan.heater().density()];
        }
        return plan.parts().isEmpty()
                ? whole.in[plan.heater().linearPower()] / whole.in[plan.heater().spacing()]
                : whole.in[plan.heater().linearPower()] * cable() / partsArea();
    }

    private double partsArea() {
        return plan.parts().stream().mapToDouble(part -> whole.in[part.area()]).sum();
    }

    /** Cable or pipe in all parts: each one's area over its spacing, m. */
    double cable() {
        return plan.parts().stream()
                .mapToDouble(part -> whole.in[part.area()] / whole.in[part.spacing()])
                .sum();
    }

    /** How many limits each part of the floor has, and a floor without parts beside those of its heater. */
    int slotsOfAPart() {
        return SURFACE_LIMITS + plan.layerLimits().size();
    }

    double zoneMaximum() {
        return Limits.zoneMaximum(zone(), room);
    }

    private void limits() {
        int last = limits.length - HEATER_LIMITS;
        mats = MatLayouts.Made.NOT_ASKED;
        matsDensity = Double.POSITIVE_INFINITY;
        Arrays.fill(limits, Double.POSITIVE_INFINITY);
        limits[0] = HeatedFloor.flux(zoneMaximum() - room);
        limits[1] = plan.maximumSurface() == Stack.NONE
                ? Double.POSITIVE_INFINITY
                : HeatedFloor.flux(whole.in[plan.maximumSurface()] - room);
        double down = 0;
        int next = 0;
        for (int i = 0; i < toLayer.length; i++) {
            LayerLimit limit = plan.layerLimits().get(i);
            Stack above = whole.plan.stacks.get(plan.above());
            while (next <= limit.layer()) {
                down += whole.layerResistance[above.first + next++];
            }
            toLayer[i] = down;
            limits[2 + i] = HeatedFloor.fluxAtTemperature(whole.in[limit.maximum()], room, down);
        }
        limits[last] = heaterLimit(whole.outdoor);
        govern();
    }

    private void govern() {
        governing = 0;
        for (int i = 1; i < limits.length; i++) {
            if (limits[i] < limits[governing]) {
                governing = i;
            }
        }
        carryingFlux = limits[governing];
    }

    private void warmUp() {
        warmUp = Optional.empty();
        warmUpReason = "";
        if (whole.plan.roomIndexes[plan.room()].setback() == Stack.NONE) {
            return;
        }
        WarmUpFloor.Made made = WarmUpFloor.of(this);
        warmUp = made.floor();
        warmUpReason = made.whyNot();
        warmUp.ifPresent(found -> whole.addReheat(plan.room(), found.reheat()));
    }

    private void section() {
        section = null;
        parted = null;
        sectionReason = "";
        if (plan.heater().spacing() == Stack.NONE && plan.parts().isEmpty()) {
            return;
        }
        if (!(requiredFlux <= SectionFloor.HIGHEST_FLUX)) {
            sectionReason = "the required flux is far beyond what any floor gives";
            return;
        }
        if (plan.parts().isEmpty()) {
            Optional<SectionFloor> found = solved(whole.in[plan.heater().spacing()]);
            found.ifPresent(floor -> floor.limits(limits));
            section = found.orElse(null);
        } else {
            parted = parts().orElse(null);
        }
        govern();
    }

    /** The floor with one spacing; empty, with the reason told, when it cannot be solved. */
    private Optional<SectionFloor> solved(double spacing) {
        SectionGeometry.Made made = SectionGeometry.of(this, whole, spacing);
        if (made.geometry().isEmpty()) {
            sectionReason = made.whyNot();
            return Optional.empty();
        }
        Optional<FloorResponse> response = whole.sections.of(made.geometry().get());
        if (response.isEmpty()) {
            sectionReason = whole.sections.whyNot();
        }
        return response.map(found -> new SectionFloor(this, made.geometry().get(), found));
    }

    private Optional<PartedFloor> parts() {
        List<PartedFloor.Part> parts = new ArrayList<>();
        for (PartPlan part : plan.parts()) {
            Optional<SectionFloor> found = solved(whole.in[part.spacing()]);
            if (found.isEmpty()) {
                return Optional.empty();
            }
            parts.add(new PartedFloor.Part(part.name(), part.zone(), whole.in[part.area()], found.get()));
        }
        PartedFloor floor = new PartedFloor(this, parts);
        if (!floor.gives(requiredFlux, whole.outdoor)) {
            sectionReason = "the parts would have to give far more than any floor does";
            return Optional.empty();
        }
        floor.limits(limits);
        return Optional.of(floor);
    }

    /** Chooses the mats: by the heat needed, so that what they give can then be a limit of the floor. */
    private void mats() {
        double needed = made(requiredFlux) * area;
        if (given.heater().isEmpty() || !Double.isFinite(needed)) {
            return;
        }
        mats = MatLayouts.of(
                given.heater().get(),
                "/rooms/" + plan.room() + "/heatedFloor/heater",
                area,
                given.plan().map(rectangle -> FreeFloors.of(rectangle, area)),
                needed);
        mats.layout().ifPresent(chosen -> {
            matsDensity = chosen.meanDensity().orElseThrow();
            limits[limits.length - 1] = matsLimit();
            govern();
        });
    }

    /** What the heater makes at a flux on the design day, W/m². */
    private double made(double flux) {
        if (parted != null) {
            return PartAnswers.whole(parted, flux, whole.outdoor).heaterFlux();
        }
        return section == null
                ? heaterFlux(flux, whole.outdoor)
                : section.at(flux, whole.outdoor).made();
    }

    /** The largest flux for which the chosen mats make the heat; more than they make is not counted on. */
    private double matsLimit() {
        if (made(0) >= matsDensity) {
            return 0;
        }
        double most =
                section == null && parted == null ? matsDensity : Math.min(matsDensity, SectionFloor.HIGHEST_FLUX);
        return made(most) <= matsDensity ? matsDensity : Bracket.root(flux -> made(flux) - matsDensity, 0, most);
    }

    /** The most that the heater makes by its density and by the chosen mats, W/m²; infinite when neither is known. */
    double mostMade() {
        return Math.min(plan.heater().hasDensity() ? density() : Double.POSITIVE_INFINITY, matsDensity);
    }

    Zone zone() {
        return given.zone();
    }

    /** Between supply and return of the water, K. */
    double waterSpread() {
        int given = plan.heater().spread();
        return given == Stack.NONE ? Heater.SPREAD : whole.in[given];
    }

    Evaluation whole() {
        return whole;
    }

    private double heaterLimit(double outdoor) {
        if (!plan.heater().hasDensity()) {
            return Double.POSITIVE_INFINITY;
        }
        double atRoom = downwardFlux(room, outdoor) + edgeFlux(room, outdoor);
        return HeatedFloor.fluxOfDensity(density(), room, resistanceAbove, downCoefficient + edgeCoefficient, atRoom);
    }

    /** The lowest of the limits that do not depend on the outdoor temperature. */
    private double fixedLimit() {
        double lowest = mostMade();
        for (int i = 0; i < limits.length - HEATER_LIMITS; i++) {
            lowest = Math.min(lowest, limits[i]);
        }
        return lowest;
    }

    private boolean carriesAt(double outdoor) {
        double required = requiredHeat(outdoor) / area;
        return required == 0 || required <= fixedLimit() && excessDensity(outdoor) <= 0;
    }

    /**
     * The root of carrying less required flux over the outdoor temperature; minus infinity when the floor still carries at
     * {@value #COLDEST} °C, plus infinity when it does not even at its own room temperature outdoors.
     */
    private double lowestOutdoor() {
        if (carriesAt(COLDEST)) {
            return Double.NEGATIVE_INFINITY;
        }
        if (!carriesAt(room)) {
            return Double.POSITIVE_INFINITY;
        }
        double slope = whole.roomSlope[plan.room()];
        if (slope >= 0) {
            return bisect();
        }
        double allowance = whole.in[whole.plan.roomIndexes[plan.room()].allowance()];
        double heat = fixedLimit() * area / (1 + allowance);
        double byFixed = Math.max(COLDEST, (heat - whole.roomConstant[plan.room()]) / slope);
        if (excessDensity(byFixed) <= 0) {
            return byFixed;
        }
        double unneeded = Math.min(room, -whole.roomConstant[plan.room()] / slope);
        return excessDensity(unneeded) > 0
                ? unneeded
                : rootOfDensity(byFixed, unneeded, slope * (1 + allowance) / area);
    }

    /** What the heater would have to make above what it can to give the required flux, W/m². */
    private double excessDensity(double outdoor) {
        return heaterFlux(requiredHeat(outdoor) / area, outdoor) - mostMade();
    }

    private double rootOfDensity(double from, double to, double fluxSlope) {
        double low = from;
        double high = to;
        double outdoor = from;
        for (int step = 0; step < 200; step++) {
            double excess = excessDensity(outdoor);
            if (excess > 0) {
                low = outdoor;
            } else {
                high = outdoor;
            }
            double flux = requiredHeat(outdoor) / area;
            double heaterSlope = flux > 0 ? fluxSlope * (HeatedFloor.overtemperatureSlope(flux) + resistanceAbove) : 0;
            double slope = fluxSlope + (downCoefficient + edgeCoefficient) * heaterSlope - downSlope - edgeSlope;
            double next = outdoor - excess / slope;
            if (Math.abs(next - outdoor) <= 1e-14 * (1 + Math.abs(outdoor))) {
                return next;
            }
            if (!(next > low && next < high)) {
                next = (low + high) / 2;
                if (next == low || next == high) {
                    return next;
                }
            }
            outdoor = next;
        }
        return outdoor;
    }

    private double bisect() {
        double low = COLDEST;
        double high = room;
        while (true) {
            double middle = (low + high) / 2;
            if (middle == low || middle == high) {
                return high;
            }
            if (carriesAt(middle)) {
                high = middle;
            } else {
                low = middle;
            }
        }
    }
}
