package org.treadwarm.checks;

import java.util.HashMap;
import java.util.Map;
import java.util.stream.DoubleStream;
import org.treadwarm.physics.PracticeLimit;
import org.treadwarm.physics.PracticeLimit.Sense;
import org.treadwarm.physics.floor.HeatedFloor;
import org.treadwarm.physics.floor.LimitCurve;
import org.treadwarm.physics.floor.ScreedFloor;
import org.treadwarm.physics.floor.TableMethod;
import org.treadwarm.physics.water.HeatedZone;
import org.treadwarm.physics.water.HeatingWater;
import org.treadwarm.physics.water.LiquidWater;
import org.treadwarm.physics.water.PipeFriction;
import org.treadwarm.physics.water.PropyleneGlycol;
import org.treadwarm.physics.water.Tube;
import org.treadwarm.physics.water.Water;
import org.treadwarm.physics.water.WaterViscosity;
import org.treadwarm.sizing.FloorMethods;
import org.treadwarm.sizing.Practice;

/** Water, glycol, pipes and circuits. */
final class CircuitChecks {
    private static final double SECONDS_PER_HOUR = 3600;

    private CircuitChecks() {}

    static Map<String, Computation> bindings() {
        return Map.ofEntries(
                Map.entry("if97-*", CircuitChecks::liquidWater),
                Map.entry("iapws-visc-*", CircuitChecks::viscosity),
                Map.entry("water-*", CircuitChecks::water),
                Map.entry("glycol-PG", CircuitChecks::propyleneGlycol),
                Map.entry("colebrook-*", CircuitChecks::friction),
                Map.entry("pipe-*", CircuitChecks::pipe),
                Map.entry("hydraulic-practice", CircuitChecks::practice),
                Map.entry("en1264-worked-1", CircuitChecks::worked));
    }

    private static Map<String, DoubleStream> liquidWater(Inputs given) {
        LiquidWater.State state = LiquidWater.at(given.number("T_K"), given.number("p_MPa") * 1e6);
        return Map.of(
                "v", DoubleStream.of(state.specificVolume()),
                "h", DoubleStream.of(state.specificEnthalpy() / 1000),
                "cp", DoubleStream.of(state.specificHeat() / 1000));
    }

    private static Map<String, DoubleStream> viscosity(Inputs given) {
        double viscosity = WaterViscosity.at(given.number("T_K"), given.number("rho"));
        return Map.of("mu_uPas", DoubleStream.of(viscosity * 1e6));
    }

    private static Map<String, DoubleStream> water(Inputs given) {
        Water water = new Water(given.number("p_MPa") * 1e6);
        double temperature = given.number("t_C");
        return Map.of(
                "rho", DoubleStream.of(water.density(temperature)),
                "cp", DoubleStream.of(water.specificHeat(temperature)),
                "mu", DoubleStream.of(water.dynamicViscosity(temperature)),
                "nu", DoubleStream.of(water.kinematicViscosity(temperature)));
    }

    private static Map<String, DoubleStream> propyleneGlycol(Inputs given) {
        return Map.of(
                "cp_kJ_kgK",
                given.numbers("percent")
                        .flatMap(percent -> given.numbers("t_C")
                                .map(new PropyleneGlycol(percent / 100)::specificHeat)
                                .map(heat -> heat / 1000)),
                "rho",
                given.numbers("percent")
                        .flatMap(percent -> given.numbers("t_C").map(new PropyleneGlycol(percent / 100)::density)));
    }

    private static Map<String, DoubleStream> friction(Inputs given) {
        double reynolds = given.number("Re");
        double roughness = given.number("rel");
        return Map.of(
                "colebrook", DoubleStream.of(PipeFriction.colebrook(reynolds, roughness)),
                "haaland", DoubleStream.of(PipeFriction.haaland(reynolds, roughness)));
    }

    private static Map<String, DoubleStream> pipe(Inputs given) {
        Tube tube = new Tube(given.number("d_i"), given.number("eps_m"));
        Tube.Flow flow = tube.flow(given.number("kg_h") / SECONDS_PER_HOUR, Water.atAtmosphere(), given.number("t_C"));
        return Map.of(
                "u", DoubleStream.of(flow.velocity()),
                "Re", DoubleStream.of(flow.reynolds()),
                "f", DoubleStream.of(flow.friction()),
                "dp_Pa", DoubleStream.of(flow.pressureGradient() * given.number("L")));
    }

