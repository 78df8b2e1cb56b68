package org.treadwarm.sizing;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import org.treadwarm.sizing.Plan.FloorPlan;
import org.treadwarm.sizing.Plan.RoomIndexes;
import org.treadwarm.sizing.Sizing.ElectricLayout;
import org.treadwarm.sizing.Sizing.PracticeJudgement;
import org.treadwarm.sizing.Sizing.RoomSizing;
import org.treadwarm.sizing.Sizing.WarmUpSizing;
import org.treadwarm.sizing.Sizing.WaterLayout;
import org.treadwarm.sizing.Sizing.WaterTotal;
import org.treadwarm.survey.Survey;

/** Steps of how a floor is fed: electric elements, or loops of warm water. */
final class LayoutSteps {
    private final Addresses addresses;
    private final Steps steps;

    LayoutSteps(Addresses addresses, Steps steps) {
        this.addresses = addresses;
        this.steps = steps;
    }

    void electric(FloorPlan floor, ElectricLayout layout, boolean planned) {
        String floorAt = addresses.pointer(floor.room()) + "/floor";
        String at = floorAt + "/electric";
        Symbol voltage = symbol("U", at + "/voltage");
        Symbol power = symbol("P", layout.mats().isPresent() ? at + "/mats/power" : floorAt + "/installedPower");
        steps.add(
                at + "/voltage",
                "voltage-given",
                "x",
                Symbol.of("x_given", Addresses.survey("/rooms/" + floor.room() + "/heatedFloor/heater/voltage")));
        if (layout.cableLength().isPresent()) {
            cable(floor, at + "/cableLength", floorAt);
        }
        steps.add(at + "/powerAtLowVoltage", "power-at-low-voltage", "P_low", power);
        steps.add(at + "/powerAtHighVoltage", "power-at-high-voltage", "P_high", power);
        List<String> all = IntStream.range(0, layout.elements().size())
                .mapToObj(i -> Addresses.sizing(at + "/elements/" + i + "/power"))
                .toList();
        for (int i = 0; i < layout.elements().size(); i++) {
            String element = at + "/elements/" + i;
            Symbol own = symbol("P_e", element + "/power");
            steps.add(element + "/power", "element-power", "P_e", power, Symbol.all("P_each", all));
            steps.add(element + "/current", "element-current", "I", own, voltage);
            steps.add(element + "/breaker", "chosen", "x");
            steps.add(element + "/resistance", "element-resistance", "R", voltage, own);
            Symbol resistance = symbol("R", element + "/resistance");
            steps.add(element + "/lowestResistance", "lowest-element-resistance", "R_low", resistance);
            steps.add(element + "/highestResistance", "highest-element-resistance", "R_high", resistance);
        }
        layout.mats().ifPresent(mats -> new MatSteps(steps, floorAt).all(mats, planned));
        judged(at, layout.limits());
    }

    private void cable(FloorPlan floor, String here, String floorAt) {
        if (floor.parts().isEmpty()) {
            steps.add(
                    here,
                    "cable-length",
                    "l",
                    symbol("A_F", floorAt + "/area"),
                    Symbol.of("T", addresses.input(floor.heater().spacing())));
            return;
        }
        steps.add(
                here,
                "cable-length-of-parts",
                "l",
                Symbol.all(
                        "A_p",
                        floor.parts().stream()
                                .map(part -> addresses.input(part.area()))
                                .toList()),
                Symbol.all(
                        "T_p",
                        floor.parts().stream()
                                .map(part -> addresses.input(part.spacing()))
                                .toList()));
    }

    void water(FloorPlan floor, WaterLayout layout) {
        String floorAt = addresses.pointer(floor.room()) + "/floor";
        String at = floorAt + "/water";
        Symbol supply = symbol("theta_V", at + "/supplyTemperature");
        Symbol spread = symbol("sigma", at + "/spread");
        Symbol over = symbol("Delta_theta_H", at + "/meanOvertemperature");
        Symbol room = Symbol.of("theta_i", addresses.temperature(floor.room()));
        chosen(at, "supplyTemperature", "heat", "massFlow", "volumeFlow", "loops", "loopLength", "velocity");
        chosen(at, "reynolds", "frictionFactor", "pressureDrop", "waterContent", "meanOvertemperature");
        steps.add(at + "/spread", "spread-of-loop", "sigma", supply, room, over);
        steps.add(at + "/returnTemperature", "return-temperature", "theta_R", supply, spread);
        if (layout.tableCoefficient().isPresent()) {
            chosen(at, "tableCoefficient");
            steps.add(
                    at + "/tableMeanOvertemperature",
                    "table-overtemperature",
                    "Delta_theta_H",
                    Symbol.all(
                            "q_each",
                            List.of(
                                    Addresses.sizing(floorAt + "/requiredFlux"),
                                    Addresses.sizing(floorAt + "/carryingFlux"))),
                    symbol("K_H", at + "/tableCoefficient"));
        }
        judged(at, layout.limits());
        for (int i = 0; i < layout.parts().size(); i++) {
            String part = at + "/parts/" + i;
            chosen(part, "heat", "massFlow", "loops", "loopLength", "velocity");
            chosen(part, "reynolds", "frictionFactor", "pressureDrop", "waterContent");
            judged(part, layout.parts().get(i).limits());
        }
    }

