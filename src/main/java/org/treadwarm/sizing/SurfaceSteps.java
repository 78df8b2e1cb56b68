package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import org.treadwarm.sizing.Plan.Link;
import org.treadwarm.sizing.Plan.PathRef;
import org.treadwarm.sizing.Sizing.PathLoss;

/** Steps of the area, U and conductance of surfaces and openings, where they are listed. */
final class SurfaceSteps {
    private final Plan plan;
    private final Addresses addresses;
    private final Steps steps;
    private final GroundSteps grounds;

    SurfaceSteps(Plan plan, Addresses addresses, Steps steps) {
        this.plan = plan;
        this.addresses = addresses;
        this.steps = steps;
        this.grounds = new GroundSteps(plan, addresses, steps);
    }

    void surface(String at, Link link, PathLoss answer) {
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

    void opening(String at, Link link) {
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
}
