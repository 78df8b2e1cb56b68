package org.treadwarm.web.pages;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.function.BooleanSupplier;
import java.util.function.DoubleConsumer;
import org.treadwarm.checks.CheckedValue;
import org.treadwarm.checks.PublishedChecks;
import org.treadwarm.tables.AirGaps;
import org.treadwarm.tables.Coverings;
import org.treadwarm.tables.Films;
import org.treadwarm.tables.Materials;
import org.treadwarm.tables.PsiDefaults;
import org.treadwarm.units.Numbers;
import org.treadwarm.units.QuantityKind;
import org.treadwarm.units.Unit;
import org.treadwarm.units.UnitTable;

/** Pages to look things up: materials and defaults, how readings are written, and the method with its published checks. */
final class TablePages {
    /** One published value as a row of text. */
    public record CheckRow(
            String subject,
            String what,
            String expected,
            String got,
            String deviation,
            String allowed,
            boolean passes,
            String confidence,
            String source) {
        static CheckRow of(CheckedValue value) {
            return new CheckRow(
                    value.standard() + (value.clause().isEmpty() ? "" : ", " + value.clause()),
                    value.caseId() + " " + value.what(),
                    Numbers.significant(value.expected(), 6),
                    Numbers.significant(value.got(), 6),
                    Numbers.significant(value.deviation(), 2),
                    Numbers.significant(value.tolerance(), 2),
                    value.passes(),
                    value.confidence().word(),
                    value.source());
        }
    }

    /** The units of one kind of quantity. */
    public record UnitsRow(String kind, String units, String source) {}

    Map<String, Object> materials(String find) {
        String text = find == null ? "" : find.strip();
        return Map.of(
                "find", text,
                "materials", text.isEmpty() ? Materials.all() : Materials.search(text),
                "films", Films.all(),
                "airGaps", AirGaps.all(),
                "psi", PsiDefaults.all(),
                "coverings", Coverings.all());
    }

    Map<String, Object> readingHelp() {
        Map<QuantityKind, StringBuilder> units = new LinkedHashMap<>();
        Map<QuantityKind, String> sources = new LinkedHashMap<>();
        for (Unit unit : UnitTable.all()) {
            StringBuilder list = units.computeIfAbsent(unit.kind(), kind -> new StringBuilder());
            list.append(list.length() == 0 ? "" : ",  ").append(unit.symbol());
            sources.merge(unit.kind(), unit.source(), (a, b) -> a.contains(b) ? a : a + "; " + b);
        }
        List<UnitsRow> rows = units.entrySet().stream()
                .map(entry ->
                        new UnitsRow(entry.getKey().words(), entry.getValue().toString(), sources.get(entry.getKey())))
                .toList();
        return Map.of("units", rows);
    }

    /** The rows of the published values, as the computation of them gives them. */
    static CheckRows checks(BooleanSupplier stopped, DoubleConsumer progress) {
        return new CheckRows(PublishedChecks.all(stopped, progress).stream()
                .map(CheckRow::of)
                .toList());
    }

    /** Every published value as a row of text. */
    record CheckRows(List<CheckRow> rows) {
        long failed() {
            return rows.stream().filter(row -> !row.passes()).count();
        }
    }
}