    private static Map<String, DoubleStream> practice(Inputs given) {
        return Map.of(
                "max_len_m", limits("loop length", Sense.AT_MOST),
                "max_dp_kPa", limits("pressure drop", Sense.AT_MOST).map(pascal -> pascal / 1000),
                "min_velocity", limits("velocity", Sense.AT_LEAST),
                "max_supply_C", limits("supply temperature", Sense.AT_MOST),
                "drop_K",
                        DoubleStream.of(
                                limits("spread", Sense.AT_LEAST).min().orElseThrow(),
                                limits("spread", Sense.AT_MOST).max().orElseThrow()));
    }

    private static DoubleStream limits(String name, Sense sense) {
        return Practice.water().stream()
                .filter(limit -> limit.name().equals(name) && limit.sense() == sense)
                .mapToDouble(PracticeLimit::limit);
    }

    /** The whole chain, from the load of a room to the pressure drop of its loops. */
    private static Map<String, DoubleStream> worked(Inputs given) {
        double room = given.number("th_i");
        double below = given.number("th_u");
        double spread = given.number("sigma");
        double area = given.number("A");
        double flux = given.number("Q") / area;
        ScreedFloor floor = WaterFloorChecks.screedFloor(given);
        double coefficient = FloorMethods.pipesInScreed().coefficient(floor);
        double mean = flux / coefficient;
        double up = TableMethod.resistanceUp(floor.covering(), floor.cover(), floor.screedConductivity());
        double down =
                given.number("R_ins") + given.number("R_ceiling") + given.number("R_plaster") + given.number("R_alpha");
        double downward = TableMethod.downwardFlux(up, down, flux, room, below);
        HeatedZone zone = new HeatedZone(area, floor.spacing(), flux, downward);
        double supply = HeatingWater.supplyOvertemperatureByRule(mean, spread);
        double massFlow = HeatingWater.massFlow(area, flux, spread, given.number("c"), up, down, room, below);
        LimitCurve.Limit limit = WaterFloorChecks.limitAt(floor, given.number("limit_C") - room);
        Map<String, DoubleStream> got = new HashMap<>();
        got.put("K_H", DoubleStream.of(coefficient));
        got.put("q", DoubleStream.of(flux));
        got.put("dTH", DoubleStream.of(mean));
        got.put("Ro", DoubleStream.of(up));
        got.put("Ru", DoubleStream.of(down));
        got.put("qu", DoubleStream.of(downward));
        got.put("q_total", DoubleStream.of(zone.heat() / area));
        got.put("dTV", DoubleStream.of(supply));
        got.put("th_V", DoubleStream.of(room + supply));
        got.put("th_R", DoubleStream.of(room + supply - spread));
        got.put("qG", DoubleStream.of(limit.flux()));
        got.put("dTHG", DoubleStream.of(limit.waterOvertemperature()));
        got.put("mean_surface", DoubleStream.of(HeatedFloor.temperatureBelow(room, flux, 0)));
        got.put("mass_flow_kg_h", DoubleStream.of(massFlow * SECONDS_PER_HOUR));
        got.put("pipe_m", DoubleStream.of(zone.pipeLength()));
        loops(given, floor, zone, massFlow, 1).forEach((name, value) -> got.put("one_circuit_" + name, value));
        loops(given, floor, zone, massFlow, 2).forEach((name, value) -> got.put("two_circuits_" + name, value));
        return got;
    }

    private static Map<String, DoubleStream> loops(
            Inputs given, ScreedFloor floor, HeatedZone zone, double massFlow, int count) {
        Tube tube = new Tube(floor.pipe().innerDiameter(), given.number("eps_m"));
        Tube.Flow flow = tube.flow(massFlow / count, Water.atAtmosphere(), given.number("fluid_C"));
        return Map.of(
                "u", DoubleStream.of(flow.velocity()),
                "Re", DoubleStream.of(flow.reynolds()),
                "f", DoubleStream.of(flow.friction()),
                "dp_kPa", DoubleStream.of(flow.pressureGradient() * zone.pipeLength() / count / 1000));
    }
}
