package org.treadwarm.survey;

import java.util.List;
import java.util.Optional;
import org.treadwarm.units.Quantity;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Reading;
import org.treadwarm.units.Wording;

/** What makes the heat in the floor. */
public record Heater(
        @Wording(label = "name") Optional<String> name,
        @Wording(label = "remark", longest = 2000) Optional<String> remark,
        @Wording(label = "kind of heater") HeaterKind kind,

        @Quantity(
                kind = QuantityKind.HEAT_FLUX,
                min = 0,
                max = 2000,
                plausibleFrom = 20,
                plausibleTo = 250,
                label = "installed density of an electric heater")
        Optional<Reading> density,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 1000,
                moreThanMin = true,
                plausibleFrom = 0.03,
                plausibleTo = 0.4,
                formUnit = "mm",
                label = "spacing of the cables or pipes",
                help = "With it the floor is solved between the cables or pipes, and its warmest point counts.")
        Optional<Reading> spacing,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0.001,
                max = 0.1,
                plausibleFrom = 0.002,
                plausibleTo = 0.032,
                formUnit = "mm",
                label = "outside diameter of the cable or pipe",
                help = "6 mm for a cable and 16 mm for a pipe when left out (common practice, no source).")
        Optional<Reading> diameter,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0.0001,
                max = 0.05,
                plausibleFrom = 0.001,
                plausibleTo = 0.005,
                formUnit = "mm",
                label = "wall thickness of the pipe",
                help = "2 mm when left out (common practice, no source).")
        Optional<Reading> wallThickness,

        @Quantity(
                kind = QuantityKind.CONDUCTIVITY,
                min = 0.01,
                max = 500,
                plausibleFrom = 0.15,
                plausibleTo = 390,
                label = "conductivity of the pipe's wall",
                help = "0.35 W/(m.K) when left out: cross-linked polyethylene (EN 1264-2, from memory).")
        Optional<Reading> wallConductivity,

        @Quantity(
                kind = QuantityKind.LINEAR_POWER,
                min = 0,
                max = 500,
                moreThanMin = true,
                plausibleFrom = 5,
                plausibleTo = 30,
                label = "power of the cable per metre",
                help = "With a spacing it gives the density when that is left out.")
        Optional<Reading> linearPower,

        @Quantity(
                kind = QuantityKind.VOLTAGE,
                min = 5,
                max = 1000,
                plausibleFrom = 12,
                plausibleTo = 415,
                label = "supply voltage of an electric heater",
                help = "Needed for current, circuits and resistances.",
                assume = "230 V",
                assumeWhy = "Nominal voltage of many public mains (IEC 60038, from memory); read the heater's label.")
        Optional<Reading> voltage,

        @Wording(label = "breakers of an electric heater", help = "The local code decides.", fallback = "european")
        CircuitRule circuitRule,

        @Quantity(
                kind = QuantityKind.TEMPERATURE,
                min = 5,
                max = 95,
                plausibleFrom = 25,
                plausibleTo = 60,
                label = "supply temperature of the water",
                help = "Leave it out to have the lowest found that carries the job.")
        Optional<Reading> supplyTemperature,

        @Quantity(
                kind = QuantityKind.TEMPERATURE_DIFFERENCE,
                min = 0.5,
                max = 40,
                plausibleFrom = 3,
                plausibleTo = 15,
                label = "spread between supply and return",
                help = "5 K when left out (common practice, no source).")
        Optional<Reading> spread,

        @Quantity(
                kind = QuantityKind.LENGTH,
                min = 0,
                max = 500,
                plausibleFrom = 0.1,
                plausibleTo = 60,
                label = "length of both feeders of a loop, from the manifold and back")
        Optional<Reading> feederLength,

        @Wording(
                label = "mats to choose from",
                help =
                        "What can be had; the sizing chooses those that leave the least floor bare and give the heat needed.")
        List<HeatingMat> mats,

        @Wording(
                label = "manifold that feeds the loops",
                help = "Rooms that name the same one are balanced together; without names there is one manifold.")
        Optional<String> manifold,

        @Quantity(
                kind = QuantityKind.PRESSURE,
                min = 0,
                max = 200000,
                plausibleFrom = 500,
                plausibleTo = 40000,
                formUnit = "kPa",
                label = "pressure drop of the manifold",
                help =
                        "Bars, open valves, actuators and mixer, at the flow of the whole manifold, as the maker states it. One room of"
                                + " a manifold is enough.")
        Optional<Reading> manifoldDrop,

        @Quantity(
                kind = QuantityKind.RATIO,
                min = 0,
                max = 0.57,
                plausibleFrom = 0,
                plausibleTo = 0.5,
                formUnit = "%",
                label = "propylene glycol in the water, share of the mass",
                help =
                        "Water alone when left out; a mixture has 15 to 57 %. The maker of boiler and pipes decides on it.")
        Optional<Reading> glycol) {
    /** As many kinds of mats as one list may have. */
    public static final int MOST_MATS = 12;

    /** Outside diameter of its cable or pipe, as given or as is usual, m. */
    double outsideDiameter() {
        return diameter.map(Reading::value).orElse(kind == HeaterKind.WATER ? PIPE_DIAMETER : CABLE_DIAMETER);
    }

    /** Outside diameter of a cable when none is given, m; common practice, no source. */
    public static final double CABLE_DIAMETER = 0.006;

    /** Outside diameter of a pipe when none is given, m; common practice, no source. */
    public static final double PIPE_DIAMETER = 0.016;

    /** Wall thickness of a pipe when none is given, m; common practice, no source. */
    public static final double WALL_THICKNESS = 0.002;

    /** Conductivity of a pipe's wall when none is given, W/(m·K): cross-linked polyethylene (EN 1264-2, from memory). */
    public static final double WALL_CONDUCTIVITY = 0.35;

    /** Spread of the water when none is given, K; common practice, no source. */
    public static final double SPREAD = 5;
}
