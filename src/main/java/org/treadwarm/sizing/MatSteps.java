package org.treadwarm.sizing;

import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;
import org.treadwarm.sizing.Sizing.MatLayout;
import org.treadwarm.sizing.Sizing.MatPieces;

/** Steps of the mats chosen for a floor. */
final class MatSteps {
    private final Steps steps;
    private final String floorAt;
    private final String at;

    /** @param floorAt pointer of the floor in the answer */
    MatSteps(Steps steps, String floorAt) {
        this.steps = steps;
        this.floorAt = floorAt;
        this.at = floorAt + "/electric/mats";
    }

    void all(MatLayout mats, boolean planned) {
        List<String> areas = new ArrayList<>();
        areas.add(Addresses.sizing(floorAt + "/area"));
        if (planned) {
            areas.add(Addresses.sizing(floorAt + "/plan/freeArea"));
        }
        Symbol counts = each(mats, "n", "count");
        steps.add(at + "/area", "area-to-cover", "A", Symbol.all("A_each", areas));
        steps.add(at + "/coveredArea", "covered-by-mats", "A_c", counts, each(mats, "A_m", "area"));
        steps.add(at + "/bareArea", "left-bare", "A_bare", symbol("A", "/area"), symbol("A_c", "/coveredArea"));
        steps.add(at + "/power", "power-of-mats", "P", counts, each(mats, "P_m", "power"));
        steps.add(
                at + "/neededPower",
                "power-needed",
                "P_need",
                Symbol.of("P_H", Addresses.sizing(floorAt + "/heaterPower")));
        steps.add(
                at + "/margin", "margin-of-mats", "P_margin", symbol("P", "/power"), symbol("P_need", "/neededPower"));
        steps.add(
                at + "/meanDensity",
                "mean-density-of-mats",
                "p",
                symbol("P", "/power"),
                Symbol.of("A_F", Addresses.sizing(floorAt + "/area")));
        for (int i = 0; i < mats.pieces().size(); i++) {
            pieces(mats.pieces().get(i), "/pieces/" + i);
        }
        for (int i = 0; i < mats.circuits().size(); i++) {
            steps.add(at + "/circuits/" + i + "/current", "chosen", "x");
            steps.add(at + "/circuits/" + i + "/breaker", "chosen", "x");
        }
    }

    private void pieces(MatPieces pieces, String key) {
        String here = at + key;
        steps.add(here + "/count", "chosen", "x");
        for (String given : List.of("area", "power")) {
            steps.add(
                    here + "/" + given,
                    "mat-given",
                    "x",
                    Symbol.of("x_given", Addresses.survey(pieces.pointer() + "/" + given)));
        }
        Symbol power = symbol("P_e", key + "/power");
        Symbol voltage = Symbol.of("U", Addresses.sizing(floorAt + "/electric/voltage"));
        Symbol resistance = symbol("R", key + "/resistance");
        steps.add(here + "/density", "density-of-mat", "p", power, symbol("A_m", key + "/area"));
        steps.add(here + "/current", "element-current", "I", power, voltage);
        steps.add(here + "/resistance", "element-resistance", "R", voltage, power);
        steps.add(here + "/lowestResistance", "lowest-element-resistance", "R_low", resistance);
        steps.add(here + "/highestResistance", "highest-element-resistance", "R_high", resistance);
    }

    private Symbol each(MatLayout mats, String name, String key) {
        return Symbol.all(
                name,
                IntStream.range(0, mats.pieces().size())
                        .mapToObj(i -> Addresses.sizing(at + "/pieces/" + i + "/" + key))
                        .toList());
    }

    private Symbol symbol(String name, String key) {
        return Symbol.of(name, Addresses.sizing(at + key));
    }
}
