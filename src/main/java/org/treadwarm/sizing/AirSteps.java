package org.treadwarm.sizing;

import org.treadwarm.sizing.Plan.Link;

/** Steps of the conductance of moving air. */
final class AirSteps {
    private final Plan plan;
    private final Addresses addresses;
    private final Steps steps;

    AirSteps(Plan plan, Addresses addresses, Steps steps) {
        this.plan = plan;
        this.addresses = addresses;
        this.steps = steps;
    }

    void conductance(String at, Link link) {
        Symbol altitude = Symbol.of("z", addresses.input(plan.site.altitude()));
        switch (link.airWay()) {
            case RATE -> rate(at, link, altitude);
            case FLOW -> steps.add(at, "air-by-flow", "H", symbol("q_v", link.first()), altitude);
            case SUPPLY ->
                steps.add(
                        at, "air-by-supply", "H", symbol("q_v", link.first()), symbol("eta", link.second()), altitude);
            case NONE -> throw new IllegalStateException("no air here");
        }
    }

    private void rate(String at, Link link, Symbol altitude) {
        Symbol rate = symbol("n", link.first());
        if (link.third() == Stack.NONE) {
            steps.add(at, "air-by-rate", "H", rate, symbol("V", link.second()), altitude);
        } else {
            steps.add(
                    at,
                    "air-by-rate-of-the-room",
                    "H",
                    rate,
                    symbol("A", link.second()),
                    symbol("h", link.third()),
                    altitude);
        }
    }

    private Symbol symbol(String name, int input) {
        return Symbol.of(name, addresses.input(input));
    }
}
