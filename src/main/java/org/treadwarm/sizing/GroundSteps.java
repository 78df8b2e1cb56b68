package org.treadwarm.sizing;

import org.treadwarm.physics.envelope.HeatFlow;
import org.treadwarm.sizing.Plan.AssemblyPlan;
import org.treadwarm.sizing.Plan.GroundPlan;
import org.treadwarm.sizing.Plan.Link;
import org.treadwarm.sizing.Sizing.GroundPath;

/** Steps of floors on the ground. */
final class GroundSteps {
    private static final String DECK_FILM = TableNumbers.insideFilm(HeatFlow.DOWN);
    private static final String GROUND_FILM = TableNumbers.outsideFilm(HeatFlow.DOWN);

    private final Plan plan;
    private final Addresses addresses;
    private final Steps steps;
    private final FilmSteps films;

    GroundSteps(Plan plan, Addresses addresses, Steps steps) {
        this.plan = plan;
        this.addresses = addresses;
        this.steps = steps;
        this.films = new FilmSteps(addresses, steps);
    }

    /** An unheated floor: its U-value and what leads to it. */
    void unheated(String at, Link link, GroundPath answer) {
        GroundPlan ground = plan.grounds.get(link.ground());
        String here = at + "/ground";
        common(here, ground);
        AssemblyPlan assembly = plan.assemblies.get(plan.faces.get(link.face()).assembly());
        films.film(here + "/insideFilm", assembly.insideCoefficient(), DECK_FILM);
        Symbol film = answered("R_si", here, "/insideFilm");
        Symbol floor = Symbol.of("R_f", addresses.side(link.face(), "resistance"));
        if (ground.suspended()) {
            steps.add(
                    at + "/uValue",
                    "suspended-floor-u-value",
                    "U",
                    film,
                    floor,
                    Symbol.of("R_se", DECK_FILM),
                    answered("U_g", here, "/voidToGround"),
                    answered("U_x", here, "/voidToOutdoors"));
            return;
        }
        steps.add(
                here + "/equivalentThickness",
                "slab-equivalent-thickness",
                "d_t",
                symbol("w", ground.wall()),
                symbol("lambda", ground.soil()),
                film,
                floor,
                Symbol.of("R_se", GROUND_FILM));
        steps.add(
                at + "/uValue",
                isLittleInsulated(answer) ? "slab-u-value" : "well-insulated-slab-u-value",
                "U",
                slab(here, ground));
    }

    /** The symbols of the two formulas of a slab. */
    Symbol[] slab(String here, GroundPlan ground) {
        return new Symbol[] {
            symbol("lambda", ground.soil()),
            answered("B", here, "/characteristicDimension"),
            answered("d_t", here, "/equivalentThickness")
        };
    }

    static boolean isLittleInsulated(GroundPath answer) {
        return answer.equivalentThickness() < answer.characteristicDimension();
    }

    /** B', the seasonal factor, and for a suspended floor the void. */
    void common(String here, GroundPlan ground) {
        steps.add(
                here + "/characteristicDimension",
                "characteristic-dimension",
                "B",
                symbol("A", ground.area()),
                symbol("P", ground.perimeter()));
        steps.add(here + "/seasonalFactor", "seasonal-factor", "f_g", seasonal());
        if (ground.suspended()) {
            hollow(here, ground);
        }
    }

    private void hollow(String here, GroundPlan ground) {
        steps.add(
                here + "/equivalentThickness",
                "void-equivalent-thickness",
                "d_g",
                symbol("w", ground.wall()),
                symbol("lambda", ground.soil()),
                Symbol.of("R_si", DECK_FILM),
                Symbol.of("R_se", GROUND_FILM));
        Symbol dimension = answered("B", here, "/characteristicDimension");
        steps.add(
                here + "/voidToGround",
                "void-to-ground",
                "U_g",
                symbol("lambda", ground.soil()),
                dimension,
                answered("d_g", here, "/equivalentThickness"));
        steps.add(
                here + "/voidToOutdoors",
                "void-to-outdoors",
                "U_x",
                symbol("h", ground.floorHeight()),
                symbol("U_w", ground.wallUValue()),
                symbol("epsilon", ground.ventArea()),
                symbol("v", ground.windSpeed()),
                Symbol.of("f_w", TableNumbers.shielding(ground.shielding())),
                dimension);
    }

    /** Conductance of a surface to the ground. */
    void conductance(String at, Link link) {
        Symbol area = answered("A", at, "/area");
        Symbol uValue = answered("U", at, "/uValue");
        if (link.ground() == Stack.NONE) {
            Symbol[] seasonal = seasonal();
            steps.add(
                    at + "/conductance",
                    "ground-conductance-of-a-given-u-value",
                    "H",
                    area,
                    uValue,
                    seasonal[0],
                    seasonal[1]);
        } else {
            steps.add(
                    at + "/conductance",
                    "ground-conductance",
                    "H",
                    area,
                    uValue,
                    answered("f_g", at, "/ground/seasonalFactor"));
        }
    }

    private Symbol[] seasonal() {
        return new Symbol[] {symbol("f_season", plan.site.season()), symbol("f_gw", plan.site.groundwater())};
    }

    private Symbol symbol(String name, int input) {
        return Symbol.of(name, addresses.input(input));
    }

    private static Symbol answered(String name, String at, String key) {
        return Symbol.of(name, Addresses.sizing(at + key));
    }
}
