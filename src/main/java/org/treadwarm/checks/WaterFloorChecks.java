package org.treadwarm.checks;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.Optional;
import java.util.function.ToDoubleFunction;
import java.util.stream.DoubleStream;
import org.treadwarm.physics.floor.LimitCurve;
import org.treadwarm.physics.floor.Pipe;
import org.treadwarm.physics.floor.Pipe.Sheath;
import org.treadwarm.physics.floor.PipesInScreed.Factors;
import org.treadwarm.physics.floor.PlaneElement;
import org.treadwarm.physics.floor.ScreedFloor;
import org.treadwarm.physics.floor.ZoneSplit;
import org.treadwarm.physics.water.HeatingWater;
import org.treadwarm.sizing.FloorMethods;
import org.treadwarm.tables.FloorFactors;
import org.treadwarm.tables.FloorFactors.Grid;
import org.treadwarm.tables.FloorFactors.Line;

/** The table method of warm-water floors: factors, characteristics, limit curves, water temperatures. */
final class WaterFloorChecks {
    /** 29 °C over 20 °C, as the limit cases say. */
    private static final double OCCUPIED_OVERTEMPERATURE = 9;

    private WaterFloorChecks() {}

    static Map<String, Computation> bindings() {
        return Map.ofEntries(
                Map.entry("en1264-tables-A", WaterFloorChecks::screedTables),
                Map.entry("en1264-tables-limit", WaterFloorChecks::limitTables),
                Map.entry("en1264-tables-B", WaterFloorChecks::sheetTables),
                Map.entry("en1264-KH-A-*", WaterFloorChecks::screedCharacteristic),
                Map.entry("en1264-KH-D-*", WaterFloorChecks::planeCharacteristic),
                Map.entry("en1264-lmtd-*", WaterFloorChecks::meanOvertemperature),
                Map.entry("en1264-limit-*", WaterFloorChecks::limit),
                Map.entry("en1264-supply-*", WaterFloorChecks::supply),
                Map.entry("en1264-edge-zone", WaterFloorChecks::occupiedFlux));
    }

    private static Map<String, DoubleStream> screedTables(Inputs given) {
        return Map.of(
                "aT", values(FloorFactors.screedSpacing(), given.numbers("R")),
                "aU", values(FloorFactors.screedCover(), given, "T", "R"),
                "aD", values(FloorFactors.screedDiameter(), given, "T", "R"));
    }

    private static Map<String, DoubleStream> limitTables(Inputs given) {
        return Map.of(
                "BG", values(FloorFactors.limitCoefficient(), given, "T_BG", "su_over_lambda"),
                "nG", values(FloorFactors.limitExponent(), given, "T_nG", "su_over_lambda"),
                "BG_thick", values(FloorFactors.thickLimitCoefficient(), given.numbers("su_over_T")),
                "nG_thick", values(FloorFactors.thickLimitExponent(), given.numbers("su_over_T")));
    }

    private static Map<String, DoubleStream> sheetTables(Inputs given) {
        return Map.of(
                "aT", values(FloorFactors.sheetSpacing(), given.numbers("su_over_lambda")),
                "aK", values(FloorFactors.sheetContact(), given.numbers("T")),
                "bu", values(FloorFactors.sheetScreedShare(), given.numbers("T")));
    }

    private static DoubleStream values(Line table, DoubleStream arguments) {
        return arguments.map(argument -> table.points().stream()
                .filter(point -> point.argument() == argument)
                .mapToDouble(Line.Point::value)
                .findFirst()
                .orElseThrow());
    }

    private static DoubleStream values(Grid table, Inputs given, String rows, String columns) {
        return given.numbers(rows)
                .flatMap(row -> given.numbers(columns)
                        .map(column -> table.cells().stream()
                                .filter(cell -> cell.row() == row && cell.column() == column)
                                .mapToDouble(Grid.Cell::value)
                                .findFirst()
                                .orElseThrow()));
    }

    private static Map<String, DoubleStream> screedCharacteristic(Inputs given) {
        ScreedFloor floor = screedFloor(given);
        double coefficient = FloorMethods.pipesInScreed().coefficient(floor);
        Map<String, DoubleStream> got = new LinkedHashMap<>();
        got.put("K_H", DoubleStream.of(coefficient));
        if (given.has("dTH")) {
            got.put("q_at_15K", DoubleStream.of(coefficient * given.number("dTH")));
            Factors factors = FloorMethods.pipesInScreed().factors(floor);
            Map<String, ToDoubleFunction<Factors>> named = Map.of(
                    "aB", Factors::aB,
                    "aT", Factors::aT,
                    "aU", Factors::aU,
                    "aD", Factors::aD,
                    "mT", Factors::mT,
                    "mU", Factors::mU,
                    "mD", Factors::mD);
            named.forEach((name, factor) -> got.put(name, DoubleStream.of(factor.applyAsDouble(factors))));
        }
        return got;
    }

    static ScreedFloor screedFloor(Inputs given) {
        Optional<Sheath> sheath = given.has("D_M")
                ? Optional.of(new Sheath(given.number("D_M"), given.number("lam_M")))
                : Optional.empty();
        Pipe pipe = given.has("lam_R")
                ? new Pipe(given.number("D"), given.number("s_R"), given.number("lam_R"), sheath)
                : Pipe.reference(given.number("D"));
        return new ScreedFloor(
                given.number("T"), given.number("su"), given.number("lambda_E"), given.number("R_B"), pipe);
    }

    private static Map<String, DoubleStream> planeCharacteristic(Inputs given) {
        double coverResistance = given.number("su") / given.number("lambda_E");
        return Map.of("K_H", DoubleStream.of(PlaneElement.coefficient(coverResistance, given.number("R_B"))));
    }

    private static Map<String, DoubleStream> meanOvertemperature(Inputs given) {
        double mean = HeatingWater.meanOvertemperature(given.number("V"), given.number("R"), given.number("i"));
        return Map.of("dTH", DoubleStream.of(mean));
    }

    private static Map<String, DoubleStream> limit(Inputs given) {
        LimitCurve.Limit limit = limitAt(screedFloor(given), OCCUPIED_OVERTEMPERATURE);
        return Map.of("qG", DoubleStream.of(limit.flux()), "dTHG", DoubleStream.of(limit.waterOvertemperature()));
    }

    static LimitCurve.Limit limitAt(ScreedFloor floor, double overtemperature) {
        return FloorMethods.limitCurves()
                .of(floor)
                .meets(FloorMethods.pipesInScreed().coefficient(floor), overtemperature);
    }

    private static Map<String, DoubleStream> supply(Inputs given) {
        double mean = given.number("dTH");
        double spread = given.number("sigma");
        return Map.of(
                "rule", DoubleStream.of(HeatingWater.supplyOvertemperatureByRule(mean, spread)),
                "exact", DoubleStream.of(HeatingWater.supplyOvertemperature(mean, spread)));
    }

    private static Map<String, DoubleStream> occupiedFlux(Inputs given) {
        double area = given.number("A_F");
        double peripheral = given.number("A_R");
        double flux = ZoneSplit.occupiedFlux(area, peripheral, given.number("q_R"), given.number("q_des"));
        return Map.of("q_A", DoubleStream.of(flux));
    }
}
