package org.treadwarm.checks;

import java.util.Map;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import java.util.stream.DoubleStream;
import org.treadwarm.tables.AirGaps;
import org.treadwarm.tables.Coverings;
import org.treadwarm.tables.Films;
import org.treadwarm.tables.Materials;
import org.treadwarm.tables.PsiDefaults;

/** Rows of the program's own tables. */
final class TableChecks {
    private TableChecks() {}

    static Map<String, Computation> bindings() {
        return Map.ofEntries(
                Map.entry("table-air-gaps", TableChecks::airGaps),
                Map.entry("table-films", TableChecks::films),
                Map.entry("table-psi-14683", TableChecks::defaultPsi),
                Map.entry("table-psi-sap", TableChecks::regulationPsi),
                Map.entry("br07-heated-floor-foundation", TableChecks::highestPsi),
                Map.entry("table-materials-*", TableChecks::conductivities),
                Map.entry(
                        "table-covering-classes",
                        given -> Map.of("R", given.texts("coverings").stream().mapToDouble(TableChecks::covering))),
                Map.entry("en1264-covering-default", TableChecks::defaultCoverings));
    }

    private static Map<String, DoubleStream> airGaps(Inputs given) {
        return Map.of(
                "up", airGaps(given, AirGaps.Row::up),
                "horizontal", airGaps(given, AirGaps.Row::horizontal),
                "down", airGaps(given, AirGaps.Row::down));
    }

    private static DoubleStream airGaps(Inputs given, ToDoubleFunction<AirGaps.Row> column) {
        return given.numbers("d_mm")
                .map(thickness -> AirGaps.all().stream()
                        .filter(row -> row.thickness() == thickness)
                        .mapToDouble(column)
                        .findFirst()
                        .orElseThrow());
    }

    private static Map<String, DoubleStream> films(Inputs given) {
        return Map.of(
                "Rsi", given.texts("heat_flow").stream().mapToDouble(Films::inside),
                "Rse", given.texts("heat_flow").stream().mapToDouble(Films::outside));
    }

    private static Map<String, DoubleStream> defaultPsi(Inputs given) {
        return Map.of(
                "external", psi(given, "", PsiDefaults.Row::external),
                "overall_internal", psi(given, "", PsiDefaults.Row::overallInternal),
                "internal", psi(given, "", PsiDefaults.Row::internal));
    }

    private static Map<String, DoubleStream> regulationPsi(Inputs given) {
        return Map.of(
                "approved", psi(given, ", approved detail", PsiDefaults.Row::internal),
                "default", psi(given, ", default", PsiDefaults.Row::internal));
    }

    private static Map<String, DoubleStream> highestPsi(Inputs given) {
        double[] psi = psi(given, "", PsiDefaults.Row::internal).toArray();
        return Map.of(
                "psi_max_foundation", DoubleStream.of(psi[0]),
                "psi_max_foundation_heated_floor", DoubleStream.of(psi[1]),
                "psi_max_window_joint", DoubleStream.of(psi[2]));
    }

    private static DoubleStream psi(Inputs given, String kind, Function<PsiDefaults.Row, OptionalDouble> column) {
        return given.texts("junctions").stream()
                .mapToDouble(junction -> PsiDefaults.all().stream()
                        .filter(row -> row.junction().equals(junction + kind))
                        .findFirst()
                        .map(column)
                        .orElseThrow()
                        .orElseThrow());
    }

    private static Map<String, DoubleStream> conductivities(Inputs given) {
        return Map.of(
                "lambda",
                given.texts("materials").stream()
                        .mapToDouble(name -> Materials.find(name)
                                .orElseThrow()
                                .conductivity()
                                .orElseThrow()));
    }

    private static Map<String, DoubleStream> defaultCoverings(Inputs given) {
        double[] resistance = given.texts("coverings").stream()
                .mapToDouble(TableChecks::covering)
                .toArray();
        return Map.of(
                "living", DoubleStream.of(resistance[0]),
                "bath", DoubleStream.of(resistance[1]),
                "max", DoubleStream.of(resistance[2]));
    }

    private static double covering(String name) {
        return Coverings.all().stream()
                .filter(row -> row.name().equals(name))
                .findFirst()
                .orElseThrow()
                .resistance();
    }
}
