package org.treadwarm.web.pages;

import java.util.ArrayList;
import java.util.List;
import org.treadwarm.sizing.Sizing.ElectricLayout;
import org.treadwarm.sizing.Sizing.FloorSizing;
import org.treadwarm.sizing.Sizing.HeatingElementLayout;
import org.treadwarm.sizing.Sizing.MatCircuit;
import org.treadwarm.sizing.Sizing.MatLayout;
import org.treadwarm.sizing.Sizing.MatPieces;
import org.treadwarm.sizing.Sizing.SectionSizing;
import org.treadwarm.units.Numbers;
import org.treadwarm.web.pages.Answer.Line;
import org.treadwarm.web.pages.LayoutLines.Layout;

/** What a fitter needs to feed an electric floor, and what is measured before and after covering it. */
final class ElectricLines {
    private static final String NOTE =
            "Write down the resistance, and the insulation resistance between conductors and earth, before and after covering. A"
                    + " sound element has 5\u00a0% less to 10\u00a0% more than its rated resistance (from memory). Put the floor sensor midway between two"
                    + " runs, in a conduit; a residual-current device of 30 mA and a limit of the floor's temperature are usual."
                    + " A licensed electrician connects it, by the local code.";
    private static final String UNDER_TIMBER =
            " Under timber: 30 mm of air above the cable, 50 mm between cable and joists (trade page on wooden floors, read).";

    private final List<Line> lines = new ArrayList<>();

    private ElectricLines() {}

    static Layout of(ElectricLayout layout, FloorSizing floor) {
        ElectricLines lines = new ElectricLines();
        boolean timber = layout.limits().stream().anyMatch(limit -> limit.name().contains("timber"));
        lines.all(layout);
        if (timber) {
            floor.section().ifPresent(lines::sheath);
        }
        LayoutLines.limits(lines.lines, layout.limits());
        return new Layout("Electric layout", List.copyOf(lines.lines), timber ? NOTE + UNDER_TIMBER : NOTE);
    }

    private void all(ElectricLayout layout) {
        add("Supply", layout.voltage(), 0, "V", "");
        layout.cableLength().ifPresent(length -> add("Cable in the floor", length, 1, "m", "area / spacing"));
        layout.mats().ifPresent(this::mats);
        for (int i = 0; i < layout.elements().size(); i++) {
            element(
                    layout.elements().size() == 1 ? "Element" : "Element " + (i + 1),
                    layout.elements().get(i));
        }
        lines.add(new Line("Insulation resistance", "at least 1 MΩ", "at 500\u00a0V DC (IEC 60364-6, from memory)"));
        add("Power at 10\u00a0% less voltage", layout.powerAtLowVoltage(), 0, "W", "81 %");
        add("Power at 10\u00a0% more voltage", layout.powerAtHighVoltage(), 0, "W", "121 %");
    }

    private void element(String name, HeatingElementLayout element) {
        add(name, element.power(), 0, "W", "on a circuit of its own");
        add(name + ", current", element.current(), 2, "A", "");
        add(name + ", breaker", element.breaker(), 0, "A", "smallest usual rating; the local code decides");
        add(
                name + ", resistance",
                element.resistance(),
                1,
                "Ω",
                toFind(element.lowestResistance(), element.highestResistance()));
    }

    private void mats(MatLayout mats) {
        for (MatPieces mat : mats.pieces()) {
            add(
                    mat.count() + " × " + mat.name(),
                    mat.area(),
                    2,
                    "m²",
                    "each " + unit(mat.power(), 0, "W") + ", " + unit(mat.density(), 0, "W/m²") + ", "
                            + unit(mat.current(), 2, "A"));
            add(
                    mat.name() + ", resistance",
                    mat.resistance(),
                    1,
                    "Ω",
                    toFind(mat.lowestResistance(), mat.highestResistance()));
        }
        add(
                "Covered by mats",
                mats.coveredArea(),
                2,
                "m²",
                "of " + unit(mats.area(), 2, "m²") + "; " + unit(mats.bareArea(), 2, "m²") + " stay bare");
        add("Power of the mats", mats.power(), 0, "W", reach(mats));
        for (int i = 0; i < mats.circuits().size(); i++) {
            circuit(
                    mats.circuits().size() == 1 ? "Circuit" : "Circuit " + (i + 1),
                    mats.circuits().get(i));
        }
    }

    private static String reach(MatLayout mats) {
        return unit(mats.neededPower(), 0, "W") + " are needed on the design day: "
                + unit(Math.abs(mats.margin()), 0, "W") + (mats.margin() < 0 ? " too little" : " to spare");
    }

    private void circuit(String name, MatCircuit circuit) {
        add(
                name,
                circuit.current(),
                2,
                "A",
                String.join(", ", circuit.mats()) + "; breaker " + unit(circuit.breaker(), 0, "A")
                        + ", the smallest usual rating; the local code decides");
    }

    private void sheath(SectionSizing section) {
        add(
                "Cable sheath under timber",
                section.atCarryingFlux().heaterTemperature(),
                1,
                "°C",
                "at the carrying flux; at most 80 °C, trade page on wooden floors (read)");
    }

    private static String toFind(double lowest, double highest) {
        return "measure before and after covering: " + Numbers.fixed(lowest, 1) + " to " + unit(highest, 1, "Ω")
                + "; the maker's figure decides";
    }

    /** A number and its unit that no line break tears apart. */
    private static String unit(double value, int decimals, String unit) {
        return Numbers.fixed(value, decimals) + "\u00a0" + unit;
    }

    private void add(String name, double value, int decimals, String unit, String note) {
        lines.add(LayoutLines.line(name, value, decimals, unit, note));
    }
}
