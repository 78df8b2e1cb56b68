package org.treadwarm.web.pages;

import java.util.ArrayList;
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
            String standard,
            String clause,
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
                    value.standard(),
                    value.clause(),
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

    /** The published values of one standard or subject. */
    public record CheckGroup(String standard, List<CheckRow> rows) {
        /** How many of them fail. */
        public long failed() {
            return rows.stream().filter(row -> !row.passes()).count();
        }

        /** How many there are, and whether they pass, in words. */
        public String words() {
            String count = rows.size() == 1 ? "1 value, " : rows.size() + " values, ";
            return count + (failed() > 0 ? failed() + " FAIL" : rows.size() == 1 ? "passes" : "all pass");
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
        /** By the standard or subject they belong to, in the order in which these first come. */
        List<CheckGroup> groups() {
            Map<String, List<CheckRow>> groups = new LinkedHashMap<>();
            rows.forEach(row -> groups.computeIfAbsent(row.standard(), standard -> new ArrayList<>())
                    .add(row));
            return groups.entrySet().stream()
                    .map(group -> new CheckGroup(group.getKey(), List.copyOf(group.getValue())))
                    .toList();
        }

        long failed() {
            return rows.stream().filter(row -> !row.passes()).count();
        }
    }
}
