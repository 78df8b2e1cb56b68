package org.treadwarm.checks;

import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.stream.DoubleStream;
import org.treadwarm.physics.section.Condition.Film;
import org.treadwarm.physics.section.Condition.Held;
import org.treadwarm.physics.section.Conduction;
import org.treadwarm.physics.section.Field;
import org.treadwarm.physics.section.FloorHeater;
import org.treadwarm.physics.section.FloorHeater.HeatingCable;
import org.treadwarm.physics.section.FloorHeater.WaterPipe;
import org.treadwarm.physics.section.FloorLayer;
import org.treadwarm.physics.section.FloorLayer.Resisting;
import org.treadwarm.physics.section.FloorLayer.Solid;
import org.treadwarm.physics.section.FloorSection;
import org.treadwarm.physics.section.FloorTemperatures;
import org.treadwarm.physics.section.Grid;
import org.treadwarm.physics.section.GridLines;
import org.treadwarm.physics.section.GroundStrip;
import org.treadwarm.physics.section.Section;
import org.treadwarm.physics.section.Section.Block;
import org.treadwarm.physics.section.Section.Edge;
import org.treadwarm.physics.section.Section.Side;

/** Conduction through sections: cases of ISO 10211, heated floors and slabs on the ground. */
final class SectionChecks {
    private static final double RESIDUAL = 1e-10;

    /** Outside surface film, m²·K/W: ISO 6946:2017, table 7 (from memory). */
    private static final double OUTSIDE_FILM = 0.04;

    private SectionChecks() {}

    static Map<String, Computation> bindings() {
        return Map.of(
                "iso10211-1", SectionChecks::halfSquare,
                "iso10211-2", SectionChecks::profile,
                "floor2d-*", SectionChecks::pipeFloor,
                "cable2d-*", SectionChecks::cableFloor,
                "slab2d-*", SectionChecks::slab);
    }

    private static Map<String, DoubleStream> halfSquare(Inputs given) {
        double width = given.number("width");
        double height = given.number("height");
        Section section = Section.of(
                List.of(new Block(0, width, 0, height, 1)),
                List.of(
                        new Edge(Side.TOP, 0, width, new Held(given.number("top_C"))),
                        new Edge(Side.LEFT, 0, height, new Held(given.number("left_bottom_C"))),
                        new Edge(Side.BOTTOM, 0, width, new Held(given.number("left_bottom_C")))));
        Field field = Conduction.solve(section, Grid.uniform(width, height, 128, 256), RESIDUAL, () -> false);
        Map<String, DoubleStream> rows = new HashMap<>();
        given.numbers("y_from_top").forEach(y -> {
            String name = "T_row_" + String.format(Locale.ROOT, "%.2f", y);
            rows.put(name, given.numbers("x").map(x -> field.temperature(x, height - y)));
        });
        return rows;
    }

    /** The geometry of the case is given in words; heights are counted from the warm face. */
    private static Map<String, DoubleStream> profile(Inputs given) {
        double width = given.number("width_mm") / 1000;
        double sheet = 0.0015;
        Section section = Section.of(
                List.of(
                        new Block(0, width, 0, 0.0475, 0.029),
                        new Block(0, width, 0, sheet, 230),
                        new Block(0, 0.0015, sheet, 0.035, 230),
                        new Block(0, 0.015, 0.035, 0.0365, 230),
                        new Block(0, 0.015, 0.0365, 0.0415, 0.12),
                        new Block(0, width, 0.0415, 0.0475, 1.15)),
                List.of(
                        film(Side.BOTTOM, width, given.group("warm"), "Rsi"),
                        film(Side.TOP, width, given.group("cold"), "Rse")));
        double[] across = new GridLines(0.3, 0.02)
                .fine(0, 0.0015, 0.00025)
                .fine(0.0015, 0.015, 0.0005)
                .at(width)
                .lines();
        double[] upward = new GridLines(0.3, 0.004)
                .fine(0, sheet, 0.00025)
                .fine(0.035, 0.0415, 0.00025)
                .at(0.0365)
                .at(0.0475)
                .lines();
        Field field = Conduction.solve(section, new Grid(across, upward), RESIDUAL, () -> false);
        Map<String, DoubleStream> got = new HashMap<>();
        got.put("Q", DoubleStream.of(field.heatToEdge(1)));
        for (String point : List.of("A", "B", "C", "D", "E", "F", "G", "H", "I")) {
            double[] place = given.group("points_mm")
                    .numbers(point)
                    .map(value -> value / 1000)
                    .toArray();
            got.put(point, DoubleStream.of(field.temperature(place[0], place[1])));
        }
        return got;
    }

    private static Edge film(Side side, double width, Inputs given, String resistance) {
        return new Edge(side, 0, width, new Film(given.number("T"), 1 / given.number(resistance)));
    }

    private static Map<String, DoubleStream> pipeFloor(Inputs given) {
        Inputs pipe = given.group("pipe");
        double diameter = given.number("D");
        FloorHeater heater = new WaterPipe(
                1,
                given.number("su") + diameter / 2,
                diameter,
                pipe.number("s"),
                pipe.number("lam"),
                pipe.number("film_h"),
                given.number("T_fluid"));
        FloorTemperatures got = floor(given, heater).solve();
        double temperatureDifference =
                given.number("T_fluid") - given.group("above").number("T");
        Map<String, DoubleStream> numbers = new HashMap<>(common(got));
        numbers.put("K_num", DoubleStream.of(got.upwardFlux() / temperatureDifference));
        return numbers;
    }

    private static Map<String, DoubleStream> cableFloor(Inputs given) {
        double diameter = given.number("cable_d");
        FloorHeater heater = new HeatingCable(1, given.number("su") + diameter / 2, diameter, given.number("W_per_m"));
        FloorTemperatures got = floor(given, heater).solve();
        Map<String, DoubleStream> numbers = new HashMap<>(common(got));
        numbers.put("cable_skin_mean", DoubleStream.of(got.heaterTemperature()));
        return numbers;
    }

    /** Covering, screed and insulation, with the heater lying on the insulation. */
    private static FloorSection floor(Inputs given, FloorHeater heater) {
        Inputs below = given.group("below");
        List<FloorLayer> layers = List.of(
                new Resisting("covering", given.number("R_B")),
                new Solid("screed", given.number("su") + heater.diameter(), given.number("lambda_E")),
                new Solid("insulation", below.number("insulation_m"), below.number("k")));
        return new FloorSection(given.number("T"), layers, heater, film(given.group("above")), film(below));
    }

    private static Film film(Inputs given) {
        return new Film(given.number("T"), given.number("h"));
    }

    private static Map<String, DoubleStream> common(FloorTemperatures got) {
        return Map.of(
                "q_up", DoubleStream.of(got.upwardFlux()),
                "q_dn", DoubleStream.of(got.downwardFlux()),
                "Ts_max", DoubleStream.of(got.surfaceMaximum()),
                "Ts_min", DoubleStream.of(got.surfaceMinimum()));
    }

    private static Map<String, DoubleStream> slab(Inputs given) {
        double soil = given.number("lambda_g");
        double resistance = (given.number("d_t") - given.number("w")) / soil - OUTSIDE_FILM;
        double got = GroundStrip.transmittance(
                given.number("B") / 2, given.number("w"), soil, resistance, OUTSIDE_FILM, () -> false);
        return Map.of("U_numeric", DoubleStream.of(got));
    }
}
