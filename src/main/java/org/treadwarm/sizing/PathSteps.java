package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import org.treadwarm.sizing.Plan.Link;
import org.treadwarm.sizing.Plan.PathRef;
import org.treadwarm.sizing.Sizing.PathLoss;

/** Steps of the paths of rooms and spaces: area, U, conductance, temperature difference, heat and its share. */
final class PathSteps {
    private final Plan plan;
    private final Addresses addresses;
    private final Steps steps;
    private final GroundSteps grounds;
    private final AirSteps air;

    PathSteps(Plan plan, Addresses addresses, Steps steps) {
        this.plan = plan;
        this.addresses = addresses;
        this.steps = steps;
        this.grounds = new GroundSteps(plan, addresses, steps);
        this.air = new AirSteps(plan, addresses, steps);
    }

    /** Every path of a room or floating space, and a room's reheat, which comes after them. */
    void all(int node, List<PathLoss> answers) {
        PathRef[] paths = plan.paths[node];
        for (int i = 0; i < paths.length; i++) {
            String at = addresses.path(node, i);
            conductance(at, paths[i], answers.get(i));
            heat(at, node, paths[i], answers.get(i));
        }
        if (answers.size() > paths.length) {
            String at = addresses.path(node, paths.length);
            steps.add(
                    at + "/heatFlow",
                    "reheat-path",
                    "phi",
                    Symbol.of("phi_RH", Addresses.sizing(addresses.pointer(node) + "/heatLoss/reheat")));
            share(at, node, answers.get(paths.length));
        }
    }

    private void conductance(String at, PathRef path, PathLoss answer) {
        Link link = plan.links.get(path.link());
        if (path.heard()) {
            heard(at, addresses.path(link.owner(), new PathRef(path.link(), false)), answer);
            return;
        }
        switch (link.kind()) {
            case SURFACE -> surface(at, link, answer);
            case OPENING -> opening(at, link);
            case JUNCTION ->
                steps.add(
                        at + "/conductance",
                        "junction-conductance",
                        "H",
                        Symbol.of("psi", addresses.input(link.first())),
                        Symbol.of("l", addresses.input(link.second())));
            case AIR -> air.conductance(at + "/conductance", link);
        }
    }

    private void heard(String at, String there, PathLoss answer) {
        if (answer.area().isPresent()) {
            copy(at, there, "/area");
            copy(at, there, "/uValue");
        }
        copy(at, there, "/conductance");
    }

    private void copy(String at, String there, String key) {
        steps.add(at + key, "listed-on-the-other-side", "x", Symbol.of("x_listed", Addresses.sizing(there + key)));
    }

    private void surface(String at, Link link, PathLoss answer) {
        area(at, link);
        if (link.ground() == Stack.NONE) {
            steps.add(
                    at + "/uValue",
                    "path-u-value",
                    "U",
                    Symbol.of("U_assembly", addresses.side(link.face(), "uValue")));
        } else {
            grounds.unheated(at, link, answer.ground().orElseThrow());
        }
        if (link.other() == plan.ground) {
            grounds.conductance(at, link);
        } else {
            transmission(at);
        }
    }

    private void area(String at, Link link) {
        List<String> openings = new ArrayList<>();
        for (int i = 0; i < link.openings(); i++) {
            PathRef opening = new PathRef(link.firstOpening() + i, false);
            openings.add(Addresses.sizing(addresses.path(link.owner(), opening) + "/area"));
        }
        List<Symbol> symbols = new ArrayList<>(extent(link));
        if (!openings.isEmpty()) {
            symbols.add(Symbol.all("A_w", openings));
        }
        String formula = (openings.isEmpty() ? "area" : "net-area") + (hasHeight(link) ? "-of-width-and-height" : "");
        steps.add(at + "/area", formula, "A", symbols.toArray(new Symbol[0]));
    }

    private void opening(String at, Link link) {
        List<Symbol> symbols = new ArrayList<>(extent(link));
        symbols.add(Symbol.of("n", addresses.input(link.count())));
        steps.add(
                at + "/area",
                hasHeight(link) ? "opening-area-of-width-and-height" : "opening-area",
                "A",
                symbols.toArray(new Symbol[0]));
        steps.add(at + "/uValue", "path-u-value", "U", Symbol.of("U_assembly", addresses.side(link.face(), "uValue")));
        transmission(at);
    }

    private static boolean hasHeight(Link link) {
        return link.height() != Stack.NONE;
    }

    private List<Symbol> extent(Link link) {
        return hasHeight(link)
                ? List.of(Symbol.of("b", addresses.input(link.area())), Symbol.of("h", addresses.input(link.height())))
                : List.of(Symbol.of("A_given", addresses.input(link.area())));
    }

    private void transmission(String at) {
        steps.add(
                at + "/conductance",
                "transmission-conductance",
                "H",
                Symbol.of("A", Addresses.sizing(at + "/area")),
                Symbol.of("U", Addresses.sizing(at + "/uValue")));
    }

    private void heat(String at, int node, PathRef path, PathLoss answer) {
        Symbol conductance = Symbol.of("H", Addresses.sizing(at + "/conductance"));
        if (answer.temperatureDifference().isPresent()) {
            difference(at + "/temperatureDifference", node, addresses.other(path));
            steps.add(
                    at + "/heatFlow",
                    "heat-flow",
                    "phi",
                    conductance,
                    Symbol.of("Delta_theta", Addresses.sizing(at + "/temperatureDifference")));
        } else {
            steps.add(at + "/heatFlow", "no-heat-flow", "phi", conductance);
        }
        share(at, node, answer);
    }

    private void difference(String at, int node, int other) {
        Symbol here = Symbol.of("theta", addresses.temperature(node));
        if (addresses.isFactor(other)) {
            steps.add(
                    at,
                    "temperature-difference-by-factor",
                    "Delta_theta",
                    Symbol.of("b", addresses.input(plan.factor[other])),
                    here,
                    Symbol.of("theta_e", addresses.outdoors()));
        } else {
            steps.add(
                    at,
                    "temperature-difference",
                    "Delta_theta",
                    here,
                    Symbol.of("theta_j", addresses.temperature(other)));
        }
    }

    private void share(String at, int node, PathLoss answer) {
        if (answer.share().isPresent()) {
            steps.add(
                    at + "/share",
                    "share-of-the-heat-loss",
                    "s",
                    Symbol.of("phi", Addresses.sizing(at + "/heatFlow")),
                    Symbol.of("phi_HL", Addresses.sizing(addresses.pointer(node) + "/heatLoss/total")));
        }
    }
}
