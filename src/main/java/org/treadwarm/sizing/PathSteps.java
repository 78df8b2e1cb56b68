package org.treadwarm.sizing;

import java.util.List;
import org.treadwarm.sizing.Plan.Link;
import org.treadwarm.sizing.Plan.PathRef;
import org.treadwarm.sizing.Sizing.PathLoss;

/** Steps of the paths of rooms and spaces: conductance, temperature difference, heat and its share. */
final class PathSteps {
    private final Plan plan;
    private final Addresses addresses;
    private final Steps steps;
    private final SurfaceSteps surfaces;
    private final AirSteps air;

    PathSteps(Plan plan, Addresses addresses, Steps steps) {
        this.plan = plan;
        this.addresses = addresses;
        this.steps = steps;
        this.surfaces = new SurfaceSteps(plan, addresses, steps);
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
            case SURFACE -> surfaces.surface(at, link, answer);
            case OPENING -> surfaces.opening(at, link);
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
