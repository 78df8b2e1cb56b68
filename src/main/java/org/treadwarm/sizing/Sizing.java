package org.treadwarm.sizing;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.treadwarm.sizing.SectionEvaluation.SectionAccuracy;

/**
 * The answer for a survey: numbers only, in SI units (temperatures in degrees Celsius), never rounded. A number that does not
 * exist is left out. The component names are the answer's keys and do not change within a method version.
 */
public record Sizing(
        List<RoomSizing> rooms,
        List<SpaceSizing> spaces,
        Total total,
        List<AssemblySizing> assemblies,
        NetworkSolution network,
        List<Warning> warnings,
        Method method) {
    /** The method that made these numbers; a changed number is a new version. */
    public static final String METHOD_VERSION = "1";

    /** One room. */
    public record RoomSizing(
            String name,
            double indoorTemperature,
            HeatLoss heatLoss,
            FloorSizing floor,
            OptionalDouble fromFloorAbove,
            List<Caution> cautions) {}

    /** Heat that a room loses on the design day, W. */
    public record HeatLoss(
            double total,
            double transmission,
            double junctions,
            double air,
            double reheat,
            double gainsFromNeighbours,
            List<PathLoss> paths) {}

    /** One way heat leaves a room; a negative heat flow comes in. */
    public record PathLoss(
            String name,
            Optional<String> to,
            String kind,
            OptionalDouble area,
            OptionalDouble uValue,
            OptionalDouble conductance,
            OptionalDouble temperatureDifference,
            double heatFlow,
            OptionalDouble share,
            Optional<GroundPath> ground) {}

    /**
     * What ISO 13370 found for a path to the ground: B' and dt in m, the season factor times the groundwater factor, the film
     * above an unheated floor in m²·K/W, and Ug and Ux of a void below a suspended floor in W/(m²·K).
     */
    public record GroundPath(
            double characteristicDimension,
            double equivalentThickness,
            double seasonalFactor,
            OptionalDouble insideFilm,
            OptionalDouble voidToGround,
            OptionalDouble voidToOutdoors) {}

    /** What the heated floor must and may give. */
    public record FloorSizing(
            Verdict verdict,
            OptionalDouble area,
            OptionalDouble requiredHeat,
            OptionalDouble requiredFlux,
            OptionalDouble carryingFlux,
            OptionalDouble margin,
            OptionalDouble marginShare,
            OptionalDouble shortfall,
            OptionalDouble supplement,
            OptionalDouble holdsDownTo,
            Optional<String> holdsDownToReason,
            OptionalDouble surfaceTemperature,
            Optional<String> surfaceBasis,
            OptionalDouble heaterTemperature,
            OptionalDouble downwardFlux,
            OptionalDouble edgeFlux,
            OptionalDouble heaterFlux,
            OptionalDouble heaterPower,
            Optional<FloorState> atCarryingFlux,
            OptionalDouble installedDensity,
            OptionalDouble installedPower,
            OptionalDouble buildUpHeight,
            OptionalDouble load,
            OptionalDouble resistanceAbove,
            OptionalDouble resistanceBelow,
            List<LayerSizing> layersAbove,
            List<LayerSizing> layersBelow,
            Optional<Below> below,
            List<Edge> edges,
            List<Limit> limits,
            Optional<SectionSizing> section,
            List<PartSizing> parts,
            Optional<String> sectionReason,
            Optional<ElectricLayout> electric,
            Optional<WaterLayout> water,
            Optional<WarmUpSizing> warmup,
            Optional<String> warmupReason,
            Optional<FreeFloor> plan,
            Optional<String> matsReason) {}

    /**
     * The plan of the room's floor.
     *
     * @param area of its rectangle, m²
     * @param fixedArea of its fixed parts, m²; what they cover twice counts once
     * @param freeArea the rest, m²
     * @param freeShare free area over area
     * @param heatedShare heated area over free area; left out when nothing is free
     */
    public record FreeFloor(
            double area, double fixedArea, double freeArea, double freeShare, OptionalDouble heatedShare) {}

    /**
     * How the floor warms its room after a setback on the design day. What the room holds is assumed: the capacities and the coupling
     * stand here so that they can be looked at.
     *
     * @param from setback temperature, degrees Celsius
     * @param within hours to be warm again
     * @param reheatFlux what the heat load is raised by, W/m² of heated floor
     * @param steadyDensity heat of the heater that keeps the room warm, W/m²
     * @param densityNeeded heat of the heater that warms it in time, W/m²
     * @param density the density looked at: the installed one, or the needed one where none is installed, W/m²
     * @param hours with that density; left out when the room is not warm within 72 h
     * @param lossCoefficient of the room, W/(m²·K) of heated floor
     * @param airCapacity J/(m²·K) of heated floor
     * @param massCapacity J/(m²·K) of heated floor
     * @param massCoupling between air and mass, W/(m²·K)
     * @param hoursToFive when the heater fails in steady state, until the room is at 5 °C; left out when not within 72 h
     * @param hoursToFreezing the same until the heater plane is at 0 °C
     */
    public record WarmUpSizing(
            double from,
            double within,
            double reheatFlux,
            double steadyDensity,
            double densityNeeded,
            double density,
            OptionalDouble hours,
            double lossCoefficient,
            double airCapacity,
            double massCapacity,
            double massCoupling,
            OptionalDouble hoursToFive,
            OptionalDouble hoursToFreezing) {}

    /**
     * How an electric heater is fed.
     *
     * @param voltage V
     * @param cableLength of the runs at their spacing, m
     * @param elements equal parts, each fed whole, as few as the largest usual breaker allows; none where mats are chosen
     * @param mats chosen from those that can be had
     * @param powerAtLowVoltage of the whole heater at 10 % less voltage, W
     * @param powerAtHighVoltage of the whole heater at 10 % more voltage, W
     */
    public record ElectricLayout(
            double voltage,
            OptionalDouble cableLength,
            List<HeatingElementLayout> elements,
            Optional<MatLayout> mats,
            double powerAtLowVoltage,
            double powerAtHighVoltage,
            List<PracticeJudgement> limits) {}

    /**
     * Mats chosen for a floor: of all combinations that fit and make the heat needed on the design day the one that leaves the least
     * floor bare; where none makes it, the strongest.
     *
     * @param area to be covered, m²: the heated area, or the free area of the plan when that is less
     * @param coveredArea m²
     * @param bareArea m²
     * @param power of all mats, W
     * @param neededPower what the heater must make for the required flux, W
     * @param margin power less needed power, W; negative when the mats are too weak
     * @param meanDensity power over the heated area, W/m², which limits the floor; sheets issued before it did do not hold it
     * @param pieces the mats to order
     * @param circuits that feed them; none when a mat is too large for the largest usual breaker
     */
    public record MatLayout(
            double area,
            double coveredArea,
            double bareArea,
            double power,
            double neededPower,
            double margin,
            OptionalDouble meanDensity,
            List<MatPieces> pieces,
            List<MatCircuit> circuits) {}

    /**
     * So many of one mat; area, power and what follows are those of a single one.
     *
     * @param pointer where it stands in the survey
     * @param count how many
     * @param density W/m²
     * @param current A
     * @param resistance ohm, and from the lowest to the highest to find when it is put into service
     */
    public record MatPieces(
            String name,
            String pointer,
            int count,
            double area,
            double power,
            double density,
            double current,
            double resistance,
            double lowestResistance,
            double highestResistance) {}

    /** A circuit of mats: their names, the largest first, its current and the rating of its breaker, A. */
    public record MatCircuit(List<String> mats, double current, double breaker) {}

    /** One element: W, A, the rating of its breaker in A, and the resistances in ohm to find when it is put into service. */
    public record HeatingElementLayout(
            double power,
            double current,
            double breaker,
            double resistance,
            double lowestResistance,
            double highestResistance) {}

    /**
     * The loops of a warm-water floor, at the flux that the floor gives: the required one, or the carrying one when that is
     * less. They are all alike; where the floor is laid in parts, each part has loops of its own, and the numbers of one loop here are
     * those of the loop with the largest drop and of the longest.
     *
     * @param meanOvertemperature of the water over the room, K
     * @param heat that the water leaves, W
     * @param massFlow of all loops, kg/s
     * @param volumeFlow of all loops, m³/s
     * @param loopLength of one loop with its feeders, m
     * @param pressureDrop of one loop, Pa; straight pipe, without bends and fittings
     * @param waterContent of all loops, m³
     * @param tableCoefficient K_H of the standard table method, W/(m²·K), to stand beside the section's result
     * @param tableMeanOvertemperature what that method asks of the water for the same flux, K
     */
    public record WaterLayout(
            double supplyTemperature,
            double returnTemperature,
            double spread,
            double meanOvertemperature,
            double heat,
            double massFlow,
            double volumeFlow,
            int loops,
            double loopLength,
            double velocity,
            double reynolds,
            double frictionFactor,
            double pressureDrop,
            double waterContent,
            OptionalDouble tableCoefficient,
            OptionalDouble tableMeanOvertemperature,
            List<PracticeJudgement> limits,
            List<PartLoops> parts) {}

    /** The loops of one part of a floor, all alike and only in this part; the numbers are those of {@link WaterLayout}. */
    public record PartLoops(
            String name,
            double heat,
            double massFlow,
            int loops,
            double loopLength,
            double velocity,
            double reynolds,
            double frictionFactor,
            double pressureDrop,
            double waterContent,
            List<PracticeJudgement> limits) {}

    /**
     * A value beside a limit of practice, in SI units and degrees Celsius; what is left is negative when it is beyond.
     *
     * @param sense "at most" or "at least"; sheets issued before it was told do not hold it
     */
    public record PracticeJudgement(
            String name, Optional<String> sense, double value, double limit, double margin, String source) {}

    /**
     * The warm water of the whole job: one supply temperature, which the room that needs the hottest water governs, and the balance of
     * its loops, each within its manifold.
     *
     * @param pressure what one pump for all manifolds gives, Pa: the drop of the worst loop, and of its manifold and the heat source
     *     where the survey states them
     * @param sourceDrop of the heat source, Pa, as stated
     * @param manifolds in the order in which the rooms name them
     */
    public record WaterTotal(
            double supplyTemperature,
            String governingRoom,
            double massFlow,
            double volumeFlow,
            double pressure,
            OptionalDouble sourceDrop,
            double waterContent,
            List<ManifoldSizing> manifolds,
            List<LoopValve> valves) {}

    /**
     * One manifold.
     *
     * @param name as the rooms give it; left out for the manifold of the rooms that name none
     * @param loops how many hang on it
     * @param pressure drop of its worst loop, and of the manifold itself where the survey states it, Pa
     * @param loopDrop drop of its worst loop alone, Pa, where the manifold's own is stated
     * @param ownDrop of the manifold itself, Pa, as stated
     * @param throttled what a valve before it takes away when one pump feeds all manifolds, Pa
     */
    public record ManifoldSizing(
            Optional<String> name,
            int loops,
            double massFlow,
            double volumeFlow,
            double pressure,
            OptionalDouble loopDrop,
            OptionalDouble ownDrop,
            double throttled,
            double waterContent) {}

    /** A loop's valve, on the manifold of its room: kg/s through it, the drop of its pipe and what the valve takes away, Pa. */
    public record LoopValve(
            String room, Optional<String> part, int loop, double massFlow, double drop, double throttled) {}

    /**
     * The floor solved between its cables or pipes.
     *
     * @param spacing axis to axis, m
     * @param diameter of the cable or pipe, outside, m
     * @param heaterLayer the layer that holds it, lying on the layers below
     * @param spread between supply and return of the water, K
     * @param limits what was found at each of the floor's limits, in their order
     */
    public record SectionSizing(
            double spacing,
            double diameter,
            String heaterLayer,
            OptionalDouble spread,
            SectionState atRequiredFlux,
            SectionState atCarryingFlux,
            List<SectionLimit> limits,
            SectionAccuracy accuracy) {}

    /**
     * A part of a floor that is laid in parts. All parts are fed alike: the floor's required and carrying flux are means over its area,
     * and each part gives of them what its own section gives with the same water or the same power of the cable.
     *
     * @param zone its zone of use in words
     * @param area m²
     * @param spacing axis to axis, m
     * @param diameter of the cable or pipe, outside, m
     * @param spread between supply and return of the water, K
     * @param density of the electric heater in this part, W/m²
     * @param limits what this part may give by its own limits
     */
    public record PartSizing(
            String name,
            String zone,
            double area,
            double spacing,
            double diameter,
            OptionalDouble spread,
            OptionalDouble density,
            PartState atRequiredFlux,
            PartState atCarryingFlux,
            List<PartLimit> limits,
            SectionAccuracy accuracy) {}

    /**
     * A part at one flux of the whole floor.
     *
     * @param flux what the part itself gives, W/m²
     * @param surfaceTemperature of its warmest point, degrees Celsius
     * @param water how the water's temperature rises over the room's with the part's fluxes
     */
    public record PartState(
            double flux,
            double surfaceTemperature,
            double heaterTemperature,
            double downwardFlux,
            double edgeFlux,
            double heaterFlux,
            Optional<FluxSplit> water,
            SectionState section) {}

    /** A limit of a part: the flux of the part at which it is reached, what goes down there, and how the limited temperature rises. */
    public record PartLimit(String name, double maximumFlux, double downwardFlux, FluxSplit temperature) {}

    /**
     * A solved floor at one flux, degrees Celsius.
     *
     * @param heaterPlane mean over the upper face of the layers below
     * @param heaterTemperature mean of the cable's skin or the pipe's outside
     * @param waterTemperature mean of the water in the pipe
     * @param supplyTemperature of the water, for its spread
     * @param layers highest temperature of each layer above, at its lower face; of the one that holds the heater, at the heater
     */
    public record SectionState(
            double flux,
            double surfaceMean,
            double surfaceMaximum,
            double surfaceMinimum,
            double heaterPlane,
            double heaterTemperature,
            OptionalDouble waterTemperature,
            OptionalDouble supplyTemperature,
            List<SectionEvaluation.WarmFace> layers,
            FluxSplit surface,
            FluxSplit plane,
            FluxSplit heater) {}

    /** How far a temperature rises over the room's with the upward and with the downward flux, K per W/m², at this flux. */
    public record FluxSplit(double perUpwardFlux, double perDownwardFlux) {}

    /** What goes down and out at the edge at a limit, W/m², and how the limited temperature rises with the fluxes there. */
    public record SectionLimit(double downwardFlux, double edgeFlux, Optional<FluxSplit> temperature) {}

    /** A floor at one flux. */
    public record FloorState(
            double surfaceTemperature,
            double heaterTemperature,
            double downwardFlux,
            double edgeFlux,
            double heaterFlux,
            double heaterPower) {}

    /**
     * What the heater plane sees below: downward flux = conductance x (heater temperature - temperature). R' and R'' of the
     * layers below, with the lower side's film unless they lie on the ground, where framing crosses them.
     */
    public record Below(
            String name,
            double conductance,
            double temperature,
            OptionalDouble upperLimit,
            OptionalDouble lowerLimit,
            Optional<GroundPath> ground) {}

    /** A junction that sees the heater plane, W/K and degrees Celsius. */
    public record Edge(String name, String to, double conductance, double temperature) {}

    /** The largest upward flux that one thing allows. */
    public record Limit(String name, double maximumFlux, double margin, boolean governs, String source) {}

    /** A space that floats. */
    public record SpaceSizing(
            String name,
            double temperature,
            OptionalDouble temperatureFactor,
            OptionalDouble fromFloorAbove,
            List<PathLoss> paths) {}

    /** Sums over the rooms. */
    public record Total(
            double heatLoss,
            double heaterPower,
            OptionalDouble installedPower,
            double heatedArea,
            Optional<WaterTotal> water) {}

    /** An assembly as it was used: its layers, and its resistance towards each kind of other side. */
    public record AssemblySizing(String name, List<LayerSizing> layers, List<SideSizing> sides) {}

    /** Resistance of a layer and of the framing through it, m²·K/W. */
    public record LayerSizing(String name, double resistance, OptionalDouble framingResistance) {}

    /** R', R'' and U towards one kind of other side; towards the ground the layers alone, without films. */
    public record SideSizing(
            String side,
            OptionalDouble insideFilm,
            OptionalDouble outsideFilm,
            OptionalDouble upperLimit,
            OptionalDouble lowerLimit,
            OptionalDouble largestRelativeError,
            OptionalDouble resistance,
            OptionalDouble uValue) {}

    /** How the floating temperatures were found, and the largest heat left over in any balance, W. */
    public record NetworkSolution(int floatingSpaces, double residual) {}

    /** Something that deserves a second look. */
    public record Warning(String code, String pointer, String message, String why, String settle) {}

    /** Something that can hurt somebody. */
    public record Caution(String code, String text, String source) {}

    /** The method version. */
    public record Method(String version) {}
}