    /** Warming up after a setback. */
    void warmUp(FloorPlan floor, RoomIndexes inputs, WarmUpSizing found) {
        String at = addresses.pointer(floor.room()) + "/floor/warmup";
        steps.add(at + "/from", "setback-given", "x", Symbol.of("x_given", addresses.input(inputs.setback())));
        steps.add(at + "/within", "setback-given", "x", Symbol.of("x_given", addresses.input(inputs.warmUpTime())));
        followed(at, "reheatFlux", "steadyDensity", "densityNeeded", "density", "lossCoefficient", "airCapacity");
        followed(at, "massCapacity", "massCoupling");
        if (found.hours().isPresent()) {
            followed(at, "hours");
        }
        if (found.hoursToFive().isPresent()) {
            followed(at, "hoursToFive");
        }
        if (found.hoursToFreezing().isPresent()) {
            followed(at, "hoursToFreezing");
        }
    }

    private void followed(String at, String... keys) {
        for (String key : keys) {
            steps.add(at + "/" + key, "followed", "x");
        }
    }

    /** The water of the whole job, and of each manifold. */
    void total(List<RoomSizing> rooms, Survey survey, WaterTotal water) {
        String at = "/total/water";
        List<Integer> all = IntStream.range(0, rooms.size())
                .filter(room -> rooms.get(room).floor().water().isPresent())
                .boxed()
                .toList();
        steps.add(
                at + "/supplyTemperature", "hottest-supply", "theta_V", each("theta_room", all, "/supplyTemperature"));
        sums(at, all);
        chosen(at, "volumeFlow");
        Map<String, String> worstLoops = new HashMap<>();
        ManifoldDrops drops = new ManifoldDrops(survey);
        pump(at, all, water);
        for (int i = 0; i < water.manifolds().size(); i++) {
            Optional<String> name = water.manifolds().get(i).name();
            String manifold = at + "/manifolds/" + i;
            List<Integer> on = all.stream()
                    .filter(room -> drops.feeding(room).equals(name))
                    .toList();
            boolean ownDrop = water.manifolds().get(i).ownDrop().isPresent();
            String worst = manifold + (ownDrop ? "/loopDrop" : "/pressure");
            on.forEach(room -> worstLoops.put(rooms.get(room).name(), worst));
            sums(manifold, on);
            steps.add(worst, "worst-loop", "p", each("p_loop", on, "/pressureDrop"));
            chosen(manifold, "loops", "volumeFlow");
            if (ownDrop) {
                ownDrop(manifold, drops.statedIn(name).orElseThrow());
            }
            beforeManifold(at, manifold, water);
        }
        for (int i = 0; i < water.valves().size(); i++) {
            String valve = at + "/valves/" + i;
            chosen(valve, "loop", "massFlow", "drop");
            throttled(valve, worstLoops.get(water.valves().get(i).room()), valve + "/drop");
        }
    }

    /** What the pump has to give: the drop of the worst loop, and what the survey states of manifolds and heat source. */
    private void pump(String at, List<Integer> rooms, WaterTotal water) {
        boolean source = water.sourceDrop().isPresent();
        if (!source
                && water.manifolds().stream()
                        .noneMatch(manifold -> manifold.ownDrop().isPresent())) {
            steps.add(at + "/pressure", "worst-loop", "p", each("p_loop", rooms, "/pressureDrop"));
            return;
        }
        Symbol manifolds = Symbol.all(
                "p_manifold",
                IntStream.range(0, water.manifolds().size())
                        .mapToObj(i -> Addresses.sizing(at + "/manifolds/" + i + "/pressure"))
                        .toList());
        if (!source) {
            steps.add(at + "/pressure", "worst-manifold", "p", manifolds);
            return;
        }
        steps.add(
                at + "/sourceDrop", "drop-stated", "x", Symbol.of("x_given", Addresses.survey("/site/heatSourceDrop")));
        steps.add(
                at + "/pressure", "worst-manifold-and-source", "p", manifolds, symbol("p_source", at + "/sourceDrop"));
    }

    private void ownDrop(String manifold, int room) {
        steps.add(
                manifold + "/ownDrop",
                "drop-stated",
                "x",
                Symbol.of("x_given", Addresses.survey("/rooms/" + room + "/heatedFloor/heater/manifoldDrop")));
        steps.add(
                manifold + "/pressure",
                "loop-and-manifold",
                "p",
                symbol("p_loop", manifold + "/loopDrop"),
                symbol("p_own", manifold + "/ownDrop"));
    }

    private void beforeManifold(String at, String manifold, WaterTotal water) {
        if (water.sourceDrop().isEmpty()) {
            throttled(manifold, at + "/pressure", manifold + "/pressure");
            return;
        }
        steps.add(
                manifold + "/throttled",
                "throttled-behind-source",
                "p_valve",
                symbol("p", at + "/pressure"),
                symbol("p_source", at + "/sourceDrop"),
                symbol("p_manifold", manifold + "/pressure"));
    }

    private void sums(String at, List<Integer> rooms) {
        steps.add(at + "/massFlow", "sum-of-flows", "m", each("m_room", rooms, "/massFlow"));
        steps.add(at + "/waterContent", "sum-of-contents", "V", each("V_room", rooms, "/waterContent"));
    }

    private void throttled(String at, String whole, String own) {
        steps.add(at + "/throttled", "throttled", "p_valve", symbol("p", whole), symbol("p_loop", own));
    }

    private static Symbol each(String name, List<Integer> rooms, String key) {
        return Symbol.all(
                name,
                rooms.stream()
                        .map(room -> Addresses.sizing("/rooms/" + room + "/floor/water" + key))
                        .toList());
    }

    private void judged(String at, List<PracticeJudgement> limits) {
        for (int i = 0; i < limits.size(); i++) {
            chosen(at + "/limits/" + i, "value", "limit", "margin");
        }
    }

    private void chosen(String at, String... keys) {
        for (String key : keys) {
            steps.add(at + "/" + key, "chosen", "x");
        }
    }

    private static Symbol symbol(String name, String pointer) {
        return Symbol.of(name, Addresses.sizing(pointer));
    }
}
